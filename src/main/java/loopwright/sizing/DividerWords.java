package loopwright.sizing;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import java.util.function.ToDoubleFunction;
import java.util.stream.Collectors;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Unit;
import loopwright.sizing.DividerSizing.Solved;

/**
 * A divider in words: its parts, its worst case, what makes its score, and what it gives up to
 * others.
 */
final class DividerWords {
  /** A term that another divider undercuts by less than this is not worth a word. */
  private static final double WORTH = 0.1;

  /** A term below this does not show in a score of two decimals. */
  private static final double SHOWN = 0.005;

  private static final int DIGITS = 3;

  /** A term of the score, and what it stands for as a person would read it off an instrument. */
  private record Term(
      String name, ToDoubleFunction<Solved> share, Function<Solved, String> reading) {}

  private static final List<Term> TERMS =
      List.of(
          new Term(
              "gain error",
              one -> one.terms().error(),
              one -> EngineeringFormat.percent(round(one.gainError()))),
          new Term(
              "tolerance band",
              one -> one.terms().band(),
              one -> "± " + EngineeringFormat.percent(round(one.halfBand()))),
          new Term(
              "load on the output",
              one -> one.terms().current(),
              one -> number(one.current(), Unit.AMPERE)),
          new Term(
              "offset by the bias currents",
              one -> one.terms().offset(),
              one -> number(one.biasOffset(), Unit.VOLT)),
          new Term(
              "noise",
              one -> one.terms().noise(),
              one -> number(one.noise().number().orElse(0), Unit.VOLT_PER_ROOT_HERTZ)),
          new Term(
              "phase margin",
              one -> one.terms().phase(),
              one ->
                  one.margin().number().isPresent()
                      ? number(one.margin().number().getAsDouble(), Unit.DEGREE)
                      : "no crossing"),
          new Term(
              "number of parts",
              one -> one.terms().parts(),
              one -> Integer.toString(one.divider().partCount())));

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
    if (!one.isSolved()) {
      return parts + ": a build within the tolerances could not be solved.";
    }
    List<String> given = new ArrayList<>();
    TERMS.forEach(term -> giveUp(solved, one, term).ifPresent(given::add));
    return parts + ". " + worst(one) + "Score: " + score(one) + "." + givenUp(solved, given);
  }

  private static String givenUp(List<Solved> solved, List<String> given) {
    if (solved.size() == 1) {
      return "";
    }
    return given.isEmpty()
        ? " No other of these dividers is better in anything by much."
        : " Gives up " + String.join("; ", given) + ".";
  }

  private static String parts(DividerCandidate divider) {
    if (divider.lower().isEmpty()) {
      return "A wire";
    }
    return divider.upper().says() + " over " + divider.lower().get().says();
  }

  private static String worst(Solved one) {
    if (one.divider().lower().isEmpty()) {
      return "";
    }
    double gain = one.gain().number().orElseThrow();
    return "With both resistors at the wrong ends of their tolerances the gain is "
        + EngineeringFormat.format(gain * one.worst().low(), Unit.ONE)
        + " or "
        + EngineeringFormat.format(gain * one.worst().high(), Unit.ONE)
        + ". ";
  }

  /** The terms that make it, the largest first. */
  private static String score(Solved one) {
    String terms =
        TERMS.stream()
            .filter(term -> term.share().applyAsDouble(one) >= SHOWN)
            .sorted(
                Comparator.comparingDouble((Term term) -> term.share().applyAsDouble(one))
                    .reversed())
            .map(
                term ->
                    EngineeringFormat.format(term.share().applyAsDouble(one), Unit.ONE, 2)
                        + " for "
                        + term.name()
                        + " ("
                        + term.reading().apply(one)
                        + ")")
            .collect(Collectors.joining(", "));
    return terms.isEmpty() ? "nothing speaks against it" : terms;
  }

  private static Optional<String> giveUp(List<Solved> solved, Solved one, Term term) {
    double own = term.share().applyAsDouble(one);
    return solved.stream()
        .filter(Solved::isSolved)
        .filter(other -> term.share().applyAsDouble(other) < own - WORTH)
        .min(Comparator.comparingDouble(term.share()))
        .map(
            other ->
                term.name()
                    + " to "
                    + parts(other.divider())
                    + " ("
                    + term.reading().apply(other)
                    + " instead of "
                    + term.reading().apply(one)
                    + ")");
  }

  private static String number(double value, Unit unit) {
    return EngineeringFormat.format(value, unit, DIGITS);
  }

  private static double round(double fraction) {
    return new BigDecimal(fraction).round(new MathContext(2)).doubleValue();
  }
}
