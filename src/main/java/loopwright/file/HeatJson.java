package loopwright.file;

import static loopwright.file.ResultJson.list;
import static loopwright.file.ResultJson.member;
import static loopwright.file.ResultJson.nothing;
import static loopwright.file.ResultJson.number;
import static loopwright.file.ResultJson.text;

import java.util.List;
import java.util.OptionalDouble;
import loopwright.predict.AmbientHeat;
import loopwright.predict.HeatReport;
import loopwright.predict.RunawayEstimate;
import loopwright.predict.SwingHeat;

/** Heat as JSON, for scripts: SI units, temperatures in °C. */
public final class HeatJson {
  private HeatJson() {}

  /** The whole text, with a line break at its end. */
  public static String write(HeatReport report) {
    return JsonWriter.write(
        Json.block(
            List.of(
                member("hookup", text(report.hookup())),
                member("idleDevice", text(report.idleDevice())),
                member("ambients", list(report.ambients(), HeatJson::ambient)),
                member("runaway", list(report.estimates(), HeatJson::estimate)),
                member("leastEmitterResistance", optional(report.leastResistance())),
                member("leastEmitterResistanceSays", text(report.resistanceSays())),
                member("overSwing", list(report.devices(), HeatJson::device)),
                member("overSwingReason", text(report.swingReason())),
                member("shortCircuit", text(report.shortCircuit())),
                member("cautions", list(HeatReport.CAUTIONS, ResultJson::text)))));
  }

  private static Json ambient(AmbientHeat ambient) {
    return Json.block(
        List.of(
            member("ambient", number(ambient.ambient())),
            member("idleCurrent", optional(ambient.idle())),
            member("idleCurrentUnheated", optional(ambient.idleUnheated())),
            member("hottest", text(ambient.hottest())),
            member("junctionTemperature", optional(ambient.celsius())),
            member("loop", optional(ambient.loop())),
            member("reason", text(ambient.reason()))));
  }

  private static Json estimate(RunawayEstimate estimate) {
    return Json.block(
        List.of(
            member("device", text(estimate.role())),
            member("formula", number(estimate.formula())),
            member("solved", optional(estimate.solved())),
            member("kappa", number(estimate.kappa())),
            member("collectorCurrent", number(estimate.collectorCurrent())),
            member("collectorEmitterVoltage", number(estimate.collectorEmitter())),
            member("leastEmitterResistance", number(estimate.leastResistance()))));
  }

  private static Json device(SwingHeat device) {
    return Json.block(
        List.of(
            member("device", text(device.role())),
            member("rest", number(device.rest())),
            member("most", number(device.most())),
            member("mostAt", number(device.at())),
            member("worstMean", number(device.mean())),
            member("worstAmplitude", number(device.amplitude())),
            member("junctionTemperature", optional(device.celsius())),
            member("classB", optional(device.classB()))));
  }

  private static Json optional(OptionalDouble value) {
    return value.isPresent() ? number(value.getAsDouble()) : nothing();
  }
}
