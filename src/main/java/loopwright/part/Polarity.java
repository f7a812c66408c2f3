package loopwright.part;

/** The polarity of a bipolar transistor. */
public enum Polarity {
  NPN,
  PNP;

  /** The other one. */
  public Polarity opposite() {
    return this == NPN ? PNP : NPN;
  }

  /**
   * +1 for npn, −1 for pnp: the sign that maps terminal voltages and currents to the npn equations.
   */
  public int sign() {
    return this == NPN ? 1 : -1;
  }
}
