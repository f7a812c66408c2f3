package loopwright.predict;

import java.util.List;

/**
 * How one figure changes with every part.
 *
 * @param figure the figure
 * @param value its value, or why there is none
 * @param parts every part of the hookup in the order of the file; empty where there is no value
 */
public record FigureSensitivity(Figure figure, FigureValue value, List<PartSensitivity> parts) {
  /** Keeps its own copy. */
  public FigureSensitivity {
    parts = List.copyOf(parts);
  }
}
