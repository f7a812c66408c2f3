package loopwright.view.path;

/** What the blocks of the signal path are called: paths of the design file where it has one. */
final class BlockIds {
  static final String SOURCE = "source";
  static final String AMPLIFIER = "amplifier";
  static final String INPUT_PAIR = "amplifier.inputPair";
  static final String TAIL = "amplifier.inputPair.tail";
  static final String GAIN_STAGE = "amplifier.gainStage";
  static final String GAIN_LOAD = "amplifier.gainStage.load";
  static final String OUTPUT_STAGE = "amplifier.outputStage";
  static final String FEEDBACK = "feedback";
  static final String LOAD = "load";

  private BlockIds() {}
}
