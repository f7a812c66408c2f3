package loopwright.sheet;

import loopwright.design.Design;
import loopwright.design.Hookup;
import loopwright.design.Instrument;
import loopwright.design.InstrumentKind;
import loopwright.design.Source;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Unit;

/** How to set the generator. */
final class GeneratorWords {
  private GeneratorWords() {}

  /** Its setting for a hookup. */
  static String of(Hookup hookup) {
    Source source = hookup.source();
    double amplitude = source.amplitude().value();
    double dc = source.dc().value();
    String wave =
        amplitude == 0
            ? "Generator: no signal, " + volts(dc) + " dc"
            : "Generator: sine of "
                + EngineeringFormat.format(source.frequency().value(), Unit.HERTZ)
                + ", "
                + volts(2 * amplitude)
                + " peak to peak ("
                + volts(amplitude)
                + " peak), "
                + volts(dc)
                + " dc";
    return wave + " behind " + behind(source) + ".";
  }

  private static String behind(Source source) {
    double resistance = source.resistance().effective();
    return resistance == 0
        ? "no resistance (a low-impedance source)"
        : EngineeringFormat.format(resistance, Unit.OHM) + " in all";
  }

  /** A display that means the voltage into 50 Ω shows half (common practice, no source). */
  static String display(Design design) {
    boolean matched =
        design.bench().instruments().values().stream()
            .filter(instrument -> instrument.kind() == InstrumentKind.GENERATOR)
            .map(Instrument::displayLoad)
            .anyMatch(load -> load.filter(ohms -> Double.isFinite(ohms.value())).isPresent());
    return matched
        ? "The display of this bench's generator is meant for a load of 50 \u03A9: set it to half."
        : "A generator's display that is meant for a load of 50 \u03A9 shows half.";
  }

  private static String volts(double value) {
    return EngineeringFormat.format(value, Unit.VOLT);
  }
}
