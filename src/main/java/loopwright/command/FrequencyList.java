package loopwright.command;

import loopwright.quantity.Quantity;
import loopwright.quantity.QuantityException;
import loopwright.quantity.Unit;
import picocli.CommandLine.ITypeConverter;
import picocli.CommandLine.TypeConversionException;

/** Reads frequencies as people write them, with commas between: {@code 20,1k,1 MHz}. */
final class FrequencyList implements ITypeConverter<FrequencyList.Wanted> {
  /**
   * Frequencies in Hz. A type of its own, since the library takes an array for an option that is
   * given many times.
   */
  record Wanted(double[] hertz) {}

  @Override
  public Wanted convert(String text) {
    String[] words = text.split(",", -1);
    double[] frequencies = new double[words.length];
    for (int i = 0; i < words.length; i++) {
      frequencies[i] = frequency(words[i].trim());
    }
    return new Wanted(frequencies);
  }

  private static double frequency(String word) {
    double hertz;
    try {
      hertz = Quantity.parse(word, Unit.HERTZ).value();
    } catch (QuantityException wrong) {
      throw new TypeConversionException(wrong.getMessage());
    }
    if (!(hertz > 0) || Double.isInfinite(hertz)) {
      throw new TypeConversionException(
          "found \"" + word + "\", expected a frequency above 0 Hz, such as 1k or 2.5 MHz");
    }
    return hertz;
  }
}
