package loopwright.benchmark;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import loopwright.design.Design;
import loopwright.file.DesignText;

/** The designs that the benchmarks refer to. */
final class BenchmarkDesigns {
  private BenchmarkDesigns() {}

  /** The reference example, which has one of everything that the stage library offers. */
  static Design referenceExample() {
    return DesignText.example("everything-fitted");
  }

  /** One of the reference designs by its number, from 1; 0 is the reference example. */
  static Design numbered(int number) {
    return number == 0 ? referenceExample() : referenceDesign(number);
  }

  /** One of the reference designs by its number, from 1. */
  private static Design referenceDesign(int number) {
    try (InputStream stream =
        BenchmarkDesigns.class.getResourceAsStream("/loopwright/reference-designs.json")) {
      JsonNode cases = new ObjectMapper().readTree(stream).get("cases");
      return DesignText.read(cases.get(number - 1).get("design").toString());
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }
}
