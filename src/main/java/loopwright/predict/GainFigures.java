package loopwright.predict;

import static loopwright.quantity.Unit.ONE;

import java.util.List;
import java.util.OptionalDouble;
import java.util.function.Function;
import loopwright.solve.MidbandNetwork;

/** Open-loop and closed-loop gains. */
final class GainFigures {
  private GainFigures() {}

  static List<Figure> entries() {
    return List.of(
        new Figure(
            "openLoopGain",
            "Open-loop gain A",
            ONE,
            "Gain from the differential input to the output with every loading in place; harmonic"
                + " mean of the gains at the high and the low level, since the error goes as 1/A.",
            "high and low",
            "product of stage gains: G_m1 (R_load ∥ R_in2) × G_m2 (R_load ∥ R_in3) × follower",
            CostClass.LINEAR,
            solution -> {
              double high = mean(solution.midbandHigh());
              double low = mean(solution.midbandLow());
              return FigureValue.of(2 / (1 / high + 1 / low), solution.levels().remark());
            },
            LoopFormulas::openLoopGain),
        level("openLoopGainHigh", "A at the high level", "high", HookupSolution::midbandHigh),
        level("openLoopGainLow", "A at the low level", "low", HookupSolution::midbandLow),
        level("openLoopGainAtRest", "A at rest", "at rest", HookupSolution::midbandRest),
        new Figure(
            "commonModeRejection",
            "Common-mode rejection",
            ONE,
            "1/|c|, where c is the mean at the high and the low level of (A₊ − A₋)/A.",
            "high and low",
            "2 G_m1 R_tail for a resistor tail and a resistor load",
            CostClass.LINEAR,
            solution -> {
              double share = commonModeShare(solution);
              return FigureValue.of(
                  1 / Math.abs(share), share < 0 ? "A₊ is the smaller" : "A₊ is the larger");
            },
            LoopFormulas::commonModeRejection),
        new Figure(
            "idealGain",
            "Ideal gain",
            ONE,
            "Gain from generator to output that an amplifier of infinite gain would have.",
            "from resistor values",
            "κ (1 + upper/lower); inverting −κ upper/(inputResistor + R_source)",
            CostClass.DESIGN,
            solution -> ideal(solution.gains().idealGain()),
            solution -> ideal(solution.gains().idealGain())),
        new Figure(
            "noiseGain",
            "Noise gain",
            ONE,
            "Gain from a voltage in series with an input to the output, for an amplifier of infinite"
                + " gain.",
            "from resistor values",
            "1 + upper/lower; inverting 1 + upper/(inputResistor + R_source)",
            CostClass.DESIGN,
            solution -> ideal(solution.gains().noiseGain()),
            solution -> ideal(solution.gains().noiseGain())),
        new Figure(
            "closedLoopGain",
            "Closed-loop gain",
            ONE,
            "Fundamental of the static waveform over the generator's amplitude, signed; without"
                + " amplitude the mean of the gains at the high and the low level.",
            "over the waveform",
            "κ A (1 + c/2)/(1 + A (1 − c/2)/NG) × R_in/(R_in + R_source) × describing function of the"
                + " dead zone",
            CostClass.WAVEFORM,
            GainFigures::closedLoopGain,
            LoopFormulas::closedLoopGain),
        new Figure(
            "closedLoopGainAtRest",
            "Closed-loop gain at rest",
            ONE,
            "Small-signal gain from generator to output at rest, blocking capacitors shorted.",
            "at rest",
            "",
            CostClass.LINEAR,
            solution -> {
              solution.needLoop();
              return FigureValue.of(solution.midbandRest().gain());
            },
            NoFormula.ROAD));
  }

  /** Mean of A₊ and A₋. */
  static double mean(MidbandNetwork network) {
    double[] gains = network.twoInputGains();
    return (gains[0] + gains[1]) / 2;
  }

  /** c, the mean at the high and the low level of (A₊ − A₋)/A. */
  static double commonModeShare(HookupSolution solution) {
    if (solution.assembled().isOpen() || solution.assembled().isInverting()) {
      throw new UnsolvedException("the hookup does not move both inputs together");
    }
    return (share(solution.midbandHigh()) + share(solution.midbandLow())) / 2;
  }

  private static double share(MidbandNetwork network) {
    double[] gains = network.twoInputGains();
    return (gains[0] - gains[1]) / ((gains[0] + gains[1]) / 2);
  }

  private static Figure level(
      String key, String label, String where, Function<HookupSolution, MidbandNetwork> network) {
    return new Figure(
        key,
        label,
        ONE,
        "Gain from the differential input to the output, mean of the gains from either input.",
        where,
        "",
        CostClass.LINEAR,
        solution -> {
          String remark =
              where.equals("at rest") ? restRemark(solution) : solution.levels().remark();
          return FigureValue.of(mean(network.apply(solution)), remark);
        },
        NoFormula.ROAD);
  }

  private static String restRemark(HookupSolution solution) {
    return solution.assembled().isOpen()
        ? "taken with the generator at "
            + Text.volts(solution.linearRest().generator())
            + ", where the output is at its reference"
        : "";
  }

  private static FigureValue ideal(OptionalDouble gain) {
    return gain.isPresent()
        ? FigureValue.of(gain.getAsDouble())
        : FigureValue.none("the hookup is open: there is no loop");
  }

  private static FigureValue closedLoopGain(HookupSolution solution) {
    solution.needLoop();
    if (solution.hookup().source().amplitude().value() == 0) {
      double gain = (solution.midbandHigh().gain() + solution.midbandLow().gain()) / 2;
      return FigureValue.of(
          gain, "the source has no amplitude: mean at the high and the low level");
    }
    return FigureValue.of(solution.waveform().gain());
  }
}
