package loopwright.file;

import static loopwright.file.ResultJson.list;
import static loopwright.file.ResultJson.member;
import static loopwright.file.ResultJson.number;
import static loopwright.file.ResultJson.text;

import java.util.ArrayList;
import java.util.List;
import loopwright.predict.FigureValue;
import loopwright.predict.Oscillation;
import loopwright.predict.SteadyDistortion;
import loopwright.predict.StepResponses;

/**
 * What was solved in time as JSON, for scripts: SI numbers; one that does not exist is null, with
 * its reason beside it.
 */
public final class TimeJson {
  private TimeJson() {}

  /** Steps and oscillations; with a line break at the end. */
  public static String step(String design, List<StepResponses> hookups) {
    return whole(design, list(hookups, TimeJson::steps));
  }

  /** Distortion; with a line break at the end. */
  public static String distortion(String design, List<SteadyDistortion> hookups) {
    return whole(design, list(hookups, TimeJson::distortion));
  }

  private static String whole(String design, Json hookups) {
    return JsonWriter.write(
        Json.block(List.of(member("design", text(design)), member("hookups", hookups))));
  }

  private static Json steps(StepResponses hookup) {
    List<Json.Member> members = new ArrayList<>();
    members.add(member("name", text(hookup.hookup())));
    members.add(member("figures", PredictionJson.figures(hookup.figures())));
    members.add(member("steps", list(hookup.curves(), TimeJson::curve)));
    members.add(
        member(
            "oscillation",
            hookup.oscillation().map(TimeJson::oscillation).orElseGet(ResultJson::nothing)));
    if (hookup.oscillation().isEmpty()) {
      members.add(
          member(
              "reason",
              text(hookup.says().isEmpty() ? "nothing oscillates at any level" : hookup.says())));
    }
    return Json.block(members);
  }

  private static Json curve(StepResponses.Curve curve) {
    List<Json.Member> members = new ArrayList<>();
    members.add(member("kind", text(curve.kind())));
    members.add(member("from", number(curve.from())));
    members.add(member("to", number(curve.to())));
    members.add(member("times", list(curve.times(), ResultJson::number)));
    members.add(member("output", list(curve.output(), ResultJson::number)));
    addReason(members, curve.says());
    return Json.block(members);
  }

  private static Json oscillation(Oscillation oscillation) {
    List<Json.Member> members = new ArrayList<>();
    members.add(member("generator", number(oscillation.generator())));
    members.add(member("output", number(oscillation.output())));
    members.add(member("forecastFrequency", number(oscillation.forecastFrequency())));
    members.add(member("forecastGrowth", number(oscillation.forecastGrowth())));
    members.add(member("earlyFrequency", number(oscillation.early().frequency())));
    members.add(member("earlyGrowth", number(oscillation.early().growth())));
    members.add(
        member(
            "settled",
            oscillation.settled().map(TimeJson::settled).orElseGet(ResultJson::nothing)));
    members.add(member("ridesOn", list(oscillation.rides(), TimeJson::ride)));
    members.add(member("times", list(oscillation.times(), ResultJson::number)));
    members.add(member("voltages", list(oscillation.volts(), ResultJson::number)));
    addReason(members, oscillation.says());
    return Json.block(members);
  }

  private static Json settled(Oscillation.Settled settled) {
    return Json.block(
        List.of(
            member("frequency", number(settled.frequency())),
            member("amplitude", number(settled.amplitude())),
            member("low", number(settled.low())),
            member("high", number(settled.high()))));
  }

  private static Json ride(Oscillation.Rides ride) {
    return Json.block(
        List.of(
            member("lowOutput", number(ride.lowOutput())),
            member("highOutput", number(ride.highOutput())),
            member("fromPhase", number(ride.fromPhase())),
            member("toPhase", number(ride.toPhase()))));
  }

  private static Json distortion(SteadyDistortion hookup) {
    List<Json.Member> members = new ArrayList<>();
    members.add(member("name", text(hookup.hookup())));
    members.add(member("frequency", number(hookup.frequency())));
    members.add(member("amplitude", number(hookup.amplitude())));
    members.add(member("thd", number(hookup.thd())));
    members.add(member("staticThd", number(hookup.staticThd().number())));
    members.add(member("harmonics", list(hookup.harmonics(), ResultJson::number)));
    members.add(member("output", list(hookup.output(), ResultJson::number)));
    members.add(member("residual", list(hookup.residual(), ResultJson::number)));
    members.add(member("periods", number(hookup.periods())));
    members.add(member("change", number(hookup.change())));
    members.add(member("changeAllowed", number(SteadyDistortion.ALIKE)));
    addReason(members, reasons(hookup));
    return Json.block(members);
  }

  private static String reasons(SteadyDistortion hookup) {
    List<String> reasons = new ArrayList<>();
    if (!hookup.says().isEmpty()) {
      reasons.add("thd: " + hookup.says());
    }
    FigureValue still = hookup.staticThd();
    if (still.number().isEmpty()) {
      reasons.add("staticThd: " + still.says());
    }
    return String.join("; ", reasons);
  }

  private static void addReason(List<Json.Member> members, String reason) {
    if (!reason.isEmpty()) {
      members.add(member("reason", text(reason)));
    }
  }
}
