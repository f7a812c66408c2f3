package loopwright.predict;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.nio.file.Path;
import java.util.List;
import java.util.stream.Collectors;
import loopwright.design.Design;
import loopwright.file.DesignFile;
import loopwright.file.ShelfFile;
import loopwright.solve.MidbandNetwork;
import loopwright.task.Progress;
import org.junit.jupiter.api.Test;

/** Far below every corner they are what the network without capacitors gives, solved apart. */
class SpectraTest {
  private static Design design(String example) {
    return new DesignFile(
            new ShelfFile().shipped(),
            Catalogue.figures().stream().collect(Collectors.toMap(Figure::key, Figure::unit)))
        .read(Path.of("examples", example + ".json"))
        .design();
  }

  private static double nearest(List<ComplexPoint> points, double hertz) {
    return points.stream()
        .min(
            (a, b) ->
                Double.compare(
                    Math.abs(Math.log(a.frequency() / hertz)),
                    Math.abs(Math.log(b.frequency() / hertz))))
        .orElseThrow()
        .magnitude();
  }

  @Test
  void farBelowEveryCornerTheyAreThoseOfTheNetworkWithoutCapacitors() {
    Design design = design("seismometer-coil");
    String hookup = design.hookups().get(0).name();
    Spectra spectra = Spectra.of(design, hookup, Progress.none());
    HookupSolution solution = HookupFigures.of(design, hookup).solution();
    double noiseGain = solution.gains().noiseGain().orElseThrow();
    MidbandNetwork midband = solution.midbandRest();
    double positive =
        noiseGain / Math.abs(midband.outputBySupply(solution.assembled().positiveSupply()));
    double negative =
        noiseGain / Math.abs(midband.outputBySupply(solution.assembled().negativeSupply()));
    // At 10 Hz the loop still has all its gain, and no capacitor of this hookup counts yet.
    assertThat(nearest(spectra.positiveRejection(), 10) / positive).isCloseTo(1, within(1e-3));
    assertThat(nearest(spectra.negativeRejection(), 10) / negative).isCloseTo(1, within(1e-3));
    assertThat(nearest(spectra.inputImpedance(), 10) / midband.inputResistance())
        .isCloseTo(1, within(1e-3));
    // The loop's gain falls with frequency, and with it what it keeps out.
    assertThat(nearest(spectra.positiveRejection(), 1e4)).isLessThan(positive / 10);
  }
}
