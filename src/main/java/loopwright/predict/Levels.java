package loopwright.predict;

import java.util.Optional;
import java.util.OptionalDouble;
import loopwright.assembly.AssembledHookup;
import loopwright.assembly.Nodes;
import loopwright.circuit.CircuitState;
import loopwright.design.Design;
import loopwright.numeric.RootSearch;
import loopwright.solve.GeneratorWalk;
import loopwright.solve.LevelSearch;

/**
 * The output levels at which the figures are taken: at rest, and where the output first reaches the
 * reference ± P/2 as the generator moves from rest.
 *
 * @param reference what an ideal amplifier would put at the output at rest, V
 * @param peak P, V: |ideal gain| × amplitude, or 1 V; halved until both levels are within reach
 * @param halvings how often it was halved
 * @param rest at rest, blocking capacitors held
 * @param high output at reference + P/2
 * @param low output at reference − P/2
 */
record Levels(
    double reference,
    double peak,
    int halvings,
    CircuitState rest,
    CircuitState high,
    CircuitState low) {
  private static final int MOST_HALVINGS = 40;

  /** P before any halving. */
  static double nominalPeak(AssembledHookup hookup, HookupGains gains) {
    double amplitude = hookup.hookup().source().amplitude().value();
    OptionalDouble ideal = gains.idealGain();
    return ideal.isEmpty() || amplitude == 0 ? 1 : Math.abs(ideal.getAsDouble()) * amplitude;
  }

  /** What an ideal amplifier would put at the output, V, for the circuit at rest. */
  static double reference(AssembledHookup hookup, HookupGains gains, CircuitState rest) {
    return gains.reference(
        hookup.circuit().hasNode(Nodes.MID_RAIL) ? rest.voltage(Nodes.MID_RAIL) : 0);
  }

  /**
   * Where linear figures at rest are taken: at rest, or with an open hookup where the output is at
   * the reference.
   *
   * @param held at rest, blocking capacitors held
   */
  static CircuitState linearRest(AssembledHookup hookup, HookupGains gains, CircuitState held) {
    CircuitState state =
        hookup.isOpen() ? reach(hookup, gains, held, reference(hookup, gains, held)) : held;
    if (state == null) {
      throw new UnsolvedException("the generator cannot bring the output to its reference");
    }
    return state;
  }

  /**
   * Finds the levels from the circuit at rest.
   *
   * @param held at rest, blocking capacitors held
   */
  static Levels find(AssembledHookup hookup, HookupGains gains, CircuitState held) {
    double reference = reference(hookup, gains, held);
    double peak = nominalPeak(hookup, gains);
    for (int halvings = 0; halvings <= MOST_HALVINGS; halvings++) {
      CircuitState high = reach(hookup, gains, held, reference + peak / 2);
      CircuitState low = high == null ? null : reach(hookup, gains, held, reference - peak / 2);
      if (low != null) {
        return new Levels(reference, peak, halvings, held, high, low);
      }
      peak /= 2;
    }
    throw new UnsolvedException("the output does not move to either side of its reference");
  }

  /**
   * The levels of a circuit that differs little in its values from one whose levels are known;
   * empty where they are not on the same branch, or where those were halved.
   *
   * @param held at rest, blocking capacitors held
   * @param neighbour the levels of the other circuit
   */
  static Optional<Levels> near(
      AssembledHookup hookup, HookupGains gains, CircuitState held, Levels neighbour) {
    if (neighbour.halvings() > 0 || !hookup.circuit().isLike(neighbour.rest().circuit())) {
      return Optional.empty();
    }
    double reference = reference(hookup, gains, held);
    double peak = nominalPeak(hookup, gains);
    LevelSearch search = new LevelSearch(hookup, held);
    return search
        .near(neighbour.high(), reference + peak / 2)
        .flatMap(
            high ->
                search
                    .near(neighbour.low(), reference - peak / 2)
                    .map(low -> new Levels(reference, peak, 0, held, high, low)));
  }

  /**
   * Generator voltage at which the output would stand at its reference plus P, V, for an amplifier
   * that follows; with an open hookup the voltage that brings it there.
   *
   * @param held at rest, blocking capacitors held
   * @param direction of the output: 1 upward, −1 downward
   * @throws UnsolvedException when an open hookup does not get there
   */
  static double generatorForPeak(
      AssembledHookup hookup, HookupGains gains, CircuitState held, int direction) {
    double peak = nominalPeak(hookup, gains);
    if (gains.idealGain().isPresent()) {
      return held.generator() + direction * peak / gains.idealGain().getAsDouble();
    }
    double target = reference(hookup, gains, held) + direction * peak;
    CircuitState there = reach(hookup, gains, held, target);
    if (there == null) {
      throw new UnsolvedException("the output does not reach " + Text.volts(target));
    }
    return there.generator();
  }

  /** What is to be said about P, or empty. */
  String remark() {
    return halvings == 0
        ? ""
        : "taken at ± "
            + peak / 2
            + " V about the reference, since the output does not reach the full swing";
  }

  /** The state in which the output first reaches a level, or null when it never does. */
  static CircuitState reach(
      AssembledHookup hookup, HookupGains gains, CircuitState from, double target) {
    double start = from.voltage(hookup.out());
    if (start == target) {
      return from;
    }
    int direction = gains.direction() * (target > start ? 1 : -1);
    double limit = from.generator() + direction * furthest(hookup.design(), gains);
    GeneratorWalk walk = new GeneratorWalk(hookup, from, furthest(hookup.design(), gains) / 64);
    CircuitState before = from.copy();
    while (walk.generator() != limit) {
      before.copyFrom(walk.state());
      if (!walk.step(limit)) {
        return null;
      }
      if ((walk.output() - target) * (start - target) <= 0) {
        return between(hookup, before, walk, target);
      }
    }
    return null;
  }

  private static CircuitState between(
      AssembledHookup hookup, CircuitState before, GeneratorWalk walk, double target) {
    double near = before.generator();
    double far = walk.generator();
    double root =
        RootSearch.find(
            generator -> {
              GeneratorWalk fine = new GeneratorWalk(hookup, before, Math.abs(far - near));
              return fine.advance(generator) ? fine.output() - target : Double.NaN;
            },
            near,
            far,
            1e-13 * Math.max(1e-3, Math.max(Math.abs(near), Math.abs(far))));
    GeneratorWalk last = new GeneratorWalk(hookup, before, Math.abs(far - near));
    return Double.isNaN(root) || !last.advance(root) ? null : last.state();
  }

  /** How far the generator may have to move: the input by the whole span of the rails, V. */
  private static double furthest(Design design, HookupGains gains) {
    double span = design.rails().positive().value() - design.rails().negative().value();
    double ideal = Math.abs(gains.idealGain().orElse(gains.inputRatio()));
    double input = gains.direction() > 0 ? gains.inputRatio() : Math.min(ideal, gains.inputRatio());
    return span / input;
  }
}
