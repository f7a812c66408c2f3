package loopwright.design;

import java.util.Optional;
import loopwright.part.Polarity;

/** The supply, and everything that is fed from it or returned to it. */
final class RailsCheck {
  private final Design design;
  private final Problems problems;

  private RailsCheck(Design design, Problems problems) {
    this.design = design;
    this.problems = problems;
  }

  static void check(Design design, Problems problems) {
    RailsCheck check = new RailsCheck(design, problems);
    check.order();
    if (design.amplifier() instanceof StagesAmplifier stages) {
      check.feed("amplifier.inputPair.tail", stages.inputPair().tail());
      check.feed("amplifier.gainStage.load", stages.gainStage().load());
    }
    for (Hookup hookup : design.hookups()) {
      String path = "hookups." + hookup.name();
      check.returned(path + ".source.biasTo", hookup.source().biasTo());
      if (hookup.feedback() instanceof Feedback.NonInverting divider) {
        check.returned(path + ".feedback.returnTo", divider.returnTo());
      } else if (hookup.feedback() instanceof Feedback.Inverting inverting) {
        check.returned(path + ".feedback.returnTo", inverting.returnTo());
      }
    }
  }

  private void order() {
    Rails rails = design.rails();
    if (rails.positive().value() <= rails.negative().value()) {
      problems.add(
          "rails.positive",
          rails.positive().spelling() + " with a negative rail of " + rails.negative().spelling(),
          "a positive rail above the negative one");
    }
  }

  private void returned(String path, ReturnNode node) {
    if (node == ReturnNode.MID_RAIL) {
      requireMidRail(path);
    }
  }

  private void feed(String path, CurrentSource source) {
    Optional<FeedFrom> from = Optional.empty();
    if (source instanceof CurrentSource.Mirror mirror) {
      from = mirror.feedFrom();
    } else if (source instanceof CurrentSource.DiodeBiased biased) {
      from = biased.feedFrom();
    } else if (source instanceof CurrentSource.TwoTransistor two) {
      from = two.feedFrom();
    }
    if (from.equals(Optional.of(FeedFrom.MID_RAIL))) {
      requireMidRail(path + ".feedFrom");
    } else if (from.equals(Optional.of(FeedFrom.GROUND)) && sourceRailIsGround()) {
      problems.add(
          path + ".feedFrom",
          "ground, which is the rail that the source pulls to",
          "oppositeRail, or midRail with rails.midRail");
    }
  }

  /** With an npn pair the sources pull to the negative rail, with a pnp pair to the positive. */
  private boolean sourceRailIsGround() {
    return DeviceRoles.pairPolarity(design)
        .map(pair -> pair == Polarity.NPN ? design.rails().negative() : design.rails().positive())
        .filter(rail -> rail.value() == 0)
        .isPresent();
  }

  private void requireMidRail(String path) {
    if (design.rails().midRail().isEmpty()) {
      problems.add(path, "midRail without a mid-rail", "rails.midRail in the design");
    }
  }
}
