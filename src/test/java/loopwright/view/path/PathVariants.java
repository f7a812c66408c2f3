package loopwright.view.path;

import java.util.ArrayList;
import java.util.List;
import loopwright.design.Design;
import loopwright.file.DesignText;

/**
 * Designs in which every variant of every stage, source, feedback and load meets every variant of
 * every other at least once: few enough to be drawn all.
 */
final class PathVariants {
  private static final String TAIL =
      """
      {"kind": "resistor", "resistance": "12k"}
      {"kind": "ideal", "current": "1.25m"}
      {"kind": "mirror", "transistor": "$T", "setResistance": "10k"}
      {"kind": "mirror", "transistor": "$T", "setResistance": "47k", "emitterResistance": 120, "feedFrom": "oppositeRail"}
      {"kind": "diodeBiased", "transistor": "$T", "diode": "1N4148", "feedResistance": "22k", "emitterResistance": 330}
      {"kind": "diodeBiased", "transistor": "$T", "diode": "1N4148", "count": 3, "feedResistance": "47k", "emitterResistance": 1200, "feedFrom": "midRail"}
      {"kind": "twoTransistor", "transistor": "$T", "feedResistance": "22k", "senseResistance": 560, "feedFrom": "midRail"}
      {"kind": "twoTransistor", "transistor": "$T", "feedResistance": "22k", "senseResistance": 560}
      """;

  /** Each factor with its variants, one a line. */
  private static final List<String> FACTORS =
      List.of(
          "npn\npnp",
          """
          {"kind": "resistors", "output": "1k5"}
          {"kind": "resistors", "output": "1k5", "other": "1k5"}
          {"kind": "mirror", "transistor": "$O", "emitterResistance": 100}
          """,
          """

          "emitterResistance": 220, "baseResistance": 47,
          "emitterResistance": 220, "baseResistance": 47, "baseEmitterMismatch": "2.35m",
          """,
          TAIL,
          TAIL,
          """

          , "emitterResistance": 100, "compensation": {"capacitance": "33p"}
          , "emitterResistance": 120, "emitterBypass": "220u", "compensation": {"capacitance": "150p", "resistance": 220}, "buffer": {"transistor": "$O", "emitterResistance": "4k7"}
          """,
          """
          {"kind": "none"}
          {"kind": "pushPull", "upper": "2N3904", "lower": "2N3906", "bias": {"kind": "joined"}}
          {"kind": "pushPull", "upper": "2N3904", "lower": "2N3906", "bias": {"kind": "diodes", "diode": "1N4148"}, "emitterResistance": 22}
          {"kind": "pushPull", "upper": "BD139", "lower": "BD140", "bias": {"kind": "vbeMultiplier", "transistor": "2N3904", "upper": "2k2", "lower": "1k"}, "emitterResistance": 0.47, "drivers": {"upper": "2N3904", "lower": "2N3906", "resistance": 470}}
          """,
          """
          {}
          {"resistance": 600, "amplitude": "200m"}
          {"resistance": 600, "amplitude": "200m", "dc": "-150m", "attenuator": {"series": "99.9k", "shunt": 100}}
          {"resistance": 50, "amplitude": "125m", "frequency": "12.5k", "couplingCapacitance": "2.2u", "biasResistance": "100k", "biasTo": "midRail"}
          """,
          """
          {"kind": "nonInverting", "upper": 0}
          {"kind": "nonInverting", "upper": "10k", "lower": "1k"}
          {"kind": "nonInverting", "upper": "47k", "lower": "4k7", "lowerCapacitance": "100u", "leadCapacitance": "22p", "returnTo": "midRail"}
          {"kind": "nonInverting", "upper": "10k", "lower": "1k", "from": "load"}
          {"kind": "inverting", "upper": "100k", "inputResistor": "10k", "leadCapacitance": "4.7p", "returnResistance": "9k1", "returnTo": "midRail"}
          {"kind": "open", "returnResistance": 600}
          """,
          """
          {}
          {"resistance": "10k", "capacitance": "100p"}
          {"resistance": 32, "capacitance": "4.7n", "isolation": 47, "couplingCapacitance": "1000u", "snubber": {"resistance": 10, "capacitance": "100n"}}
          """);

  private PathVariants() {}

  /** Every variant of an amplifier known by its figures, in a hookup of each feedback. */
  static List<Design> byFigures() {
    String plain = "{\"kind\": \"figures\", \"gain\": 500}";
    String full =
        """
        {"kind": "figures", "gain": 12500, "inputOffset": "-6.1m", "deadZone": "0.6",
         "poles": ["12.5k", "3.3M", "47M"], "inputResistance": "1.5M", "inputCapacitance": "12p",
         "inputBiasCurrent": "120n", "commonModeRejection": 12500, "outputResistance": 47,
         "outputHigh": 10.5, "outputLow": -10.5, "slewRate": "0.55e6"}
        """;
    List<Design> designs = new ArrayList<>();
    for (String amplifier : List.of(plain, full)) {
      for (String feedback : variants(8)) {
        designs.add(
            DesignText.read(text(amplifier, variants(7).get(3), feedback, variants(9).get(2))));
      }
    }
    return designs;
  }

  /** Amplifiers of stages, every two variants together at least once. */
  static List<Design> ofStages() {
    List<Integer> sizes = new ArrayList<>();
    for (int factor = 0; factor < FACTORS.size(); factor++) {
      sizes.add(variants(factor).size());
    }
    return Pairwise.rows(sizes).stream().map(PathVariants::design).toList();
  }

  private static Design design(int[] row) {
    List<String> chosen = new ArrayList<>();
    for (int factor = 0; factor < row.length; factor++) {
      chosen.add(variants(factor).get(row[factor]));
    }
    boolean isNpn = chosen.get(0).equals("npn");
    String amplifier =
        "{\"kind\": \"stages\", \"inputPair\": {\"transistor\": \"$T\","
            + chosen.get(2)
            + "\"tail\": "
            + chosen.get(3)
            + ", \"load\": "
            + chosen.get(1)
            + "}, \"gainStage\": {\"transistor\": \"$O\", \"load\": "
            + chosen.get(4)
            + chosen.get(5)
            + "}, \"outputStage\": "
            + chosen.get(6)
            + "}";
    String text = text(amplifier, chosen.get(7), chosen.get(8), chosen.get(9));
    return DesignText.read(
        text.replace("$T", isNpn ? "2N3904" : "2N3906").replace("$O", isNpn ? "2N3906" : "2N3904"));
  }

  private static List<String> variants(int factor) {
    return FACTORS.get(factor).stripTrailing().lines().toList();
  }

  private static String text(String amplifier, String source, String feedback, String load) {
    String model = "\"model\": {\"saturationCurrent\": 1e-14, \"forwardBeta\": 200}}";
    return """
        {"loopwright": 1, "name": "variants",
         "rails": {"positive": 12, "negative": -12, "midRail": {"upper": "10k", "lower": "10k"}},
         "parts": {"2N3904": {"kind": "npn", MODEL, "2N3906": {"kind": "pnp", MODEL,
                   "BD139": {"kind": "npn", MODEL, "BD140": {"kind": "pnp", MODEL,
                   "1N4148": {"kind": "diode", "model": {"saturationCurrent": 1e-9}}},
         "amplifier": AMPLIFIER,
         "hookups": [{"name": "bench", "source": SOURCE, "feedback": FEEDBACK, "load": LOAD}]}
        """
        .replace("MODEL", model)
        .replace("AMPLIFIER", amplifier)
        .replace("SOURCE", source)
        .replace("FEEDBACK", feedback)
        .replace("LOAD", load);
  }
}
