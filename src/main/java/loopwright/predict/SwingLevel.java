package loopwright.predict;

import java.util.OptionalDouble;

/**
 * The linear circuit at one level of the output.
 *
 * @param generator V
 * @param output voltage of {@code out}, V
 * @param stable whether no natural frequency grows
 * @param frequency of the fastest growing or, where none grows, the least damped complex pair, Hz
 * @param growth largest real part among complex pairs, 1/s; empty where there is no pair
 * @param phaseMargin degrees; empty where the loop gain never passes 1
 * @param gain incremental gain from generator to output
 */
public record SwingLevel(
    double generator,
    double output,
    boolean stable,
    OptionalDouble frequency,
    OptionalDouble growth,
    OptionalDouble phaseMargin,
    double gain) {}
