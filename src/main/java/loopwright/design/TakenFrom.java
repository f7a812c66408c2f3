package loopwright.design;

/** The node that the feedback is taken from. */
public enum TakenFrom {
  OUT,
  LOAD
}
