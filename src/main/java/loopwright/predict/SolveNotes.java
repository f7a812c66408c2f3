package loopwright.predict;

import java.util.ArrayList;
import java.util.List;
import loopwright.circuit.CircuitBuilder;
import loopwright.circuit.CircuitState;
import loopwright.circuit.Element;
import loopwright.solve.BlockingCorners;

/** Collects what is to be said about how a hookup was solved. */
final class SolveNotes {
  private static final String LEAKAGE_PREFIX = CircuitBuilder.LEAKAGE_PREFIX;

  private SolveNotes() {}

  static List<SolveNote> of(HookupSolution solution) {
    List<SolveNote> notes = new ArrayList<>();
    if (!solution.restOutcome().isPresent()) {
      return notes;
    }
    String hookup = solution.hookup().name();
    if (!solution.rest().remark().isEmpty()) {
      notes.add(new SolveNote(hookup, "Operating point: " + solution.rest().remark() + "."));
    }
    for (Element element : solution.assembled().circuit().elements()) {
      if (element.name().startsWith(LEAKAGE_PREFIX)) {
        String node = element.name().substring(LEAKAGE_PREFIX.length());
        notes.add(
            new SolveNote(
                node,
                "Nothing but capacitors ties node "
                    + node
                    + " to the rest; a leakage of 1 pS to ground was assumed."));
      }
    }
    addCorners(solution, notes);
    Outcome<SwingStability> swing = solution.swingOutcome();
    if (swing.isPresent() && !swing.value().remark().isEmpty()) {
      notes.add(new SolveNote(hookup, "Over the swing the output " + swing.value().remark() + "."));
    }
    solution
        .assembled()
        .models()
        .notes()
        .forEach(
            (part, sentences) ->
                sentences.forEach(sentence -> notes.add(new SolveNote("parts." + part, sentence))));
    return notes;
  }

  private static void addCorners(HookupSolution solution, List<SolveNote> notes) {
    CircuitState held = solution.rest().state().copy();
    held.holdBlockingCapacitors();
    double frequency = solution.hookup().source().frequency().value();
    for (BlockingCorners.Corner corner : BlockingCorners.of(held)) {
      if (corner.frequency() > frequency / 10) {
        notes.add(
            new SolveNote(
                corner.name(),
                "Its corner at "
                    + Text.hertz(corner.frequency())
                    + " is above a tenth of the signal frequency of "
                    + Text.hertz(frequency)
                    + "; midband figures leave it out."));
      }
    }
  }
}
