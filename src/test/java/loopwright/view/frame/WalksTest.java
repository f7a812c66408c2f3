package loopwright.view.frame;

import static loopwright.view.frame.WindowHand.onEventThread;
import static loopwright.view.frame.WindowHand.waitFor;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static org.junit.jupiter.api.Assumptions.assumeFalse;

import java.awt.Container;
import java.awt.EventQueue;
import java.awt.GraphicsEnvironment;
import java.awt.Rectangle;
import java.awt.Robot;
import java.awt.Toolkit;
import java.awt.Window;
import java.awt.event.InputEvent;
import java.awt.event.KeyEvent;
import java.awt.image.BufferedImage;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Collectors;
import javax.imageio.ImageIO;
import javax.swing.JButton;
import javax.swing.JComboBox;
import javax.swing.JComponent;
import javax.swing.JDialog;
import javax.swing.JFrame;
import javax.swing.JTable;
import javax.swing.JTextArea;
import javax.swing.JTextField;
import loopwright.check.Finding;
import loopwright.design.Change;
import loopwright.design.Design;
import loopwright.file.DesignFile;
import loopwright.file.ShelfFile;
import loopwright.part.Shelf;
import loopwright.predict.Catalogue;
import loopwright.predict.Figure;
import loopwright.predict.HookupFigures;
import loopwright.session.Session;
import loopwright.session.Snapshot;
import loopwright.task.BackgroundRunner;
import loopwright.view.Lookup;
import loopwright.view.theme.Theme;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Whole visits at the desk, on a real display, by keys and pointer. */
class WalksTest {
  private static final Path PICTURES = Path.of("target", "pictures");

  @TempDir private Path folder;
  private Session session;
  private JFrame frame;
  private WindowHand hand;

  private void open(Design design) throws Exception {
    hand = new WindowHand();
    frame =
        onEventThread(
            () -> {
              Shelf shelf = new ShelfFile().shipped();
              session =
                  new Session(
                      files(),
                      Screenshots.SOURCE,
                      new BackgroundRunner(EventQueue::invokeLater),
                      design);
              MainWindow window =
                  new MainWindow(
                      session,
                      shelf,
                      Theme.LIGHT,
                      SampleKeeping.in(folder.resolve("user"), session, files()),
                      new SilentDialogs());
              window.open();
              return window.frame();
            });
    waitFor(() -> snapshot().current());
  }

  private static DesignFile files() {
    return new DesignFile(
        new ShelfFile().shipped(),
        Catalogue.figures().stream().collect(Collectors.toMap(Figure::key, Figure::unit)));
  }

  private static Design example(String name) {
    return files().read(Path.of("examples", name + ".json")).design();
  }

  private Snapshot snapshot() throws Exception {
    return onEventThread(() -> session.snapshot());
  }

  @AfterEach
  void close() throws Exception {
    if (frame != null) {
      onEventThread(
          () -> {
            session.close();
            for (Window window : Window.getWindows()) {
              window.dispose();
            }
            return null;
          });
    }
  }

  private static void picture(String name) throws Exception {
    Files.createDirectories(PICTURES);
    BufferedImage image =
        new Robot().createScreenCapture(new Rectangle(Toolkit.getDefaultToolkit().getScreenSize()));
    ImageIO.write(image, "png", PICTURES.resolve(name + ".png").toFile());
  }

  private static <C extends JComponent> C named(Container root, String name, Class<C> type)
      throws Exception {
    return onEventThread(() -> Lookup.named(root, name, type));
  }

  /** An amplifier known by its measured figures: which two resistors make a gain of 15? */
  @Test
  void aDividerIsSizedFromMeasuredFiguresInAtMostTwelveActions() throws Exception {
    assumeFalse(GraphicsEnvironment.isHeadless(), "needs a display");
    open(example("measured-amplifier"));

    hand.press(KeyEvent.VK_D, InputEvent.CTRL_DOWN_MASK);
    JDialog dialog = WindowHand.dialog("study.size-a-divider");
    hand.type(named(dialog, "gain", JTextField.class), "15");
    hand.press(KeyEvent.VK_ENTER, 0);
    JTable table = named(dialog, "proposals", JTable.class);
    waitFor(() -> onEventThread(table::getRowCount) > 0);
    picture("walk-divider");
    hand.click(named(dialog, "apply", JButton.class));
    waitFor(() -> snapshot().unsaved() && snapshot().current());

    assertThat(hand.actions()).isLessThanOrEqualTo(12);
    double gain =
        HookupFigures.of(snapshot().design(), snapshot().hookup())
            .solved(Catalogue.find("closedLoopGain").orElseThrow())
            .number()
            .orElseThrow();
    assertThat(gain).isEqualTo(15, within(0.5));
  }

  /** A follower with an unbiased output stage: do gain and offset agree with the prediction? */
  @Test
  void measuredGainAndOffsetGetAVerdict() throws Exception {
    assumeFalse(GraphicsEnvironment.isHeadless(), "needs a display");
    open(example("seismometer-coil"));
    int before = snapshot().design().bench().readings().size();

    hand.press(KeyEvent.VK_B, InputEvent.CTRL_DOWN_MASK);
    JDialog dialog = WindowHand.dialog("study.bench");
    add(dialog, "Closed-loop gain", "10.5");
    add(dialog, "Output offset", "110m");
    waitFor(() -> snapshot().design().bench().readings().size() == before + 2);
    hand.click(named(dialog, "start", JButton.class));
    JTextArea set = named(dialog, "set", JTextArea.class);
    waitFor(() -> onEventThread(set::getText).contains("with the prediction"));
    picture("walk-bench");

    JTable table = named(dialog, "proposals", JTable.class);
    assertThat(onEventThread(() -> (String) table.getValueAt(before + 1, 7))).isEqualTo("agrees");
    String verdict = onEventThread(set::getText);
    assertThat(verdict).contains("readings agree with the prediction");
  }

  private void add(JDialog dialog, String quantity, String value) throws Exception {
    JComboBox<?> box = named(dialog, "quantity", JComboBox.class);
    onEventThread(
        () -> {
          for (int i = 0; i < box.getItemCount(); i++) {
            if (box.getItemAt(i).toString().equals(quantity)) {
              box.setSelectedIndex(i);
            }
          }
          return null;
        });
    hand.type(named(dialog, "value", JTextField.class), value);
    hand.click(named(dialog, "add", JButton.class));
  }

  /** A follower that oscillates, its pair out of balance: its findings cure it. */
  @Test
  void aWrongDesignIsCuredByItsFindings() throws Exception {
    assumeFalse(GraphicsEnvironment.isHeadless(), "needs a display");
    Design wrong =
        new Change("amplifier.inputPair.load.output", "2k7")
            .applyTo(example("hydrophone-follower"));
    open(wrong);
    assertThat(severities()).contains(Finding.Severity.FAILS);
    picture("walk-findings-before");

    for (int i = 0; i < 6 && worthCuring(); i++) {
      Design before = snapshot().design();
      JButton remedy =
          onEventThread(
              () ->
                  Lookup.all(frame.getContentPane(), JButton.class).stream()
                      .filter(
                          button ->
                              button.getName() != null && button.getName().startsWith("remedy."))
                      .findFirst()
                      .orElseThrow(() -> new AssertionError("no remedy is offered")));
      assertThat(onEventThread(remedy::isShowing)).isTrue();
      onEventThread(
          () -> {
            ((JComponent) remedy.getParent()).scrollRectToVisible(remedy.getBounds());
            return null;
          });
      hand.click(remedy);
      waitFor(() -> !snapshot().design().equals(before) && snapshot().current());
    }

    picture("walk-findings-after");
    assertThat(severities())
        .doesNotContain(Finding.Severity.FAILS)
        .doesNotContain(Finding.Severity.RISKY);
    assertThat(snapshot().prediction().orElseThrow().overSwing())
        .allSatisfy(level -> assertThat(level.stable()).isTrue());
  }

  private boolean worthCuring() throws Exception {
    return severities().stream().anyMatch(severity -> severity != Finding.Severity.REMARK);
  }

  private List<Finding.Severity> severities() throws Exception {
    return snapshot().findings().stream().map(Finding::severity).toList();
  }
}
