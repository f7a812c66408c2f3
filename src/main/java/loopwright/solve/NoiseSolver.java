package loopwright.solve;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.stream.DoubleStream;
import loopwright.circuit.CircuitState;
import loopwright.circuit.Element;
import loopwright.circuit.NoiseSource;
import loopwright.numeric.AdaptiveQuadrature;

/**
 * Noise at one unknown of a linear network: every source through its own transfer, all transfers of
 * a frequency from one solution of the transposed system (Rohrer, Nagel, Meyer and Weber, IEEE
 * Journal of Solid-State Circuits 6, 1971, 204–213). Sources are independent, so that their powers
 * add up.
 */
public final class NoiseSolver {
  /**
   * Accuracy to which powers are integrated, as a share; what is kept is far closer.
   *
   * @see AdaptiveQuadrature
   */
  public static final double ACCURACY = 1e-8;

  private final SmallSignalCircuit network;
  private final int unknown;
  private final List<NoiseSource> sources;

  /**
   * Noise of a circuit at a solved state.
   *
   * @param network linearised at the state
   * @param state solved; not modified
   * @param unknown where the noise is wanted; not ground
   */
  public NoiseSolver(SmallSignalCircuit network, CircuitState state, int unknown) {
    this.network = network;
    this.unknown = unknown;
    List<NoiseSource> found = new ArrayList<>();
    for (Element element : state.circuit().elements()) {
      element.addNoise(state, found);
    }
    this.sources = List.copyOf(found);
  }

  /** All sources of noise, in the order of their elements. */
  public List<NoiseSource> sources() {
    return sources;
  }

  /**
   * What each source makes of the density at the unknown.
   *
   * @param frequency Hz, above zero
   * @return V²/Hz by source
   * @throws ArithmeticException when the network is singular there
   */
  public double[] densities(double frequency) {
    double[] densities = new double[sources.size()];
    fill(frequency, densities);
    return densities;
  }

  /**
   * What each source makes of the mean square at the unknown within a band. Integrated over the
   * logarithm of frequency, decade by decade at first.
   *
   * @param low lower end of the band, Hz, above zero
   * @param high upper end, Hz
   * @param resonances frequencies where the response may be narrow, Hz
   * @return V² by source, their sum within {@link #ACCURACY}
   * @throws ArithmeticException when the network is singular somewhere, or the integral does not
   *     converge
   */
  public double[] powers(double low, double high, double[] resonances) {
    int decades = (int) Math.ceil(Math.log10(high / low));
    double[] limits =
        DoubleStream.concat(
                DoubleStream.iterate(low, f -> 10 * f).limit(decades), DoubleStream.of(resonances))
            .filter(f -> f >= low && f < high)
            .map(Math::log)
            .sorted()
            .distinct()
            .toArray();
    double[] closed = Arrays.copyOf(limits, limits.length + 1);
    closed[limits.length] = Math.log(high);
    return AdaptiveQuadrature.integrate(
        (logarithm, values) -> {
          double frequency = Math.exp(logarithm);
          fill(frequency, values);
          for (int i = 0; i < values.length; i++) {
            values[i] *= frequency;
          }
        },
        sources.size(),
        closed,
        ACCURACY);
  }

  private void fill(double frequency, double[] densities) {
    double[] transfers = network.transfersTo(frequency, unknown);
    for (int i = 0; i < densities.length; i++) {
      NoiseSource source = sources.get(i);
      double re = at(transfers, source.to(), 0) - at(transfers, source.from(), 0);
      double im = at(transfers, source.to(), 1) - at(transfers, source.from(), 1);
      densities[i] = (re * re + im * im) * source.density(frequency);
    }
  }

  private static double at(double[] vector, int row, int part) {
    return row < 0 ? 0 : vector[2 * row + part];
  }
}
