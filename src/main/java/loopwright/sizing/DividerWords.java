package loopwright.sizing;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.function.ToDoubleFunction;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Unit;
import loopwright.sizing.DividerSizing.Solved;

/** A divider's parts, what it is good at and what it gives up to others, in words. */
final class DividerWords {
  /** A term that another divider undercuts by less than this is not worth a word. */
  private static final double WORTH = 0.1;

  private DividerWords() {}

  /**
   * @param solved all dividers, the best first
   * @param index of the one that is spoken of
   */
  static String of(List<Solved> solved, int index) {
    Solved one = solved.get(index);
    String parts = parts(one.divider());
    if (one.gain().number().isEmpty()) {
      return parts + ": not solved, " + one.gain().says() + ".";
    }
    List<String> given = new ArrayList<>();
    giveUp(solved, one, "gain error", s -> s.terms().error(), given);
    giveUp(solved, one, "tolerance band", s -> s.terms().band(), given);
    giveUp(solved, one, "load on the output", s -> s.terms().current(), given);
    giveUp(solved, one, "offset by the bias current", s -> s.terms().offset(), given);
    giveUp(solved, one, "noise", s -> s.terms().noise(), given);
    giveUp(solved, one, "phase at the input capacitance", s -> s.terms().phase(), given);
    String most =
        "speaks most against it: "
            + worst(one)
            + (given.isEmpty() ? "; no other divider is better in anything" : "");
    return parts
        + "; "
        + most
        + (given.isEmpty() ? "" : "; gives up " + String.join(", ", given))
        + ".";
  }

  private static String parts(DividerCandidate divider) {
    if (divider.lower().isEmpty()) {
      return "A wire";
    }
    return divider.upper().says() + " over " + divider.lower().get().says();
  }

  private static String worst(Solved one) {
    DividerScore terms = one.terms();
    List<String> names =
        List.of(
            "gain error",
            "tolerance band",
            "load on the output",
            "offset by the bias current",
            "noise",
            "phase at the input capacitance",
            "number of parts");
    double[] values = {
      terms.error(),
      terms.band(),
      terms.current(),
      terms.offset(),
      terms.noise(),
      terms.phase(),
      terms.parts()
    };
    int most = 0;
    for (int i = 1; i < values.length; i++) {
      most = values[i] > values[most] ? i : most;
    }
    return names.get(most) + " (" + EngineeringFormat.format(values[most], Unit.ONE, 2) + ")";
  }

  private static void giveUp(
      List<Solved> solved,
      Solved one,
      String what,
      ToDoubleFunction<Solved> term,
      List<String> given) {
    Optional<Solved> better =
        solved.stream()
            .filter(other -> other.gain().number().isPresent())
            .filter(other -> term.applyAsDouble(other) < term.applyAsDouble(one) - WORTH)
            .min(Comparator.comparingDouble(term));
    better.ifPresent(
        other ->
            given.add(
                what
                    + " to "
                    + parts(other.divider())
                    + " ("
                    + EngineeringFormat.format(term.applyAsDouble(other), Unit.ONE, 2)
                    + " instead of "
                    + EngineeringFormat.format(term.applyAsDouble(one), Unit.ONE, 2)
                    + ")"));
  }
}
