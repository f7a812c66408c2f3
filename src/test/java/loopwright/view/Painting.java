package loopwright.view;

import java.awt.Color;
import java.awt.Component;
import java.awt.Container;
import java.awt.Graphics2D;
import java.awt.Rectangle;
import java.awt.image.BufferedImage;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import javax.imageio.ImageIO;
import javax.swing.JComponent;

/** A component painted without a display, and what can be said of its pixels. */
public final class Painting {
  private static final Path FOLDER = Path.of("target", "pictures");

  private final BufferedImage image;

  private Painting(BufferedImage image) {
    this.image = image;
  }

  /** Lays the component out at this size and paints it. */
  public static Painting of(JComponent component, int width, int height) {
    component.setSize(width, height);
    component.addNotify();
    layOut(component);
    // Text that wraps knows its height only once it has a width.
    layOut(component);
    BufferedImage image = new BufferedImage(width, height, BufferedImage.TYPE_INT_RGB);
    Graphics2D g2 = image.createGraphics();
    component.printAll(g2);
    g2.dispose();
    component.removeNotify();
    return new Painting(image);
  }

  private static void layOut(Component component) {
    component.invalidate();
    component.doLayout();
    if (component instanceof Container container) {
      for (Component part : container.getComponents()) {
        layOut(part);
      }
    }
  }

  /** Keeps it for a person to look at. */
  public Painting save(String name) {
    try {
      Files.createDirectories(FOLDER);
      ImageIO.write(image, "png", FOLDER.resolve(name + ".png").toFile());
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
    return this;
  }

  /** How many pixels of a region have exactly this colour. */
  public int count(Color colour, Rectangle region) {
    int count = 0;
    Rectangle inside = region.intersection(new Rectangle(image.getWidth(), image.getHeight()));
    for (int y = inside.y; y < inside.y + inside.height; y++) {
      for (int x = inside.x; x < inside.x + inside.width; x++) {
        count += (image.getRGB(x, y) & 0xFFFFFF) == (colour.getRGB() & 0xFFFFFF) ? 1 : 0;
      }
    }
    return count;
  }

  /** How many pixels of a region have another colour than this. */
  public int countOther(Color ground, Rectangle region) {
    Rectangle inside = region.intersection(new Rectangle(image.getWidth(), image.getHeight()));
    return inside.width * inside.height - count(ground, inside);
  }

  /** How many pixels of the whole have exactly this colour. */
  public int count(Color colour) {
    return count(colour, new Rectangle(image.getWidth(), image.getHeight()));
  }
}
