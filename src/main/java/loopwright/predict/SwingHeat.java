package loopwright.predict;

import java.util.OptionalDouble;

/**
 * Dissipation of one device over the swing.
 *
 * @param role of the device
 * @param rest dissipation at rest, W
 * @param most the largest at any level, W
 * @param at output voltage of that level, V
 * @param mean mean over a sine of the amplitude that heats it most, W; such a sine rests where the
 *     output rests
 * @param amplitude that amplitude, peak, V
 * @param celsius junction temperature at that mean, °C; empty where the part states no thermal
 *     resistance
 * @param classB V²/(π² R) by hand, W; empty but for output devices into a resistive load
 */
public record SwingHeat(
    String role,
    double rest,
    double most,
    double at,
    double mean,
    double amplitude,
    OptionalDouble celsius,
    OptionalDouble classB) {}
