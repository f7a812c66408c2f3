package loopwright.sizing;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.Comparator;
import java.util.List;
import loopwright.design.Change;
import loopwright.design.Design;
import loopwright.design.DesignException;
import loopwright.file.DesignText;
import loopwright.predict.Catalogue;
import loopwright.predict.HookupFigures;
import loopwright.predict.TolerancedPart;
import loopwright.predict.TolerancedParts;
import loopwright.quantity.PreferredValues;
import loopwright.quantity.Quantity;
import loopwright.quantity.Unit;
import loopwright.task.Progress;
import org.junit.jupiter.api.Test;

/** Dividers against exhaustive search and against what a hand works out. */
class DividerSizingTest {
  private static final String DESIGN =
      """
      {"loopwright": 1, "name": "bench", "rails": {"positive": 12, "negative": -12},
       "drawer": {"resistors": ["1k", "2k2", "10k", "22k", "100k", 470]},
       "amplifier": {"kind": "figures", "gain": 500, "inputBiasCurrent": "1u",
                     "inputCapacitance": "10p", "poles": ["10k"], "outputResistance": 100},
       "hookups": [
        {"name": "plain", "source": {"amplitude": 0.1},
         "feedback": {"kind": "nonInverting", "upper": 0}},
        {"name": "inverting", "source": {"resistance": 50, "amplitude": 0.1},
         "feedback": {"kind": "inverting", "upper": "10k", "inputResistor": "1k"}},
        {"name": "open", "feedback": {"kind": "open"}}]}
      """;

  private final Design design = DesignText.read(DESIGN);

  private List<DividerProposal> size(String hookup, double gain, String series, boolean twoParts) {
    return DividerSizing.of(design, hookup, gain, series, twoParts, Progress.none());
  }

  private static double solved(Design design, String hookup, String key) {
    return HookupFigures.of(design, hookup)
        .solved(Catalogue.find(key).orElseThrow())
        .number()
        .orElseThrow();
  }

  /** Every pair of the series, tried one by one, has no better one than the screen finds. */
  @Test
  void theScreenFindsWhatAnExhaustiveSearchFinds() {
    AmplifierFacts facts = AmplifierFacts.of(HookupFigures.of(design, "plain"));
    for (String series : List.of("E12", "E24", "drawer")) {
      ResistorStock stock = ResistorStock.of(design, series, false);
      for (double gain : new double[] {2, 4.7, 11, 30}) {
        double least = Double.MAX_VALUE;
        for (double upper : stock.singles()) {
          for (double lower : stock.singles()) {
            DividerCandidate divider =
                DividerCandidate.of(ResistorChoice.single(upper), ResistorChoice.single(lower));
            double noiseGain = 1 + upper / lower;
            double band = 2 * 0.05 * (noiseGain - 1) / noiseGain * Math.sqrt(2.0 / 3);
            least = Math.min(least, DividerScore.byHand(facts, divider, gain, band).sum());
          }
        }
        double found =
            new DividerScreen(facts, stock, gain, 0.05).best(1, "here").get(0).score().sum();
        assertThat(found).as("%s, %s", series, gain).isEqualTo(least, within(1e-9 * least));
      }
    }
  }

  @Test
  void theChangesGiveTheFiguresOfTheEntry() {
    for (String hookup : List.of("plain", "inverting")) {
      DividerProposal best = size(hookup, 11, "E24", false).get(0);
      Design changed = Change.applyAll(design, best.changes());
      assertThat(best.gain().number().orElseThrow())
          .isEqualTo(solved(changed, hookup, "closedLoopGain"), within(1e-6));
      assertThat(best.outputOffset().number().orElseThrow())
          .isEqualTo(solved(changed, hookup, "outputOffset"), within(1e-9));
      assertThat(Math.abs(best.gain().number().orElseThrow())).isEqualTo(11, within(0.3));
      assertThat(best.gain().number().orElseThrow())
          .isBetween(best.gainLow().orElseThrow(), best.gainHigh().orElseThrow());
    }
    assertThat(size("plain", 11, "E96", false))
        .isSortedAccordingTo(Comparator.comparingDouble(DividerProposal::score));
  }

  /** An open-loop gain of 500 makes 11 of an ideal 11.25 (Black 1934): 11.25/(1 + 11.25/500). */
  @Test
  void theFiniteGainIsMadeUpFor() {
    DividerProposal best = size("plain", 11, "E96", false).get(0);
    double upper = value(best, 0);
    double lower = value(best, 1);
    assertThat(1 + upper / lower).isEqualTo(11.247, within(0.06));
    assertThat(best.gain().number().orElseThrow()).isEqualTo(11, within(0.06));
  }

  /** Two parts come nearer than one, and their combination is what stands in the change. */
  @Test
  void twoPartsComeNearer() {
    DividerProposal single = size("plain", 11, "drawer", false).get(0);
    List<DividerProposal> two = size("plain", 11, "drawer", true);
    double error = Math.abs(single.gain().number().orElseThrow() / 11 - 1);
    assertThat(two)
        .anySatisfy(
            proposal -> {
              assertThat(Math.abs(proposal.gain().number().orElseThrow() / 11 - 1))
                  .isLessThan(error / 3);
              assertThat(proposal.says()).containsAnyOf("in series", "in parallel");
            });
  }

  /** E24 is no subset of E96: 2.2 kΩ is not in it (IEC 60063). */
  @Test
  void aSeriesHasItsOwnValuesOnly() {
    for (DividerProposal proposal : size("plain", 23, "E96", false)) {
      for (int i = 0; i < 2; i++) {
        double mantissa =
            value(proposal, i) / Math.pow(10, Math.floor(Math.log10(value(proposal, i))));
        assertThat(PreferredValues.E96.contains(mantissa)).isTrue();
      }
    }
    assertThat(PreferredValues.E96.contains(2.2)).isFalse();
  }

  /** Gain 11 from 10 kΩ and 1 kΩ at worst: 10.05 to 12.05 with 5 %, 10.80 to 11.20 with 1 %. */
  @Test
  void theWorstCaseOfADivider() {
    Design ideal = DesignText.read(DESIGN.replace("\"gain\": 500", "\"gain\": 1e9"));
    Design eleven =
        Change.applyAll(
            ideal,
            List.of(
                new Change("hookups.plain.feedback.upper", "10k"),
                new Change("hookups.plain.feedback.lower", "1k")));
    assertThat(worst(eleven, 0.05, -1)).isEqualTo(10.05, within(0.005));
    assertThat(worst(eleven, 0.05, 1)).isEqualTo(12.05, within(0.005));
    assertThat(worst(eleven, 0.01, -1)).isEqualTo(10.80, within(0.005));
    assertThat(worst(eleven, 0.01, 1)).isEqualTo(11.20, within(0.005));
  }

  private static double worst(Design design, double tolerance, int direction) {
    List<TolerancedPart> parts =
        List.of(
            new TolerancedPart(TolerancedPart.Kind.RESISTOR, "hookups.plain.feedback.upper", -1, 1),
            new TolerancedPart(
                TolerancedPart.Kind.RESISTOR, "hookups.plain.feedback.lower", -1, 1));
    HookupFigures figures = HookupFigures.of(design, "plain");
    return figures
        .of(
            TolerancedParts.build(
                design, parts, new double[] {direction * tolerance, -direction * tolerance}))
        .solved(Catalogue.find("closedLoopGainAtRest").orElseThrow())
        .number()
        .orElseThrow();
  }

  @Test
  void aFollowerIsAWire() {
    List<DividerProposal> follower = size("plain", 1, "E24", false);
    assertThat(follower).hasSize(1);
    assertThat(follower.get(0).changes())
        .containsExactly(new Change("hookups.plain.feedback.upper", "0"));
    assertThat(follower.get(0).dividerCurrent()).isZero();
    // 1/(1 + 1/500) (Black 1934): the gain error of such a follower is about 0.2 %.
    assertThat(follower.get(0).gain().number().orElseThrow()).isEqualTo(0.998, within(1e-4));
  }

  @Test
  void whatCannotBeIsRefusedWithItsPlace() {
    assertThatThrownBy(() -> size("plain", 0.5, "E24", false))
        .isInstanceOf(DesignException.class)
        .hasMessageContaining("hookups.plain.feedback")
        .hasMessageContaining("expected");
    assertThatThrownBy(() -> size("plain", -11, "E24", false))
        .isInstanceOf(DesignException.class)
        .hasMessageContaining("the feedback does not invert");
    assertThatThrownBy(() -> size("open", 11, "E24", false))
        .isInstanceOf(DesignException.class)
        .hasMessageContaining("expected one with feedback");
    Design empty = DesignText.read(DESIGN.replaceAll("\"drawer\": \\{[^}]*\\},", ""));
    assertThatThrownBy(() -> DividerSizing.of(empty, "plain", 11, "drawer", false, Progress.none()))
        .isInstanceOf(DesignException.class)
        .hasMessageContaining("drawer.resistors");
  }

  private static double value(DividerProposal proposal, int change) {
    return Quantity.parse(proposal.changes().get(change).value(), Unit.OHM).value();
  }
}
