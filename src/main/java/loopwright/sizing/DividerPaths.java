package loopwright.sizing;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import loopwright.design.Change;
import loopwright.design.Design;
import loopwright.design.DesignException;
import loopwright.design.Feedback;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Unit;

/**
 * Where the divider of a hookup stands in the design.
 *
 * @param hookup name of the hookup
 * @param inverting whether the source drives the inverting input
 * @param lowerStands whether there is a lower resistor now
 */
record DividerPaths(String hookup, boolean inverting, boolean lowerStands) {
  /**
   * Those of a hookup of the design.
   *
   * @throws DesignException when it has no feedback
   */
  static DividerPaths of(Design design, String hookup) {
    Feedback feedback =
        design
            .hookup(hookup)
            .orElseThrow(() -> new IllegalArgumentException("no hookup is called " + hookup))
            .feedback();
    boolean inverting = feedback instanceof Feedback.Inverting;
    boolean lowerStands =
        feedback instanceof Feedback.NonInverting divider && divider.lower().isPresent();
    DividerPaths paths = new DividerPaths(hookup, inverting, inverting || lowerStands);
    if (feedback instanceof Feedback.Open) {
      throw new DesignException(
          paths.feedback(), "found an open hookup, expected one with feedback");
    }
    return paths;
  }

  String feedback() {
    return "hookups." + hookup + ".feedback";
  }

  String upper() {
    return feedback() + ".upper";
  }

  String lower() {
    return feedback() + (inverting ? ".inputResistor" : ".lower");
  }

  /**
   * What makes a divider of the design.
   *
   * @param upper Ω
   * @param lower Ω; empty for none
   */
  List<Change> changes(double upper, OptionalDouble lower) {
    List<Change> changes = new ArrayList<>();
    changes.add(change(upper(), upper));
    if (lower.isPresent()) {
      changes.add(change(lower(), lower.getAsDouble()));
    } else if (lowerStands) {
      changes.add(new Change(lower(), ""));
    }
    return changes;
  }

  private static Change change(String path, double value) {
    return new Change(path, EngineeringFormat.spelling(value, Unit.OHM));
  }
}
