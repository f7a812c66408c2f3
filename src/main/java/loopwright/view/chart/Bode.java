package loopwright.view.chart;

import java.util.List;
import java.util.stream.DoubleStream;
import java.util.stream.IntStream;
import loopwright.predict.ComplexPoint;
import loopwright.quantity.Unit;

/**
 * A response in the two ways that it is drawn.
 *
 * @param frequencies Hz, ascending
 * @param decibels 20 log of the magnitude; not a number where that is 0
 * @param degrees angle, continuous from the lowest frequency on
 */
record Bode(double[] frequencies, double[] decibels, double[] degrees) {
  /** From the points of a response, in ascending order of frequency. */
  static Bode of(List<ComplexPoint> points) {
    int count = points.size();
    double[] frequencies = new double[count];
    double[] decibels = new double[count];
    double[] degrees = new double[count];
    for (int i = 0; i < count; i++) {
      ComplexPoint point = points.get(i);
      frequencies[i] = point.frequency();
      double magnitude = point.magnitude();
      decibels[i] = magnitude > 0 ? decibels(magnitude) : Double.NaN;
      double angle = point.degrees();
      degrees[i] = i == 0 ? angle : angle + 360 * Math.rint((degrees[i - 1] - angle) / 360);
    }
    return new Bode(frequencies, decibels, degrees);
  }

  /** 20 log of a ratio. */
  static double decibels(double ratio) {
    return 20 * Math.log10(ratio);
  }

  Curve magnitude(String name) {
    return new Curve(name, frequencies, decibels);
  }

  Curve phase(String name) {
    return new Curve(name, frequencies, degrees);
  }

  /** The highest level. */
  double peak() {
    return DoubleStream.of(decibels).filter(Double::isFinite).max().orElse(0);
  }

  /** Levels from the highest down to a floor. */
  Span levels(double floor) {
    return Span.of(DoubleStream.of(decibels).filter(level -> level >= floor));
  }

  /** Angles where the level is above a floor: below it they are of no account. */
  Span angles(double floor) {
    return Span.of(
        IntStream.range(0, degrees.length)
            .filter(i -> decibels[i] >= floor)
            .mapToDouble(i -> degrees[i]));
  }

  /** An axis from the lowest frequency to the last at which the level is above a floor. */
  DecadeAxis axis(double floor) {
    int last = frequencies.length - 1;
    while (last > 1 && !(decibels[last - 1] >= floor)) {
      last--;
    }
    return new DecadeAxis(Unit.HERTZ, frequencies[0], frequencies[last]);
  }
}
