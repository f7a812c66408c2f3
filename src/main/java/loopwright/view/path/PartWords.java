package loopwright.view.path;

import java.util.Locale;
import java.util.Optional;
import loopwright.design.Design;
import loopwright.design.PartValue;
import loopwright.part.PartRecord;
import loopwright.part.Polarity;
import loopwright.part.TransistorRecord;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Unit;

/** Parts of a design in words. */
final class PartWords {
  private final Design design;

  PartWords(Design design) {
    this.design = design;
  }

  static String ohms(PartValue part) {
    return EngineeringFormat.format(part.effective(), Unit.OHM);
  }

  /** A resistor with what it is; empty for a wire. */
  static String ohms(PartValue part, String what) {
    return part.effective() == 0 ? "" : ohms(part) + what;
  }

  /** A resistor behind something else; empty for a wire. */
  static String ohms(String before, PartValue part) {
    return part.effective() == 0 ? "" : before + ohms(part);
  }

  static String farads(PartValue part) {
    return EngineeringFormat.format(part.effective(), Unit.FARAD);
  }

  static String volts(double volts) {
    return EngineeringFormat.format(volts, Unit.VOLT);
  }

  /** A gain or ratio. */
  static String ratio(double ratio) {
    return EngineeringFormat.format(ratio, Unit.ONE);
  }

  /** Polarity and type of a transistor; the type alone where that says it, or nothing else does. */
  String transistor(String name) {
    return polarity(name)
        .map(polarity -> polarity == Polarity.NPN ? "npn" : "pnp")
        .filter(word -> !name.toLowerCase(Locale.ROOT).contains(word))
        .map(word -> word + " " + name)
        .orElse(name);
  }

  /** The rail that the pair's tail and the gain stage's load pull toward; empty when not known. */
  String lowerRail(String pairTransistor) {
    return polarity(pairTransistor)
        .map(
            polarity ->
                polarity == Polarity.NPN ? design.rails().negative() : design.rails().positive())
        .map(rail -> rail.value() == 0 ? "0 V" : signed(rail.value()))
        .orElse("");
  }

  private static String signed(double volts) {
    return (volts > 0 ? "+" : "") + volts(volts);
  }

  /** Polarity of a transistor; empty where the design does not carry its record. */
  Optional<Polarity> polarity(String name) {
    PartRecord record = design.parts().get(name);
    return record instanceof TransistorRecord transistor
        ? Optional.of(transistor.kind())
        : Optional.empty();
  }
}
