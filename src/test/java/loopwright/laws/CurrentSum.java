package loopwright.laws;

import java.util.HashMap;
import java.util.Map;
import loopwright.assembly.AssembledHookup;
import loopwright.circuit.CircuitState;
import loopwright.part.DiodeModel;
import loopwright.part.DiodeRecord;
import loopwright.part.Polarity;
import loopwright.part.TransistorParameters;
import loopwright.quantity.Quantity;

/**
 * Currents at the nodes of a {@link Wiring} by Ohm's law and the transport equations, written here
 * anew, at the voltages that a solved circuit shows.
 */
final class CurrentSum {
  /** What meets at a node. */
  static final class Node {
    private double leaving;
    private double magnitudes;
    private double conducted;

    /** Sum of the currents that leave, A. */
    double leaving() {
      return leaving;
    }

    /**
     * What the convergence criterion of the program's definition allows: 1e-9 of the magnitudes, or
     * 1e-15 A and 1e-15 of conductance times voltage.
     */
    double allowed() {
      return Math.max(1e-9 * magnitudes, 1e-15 + 1e-15 * conducted);
    }
  }

  /** By how much two ways of rounding may exceed what is allowed. */
  static final double ROUNDED_TWICE = 1.5;

  private static final double SHUNT = 1e-13;

  private final AssembledHookup hookup;
  private final CircuitState state;
  private final Wiring wiring;
  private final double kelvin;
  private final double thermal;
  private final Map<String, Node> nodes = new HashMap<>();

  CurrentSum(AssembledHookup hookup, CircuitState state, Wiring wiring) {
    this.hookup = hookup;
    this.state = state;
    this.wiring = wiring;
    this.kelvin = 273.15 + hookup.design().surroundings().ambient().value();
    this.thermal = 1.380649e-23 * kelvin / 1.602176634e-19;
    wiring.resistances().forEach(r -> resistor(r.from(), r.to(), r.ohms()));
    wiring.currents().forEach(c -> flows(c.from(), c.to(), c.amperes(), 0));
    wiring.transistors().forEach(this::transistor);
    wiring.diodes().forEach(this::diode);
  }

  /** Every node by one of its names; a device's inner nodes bear the program's names. */
  Map<String, Node> nodes() {
    return nodes;
  }

  private double volts(String node) {
    return state.voltage(node);
  }

  private void resistor(String from, String to, double ohms) {
    double conducted = (Math.abs(volts(from)) + Math.abs(volts(to))) / ohms;
    flows(from, to, (volts(from) - volts(to)) / ohms, conducted);
  }

  private void flows(String from, String to, double current, double conducted) {
    leaves(from, current, conducted);
    leaves(to, -current, conducted);
  }

  private void leaves(String name, double current, double conducted) {
    Node node = nodes.computeIfAbsent(wiring.node(name), key -> new Node());
    node.leaving += current;
    node.magnitudes += Math.abs(current);
    node.conducted += conducted;
  }

  /** A terminal's inner node, behind its resistance where it has one. */
  private String inner(String role, String terminal, String outer, double ohms) {
    if (ohms == 0) {
      return outer;
    }
    String inner = role + ".inner." + terminal;
    resistor(outer, inner, ohms);
    return inner;
  }

  private void transistor(Wiring.TransistorAt at) {
    TransistorParameters p = hookup.models().transistor(at.role());
    int sign = polarity(at.role()) == Polarity.NPN ? 1 : -1;
    String c = inner(at.role(), "collector", at.collector(), p.collectorResistance());
    String b = inner(at.role(), "base", at.base(), p.baseResistance());
    String e = inner(at.role(), "emitter", at.emitter(), p.emitterResistance());
    double vbe = sign * (volts(b) - volts(e));
    double vbc = sign * (volts(b) - volts(c));

    double growth = growth();
    double beta = Math.pow(kelvin / 298.15, 1.5);
    double is = p.saturationCurrent() * growth;
    double forward = is * Math.expm1(vbe / thermal);
    double reverse = is * Math.expm1(vbc / thermal);
    double q1 = 1 / (1 - vbc / p.earlyVoltage());
    double qb = q1 / 2 * (1 + Math.sqrt(1 + 4 * forward / p.kneeCurrent()));
    double recombination =
        p.recombinationCurrent()
            * Math.pow(growth, 1 / p.recombinationIdeality())
            * Math.expm1(vbe / (p.recombinationIdeality() * thermal));
    double backward = reverse / (p.reverseBeta() * beta);
    double collector = (forward - reverse) / qb - backward - SHUNT * vbc;
    double base =
        forward / (p.forwardBeta() * beta) + recombination + backward + SHUNT * (vbe + vbc);

    double conducted =
        (Math.abs(forward) + Math.abs(reverse) + Math.abs(recombination))
            / thermal
            * (Math.abs(volts(b)) + Math.abs(volts(c)) + Math.abs(volts(e)));
    leaves(c, sign * collector, conducted);
    leaves(b, sign * base, conducted);
    leaves(e, -sign * (collector + base), conducted);
  }

  private void diode(Wiring.DiodeAt at) {
    DiodeModel model = ((DiodeRecord) hookup.models().record(at.role())).model().orElseThrow();
    double ideality = model.ideality().map(Quantity::value).orElse(1.0);
    double series = model.seriesResistance().map(Quantity::value).orElse(0.0);
    String a = inner(at.role(), "anode", at.anode(), series);
    double v = volts(a) - volts(at.cathode());
    double forward =
        model.saturationCurrent().orElseThrow().value()
            * Math.pow(growth(), 1 / ideality)
            * Math.expm1(v / (ideality * thermal));
    double conducted =
        Math.abs(forward) / thermal * (Math.abs(volts(a)) + Math.abs(volts(at.cathode())));
    flows(a, at.cathode(), forward + SHUNT * v, conducted);
  }

  private Polarity polarity(String role) {
    return ((loopwright.part.TransistorRecord) hookup.models().record(role)).kind();
  }

  /** (T/T₀)³ exp((1.12 eV/k)(1/T₀ − 1/T)). */
  private double growth() {
    double gap = 1.12 * 1.602176634e-19 / 1.380649e-23;
    return Math.pow(kelvin / 298.15, 3) * Math.exp(gap * (1 / 298.15 - 1 / kelvin));
  }
}
