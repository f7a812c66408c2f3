package loopwright.predict;

import static loopwright.quantity.Unit.VOLT;
import static loopwright.quantity.Unit.VOLT_PER_ROOT_HERTZ;

import java.util.List;

/** Noise at input and output. */
final class NoiseFigures {
  private static final String NOT_YET = "not solved by this version: the noise solver comes later";

  private NoiseFigures() {}

  static List<Figure> entries() {
    return List.of(
        new Figure(
            "inputNoise",
            "Input noise",
            VOLT_PER_ROOT_HERTZ,
            "Noise density at signal frequency, referred to the generator through the ideal gain.",
            "at rest",
            "root of 2·4kT(r_B + R_E + 1/(2g_m)) + 4kT R₊ + 4kT(upper ∥ lower)"
                + " + 2q I_B (R₊² + (upper ∥ lower)²)",
            CostClass.LINEAR,
            solution -> FigureValue.none(NOT_YET),
            SwingFormulas::inputNoise),
        new Figure(
            "outputNoise",
            "Output noise",
            VOLT,
            "Noise at the output from 10 Hz to 100 kHz, rms.",
            "at rest",
            "",
            CostClass.LINEAR,
            solution -> FigureValue.none(NOT_YET),
            NoFormula.ROAD));
  }
}
