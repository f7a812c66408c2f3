package loopwright.file;

import java.nio.file.Path;
import java.util.stream.Collectors;
import loopwright.design.Design;
import loopwright.predict.Catalogue;
import loopwright.predict.Figure;

/** The examples that come with the program, with the shelf that comes with it. */
public final class ExampleDesigns {
  private ExampleDesigns() {}

  /** The example of a file name. */
  public static Design read(String name) {
    return new DesignFile(
            Shelves.load(Path.of("no folder of one's own")).shelf(),
            Catalogue.figures().stream().collect(Collectors.toMap(Figure::key, Figure::unit)))
        .read(Path.of("examples", name))
        .design();
  }
}
