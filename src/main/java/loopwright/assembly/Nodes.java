package loopwright.assembly;

/** Node names that more than one stage speaks of; the format's page says what they mean. */
public final class Nodes {
  public static final String POSITIVE = "positive";
  public static final String NEGATIVE = "negative";
  public static final String IDEAL_POSITIVE = "ideal.positive";
  public static final String IDEAL_NEGATIVE = "ideal.negative";
  public static final String MID_RAIL = "midRail";
  public static final String GENERATOR = "generator";
  public static final String IN_PLUS = "in+";
  public static final String IN_MINUS = "in-";
  public static final String INPUT_END = "inputEnd";
  public static final String TAIL = "tail";
  public static final String PAIR_OUT = "pairOut";
  public static final String PAIR_OTHER = "pairOther";
  public static final String GAIN_OUT = "gainOut";
  public static final String DRIVE_HIGH = "driveHigh";
  public static final String DRIVE_LOW = "driveLow";
  public static final String OUT = "out";
  public static final String LOAD = "load";

  /** Prefix of the program's own nodes on the far side of a lead; the design does not name them. */
  static final String BEHIND_LEAD = "behindLead.";

  private Nodes() {}

  /**
   * Whether a node is the program's own and no use to a reader: it repeats another or is inside a
   * device.
   */
  public static boolean isInternal(String name) {
    return name.startsWith(BEHIND_LEAD) || name.contains(".inner.");
  }
}
