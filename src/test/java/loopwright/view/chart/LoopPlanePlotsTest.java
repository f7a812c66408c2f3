package loopwright.view.chart;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.stream.Collectors;
import loopwright.design.Design;
import loopwright.file.DesignFile;
import loopwright.file.ShelfFile;
import loopwright.predict.Catalogue;
import loopwright.predict.Figure;
import loopwright.predict.LoopPlane;
import loopwright.task.Progress;
import loopwright.view.OnEventThread;
import loopwright.view.Painting;
import loopwright.view.theme.Palette;
import loopwright.view.theme.Theme;
import org.jfree.chart.plot.XYPlot;
import org.junit.jupiter.api.extension.ExtendWith;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** The loop about −1 and its roots over the swing, of one example that oscillates and one not. */
@ExtendWith(OnEventThread.class)
class LoopPlanePlotsTest {
  private static LoopPlane plane(String example) {
    Design design =
        new DesignFile(
                new ShelfFile().shipped(),
                Catalogue.figures().stream().collect(Collectors.toMap(Figure::key, Figure::unit)))
            .read(Path.of("examples", example + ".json"))
            .design();
    return LoopPlane.of(design, design.hookups().get(0), Progress.none());
  }

  private static void paint(Picture picture, String name) {
    ChartCanvas canvas = new ChartCanvas();
    canvas.setBackground(Palette.card());
    canvas.show(picture.chart(), false);
    Painting small = Painting.of(canvas, 560, 360).save(name + "-small");
    Painting.of(canvas, 1100, 720).save(name + "-large");
    assertThat(small.count(Palette.plot(0))).as(name).isGreaterThan(50);
    canvas.step(2);
    assertThat(canvas.readout()).as("what is read on a plane").hasSize(2);
    canvas.otherCurve(1);
    Painting.of(canvas, 560, 360).save(name + "-read");
  }

  @ParameterizedTest
  @CsvSource({
    "hydrophone-follower, LIGHT, turns about −1 twice clockwise: 2 roots grow, Roots grow at",
    "seismometer-coil, DARK, does not turn about −1: nothing grows, No root grows at any level"
  })
  void theLoopSaysWhetherItTurnsAndItsRootsWhetherTheyGrow(
      String example, Theme theme, String turns, String grows) {
    theme.apply();
    LoopPlane plane = plane(example);
    String name = example + "-" + theme.name().toLowerCase(Locale.ROOT);

    Picture nyquist = LoopPlanePlots.nyquist(plane, PlotTheme.current());
    assertThat(nyquist.title()).endsWith(turns);
    XYPlot strip = Drawn.strips(nyquist).get(0);
    List<String> words = Drawn.words(strip);
    assertThat(words).contains("−1", "unit circle", "at rest").hasSizeLessThan(30);
    assertThat(words.stream().filter(word -> word.endsWith("Hz")).count()).isGreaterThan(2);
    assertThat(strip.getRangeAxis().getLowerBound()).isLessThan(-1);
    paint(nyquist, "nyquist-" + name);

    Picture roots = LoopPlanePlots.roots(plane, PlotTheme.current());
    assertThat(roots.title()).startsWith(grows);
    assertThat(Drawn.words(Drawn.strips(roots).get(0)))
        .contains("grows", "dies away")
        .anyMatch(word -> word.startsWith("out at "));
    paint(roots, "roots-" + name);
  }
}
