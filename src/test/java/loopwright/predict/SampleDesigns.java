package loopwright.predict;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import loopwright.design.Bench;
import loopwright.design.Design;
import loopwright.design.Drawer;
import loopwright.design.Feedback;
import loopwright.design.FiguresAmplifier;
import loopwright.design.Hookup;
import loopwright.design.Load;
import loopwright.design.PartValue;
import loopwright.design.Rails;
import loopwright.design.ReturnNode;
import loopwright.design.Source;
import loopwright.design.Surroundings;
import loopwright.design.TakenFrom;
import loopwright.design.Tolerances;
import loopwright.quantity.Quantity;

/** Designs made without a file, for tests of what is done with predictions. */
public final class SampleDesigns {
  private SampleDesigns() {}

  /** An amplifier known by its figures, with the hookups {@code divider} and {@code follower}. */
  public static Design figures() {
    return new Design(
        Design.VERSION,
        "River gauge",
        Optional.empty(),
        new Rails(
            Quantity.of(12),
            Quantity.of(-12),
            PartValue.of(0),
            Quantity.of(0),
            Optional.empty(),
            Optional.empty()),
        new Surroundings(Quantity.of(25), Quantity.of(0), false, Quantity.of(0)),
        Map.of(),
        amplifier(),
        Map.of(),
        List.of(),
        List.of(
            hookup("divider", divider(9000, Optional.of(PartValue.of(1000)))),
            hookup("follower", divider(0, Optional.empty()))),
        new Tolerances(
            Optional.empty(),
            Optional.empty(),
            Optional.empty(),
            Optional.empty(),
            Optional.empty(),
            Optional.empty()),
        List.of(),
        new Drawer(Optional.empty(), Optional.empty(), List.of()),
        new Bench(Map.of(), List.of(), List.of(), Optional.empty()));
  }

  /** A hookup that drives nothing, from a generator of 0.2 V peak at 1 kHz. */
  public static Hookup hookup(String name, Feedback feedback) {
    return new Hookup(name, source(), feedback, load(), List.of());
  }

  /** Feedback from the output through a divider to ground; without {@code lower} a series part. */
  public static Feedback divider(double upper, Optional<PartValue> lower) {
    return new Feedback.NonInverting(
        PartValue.of(upper),
        lower,
        Optional.empty(),
        Optional.empty(),
        ReturnNode.GROUND,
        TakenFrom.OUT);
  }

  private static FiguresAmplifier amplifier() {
    Quantity zero = Quantity.of(0);
    Quantity infinite = Quantity.of(Double.POSITIVE_INFINITY);
    return new FiguresAmplifier(
        Quantity.of(500),
        zero,
        zero,
        List.of(),
        infinite,
        zero,
        zero,
        infinite,
        zero,
        Optional.empty(),
        Optional.empty(),
        infinite);
  }

  private static Source source() {
    return new Source(
        PartValue.of(0),
        Quantity.of(0),
        Quantity.of(0.2),
        Quantity.of(1000),
        Optional.empty(),
        Optional.empty(),
        Optional.empty(),
        ReturnNode.GROUND);
  }

  private static Load load() {
    return new Load(
        Optional.empty(), Optional.empty(), PartValue.of(0), Optional.empty(), Optional.empty());
  }
}
