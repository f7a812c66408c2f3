package loopwright.file;

import static loopwright.file.ResultJson.list;
import static loopwright.file.ResultJson.member;
import static loopwright.file.ResultJson.number;
import static loopwright.file.ResultJson.text;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.OptionalDouble;
import loopwright.check.Finding;
import loopwright.design.Feedback;
import loopwright.predict.ComplexPoint;
import loopwright.predict.FigureResult;
import loopwright.predict.FigureValue;
import loopwright.predict.HookupPrediction;
import loopwright.predict.OffsetShare;
import loopwright.predict.Prediction;
import loopwright.predict.Root;
import loopwright.predict.SwingLevel;
import loopwright.quantity.Unit;

/**
 * A prediction as JSON, for scripts: SI numbers with every digit that they have; a number that does
 * not exist is null, with a {@code reason} beside it.
 */
public final class PredictionJson {
  private PredictionJson() {}

  /** The whole text, with a line break at its end. */
  public static String write(Prediction prediction, List<Finding> findings) {
    return JsonWriter.write(
        Json.block(
            List.of(
                member("design", text(prediction.design().name())),
                member("hookups", list(prediction.hookups(), PredictionJson::hookup)),
                member("findings", list(findings, PredictionJson::finding)))));
  }

  private static Json hookup(HookupPrediction hookup) {
    boolean open = hookup.hookup().feedback() instanceof Feedback.Open;
    List<Json.Member> members = new ArrayList<>();
    members.add(member("name", text(hookup.hookup().name())));
    members.add(member("operatingPoint", RestJson.of(hookup)));
    members.add(member("figures", figures(hookup.figures())));
    members.add(member("response", list(hookup.response(), PredictionJson::point)));
    members.add(member("loopGain", list(hookup.loopGain(), PredictionJson::point)));
    members.add(member("unstablePoles", list(hookup.unstablePoles(), PredictionJson::root)));
    members.add(member("overSwing", list(hookup.overSwing(), level -> level(level, open))));
    members.add(
        member("offsetContributions", list(hookup.offsetContributions(), PredictionJson::share)));
    members.add(member("harmonics", list(hookup.harmonics(), ResultJson::number)));
    if (!hookup.swingRemark().isBlank()) {
      members.add(member("remark", text(hookup.swingRemark())));
    }
    return Json.block(members);
  }

  static Json figures(Map<String, FigureResult> figures) {
    List<Json.Member> members = new ArrayList<>();
    figures.forEach((key, result) -> members.add(member(key, figure(result))));
    return Json.block(members);
  }

  private static Json figure(FigureResult result) {
    Unit unit = result.figure().unit();
    List<Json.Member> members = new ArrayList<>();
    members.add(member("formula", number(result.formula().number())));
    members.add(member("solved", number(result.solved().number())));
    members.add(member("unit", text(unit == Unit.ONE ? "1" : unit.symbol())));
    addSentence(members, "reason", result, false);
    addSentence(members, "remark", result, true);
    return Json.block(members);
  }

  /** What is said about those values of a figure that have a number, or that have none. */
  private static void addSentence(
      List<Json.Member> members, String name, FigureResult result, boolean withNumber) {
    String formula = said(result.formula(), withNumber);
    String solved = said(result.solved(), withNumber);
    if (!formula.isBlank() && formula.equals(solved)) {
      members.add(member(name, text("formula and solved: " + formula)));
      return;
    }
    List<String> parts = new ArrayList<>();
    if (!formula.isBlank()) {
      parts.add("formula: " + formula);
    }
    if (!solved.isBlank()) {
      parts.add("solved: " + solved);
    }
    if (!parts.isEmpty()) {
      members.add(member(name, text(String.join("; ", parts))));
    }
  }

  private static String said(FigureValue value, boolean withNumber) {
    return value.number().isPresent() == withNumber ? value.says() : "";
  }

  private static Json point(ComplexPoint point) {
    return Json.block(
        List.of(
            member("frequency", number(point.frequency())),
            member("re", number(point.re())),
            member("im", number(point.im()))));
  }

  private static Json root(Root root) {
    return Json.block(List.of(member("re", number(root.re())), member("im", number(root.im()))));
  }

  private static Json level(SwingLevel level, boolean open) {
    List<Json.Member> members = new ArrayList<>();
    members.add(member("output", number(level.output())));
    members.add(member("stable", Json.truth(level.stable())));
    members.add(member("frequency", number(level.frequency())));
    members.add(member("growth", number(level.growth())));
    members.add(member("phaseMargin", number(level.phaseMargin())));
    List<String> reasons = new ArrayList<>();
    addReason(reasons, level.frequency(), "frequency: no natural frequency is complex");
    addReason(reasons, level.growth(), "growth: no natural frequency is complex");
    addReason(
        reasons,
        level.phaseMargin(),
        open ? "phaseMargin: an open hookup has no loop" : "phaseMargin: loop gain never passes 1");
    if (!reasons.isEmpty()) {
      members.add(member("reason", text(String.join("; ", reasons))));
    }
    return Json.block(members);
  }

  private static void addReason(List<String> reasons, OptionalDouble value, String reason) {
    if (value.isEmpty()) {
      reasons.add(reason);
    }
  }

  private static Json share(OffsetShare share) {
    return Json.block(
        List.of(member("cause", text(share.cause())), member("output", number(share.output()))));
  }

  private static Json finding(Finding finding) {
    return Json.block(
        List.of(
            member("severity", text(finding.severity().name().toLowerCase(Locale.ROOT))),
            member("where", text(finding.where())),
            member("says", text(finding.says())),
            member("remedy", text(finding.remedy()))));
  }
}
