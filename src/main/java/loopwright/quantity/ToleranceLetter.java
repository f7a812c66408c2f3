package loopwright.quantity;

import java.util.Arrays;
import java.util.Optional;

/**
 * The tolerance letters of IEC 60062. On capacitors below 10 pF the letters B, C and D mean
 * picofarads instead of per cent.
 */
public enum ToleranceLetter {
  B(-0.001, 0.001, 0.1e-12),
  C(-0.0025, 0.0025, 0.25e-12),
  D(-0.005, 0.005, 0.5e-12),
  F(-0.01, 0.01, Double.NaN),
  G(-0.02, 0.02, Double.NaN),
  J(-0.05, 0.05, Double.NaN),
  K(-0.1, 0.1, Double.NaN),
  M(-0.2, 0.2, Double.NaN),
  N(-0.3, 0.3, Double.NaN),
  Z(-0.2, 0.8, Double.NaN);

  private static final double SMALL_CAPACITOR = 10e-12;

  private final double below;
  private final double above;
  private final double smallCapacitor;

  ToleranceLetter(double below, double above, double smallCapacitor) {
    this.below = below;
    this.above = above;
    this.smallCapacitor = smallCapacitor;
  }

  /** The letter's meaning, if it has one; case matters. */
  public static Optional<ToleranceLetter> fromLetter(String letter) {
    return Arrays.stream(values()).filter(known -> known.name().equals(letter)).findFirst();
  }

  /**
   * The lowest value of a part so marked.
   *
   * @param nominal in the plain unit
   * @param unit of the part: Ω or F
   */
  public double lowest(double nominal, Unit unit) {
    return isAbsolute(nominal, unit) ? nominal - smallCapacitor : nominal * (1 + below);
  }

  /**
   * The highest value of a part so marked.
   *
   * @param nominal in the plain unit
   * @param unit of the part: Ω or F
   */
  public double highest(double nominal, Unit unit) {
    return isAbsolute(nominal, unit) ? nominal + smallCapacitor : nominal * (1 + above);
  }

  private boolean isAbsolute(double nominal, Unit unit) {
    return unit == Unit.FARAD && nominal < SMALL_CAPACITOR && !Double.isNaN(smallCapacitor);
  }
}
