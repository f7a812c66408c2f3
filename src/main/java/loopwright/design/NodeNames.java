package loopwright.design;

import java.util.List;

/** The nodes that a design may name: those of the stages, the rails and the hookups. */
public final class NodeNames {
  /** Every name that a node of some amplifier or hookup has, from the supply to the load. */
  public static final List<String> ALL =
      List.of(
          "ground",
          "positive",
          "negative",
          "ideal.positive",
          "ideal.negative",
          "decoupling.positive",
          "decoupling.negative",
          "midRail",
          "generator",
          "attenuatorTop",
          "coupling",
          "inputEnd",
          "in+",
          "in-",
          "base1",
          "base2",
          "emitter1",
          "emitter2",
          "tail",
          "pairOut",
          "pairOther",
          "gainBase",
          "gainEmitter",
          "gainOut",
          "driveHigh",
          "driveLow",
          "biasTap",
          "powerHigh",
          "powerLow",
          "outHigh",
          "outLow",
          "out",
          "load",
          "dividerFoot",
          "snubberFoot");

  private NodeNames() {}
}
