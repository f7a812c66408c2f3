package loopwright.file;

import java.util.Map;
import java.util.stream.Collectors;
import loopwright.design.Design;
import loopwright.part.RecordShelf;
import loopwright.predict.Catalogue;
import loopwright.predict.Figure;

/** Designs that tests write as a file would say them; they bring along every part they use. */
public final class DesignText {
  private DesignText() {}

  /** The design that a text says. */
  public static Design read(String json) {
    return new DesignFile(
            new RecordShelf(Map.of()),
            Catalogue.figures().stream().collect(Collectors.toMap(Figure::key, Figure::unit)))
        .read(json, "a test's own text")
        .design();
  }
}
