package loopwright.predict;

import java.util.OptionalDouble;

/**
 * The amplifier at rest at one ambient temperature, every junction at the temperature that its own
 * dissipation gives it.
 *
 * @param ambient °C
 * @param idle collector current of the idle device, A; empty where it finds no rest
 * @param idleUnheated the same with every junction at ambient, A; empty where it finds no rest
 * @param hottest role of the hottest junction, or empty
 * @param celsius its temperature, °C; empty where no part states its thermal resistance
 * @param loop of dissipation and temperature; from 1 on it runs away; empty where not solved
 * @param reason why something is empty; empty when nothing is
 */
public record AmbientHeat(
    double ambient,
    OptionalDouble idle,
    OptionalDouble idleUnheated,
    String hottest,
    OptionalDouble celsius,
    OptionalDouble loop,
    String reason) {}
