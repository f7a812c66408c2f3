package loopwright.predict;

import static loopwright.quantity.Unit.DECIBEL;
import static loopwright.quantity.Unit.DEGREE;
import static loopwright.quantity.Unit.HERTZ;
import static loopwright.quantity.Unit.ONE;
import static loopwright.quantity.Unit.PER_SECOND;

import java.util.Comparator;
import java.util.List;
import java.util.OptionalDouble;
import java.util.stream.Collectors;
import loopwright.solve.NaturalFrequencies.Pole;

/** Loop gain, margins, bandwidth and stability over the swing. */
final class LoopFigures {
  private LoopFigures() {}

  static List<Figure> entries() {
    return List.of(
        new Figure(
            "loopGainDc",
            "Loop gain",
            ONE,
            "Loop gain at rest at signal frequency, by double injection in the lead of the inverting"
                + " input, blocking capacitors shorted.",
            "at rest",
            "A/NG",
            CostClass.LINEAR,
            solution -> {
              solution.needLoop();
              return FigureValue.of(solution.midbandRest().loopGain());
            },
            LoopFormulas::loopGain),
        new Figure(
            "loopGainAtSignal",
            "Loop gain at the signal",
            ONE,
            "Magnitude of the loop gain at rest at the signal's frequency, every capacitor in place.",
            "at rest",
            "",
            CostClass.LINEAR,
            solution -> {
              solution.needLoop();
              double frequency = solution.hookup().source().frequency().value();
              double[] value = solution.network().loopGain(frequency);
              return FigureValue.of(Math.hypot(value[0], value[1]), "at " + Text.hertz(frequency));
            },
            NoFormula.ROAD),
        new Figure(
            "unityFrequency",
            "Unity-gain frequency of the loop",
            HERTZ,
            "Highest frequency where the loop gain is 1.",
            "at rest",
            "G_m1/(2π (C_c + C_cb + strays) NG)",
            CostClass.LINEAR,
            solution -> FigureValue.of(solution.crossing().frequency()),
            LoopFormulas::unityFrequency),
        new Figure(
            "phaseMargin",
            "Phase margin",
            DEGREE,
            "180° plus the argument of the loop gain at its unity-gain frequency, the argument"
                + " continuous from low frequency.",
            "at rest",
            "",
            CostClass.LINEAR,
            solution -> FigureValue.of(solution.crossing().phaseMargin()),
            NoFormula.ROAD),
        new Figure(
            "gainMargin",
            "Gain margin",
            ONE,
            "Smallest factor above 1 by which the loop gain may grow before it passes −1.",
            "at rest",
            "",
            CostClass.LINEAR,
            LoopFigures::gainMargin,
            NoFormula.ROAD),
        new Figure(
            "worstPhaseMargin",
            "Phase margin, worst",
            DEGREE,
            "Smallest phase margin over the levels that the output passes.",
            "over the swing",
            "",
            CostClass.WAVEFORM,
            solution -> {
              solution.needLoop();
              SwingStability.Solved worst =
                  solution
                      .swing()
                      .worstByMargin()
                      .orElseThrow(
                          () -> new UnsolvedException("the loop gain never passes 1 at any level"));
              return FigureValue.of(
                  worst.level().phaseMargin().getAsDouble(),
                  "at " + Text.volts(worst.level().output()));
            },
            NoFormula.ROAD),
        new Figure(
            "worstGrowth",
            "Growth, worst",
            PER_SECOND,
            "Largest real part among complex natural frequencies over the levels that the output"
                + " passes; negative when everything dies away.",
            "over the swing",
            "",
            CostClass.WAVEFORM,
            solution -> {
              SwingStability swing = solution.swing();
              SwingStability.Solved worst =
                  swing
                      .worstByGrowth()
                      .orElseThrow(() -> new UnsolvedException("no complex natural frequency"));
              return FigureValue.of(worst.level().growth().getAsDouble(), swing.says());
            },
            NoFormula.ROAD),
        new Figure(
            "oscillationFrequency",
            "Oscillation frequency",
            HERTZ,
            "Frequency at which the fastest growing oscillation starts, over the levels that the"
                + " output passes.",
            "over the swing",
            "",
            CostClass.WAVEFORM,
            LoopFigures::oscillationFrequency,
            NoFormula.ROAD),
        new Figure(
            "bandwidth",
            "Bandwidth",
            HERTZ,
            "First fall of the closed loop to −3 dB of its midband gain going up.",
            "at rest",
            "unity-gain frequency of the loop",
            CostClass.LINEAR,
            solution -> some(solution.closedLoop().bandwidth(), "no fall below 3 dB up to 100 GHz"),
            LoopFormulas::bandwidth),
        new Figure(
            "lowCorner",
            "Low corner",
            HERTZ,
            "First fall of the closed loop to −3 dB of its midband gain going down.",
            "at rest",
            "",
            CostClass.LINEAR,
            solution -> some(solution.closedLoop().lowCorner(), "no fall toward dc"),
            NoFormula.ROAD),
        new Figure(
            "peaking",
            "Peaking",
            DECIBEL,
            "Largest rise of the closed loop above its midband gain; 0 when there is none.",
            "at rest",
            "",
            CostClass.LINEAR,
            solution -> FigureValue.of(solution.closedLoop().peaking()),
            NoFormula.ROAD));
  }

  private static FigureValue some(OptionalDouble value, String otherwise) {
    return value.isPresent() ? FigureValue.of(value.getAsDouble()) : FigureValue.none(otherwise);
  }

  private static FigureValue gainMargin(HookupSolution solution) {
    LoopMargins margins = solution.margins();
    String below =
        margins.marginsBelowOne().stream().map(Text::ratio).collect(Collectors.joining(", "));
    String remark =
        below.isEmpty() ? "" : "also passes the negative axis at margins below 1: " + below;
    return margins.gainMargin().isPresent()
        ? FigureValue.of(margins.gainMargin().getAsDouble(), remark)
        : FigureValue.none(
            "the loop gain never passes the negative axis below 1"
                + (remark.isEmpty() ? "" : "; " + remark));
  }

  private static FigureValue oscillationFrequency(HookupSolution solution) {
    SwingStability swing = solution.swing();
    return swing
        .worstByGrowth()
        .filter(worst -> worst.growing().stream().anyMatch(pole -> pole.im() > 0))
        .map(worst -> FigureValue.of(fastest(worst.growing()), swing.says()))
        .orElse(FigureValue.none("nothing oscillates at any level"));
  }

  private static double fastest(List<Pole> growing) {
    Pole fastest =
        growing.stream()
            .filter(pole -> pole.im() > 0)
            .max(Comparator.comparingDouble(Pole::re))
            .orElseThrow();
    return fastest.im() / (2 * Math.PI);
  }
}
