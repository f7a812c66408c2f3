package loopwright.bench;

import java.util.Map;
import java.util.Set;
import java.util.function.UnaryOperator;
import loopwright.assembly.Deviations;
import loopwright.assembly.DeviceFault;
import loopwright.design.Design;
import loopwright.design.Reading;
import loopwright.predict.Build;

/**
 * One thing that may be wrong with a build or at the bench.
 *
 * @param part what it concerns: path of a part, role of a device, a rail, or an instrument
 * @param says what it would be, in words
 * @param design what it changes in the design
 * @param deviations what it changes beyond that
 * @param factors by quantity, what it does to what an instrument shows
 */
record Candidate(
    String part,
    String says,
    UnaryOperator<Design> design,
    Deviations deviations,
    Map<String, Double> factors) {
  static Candidate ofPart(String element, String says, double ratio) {
    return new Candidate(
        element,
        says,
        UnaryOperator.identity(),
        new Deviations(Map.of(), Map.of(element, ratio)),
        Map.of());
  }

  static Candidate exchanged(String one, double ofOne, String other, double ofOther, String says) {
    return new Candidate(
        one,
        says,
        UnaryOperator.identity(),
        new Deviations(Map.of(), Map.of(one, ofOther / ofOne, other, ofOne / ofOther)),
        Map.of());
  }

  static Candidate shorted(String capacitor, String says) {
    return new Candidate(
        capacitor,
        says,
        UnaryOperator.identity(),
        new Deviations(Map.of(), Map.of(), Map.of(), Set.of(capacitor)),
        Map.of());
  }

  static Candidate ofDevice(String role, DeviceFault fault) {
    return new Candidate(
        role,
        role + ": " + fault.says(),
        UnaryOperator.identity(),
        new Deviations(Map.of(), Map.of(), Map.of(role, fault), Set.of()),
        Map.of());
  }

  static Candidate ofSupply(String rail, String says, UnaryOperator<Design> change) {
    return new Candidate(rail, says, change, Deviations.NONE, Map.of());
  }

  static Candidate ofBench(String what, String says, Map<String, Double> factors) {
    return new Candidate(what, says, UnaryOperator.identity(), Deviations.NONE, factors);
  }

  /** A build of a circuit with this fault. */
  Build build(Design circuit) {
    return new Build(design.apply(circuit), deviations);
  }

  /** What an instrument shows of a value. */
  double shown(Reading reading, double value) {
    return value * factors.getOrDefault(reading.quantity(), 1.0);
  }
}
