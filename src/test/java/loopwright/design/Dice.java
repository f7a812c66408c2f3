package loopwright.design;

import java.util.Optional;
import java.util.Random;
import java.util.function.Supplier;
import loopwright.quantity.Quantity;

/** Choices of a random design; the same seed makes the same ones. */
final class Dice {
  private final Random random;

  Dice(long seed) {
    this.random = new Random(seed);
  }

  boolean chance(double probability) {
    return random.nextDouble() < probability;
  }

  int whole(int low, int high) {
    return low + random.nextInt(high - low + 1);
  }

  double between(double low, double high) {
    return low + (high - low) * random.nextDouble();
  }

  /** Evenly over the logarithm, to three digits as a person would write it. */
  double spread(double low, double high) {
    return round(low * Math.pow(high / low, random.nextDouble()));
  }

  /** About a value that hand calculation gives: within a fifth of it, to three digits. */
  double about(double value) {
    return round(value * between(0.85, 1.2));
  }

  @SafeVarargs
  final <T> T one(T... choices) {
    return choices[random.nextInt(choices.length)];
  }

  PartValue part(double value) {
    return PartValue.of(value);
  }

  /** A value, or none in its place. */
  PartValue partOrZero(double probability, double low, double high) {
    return part(chance(probability) ? spread(low, high) : 0);
  }

  Optional<PartValue> maybePart(double probability, double low, double high) {
    return maybe(probability, () -> part(spread(low, high)));
  }

  <T> Optional<T> maybe(double probability, Supplier<T> made) {
    return chance(probability) ? Optional.of(made.get()) : Optional.empty();
  }

  Quantity quantity(double value) {
    return Quantity.of(value);
  }

  private static double round(double value) {
    double unit = Math.pow(10, Math.floor(Math.log10(Math.abs(value))) - 2);
    return Double.parseDouble(String.format(java.util.Locale.ROOT, "%.3g", value / unit)) * unit;
  }
}
