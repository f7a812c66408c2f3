package loopwright.propose;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.nio.file.Path;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import loopwright.design.Change;
import loopwright.design.Design;
import loopwright.file.DesignFile;
import loopwright.file.ShelfFile;
import loopwright.predict.Catalogue;
import loopwright.predict.HookupFigures;
import loopwright.quantity.Unit;
import loopwright.task.Progress;
import org.junit.jupiter.api.Test;

/** Trims are signed, ranked, and held against whole solutions of the changed design. */
class TrimAdviceTest {
  private static final Design DESIGN =
      new DesignFile(new ShelfFile().shipped(), Map.of("closedLoopGain", Unit.ONE))
          .read(Path.of("examples", "seismometer-coil.json"))
          .design();

  private static final TrimAdvice ADVICE = TrimAdvice.of(DESIGN, "divider", Progress.none());

  private static double solved(Design design, String key) {
    return HookupFigures.of(design, "divider")
        .solved(Catalogue.find(key).orElseThrow())
        .number()
        .orElseThrow();
  }

  @Test
  void tellsWhichPartWhichWayAndHowMuch() {
    assertThat(ADVICE.offsetTrims())
        .hasSizeGreaterThan(5)
        .isSortedAccordingTo(Comparator.comparingDouble(trim -> -Math.abs(trim.perCent())));
    Trim strongest = ADVICE.offsetTrims().get(0);
    Design moved = moved(strongest);
    double change = solved(moved, "outputOffset") - solved(DESIGN, "outputOffset");
    assertThat(change).isEqualTo(strongest.perCent(), within(0.03 * Math.abs(strongest.perCent())));
    assertThat(strongest.says()).contains(strongest.perCent() > 0 ? "raises" : "lowers", "mV");

    Trim gain = ADVICE.gainTrims().get(0);
    double ratio = solved(moved(gain), "closedLoopGain") / solved(DESIGN, "closedLoopGain");
    assertThat(ratio - 1).isEqualTo(gain.perCent(), within(0.03 * Math.abs(gain.perCent())));
    assertThat(gain.path()).startsWith("hookups.divider.feedback.");
  }

  private static Design moved(Trim trim) {
    return Change.applyAll(
        DESIGN, List.of(new Change(trim.path(), Double.toString(trim.present() * 1.01))));
  }

  @Test
  void theBestChangeLeavesLessOffsetAndTheGain() {
    TrimAdvice.Best best = ADVICE.best().orElseThrow();
    Design changed = Change.applyAll(DESIGN, List.of(best.change()));
    double before = solved(DESIGN, "outputOffset");
    double after = solved(changed, "outputOffset");
    assertThat(after).isEqualTo(best.left(), within(1e-9));
    assertThat(Math.abs(after)).isLessThan(Math.abs(before) / 2);
    assertThat(solved(changed, "closedLoopGain"))
        .isEqualTo(solved(DESIGN, "closedLoopGain"), within(0.06));
  }
}
