package loopwright.design;

/** Where the bias of a current source is fed from. */
public enum FeedFrom {
  GROUND,
  MID_RAIL,
  OPPOSITE_RAIL
}
