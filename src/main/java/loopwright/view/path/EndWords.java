package loopwright.view.path;

import java.util.ArrayList;
import java.util.List;
import loopwright.design.Load;
import loopwright.design.ReturnNode;
import loopwright.design.Source;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Unit;

/** Source and load of a hookup in words. */
final class EndWords {
  private final RestWords rest;

  EndWords(RestWords rest) {
    this.rest = rest;
  }

  Block source(Source source) {
    List<String> says = new ArrayList<>();
    if (source.resistance().effective() > 0) {
      says.add(PartWords.ohms(source.resistance()));
    }
    source
        .attenuator()
        .ifPresent(
            attenuator -> {
              says.add(
                  PartWords.ohms(attenuator.series())
                      + " over "
                      + PartWords.ohms(attenuator.shunt()));
              double ratio = 1 + attenuator.series().effective() / attenuator.shunt().effective();
              says.add("attenuates 1/" + PartWords.ratio(ratio));
            });
    source
        .couplingCapacitance()
        .ifPresent(capacitance -> says.add("through " + PartWords.farads(capacitance)));
    source
        .biasResistance()
        .ifPresent(bias -> says.add(PartWords.ohms(bias) + place(source.biasTo())));
    if (says.isEmpty()) {
      says.add("no resistance");
    }
    double dc = source.dc().value();
    boolean isSine = source.amplitude().value() != 0;
    if (isSine && dc != 0) {
      says.add("on " + PartWords.volts(dc) + " dc");
    }
    return new Block(BlockIds.SOURCE, Block.Kind.END, "Source", says, signal(source));
  }

  private static String place(ReturnNode node) {
    return node == ReturnNode.GROUND ? " to ground" : " to mid-rail";
  }

  private static String signal(Source source) {
    double dc = source.dc().value();
    if (source.amplitude().value() == 0) {
      return dc == 0 ? "no signal" : PartWords.volts(dc) + " dc";
    }
    return PartWords.volts(source.amplitude().value())
        + " peak, "
        + EngineeringFormat.format(source.frequency().value(), Unit.HERTZ);
  }

  Block load(Load load) {
    List<String> says = new ArrayList<>();
    List<String> parts = new ArrayList<>();
    load.resistance().ifPresent(part -> parts.add(PartWords.ohms(part)));
    load.capacitance()
        .filter(part -> part.effective() > 0)
        .ifPresent(part -> parts.add(PartWords.farads(part)));
    says.add(parts.isEmpty() ? "nothing connected" : String.join(", ", parts));
    List<String> ahead = new ArrayList<>();
    if (load.isolation().effective() > 0) {
      ahead.add(PartWords.ohms(load.isolation()));
    }
    load.couplingCapacitance().ifPresent(part -> ahead.add(PartWords.farads(part)));
    says.add(ahead.isEmpty() ? "" : "behind " + String.join(" and ", ahead));
    load.snubber()
        .ifPresent(
            snubber ->
                says.add(
                    "snubber "
                        + PartWords.ohms(snubber.resistance())
                        + ", "
                        + PartWords.farads(snubber.capacitance())));
    String volts = load.isSeparate() ? rest.voltsSay("load") : "";
    return new Block(
        BlockIds.LOAD, Block.Kind.END, "Load", says, volts.isEmpty() ? "" : "load " + volts);
  }
}
