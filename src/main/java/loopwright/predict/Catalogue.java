package loopwright.predict;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Function;
import java.util.stream.Collectors;
import java.util.stream.Stream;

/** Every figure of the program, once. Files, tables, help and sheets read it. */
public final class Catalogue {
  private static final List<Figure> FIGURES =
      Stream.of(
              GainFigures.entries(),
              OffsetFigures.entries(),
              WaveformFigures.entries(),
              LoopFigures.entries(),
              ImpedanceFigures.entries(),
              SwingFigures.entries(),
              NoiseFigures.entries(),
              SupplyFigures.entries())
          .flatMap(List::stream)
          .toList();

  private static final Map<String, Figure> BY_KEY =
      FIGURES.stream().collect(Collectors.toUnmodifiableMap(Figure::key, Function.identity()));

  private Catalogue() {}

  /** All entries in the order in which a person would read them. */
  public static List<Figure> figures() {
    return FIGURES;
  }

  /** The entry of a key. */
  public static Optional<Figure> find(String key) {
    return Optional.ofNullable(BY_KEY.get(key));
  }
}
