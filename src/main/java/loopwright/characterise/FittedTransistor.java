package loopwright.characterise;

import java.util.List;
import loopwright.part.TransistorParameters;

/**
 * What a fit makes of a transistor's record.
 *
 * @param parameters complete, at 25 °C
 * @param comparison every usable figure of the record beside what the parameters give
 * @param notes what a person should know of the fit, a sentence each
 */
public record FittedTransistor(
    TransistorParameters parameters, List<FigureComparison> comparison, List<String> notes) {
  /** Keeps its own copies of the lists. */
  public FittedTransistor {
    comparison = List.copyOf(comparison);
    notes = List.copyOf(notes);
  }
}
