package loopwright.design;

import java.util.List;
import java.util.Optional;
import loopwright.quantity.Kind;
import loopwright.quantity.Measure;
import loopwright.quantity.Otherwise;
import loopwright.quantity.Quantity;
import loopwright.quantity.Range;
import loopwright.quantity.Unit;

/**
 * An amplifier that was measured, or of which only the figures are known.
 *
 * @param gain open-loop gain at dc
 * @param inputOffset differential input that centres the output, V
 * @param deadZone half-width of the crossover dead zone at the output, V
 * @param poles Hz
 * @param inputResistance between the inputs, Ω
 * @param inputCapacitance from each input to ground, F
 * @param inputBiasCurrent into each input, A
 * @param commonModeRejection ratio
 * @param outputResistance Ω
 * @param outputHigh highest output, V; the positive rail when absent
 * @param outputLow lowest output, V; the negative rail when absent
 * @param slewRate V/s
 */
@Kind("figures")
public record FiguresAmplifier(
    @Measure(unit = Unit.ONE, range = Range.POSITIVE) Quantity gain,
    @Measure(unit = Unit.VOLT) @Otherwise("0") Quantity inputOffset,
    @Measure(unit = Unit.VOLT, range = Range.NOT_NEGATIVE) @Otherwise("0") Quantity deadZone,
    @Measure(unit = Unit.HERTZ, range = Range.POSITIVE) List<Quantity> poles,
    @Measure(unit = Unit.OHM, range = Range.POSITIVE_OR_INFINITE) @Otherwise("infinite")
        Quantity inputResistance,
    @Measure(unit = Unit.FARAD, range = Range.NOT_NEGATIVE) @Otherwise("0")
        Quantity inputCapacitance,
    @Measure(unit = Unit.AMPERE) @Otherwise("0") Quantity inputBiasCurrent,
    @Measure(unit = Unit.ONE, range = Range.NOT_ZERO_OR_INFINITE) @Otherwise("infinite")
        Quantity commonModeRejection,
    @Measure(unit = Unit.OHM, range = Range.NOT_NEGATIVE) @Otherwise("0") Quantity outputResistance,
    @Measure(unit = Unit.VOLT) Optional<Quantity> outputHigh,
    @Measure(unit = Unit.VOLT) Optional<Quantity> outputLow,
    @Measure(unit = Unit.VOLT_PER_SECOND, range = Range.POSITIVE_OR_INFINITE) @Otherwise("infinite")
        Quantity slewRate)
    implements Amplifier {
  /** Keeps its own copy of the poles. */
  public FiguresAmplifier {
    poles = List.copyOf(poles);
  }
}
