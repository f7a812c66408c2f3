package loopwright.command;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class InvocationTest {
  @Test
  void opensTheWindowWithTheWorkedExampleWithoutArguments() {
    assertThat(Invocation.of(List.of())).isEqualTo(new Invocation.Window(Optional.empty()));
  }

  @Test
  void opensTheWindowWithAFileThatStandsAlone(@TempDir Path folder) throws IOException {
    Path file = Files.createFile(folder.resolve("a design without extension"));

    assertThat(Invocation.of(List.of(file.toString())))
        .isEqualTo(new Invocation.Window(Optional.of(file)));
    assertThat(Invocation.of(List.of("missing.JSON")))
        .isEqualTo(new Invocation.Window(Optional.of(Path.of("missing.JSON"))));
  }

  @Test
  void leavesAllElseToTheCommandLine() {
    for (List<String> call :
        List.of(
            List.of("predict"),
            List.of("predikt"),
            List.of("--help"),
            List.of("-"),
            List.of("a\0.json"),
            List.of("design.json", "--json"),
            List.of("predict", "design.json"))) {
      assertThat(Invocation.of(call)).isEqualTo(new Invocation.Line(call));
    }
  }
}
