package loopwright.assembly;

/** What can be wrong with one transistor beyond its values. */
public enum DeviceFault {
  REVERSED("collector and emitter exchanged"),
  WRONG_POLARITY("of the wrong polarity"),
  BASE_OPEN("base open"),
  COLLECTOR_OPEN("collector open"),
  EMITTER_OPEN("emitter open"),
  BASE_EMITTER_SHORT("base and emitter shorted"),
  BASE_COLLECTOR_SHORT("base and collector shorted"),
  COLLECTOR_EMITTER_SHORT("collector and emitter shorted");

  private final String says;

  DeviceFault(String says) {
    this.says = says;
  }

  /** In words that fit behind the device's role. */
  public String says() {
    return says;
  }
}
