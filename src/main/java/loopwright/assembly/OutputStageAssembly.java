package loopwright.assembly;

import loopwright.circuit.CircuitBuilder;
import loopwright.design.Bias;
import loopwright.design.OutputStage;
import loopwright.part.Polarity;

/** The push-pull follower with bias and drivers, or a wire in its place. */
final class OutputStageAssembly {
  private static final String PATH = "amplifier.outputStage";

  private OutputStageAssembly() {}

  /**
   * Adds the stage.
   *
   * @return the node on which the gain stage's load hangs
   */
  static String add(Workpiece work, OutputStage stage) {
    if (stage instanceof OutputStage.PushPull pushPull) {
      return addPushPull(work, pushPull);
    }
    work.circuit().join(Nodes.GAIN_OUT, Nodes.OUT);
    return Nodes.GAIN_OUT;
  }

  private static String addPushPull(Workpiece work, OutputStage.PushPull stage) {
    CircuitBuilder circuit = work.circuit();
    boolean downward = work.pairPolarity() == Polarity.NPN;
    circuit.join(Nodes.GAIN_OUT, downward ? Nodes.DRIVE_HIGH : Nodes.DRIVE_LOW);
    addBias(work, stage.bias());

    String upperBase = Nodes.DRIVE_HIGH;
    String lowerBase = Nodes.DRIVE_LOW;
    if (stage.drivers().isPresent()) {
      OutputStage.Drivers drivers = stage.drivers().get();
      upperBase = "powerHigh";
      lowerBase = "powerLow";
      work.transistor("driver.upper", drivers.upper(), Nodes.POSITIVE, Nodes.DRIVE_HIGH, upperBase);
      work.transistor("driver.lower", drivers.lower(), Nodes.NEGATIVE, Nodes.DRIVE_LOW, lowerBase);
      work.resistor(PATH + ".drivers.resistance", upperBase, lowerBase, drivers.resistance());
    }
    work.resistor(
        PATH + ".emitterResistance@out.upper", Nodes.OUT, "outHigh", stage.emitterResistance());
    work.resistor(
        PATH + ".emitterResistance@out.lower", Nodes.OUT, "outLow", stage.emitterResistance());
    work.transistor("out.upper", stage.upper(), Nodes.POSITIVE, upperBase, "outHigh");
    work.transistor("out.lower", stage.lower(), Nodes.NEGATIVE, lowerBase, "outLow");
    return downward ? Nodes.DRIVE_LOW : Nodes.DRIVE_HIGH;
  }

  private static void addBias(Workpiece work, Bias bias) {
    if (bias instanceof Bias.Joined) {
      work.circuit().join(Nodes.DRIVE_HIGH, Nodes.DRIVE_LOW);
    } else if (bias instanceof Bias.Diodes diodes) {
      work.diodeChain(
          "bias.d", "biasChain", diodes.diode(), diodes.count(), Nodes.DRIVE_HIGH, Nodes.DRIVE_LOW);
    } else if (bias instanceof Bias.VbeMultiplier multiplier) {
      String tap = "biasTap";
      work.transistor("bias.q1", multiplier.transistor(), Nodes.DRIVE_HIGH, tap, Nodes.DRIVE_LOW);
      work.resistor(PATH + ".bias.upper", Nodes.DRIVE_HIGH, tap, multiplier.upper());
      work.resistor(PATH + ".bias.lower", tap, Nodes.DRIVE_LOW, multiplier.lower());
    }
  }
}
