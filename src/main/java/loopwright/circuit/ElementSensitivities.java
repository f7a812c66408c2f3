package loopwright.circuit;

import java.util.HashMap;
import java.util.Map;

/** Derivatives of one quantity by the parameters of the elements, summed up from several shares. */
public final class ElementSensitivities {
  private record Key(String element, Parameter parameter) {}

  private final Map<Key, Double> sums = new HashMap<>();

  /** Adds a share, in the quantity's unit per unit of the parameter. */
  public void add(String element, Parameter parameter, double share) {
    sums.merge(new Key(element, parameter), share, Double::sum);
  }

  /** The derivative; 0 where nothing was added. */
  public double get(String element, Parameter parameter) {
    return sums.getOrDefault(new Key(element, parameter), 0.0);
  }
}
