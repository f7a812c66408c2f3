package loopwright.design;

/** The amplifier: drawn stage by stage, or known only by its figures. */
public sealed interface Amplifier permits StagesAmplifier, FiguresAmplifier {}
