package loopwright.design;

/** The node that a signal is referred to. */
public enum ReturnNode {
  GROUND,
  MID_RAIL
}
