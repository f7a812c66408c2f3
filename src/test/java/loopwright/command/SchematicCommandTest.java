package loopwright.command;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import loopwright.file.DesignFile;
import loopwright.file.ShelfFile;
import loopwright.predict.Predictor;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class SchematicCommandTest {
  @TempDir Path folder;

  private static CapturedCall call(String... arguments) {
    CommandServices services =
        new CommandServices(
            new DesignFile(new ShelfFile().shipped(), Map.of()),
            Predictor::predict,
            prediction -> List.of());
    return CapturedCall.of(new CommandLineProgram(services), new byte[0], arguments);
  }

  @Test
  void theEndOfTheNameDecides() throws IOException {
    Path svg = folder.resolve("a.svg");
    Path png = folder.resolve("a.png");
    String design = "examples/hydrophone-follower.json";
    assertThat(call("schematic", design, "-o", svg.toString(), "--overlay").status()).isZero();
    assertThat(call("schematic", design, "-o", png.toString()).status()).isZero();
    assertThat(Files.readString(svg)).contains("<svg", ">Q21<", ">15 pF<", "gainOut ");
    assertThat(Files.readAllBytes(png)).startsWith(0x89, 'P', 'N', 'G');
  }

  @Test
  void anotherNameIsRefused() {
    CapturedCall call =
        call("schematic", "examples/hydrophone-follower.json", "-o", folder + "/a.gif");
    assertThat(call.status()).isEqualTo(2);
    assertThat(call.err()).contains("expected a name that ends in .svg or .png");
  }
}
