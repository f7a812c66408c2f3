package loopwright.part;

/** The terminals that a pin may carry. */
public enum Pin {
  EMITTER,
  BASE,
  COLLECTOR,
  ANODE,
  CATHODE
}
