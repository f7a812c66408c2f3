package loopwright.predict;

import java.util.ArrayList;
import java.util.Collections;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import loopwright.assembly.AssembledHookup;
import loopwright.design.Design;
import loopwright.design.OutputStage;
import loopwright.design.PartValue;
import loopwright.design.StagesAmplifier;
import loopwright.solve.GeneratorWalk;

/**
 * Dissipation of every device as the output goes from its lowest to its highest level, without the
 * capacitances, and the sine that heats each most. Junctions stay at their temperatures at rest.
 */
final class HeatOverSwing {
  private static final int STEPS = 60;
  private static final int AMPLITUDES = 40;
  private static final int PHASES = 360;

  private final HookupSolution solution;
  private final DeviceReadout readout;
  private final List<Double> outputs = new ArrayList<>();
  private final List<Map<String, DeviceState>> states = new ArrayList<>();

  private HeatOverSwing(HookupSolution solution) {
    this.solution = solution;
    this.readout = new DeviceReadout(solution.assembled());
  }

  /**
   * Every device, the hottest first.
   *
   * @throws UnsolvedException with the reason when the clipping levels are not known
   */
  static List<SwingHeat> of(HookupSolution solution) {
    HeatOverSwing swing = new HeatOverSwing(solution);
    swing.walk(solution.clipLow().output());
    // Downward from the top of what was walked, so that outputs rise from first to last.
    Collections.reverse(swing.outputs);
    Collections.reverse(swing.states);
    int rest = swing.outputs.size() - 1;
    swing.walk(solution.clipHigh().output());
    List<SwingHeat> heats = new ArrayList<>();
    for (String role : swing.states.get(rest).keySet()) {
      heats.add(swing.device(role, rest));
    }
    heats.sort(
        Comparator.comparingDouble((SwingHeat heat) -> heat.celsius().orElse(0))
            .thenComparingDouble(SwingHeat::mean)
            .reversed());
    return heats;
  }

  /** From rest to an output level in equal steps of the generator, as far as it goes. */
  private void walk(double target) {
    AssembledHookup hookup = solution.assembled();
    double start = solution.linearRest().voltage(hookup.out());
    GeneratorWalk walk =
        new GeneratorWalk(hookup, solution.linearRest(), Math.max(1e-6, Math.abs(target) / 8));
    if (outputs.isEmpty()) {
      add(walk);
    }
    double gain = walk.gain();
    double step = (target - start) / STEPS / gain;
    // Beyond the last level the output may never come: twice the steps are enough to see it bend.
    for (int k = 0; k < 2 * STEPS; k++) {
      if (!walk.advance(walk.generator() + step)) {
        return;
      }
      boolean beyond = (walk.output() - target) * Math.signum(target - start) > 0;
      if (beyond) {
        return;
      }
      add(walk);
    }
  }

  private void add(GeneratorWalk walk) {
    outputs.add(walk.output());
    states.add(readout.read(walk.state(), Map.of()));
  }

  private SwingHeat device(String role, int rest) {
    double[] powers = states.stream().mapToDouble(state -> state.get(role).power()).toArray();
    int most = 0;
    for (int k = 1; k < powers.length; k++) {
      most = powers[k] > powers[most] ? k : most;
    }
    double centre = outputs.get(rest);
    double reach = Math.min(centre - outputs.get(0), outputs.get(outputs.size() - 1) - centre);
    double mean = powers[rest];
    double amplitude = 0;
    for (int k = 1; k <= AMPLITUDES; k++) {
      double peak = reach * k / AMPLITUDES;
      double sum = 0;
      for (int phase = 0; phase < PHASES; phase++) {
        sum += at(powers, centre + peak * Math.sin(2 * Math.PI * (phase + 0.5) / PHASES));
      }
      if (sum / PHASES > mean) {
        mean = sum / PHASES;
        amplitude = peak;
      }
    }
    OptionalDouble resistance = readout.thermalResistances().get(role);
    return new SwingHeat(
        role,
        powers[rest],
        powers[most],
        outputs.get(most),
        mean,
        amplitude,
        new JunctionHeat(solution.design()).celsius(mean, resistance),
        classB(role));
  }

  /** Linear between the walked levels. */
  private double at(double[] powers, double output) {
    int above = 1;
    while (above < powers.length - 1 && outputs.get(above) < output) {
      above++;
    }
    double low = outputs.get(above - 1);
    double high = outputs.get(above);
    double share = high == low ? 0 : (output - low) / (high - low);
    return powers[above - 1] + share * (powers[above] - powers[above - 1]);
  }

  /**
   * V²/(π² R) of a class-B stage on an ideal supply, with V from rail to resting output (handbooks'
   * form; parts of the supply's resistance count as load).
   */
  private OptionalDouble classB(String role) {
    Design design = solution.design();
    boolean upper = role.equals("out.upper");
    if (!upper && !role.equals("out.lower")
        || !(design.amplifier() instanceof StagesAmplifier stages)
        || !(stages.outputStage() instanceof OutputStage.PushPull)
        || solution.hookup().load().resistance().isEmpty()) {
      return OptionalDouble.empty();
    }
    double rail = (upper ? design.rails().positive() : design.rails().negative()).value();
    double volts = rail - solution.reference();
    double load = solution.hookup().load().resistance().map(PartValue::effective).orElseThrow();
    return OptionalDouble.of(volts * volts / (Math.PI * Math.PI * load));
  }
}
