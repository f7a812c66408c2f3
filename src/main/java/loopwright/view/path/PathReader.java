package loopwright.view.path;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import loopwright.design.Design;
import loopwright.design.FiguresAmplifier;
import loopwright.design.Hookup;
import loopwright.design.StagesAmplifier;
import loopwright.predict.HookupPrediction;
import loopwright.view.path.SignalPath.Route;
import loopwright.view.path.SignalPath.Way;
import loopwright.view.path.SignalPath.Wire;

/** Reads the signal path out of a design, one of its hookups and what is predicted of it. */
final class PathReader {
  private final Design design;
  private final Hookup hookup;
  private final RestWords rest;

  private PathReader(Design design, Hookup hookup, RestWords rest) {
    this.design = design;
    this.hookup = hookup;
    this.rest = rest;
  }

  /** The path; without a prediction it carries no voltages and currents. */
  static SignalPath read(Design design, Hookup hookup, Optional<HookupPrediction> prediction) {
    return new PathReader(design, hookup, new RestWords(prediction)).path();
  }

  private SignalPath path() {
    List<Block> row = new ArrayList<>();
    Map<String, Block> hanging = new LinkedHashMap<>();
    EndWords ends = new EndWords(rest);
    row.add(ends.source(hookup.source()));
    if (design.amplifier() instanceof StagesAmplifier stages) {
      StageWords words = new StageWords(stages, new PartWords(design), rest);
      row.addAll(words.row());
      hanging.putAll(words.hanging());
    } else {
      row.add(figures((FiguresAmplifier) design.amplifier()));
    }
    row.add(ends.load(hookup.load()));
    Route route = FeedbackWords.route(hookup.feedback());
    boolean drivesMinus = route.way() == Way.INVERTING;
    List<Wire> wires = new ArrayList<>();
    wires.add(wire(drivesMinus ? "in-" : "in+"));
    if (!hanging.isEmpty()) {
      wires.add(wire("pairOut"));
      wires.add(wire("gainOut"));
    }
    wires.add(wire("out"));
    return new SignalPath(
        hookup.name(),
        row,
        wires,
        hanging,
        FeedbackWords.block(hookup.feedback()),
        route,
        wire(drivesMinus ? "in+" : "in-"));
  }

  private Wire wire(String node) {
    return new Wire(node.replace('-', '\u2212'), rest.voltsSay(node));
  }

  private static Block figures(FiguresAmplifier amplifier) {
    return new Block(
        BlockIds.AMPLIFIER,
        Block.Kind.STAGE,
        "Amplifier",
        AmplifierWords.says(amplifier),
        "gain " + PartWords.ratio(amplifier.gain().value()));
  }
}
