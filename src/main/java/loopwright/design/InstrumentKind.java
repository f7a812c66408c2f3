package loopwright.design;

/** Kinds of instruments. */
public enum InstrumentKind {
  VOLTMETER,
  OHMMETER,
  AMMETER,
  OSCILLOSCOPE,
  GENERATOR,
  COUNTER,
  COMPONENT_TESTER
}
