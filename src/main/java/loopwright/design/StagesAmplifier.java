package loopwright.design;

import loopwright.quantity.Kind;

/**
 * An amplifier of stages; the polarity of the pair's transistor decides that of everything else.
 */
@Kind("stages")
public record StagesAmplifier(InputPair inputPair, GainStage gainStage, OutputStage outputStage)
    implements Amplifier {}
