package loopwright.sheet;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.stream.Collectors;
import loopwright.design.Design;
import loopwright.design.DesignPath;
import loopwright.design.Feedback;
import loopwright.design.Hookup;
import loopwright.design.PartValue;
import loopwright.predict.FigureResult;
import loopwright.predict.FigureValue;
import loopwright.predict.HookupPrediction;
import loopwright.predict.Waveform;
import loopwright.quantity.Unit;
import loopwright.sheet.SheetHookup.Look;
import loopwright.spread.Band;
import loopwright.spread.HookupSpread;

/** What to build for each hookup, how to set generator and probe, and what they should show. */
final class HookupCards {
  /** Figures that are read at the bench, in the order in which a person would, and how. */
  private static final Map<String, String> READ =
      ordered(
          "outputOffset", "out, dc, without signal",
          "closedLoopGainAtRest", "gain at small signal",
          "deadZone", "dead zone: gainOut beyond out",
          "thd", "distortion (THD) at out",
          "clipHigh", "out clips at, upward",
          "clipLow", "out clips at, downward",
          "bandwidth", "bandwidth, \u22123 dB");

  private static final Set<String> NOT_ON_PAPER = Set.of("worstGrowth", "oscillationFrequency");

  private final Design design;
  private final Designators designators;

  HookupCards(Design design, Designators designators) {
    this.design = design;
    this.designators = designators;
  }

  private static Map<String, String> ordered(String... pairs) {
    Map<String, String> map = new java.util.LinkedHashMap<>();
    for (int i = 0; i < pairs.length; i += 2) {
      map.put(pairs[i], pairs[i + 1]);
    }
    return map;
  }

  /** The card of a hookup. */
  SheetHookup card(HookupPrediction prediction, Optional<HookupSpread> spread) {
    Hookup hookup = prediction.hookup();
    return new SheetHookup(
        hookup.name(),
        build(hookup),
        settings(hookup),
        looks(prediction, spread),
        OscillationWatch.of(prediction),
        further(prediction));
  }

  private String build(Hookup hookup) {
    String path = "hookups." + hookup.name() + ".";
    Wiring wiring = Wiring.of(design, hookup);
    List<String> says = new ArrayList<>();
    says.add(feedback(hookup.feedback(), parts(wiring, path + "feedback.")));
    String source = parts(wiring, path + "source.");
    if (!source.isEmpty()) {
      says.add("Source: " + source + ".");
    }
    String load = parts(wiring, path + "load.");
    says.add(load.isEmpty() ? "No load." : "Load: " + load + ".");
    return String.join(" ", says);
  }

  private static String feedback(Feedback feedback, String parts) {
    if (feedback instanceof Feedback.NonInverting divider) {
      String wire =
          divider.upper().effective() == 0
              ? "a wire from "
                  + divider.from().name().toLowerCase(java.util.Locale.ROOT)
                  + " to in\u2212"
              : "";
      return "Non-inverting: " + joined(wire, parts) + ".";
    }
    return (feedback instanceof Feedback.Inverting ? "Inverting: " : "Open loop: ")
        + joined(
            feedback instanceof Feedback.Open open && open.returnResistance().effective() == 0
                ? "in\u2212 to ground"
                : "",
            parts)
        + ".";
  }

  private static String joined(String first, String second) {
    return first.isEmpty() || second.isEmpty() ? first + second : first + "; " + second;
  }

  private String parts(Wiring wiring, String prefix) {
    return wiring.links(prefix).stream().map(this::part).collect(Collectors.joining("; "));
  }

  private String part(Wiring.Link link) {
    String path = link.name().split("@")[0];
    String name = designators.element(link.name());
    PartValue value = (PartValue) DesignPath.get(design, path);
    Unit unit = DesignPath.field(design, path).unit().orElseThrow();
    return (name.isEmpty() ? "" : name + " ")
        + PartSays.value(value, unit)
        + " from "
        + PartSays.node(link.from())
        + " to "
        + PartSays.node(link.to());
  }

  private List<String> settings(Hookup hookup) {
    List<String> settings = new ArrayList<>();
    settings.add(GeneratorWords.of(hookup));
    String probes = ProbeWords.of(hookup);
    if (!probes.isEmpty()) {
      settings.add(probes);
    }
    return settings;
  }

  private List<Look> looks(HookupPrediction prediction, Optional<HookupSpread> spread) {
    List<Look> looks = new ArrayList<>();
    READ.forEach(
        (key, how) -> {
          FigureResult result = prediction.figures().get(key);
          if (result.solved().number().isPresent()) {
            Optional<Band> band = spread.map(HookupSpread::figures).map(bands -> bands.get(key));
            Expected expected = Expected.of(result.solved(), band, result.figure().unit());
            looks.add(new Look(how, key.equals("thd") ? expected.inPercent() : expected));
          }
          if (key.equals("closedLoopGainAtRest")) {
            prediction.waveform().ifPresent(wave -> looks.add(peakToPeak(wave)));
          }
        });
    return looks;
  }

  private static Look peakToPeak(Waveform wave) {
    double high = Double.NEGATIVE_INFINITY;
    double low = Double.POSITIVE_INFINITY;
    for (double volts : wave.out()) {
      high = Math.max(high, volts);
      low = Math.min(low, volts);
    }
    return new Look(
        "out, peak to peak",
        new Expected(
            FigureValue.of(high - low),
            OptionalDouble.empty(),
            OptionalDouble.empty(),
            Unit.VOLT,
            false));
  }

  /** All other figures that have a value; the catalogue decides which there are. */
  private static List<String> further(HookupPrediction prediction) {
    return prediction.figures().entrySet().stream()
        .filter(entry -> !READ.containsKey(entry.getKey()))
        .filter(entry -> !NOT_ON_PAPER.contains(entry.getKey()))
        .filter(entry -> entry.getValue().solved().number().isPresent())
        .map(entry -> further(entry.getValue()))
        .toList();
  }

  private static String further(FigureResult result) {
    Expected expected = Expected.of(result.solved(), Optional.empty(), result.figure().unit());
    return result.figure().label() + " " + expected.says();
  }
}
