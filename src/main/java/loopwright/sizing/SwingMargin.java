package loopwright.sizing;

import java.util.List;
import java.util.OptionalDouble;
import loopwright.predict.HookupFigures;
import loopwright.predict.SwingLevel;

/** Whether a margin holds at every level of the swing. */
final class SwingMargin {
  /** Levels of a first look. */
  private static final int FEW = 9;

  /** Levels of the verdict: as many as the figures of the swing have. */
  private static final int ALL = 41;

  private final double wanted;

  /**
   * @param wanted degrees
   */
  SwingMargin(double wanted) {
    this.wanted = wanted;
  }

  /** At a few levels, ending at the first that fails. */
  boolean seemsHeld(HookupFigures figures) {
    return isHeld(figures.overSwing(FEW, this::isHeld));
  }

  /** At all levels, ending at the first that fails. */
  boolean isHeld(HookupFigures figures) {
    return isHeld(figures.overSwing(ALL, this::isHeld));
  }

  /** Smallest margin over all levels, degrees; empty where the loop gain never passes 1. */
  static OptionalDouble worst(HookupFigures figures) {
    return figures.overSwing(ALL, level -> true).stream()
        .filter(level -> level.phaseMargin().isPresent())
        .mapToDouble(level -> level.phaseMargin().getAsDouble())
        .min();
  }

  private boolean isHeld(List<SwingLevel> levels) {
    return !levels.isEmpty() && levels.stream().allMatch(this::isHeld);
  }

  private boolean isHeld(SwingLevel level) {
    return level.stable() && level.phaseMargin().orElse(Double.POSITIVE_INFINITY) >= wanted;
  }
}
