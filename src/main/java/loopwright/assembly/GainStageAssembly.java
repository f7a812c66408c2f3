package loopwright.assembly;

import loopwright.design.GainStage;

/** The common-emitter stage with buffer, degeneration, compensation and load. */
final class GainStageAssembly {
  private static final String PATH = "amplifier.gainStage";
  private static final String EMITTER = "gainEmitter";
  private static final String BUFFERED_BASE = "gainBase";

  private GainStageAssembly() {}

  /**
   * Adds the stage.
   *
   * @param loadNode the far drive node, on which the load hangs
   */
  static void add(Workpiece work, GainStage stage, String loadNode) {
    String base = Nodes.PAIR_OUT;
    if (stage.buffer().isPresent()) {
      GainStage.Buffer buffer = stage.buffer().get();
      base = BUFFERED_BASE;
      work.transistor(
          "gain.buffer", buffer.transistor(), work.tailRail(), Nodes.PAIR_OUT, BUFFERED_BASE);
      work.resistor(
          PATH + ".buffer.emitterResistance",
          BUFFERED_BASE,
          work.collectorRail(),
          buffer.emitterResistance());
    }
    work.resistor(
        PATH + ".emitterResistance", work.collectorRail(), EMITTER, stage.emitterResistance());
    stage
        .emitterBypass()
        .ifPresent(
            bypass ->
                work.blockingCapacitor(
                    PATH + ".emitterBypass", EMITTER, work.collectorRail(), bypass));
    work.transistor("gain.q1", stage.transistor(), Nodes.GAIN_OUT, base, EMITTER);
    stage
        .compensation()
        .ifPresent(
            compensation -> {
              String middle = "compensationMiddle";
              work.capacitor(
                  PATH + ".compensation.capacitance",
                  Nodes.GAIN_OUT,
                  middle,
                  compensation.capacitance());
              work.resistor(
                  PATH + ".compensation.resistance",
                  middle,
                  Nodes.PAIR_OUT,
                  compensation.resistance());
            });
    CurrentSourceAssembly.add(work, stage.load(), PATH + ".load", "gainLoad", loadNode);
  }
}
