package loopwright.circuit;

import java.util.function.ToIntFunction;
import loopwright.part.Polarity;

/** The nodes at which a device meets the circuit, outside its ohmic resistances. */
public sealed interface DeviceTerminals {
  /** Its role. */
  String role();

  /** A transistor's. */
  record TransistorTerminals(String role, Polarity polarity, int collector, int base, int emitter)
      implements DeviceTerminals {}

  /** A diode's. */
  record DiodeTerminals(String role, int anode, int cathode) implements DeviceTerminals {}

  /** Terminals by name, before nodes have indices. */
  interface Named {
    /** The terminals once nodes have indices. */
    DeviceTerminals at(ToIntFunction<String> index);

    static Named transistor(
        String role, Polarity polarity, String collector, String base, String emitter) {
      return index ->
          new TransistorTerminals(
              role,
              polarity,
              index.applyAsInt(collector),
              index.applyAsInt(base),
              index.applyAsInt(emitter));
    }

    static Named diode(String role, String anode, String cathode) {
      return index -> new DiodeTerminals(role, index.applyAsInt(anode), index.applyAsInt(cathode));
    }
  }
}
