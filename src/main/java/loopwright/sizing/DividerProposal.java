package loopwright.sizing;

import java.util.List;
import loopwright.design.Change;
import loopwright.predict.FigureValue;

/**
 * A divider for a wanted gain.
 *
 * @param changes what makes it of the design
 * @param gain closed-loop gain, solved
 * @param gainLow lower end of its band for the tolerances, 95 %
 * @param gainHigh upper end
 * @param outputOffset solved, V
 * @param inputNoise solved, or by hand where that is not possible, V/√Hz
 * @param dividerCurrent what the divider takes at the peak output, A
 * @param phaseMargin solved, degrees; without a number where the loop gain never passes 1
 * @param score what speaks against it; the least is best, infinite where it could not be solved
 * @param says the parts, and how it stands beside the others, in words
 */
public record DividerProposal(
    List<Change> changes,
    FigureValue gain,
    FigureValue gainLow,
    FigureValue gainHigh,
    FigureValue outputOffset,
    FigureValue inputNoise,
    double dividerCurrent,
    FigureValue phaseMargin,
    double score,
    String says) {
  /** Keeps its own copy. */
  public DividerProposal {
    changes = List.copyOf(changes);
  }
}
