package loopwright.view.frame;

import java.awt.Component;
import java.awt.EventQueue;
import java.awt.Point;
import java.awt.Robot;
import java.awt.Window;
import java.awt.event.InputEvent;
import java.awt.event.KeyEvent;
import java.util.Arrays;
import java.util.concurrent.Callable;
import java.util.concurrent.FutureTask;
import javax.swing.JDialog;
import javax.swing.JTextField;

/** A person's hand on keyboard and pointer, which counts what it does. */
final class WindowHand {
  private static final long PATIENCE = 60_000;

  private final Robot robot;
  private int actions;

  WindowHand() throws Exception {
    robot = new Robot();
    robot.setAutoDelay(15);
  }

  /** Clicks, typed texts and chords so far. */
  int actions() {
    return actions;
  }

  /** The dialog of that name. */
  static JDialog dialog(String name) throws Exception {
    return onEventThread(
        () ->
            Arrays.stream(Window.getWindows())
                .filter(JDialog.class::isInstance)
                .map(JDialog.class::cast)
                .filter(dialog -> name.equals(dialog.getName()) && dialog.isShowing())
                .findFirst()
                .orElseThrow(() -> new AssertionError("no dialog is called " + name)));
  }

  /** Clicks the middle of a component. */
  void click(Component component) throws Exception {
    click(
        onEventThread(
            () -> {
              Point corner = component.getLocationOnScreen();
              return new Point(
                  corner.x + component.getWidth() / 2, corner.y + component.getHeight() / 2);
            }));
  }

  /** Types a text into a field in place of what it holds. */
  void type(JTextField field, String text) throws Exception {
    Point at =
        onEventThread(
            () -> {
              Point corner = field.getLocationOnScreen();
              return new Point(corner.x + field.getWidth() / 3, corner.y + field.getHeight() / 2);
            });
    click(at);
    waitFor(() -> onEventThread(field::isFocusOwner));
    press(KeyEvent.VK_A, InputEvent.CTRL_DOWN_MASK);
    keys(text);
    actions -= 2;
  }

  void click(Point at) {
    actions++;
    robot.mouseMove(at.x, at.y);
    robot.mousePress(InputEvent.BUTTON1_DOWN_MASK);
    robot.mouseRelease(InputEvent.BUTTON1_DOWN_MASK);
    robot.waitForIdle();
  }

  void keys(String text) {
    actions++;
    for (char character : text.toCharArray()) {
      boolean shift = Character.isUpperCase(character);
      strike(
          KeyEvent.getExtendedKeyCodeForChar(Character.toLowerCase(character)),
          shift ? InputEvent.SHIFT_DOWN_MASK : 0);
    }
  }

  void press(int key, int modifier) {
    actions++;
    strike(key, modifier);
  }

  private void strike(int key, int modifier) {
    int held =
        switch (modifier) {
          case InputEvent.CTRL_DOWN_MASK -> KeyEvent.VK_CONTROL;
          case InputEvent.SHIFT_DOWN_MASK -> KeyEvent.VK_SHIFT;
          default -> 0;
        };
    if (held != 0) {
      robot.keyPress(held);
    }
    robot.keyPress(key);
    robot.keyRelease(key);
    if (held != 0) {
      robot.keyRelease(held);
    }
    robot.waitForIdle();
  }

  static <T> T onEventThread(Callable<T> work) throws Exception {
    FutureTask<T> task = new FutureTask<>(work);
    EventQueue.invokeAndWait(task);
    return task.get();
  }

  static void waitFor(Callable<Boolean> condition) throws Exception {
    long end = System.currentTimeMillis() + PATIENCE;
    while (!condition.call()) {
      if (System.currentTimeMillis() > end) {
        throw new AssertionError("waited in vain");
      }
      Thread.sleep(30);
    }
  }
}
