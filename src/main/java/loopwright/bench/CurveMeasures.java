package loopwright.bench;

import java.util.List;
import java.util.OptionalDouble;

/**
 * What a curve measures, and what it does not.
 *
 * @param figures with their uncertainties
 * @param remarks what could not be found and why, and what is odd
 */
public record CurveMeasures(List<CurveFigure> figures, List<String> remarks) {
  /** Keeps its own copies. */
  public CurveMeasures {
    figures = List.copyOf(figures);
    remarks = List.copyOf(remarks);
  }

  /**
   * Measures a curve.
   *
   * @param curve with times or frequencies in ascending order
   * @param signal frequency that the hookup is driven with, Hz; empty where it is not known
   */
  public static CurveMeasures of(MeasuredCurve curve, OptionalDouble signal) {
    if (curve.column(MeasuredCurve.TIME).isPresent()) {
      return new WaveformMeasures(curve, signal).measures();
    }
    if (curve.column(MeasuredCurve.FREQUENCY).isPresent()) {
      return new SweepMeasures(curve, signal).measures();
    }
    return new CurveMeasures(
        List.of(), List.of("No column is time or frequency, so that nothing can be measured."));
  }
}
