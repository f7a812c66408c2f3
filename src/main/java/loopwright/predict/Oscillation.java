package loopwright.predict;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import loopwright.assembly.DeviceModels;
import loopwright.design.Design;
import loopwright.design.Hookup;
import loopwright.task.Progress;

/**
 * What an oscillation looks like: begun at the level of the swing where it grows fastest, the
 * generator held there.
 *
 * @param hookup name
 * @param generator voltage of the generator at that level, V
 * @param output of the amplifier at that level, V
 * @param forecastFrequency of the small-signal circuit there, Hz
 * @param forecastGrowth of the small-signal circuit there, 1/s
 * @param early what it does in time while it is small; frequency in Hz and growth in 1/s
 * @param settled what it settles to; empty when it does not
 * @param rides over which stretches of the swing it grows: what it rides on, upward
 * @param times of a record of its beginning and of its settled cycle, s; bounded
 * @param volts the output at those times, V
 * @param says why it has not settled, or empty
 */
public record Oscillation(
    String hookup,
    double generator,
    double output,
    double forecastFrequency,
    double forecastGrowth,
    Early early,
    Optional<Settled> settled,
    List<Rides> rides,
    List<Double> times,
    List<Double> volts,
    String says) {
  /**
   * While it is small.
   *
   * @param frequency Hz
   * @param growth 1/s
   * @param cycles over how many cycles that was taken
   */
  public record Early(double frequency, double growth, int cycles) {}

  /**
   * The cycle that it settles to.
   *
   * @param frequency Hz
   * @param amplitude half of peak to peak at the output, V
   * @param low lowest output, V
   * @param high highest output, V
   * @param cycles how many it took from the first small movement
   */
  public record Settled(double frequency, double amplitude, double low, double high, int cycles) {}

  /**
   * A stretch of the waveform that it rides on.
   *
   * @param lowOutput lowest level of the output where something grows, V
   * @param highOutput highest level, V
   * @param fromPhase of the generator's sine where the lowest stands while it rises, degrees; empty
   *     without an amplitude
   * @param toPhase where the highest stands, degrees
   */
  public record Rides(
      double lowOutput, double highOutput, OptionalDouble fromPhase, OptionalDouble toPhase) {}

  /** Keeps its own copies. */
  public Oscillation {
    rides = List.copyOf(rides);
    times = List.copyOf(times);
    volts = List.copyOf(volts);
  }

  /**
   * Lets a hookup oscillate.
   *
   * @param design a valid design, every part it names among its own
   * @param progress asked whether the result is still wanted
   * @return empty where nothing oscillates at any level of the swing
   * @throws ArithmeticException when the swing or the run cannot be solved; the message says why
   * @throws loopwright.task.CancelledException when it is not wanted any more
   */
  public static Optional<Oscillation> of(Design design, Hookup hookup, Progress progress) {
    HookupSolution solution =
        new HookupSolution(design, hookup, new DeviceModels(design), Optional.empty(), progress);
    Outcome<SwingStability> swing = solution.swingOutcome();
    if (!swing.isPresent()) {
      throw new ArithmeticException(swing.reason());
    }
    return OscillationRun.worst(swing.value())
        .map(level -> new OscillationRun(solution, level, progress).run());
  }
}
