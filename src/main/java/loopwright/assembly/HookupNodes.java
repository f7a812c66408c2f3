package loopwright.assembly;

/** The two leads of a hookup and the nodes on their far sides, which repeat named nodes. */
public final class HookupNodes {
  /** The lead from source network to driven terminal. */
  public static final String SOURCE_LEAD = "sourceLead";

  /** The lead from feedback network to the amplifier's inverting input. */
  public static final String FEEDBACK_LEAD = "feedbackLead";

  /** The inverting input on the amplifier's side of its lead. */
  public static final String IN_MINUS_AMPLIFIER = Nodes.BEHIND_LEAD + Nodes.IN_MINUS;

  /** The end of the source network, ahead of its lead. */
  static final String SOURCE_END = Nodes.BEHIND_LEAD + "source";

  /** The source that holds the output, where one does. */
  static final String HOLDER = "holder.out";

  private HookupNodes() {}
}
