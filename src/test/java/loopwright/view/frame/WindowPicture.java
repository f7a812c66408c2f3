package loopwright.view.frame;

import java.awt.BorderLayout;
import java.awt.Component;
import java.awt.Container;
import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.image.BufferedImage;
import java.util.Map;
import javax.swing.JPanel;
import loopwright.part.Shelf;
import loopwright.session.Session;
import loopwright.task.SameThreadRunner;
import loopwright.view.study.Desk;
import loopwright.view.study.Studies;
import loopwright.view.theme.Theme;

/** The inside of the window, laid out and painted without any display. */
final class WindowPicture {
  private final JPanel root = new JPanel(new BorderLayout());
  private final Workbench workbench;

  /** The window's inside on a session, in a theme and a size in pixels. */
  WindowPicture(Session session, Shelf shelf, Theme theme, int width, int height) {
    theme.apply();
    workbench = new Workbench(session, shelf);
    MainMenu menu =
        new MainMenu(
            new Commands(session, new SilentDialogs(), workbench::commitTyping),
            theme,
            Theme::apply,
            session::choose,
            new Studies(
                null, new Desk(session::snapshot, session::edit, SameThreadRunner::new), shelf),
            Map.of(),
            () -> {});
    menu.show(session.snapshot());
    session.onChange(menu::show);
    root.add(menu, BorderLayout.NORTH);
    root.add(workbench);
    root.setSize(width, height);
    root.addNotify();
    layOut();
  }

  /** Lays out twice: some layouts know their height only once they know their width. */
  void layOut() {
    layOut(root);
    layOut(root);
  }

  private static void layOut(Component component) {
    if (component instanceof Container container) {
      container.doLayout();
      for (Component child : container.getComponents()) {
        layOut(child);
      }
    }
  }

  /** The picture, with so many dots a pixel. */
  BufferedImage paint(double scale) {
    BufferedImage image =
        new BufferedImage(
            (int) Math.round(root.getWidth() * scale),
            (int) Math.round(root.getHeight() * scale),
            BufferedImage.TYPE_INT_RGB);
    Graphics2D graphics = image.createGraphics();
    graphics.scale(scale, scale);
    graphics.setRenderingHint(
        RenderingHints.KEY_TEXT_ANTIALIASING, RenderingHints.VALUE_TEXT_ANTIALIAS_ON);
    root.printAll(graphics);
    graphics.dispose();
    return image;
  }

  /** Takes the picture's components off their pretended screen. */
  void close() {
    root.removeNotify();
  }

  Workbench workbench() {
    return workbench;
  }

  JPanel root() {
    return root;
  }
}
