package loopwright.characterise;

/** What part a figure of a record had in the fit. */
public enum FigureUse {
  /** A parameter was solved for it: it comes back. */
  SOLVED,
  /** One of more figures than parameters: it comes back as nearly as least squares allow. */
  LEAST_SQUARES,
  /** Another figure or parameter takes its place; it is shown for comparison. */
  COMPARED
}
