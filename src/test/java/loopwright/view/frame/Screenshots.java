package loopwright.view.frame;

import java.awt.EventQueue;
import java.awt.image.BufferedImage;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Locale;
import java.util.stream.Collectors;
import javax.imageio.ImageIO;
import loopwright.check.Findings;
import loopwright.file.DesignFile;
import loopwright.file.ShelfFile;
import loopwright.part.Shelf;
import loopwright.predict.Catalogue;
import loopwright.predict.Figure;
import loopwright.predict.Prediction;
import loopwright.predict.Predictor;
import loopwright.session.Assessment;
import loopwright.session.PredictionSource;
import loopwright.session.Session;
import loopwright.task.SameThreadRunner;
import loopwright.view.theme.Theme;

/** Makes the pictures of the window that the documentation shows. */
public final class Screenshots {
  /** Solves and checks as the program does. */
  static final PredictionSource SOURCE =
      (design, hookups, progress) -> {
        Prediction prediction = Predictor.predict(design, hookups, new double[0], progress);
        return new Assessment(prediction, Findings.of(prediction));
      };

  private Screenshots() {}

  /**
   * Writes {@code window-light.png} and {@code window-dark.png}.
   *
   * @param arguments the folder to write to, {@code docs/pictures} when absent; the design file;
   *     the width and height in pixels
   * @throws Exception when a picture cannot be made or written
   */
  public static void main(String[] arguments) throws Exception {
    Path folder = Path.of(argument(arguments, 0, "docs/pictures"));
    Path file = Path.of(argument(arguments, 1, "examples/seismometer-coil.json"));
    int width = Integer.parseInt(argument(arguments, 2, "1440"));
    int height = Integer.parseInt(argument(arguments, 3, "900"));
    Files.createDirectories(folder);
    for (Theme theme : Theme.values()) {
      BufferedImage[] picture = new BufferedImage[1];
      EventQueue.invokeAndWait(() -> picture[0] = picture(theme, file, width, height));
      String name = "window-" + theme.name().toLowerCase(Locale.ROOT) + ".png";
      ImageIO.write(picture[0], "png", folder.resolve(name).toFile());
    }
  }

  private static BufferedImage picture(Theme theme, Path file, int width, int height) {
    theme.apply();
    Shelf shelf = new ShelfFile().shipped();
    DesignFile files =
        new DesignFile(
            shelf,
            Catalogue.figures().stream().collect(Collectors.toMap(Figure::key, Figure::unit)));
    Session session = new Session(files, SOURCE, new SameThreadRunner(), file);
    WindowPicture picture = new WindowPicture(session, shelf, theme, width, height);
    BufferedImage image = picture.paint(1);
    picture.close();
    return image;
  }

  private static String argument(String[] arguments, int index, String otherwise) {
    return arguments.length > index ? arguments[index] : otherwise;
  }
}
