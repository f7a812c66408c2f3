package loopwright.view.path;

import java.util.List;
import loopwright.design.Feedback;
import loopwright.design.ReturnNode;
import loopwright.design.TakenFrom;
import loopwright.view.path.SignalPath.Route;
import loopwright.view.path.SignalPath.Way;

/** The way back in words. */
final class FeedbackWords {
  private FeedbackWords() {}

  static Block block(Feedback feedback) {
    return new Block(
        BlockIds.FEEDBACK, Block.Kind.FEEDBACK, "Feedback", List.of(says(feedback)), "");
  }

  static Route route(Feedback feedback) {
    if (feedback instanceof Feedback.NonInverting divider) {
      return new Route(Way.NON_INVERTING, divider.from() == TakenFrom.LOAD);
    }
    return feedback instanceof Feedback.Inverting inverting
        ? new Route(Way.INVERTING, inverting.from() == TakenFrom.LOAD)
        : new Route(Way.OPEN, false);
  }

  private static String says(Feedback feedback) {
    if (feedback instanceof Feedback.NonInverting divider) {
      return divider(divider);
    }
    if (feedback instanceof Feedback.Inverting inverting) {
      double ratio = inverting.upper().effective() / inverting.inputResistor().effective();
      return PartWords.ohms(inverting.upper())
          + " against "
          + PartWords.ohms(inverting.inputResistor())
          + ": ideally \u00D7 "
          + PartWords.ratio(-ratio)
          + inverting.leadCapacitance().map(c -> ", " + PartWords.farads(c) + " across").orElse("")
          + returned(inverting);
    }
    double resistance = ((Feedback.Open) feedback).returnResistance().effective();
    return "open: nothing comes back, in\u2212 to ground"
        + (resistance == 0
            ? ""
            : " through " + PartWords.ohms(((Feedback.Open) feedback).returnResistance()));
  }

  private static String divider(Feedback.NonInverting divider) {
    double upper = divider.upper().effective();
    String whole = "all of " + (divider.from() == TakenFrom.LOAD ? "load" : "out") + " comes back";
    if (divider.lower().isEmpty()) {
      return (upper == 0 ? "wire" : PartWords.ohms(divider.upper())) + ": " + whole;
    }
    double lower = divider.lower().get().effective();
    String parts =
        (upper == 0 ? "wire" : PartWords.ohms(divider.upper()))
            + " over "
            + PartWords.ohms(divider.lower().get())
            + divider.lowerCapacitance().map(c -> " and " + PartWords.farads(c)).orElse("");
    String share = upper == 0 ? whole : "1/" + PartWords.ratio(1 + upper / lower) + " comes back";
    return parts
        + ": "
        + share
        + (divider.lowerCapacitance().isPresent() && upper > 0 ? ", all at dc" : "")
        + divider.leadCapacitance().map(c -> ", " + PartWords.farads(c) + " across").orElse("")
        + midRail(divider.returnTo());
  }

  /** What ties the input that the source does not drive. */
  private static String returned(Feedback.Inverting inverting) {
    boolean toMidRail = inverting.returnTo() == ReturnNode.MID_RAIL;
    if (inverting.returnResistance().effective() == 0) {
      return toMidRail ? ", in+ to mid-rail" : "";
    }
    return ", in+ to "
        + (toMidRail ? "mid-rail" : "ground")
        + " through "
        + PartWords.ohms(inverting.returnResistance());
  }

  private static String midRail(ReturnNode node) {
    return node == ReturnNode.MID_RAIL ? ", to mid-rail" : "";
  }
}
