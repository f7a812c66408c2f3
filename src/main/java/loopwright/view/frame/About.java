package loopwright.view.frame;

/** What the program says of itself. */
final class About {
  static final String TEXT =
      """
      Loopwright predicts what a feedback amplifier of single transistors should show at the bench, \
      beside what it does show.

      It computes; it does not make a build safe. Rails, mains supplies, large capacitors and hot \
      transistors can hurt: remove power before you touch, discharge capacitors, limit the current \
      at first power, keep one hand away from high voltage. Local codes and the advice of licensed \
      people come before anything that is shown here.

      Figures are as good as the part records they are made from.

      Apache License 2.0. No warranty of any kind.""";

  private About() {}
}
