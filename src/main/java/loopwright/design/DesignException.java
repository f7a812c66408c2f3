package loopwright.design;

import java.util.List;

/** A design, or a change to one, that is wrong; it names every place that is. */
public final class DesignException extends RuntimeException {
  private static final long serialVersionUID = 1L;

  private final transient List<Problem> problems;

  /**
   * @param problems what is wrong, at least one; the first becomes the message
   */
  public DesignException(List<Problem> problems) {
    super(problems.get(0).message());
    this.problems = List.copyOf(problems);
  }

  /** One problem at one place. */
  public DesignException(String path, String says) {
    this(List.of(new Problem(path, says)));
  }

  /** Everything that is wrong, in the order of the file. */
  public List<Problem> problems() {
    return problems;
  }
}
