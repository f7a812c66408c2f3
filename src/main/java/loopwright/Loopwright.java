package loopwright;

/** Composition root: the one place that knows every package. */
public final class Loopwright {
  private Loopwright() {}

  /**
   * Starts the program.
   *
   * @param arguments none for the window, a sub-command for the command line
   */
  public static void main(String[] arguments) {}
}
