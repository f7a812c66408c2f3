package loopwright.sheet;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import loopwright.design.Bias;
import loopwright.design.Design;
import loopwright.design.DesignPath;
import loopwright.design.OutputStage;
import loopwright.design.StagesAmplifier;
import loopwright.predict.HookupPrediction;
import loopwright.predict.Prediction;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Unit;

/**
 * The cautions that a build deserves. All are advice from makers' safety pages, training texts and
 * common practice; local codes and licensed practice come first.
 */
final class Cautions {
  /** Touch-safe direct voltage in many local rules, V (common practice, no source). */
  private static final double TOUCH_SAFE = 60;

  /** Skin and insulation burn from here on, °C (common practice, no source). */
  private static final double HOT = 60;

  private static final double SMALLEST_POLARISED = 0.9e-6;

  private Cautions() {}

  static List<String> of(Design design, Prediction prediction) {
    List<String> cautions = new ArrayList<>();
    cautions.add(
        "Local electrical codes, site rules and licensed practice come before anything on this sheet;"
            + " it computes, it does not make a build safe.");
    cautions.add(
        "Use an isolated, current-limited low-voltage supply, at the limit below. Mains wiring and"
            + " earthing are for qualified people; never defeat the protective earth. Discharge"
            + " reservoir capacitors through a resistor and verify with a meter.");
    cautions.add(
        "Ground clips of mains-powered scopes and generators are joined to protective earth and to"
            + " each other: clip them to circuit ground only, never to a rail, the output or a"
            + " floating node.");
    cautions.add(heat(prediction));
    if (hasPolarised(design)) {
      cautions.add(
          "Check polarity and voltage rating of electrolytic and tantalum capacitors before power: a"
              + " reversed one can vent or burst. Wear eye protection at first power.");
    } else {
      cautions.add("Wear eye protection at first power.");
    }
    cautions.add(
        "An output stage can oscillate at MHz, invisible to a meter, and overheat: watch the supply"
            + " current and look with a wide-band \u00D710 probe before loading; test into a resistor"
            + " of adequate power first.");
    cautions.add(
        "Loudspeakers and headphones come last, at minimum level, behind a fuse or capacitor, after"
            + " the offset was checked on a dummy load; never wear headphones while bringing up.");
    if (isBiased(design)) {
      cautions.add(
          "Adjust the idle current from its minimum, slowly, with the bias device on the heat sink:"
              + " thermal runaway can take seconds.");
    }
    if (span(design) > TOUCH_SAFE) {
      cautions.add(
          "Above touch-safe voltage ("
              + EngineeringFormat.format(span(design), Unit.VOLT)
              + " between the rails): one hand, dry surface, no jewellery, not alone, and only for"
              + " people qualified under the local code.");
    }
    cautions.add(
        "Ventilate soldering fumes; tip and flux are hot; wash hands after leaded solder.");
    return List.copyOf(cautions);
  }

  private static String heat(Prediction prediction) {
    OptionalDouble hottest =
        prediction.hookups().stream()
            .map(HookupPrediction::figures)
            .filter(figures -> figures.containsKey("hottestJunction"))
            .map(figures -> figures.get("hottestJunction").solved().number())
            .filter(OptionalDouble::isPresent)
            .mapToDouble(OptionalDouble::getAsDouble)
            .max();
    String parts = "Let parts cool; measure with a thermocouple, not with a finger.";
    if (hottest.isPresent()) {
      return "Hottest junction predicted: "
          + EngineeringFormat.format(hottest.getAsDouble(), Unit.CELSIUS, 3)
          + (hottest.getAsDouble() >= HOT ? ", hot enough to burn. " : "; a fault burns skin. ")
          + parts;
    }
    return "Transistors and resistors can burn skin (a TO-92 at 0.5 W is near 125 \u00B0C). "
        + parts;
  }

  private static boolean hasPolarised(Design design) {
    return DesignPath.parts(design).stream()
        .anyMatch(
            part ->
                part.unit() == Unit.FARAD
                    && !part.path().startsWith("bench.")
                    && part.value().value().value() >= SMALLEST_POLARISED);
  }

  private static boolean isBiased(Design design) {
    return design.amplifier() instanceof StagesAmplifier stages
        && stages.outputStage() instanceof OutputStage.PushPull pushPull
        && !(pushPull.bias() instanceof Bias.Joined);
  }

  private static double span(Design design) {
    return Math.abs(design.rails().positive().value() - design.rails().negative().value());
  }
}
