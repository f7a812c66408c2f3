package loopwright.file;

import java.nio.file.Path;
import java.util.Map;
import java.util.stream.Collectors;
import loopwright.design.Design;
import loopwright.part.RecordShelf;
import loopwright.part.Shelf;
import loopwright.predict.Catalogue;
import loopwright.predict.Figure;

/** Designs that tests write as a file would say them; they bring along every part they use. */
public final class DesignText {
  private DesignText() {}

  /** The design that a text says. */
  public static Design read(String json) {
    return file(new RecordShelf(Map.of())).read(json, "a test's own text").design();
  }

  /** An example of the program by its name; its parts may come from the shelf. */
  public static Design example(String name) {
    return file(new ShelfFile().shipped()).read(Path.of("examples", name + ".json")).design();
  }

  private static DesignFile file(Shelf shelf) {
    return new DesignFile(
        shelf, Catalogue.figures().stream().collect(Collectors.toMap(Figure::key, Figure::unit)));
  }
}
