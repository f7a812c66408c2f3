package loopwright.view.frame;

/**
 * What stands in one cell of the figures table.
 *
 * @param text what is read
 * @param hover the rest, shown when the pointer rests on it
 * @param tone how it is shown
 */
record FigureCell(String text, String hover, Tone tone) {
  /** How much a cell wants to be seen. */
  enum Tone {
    NORMAL,
    STRONG,
    QUIET,
    MEASURED,
    RISKY,
    FAILS
  }

  @Override
  public String toString() {
    return text;
  }
}
