package loopwright.file;

import static loopwright.file.ResultJson.list;
import static loopwright.file.ResultJson.member;
import static loopwright.file.ResultJson.number;
import static loopwright.file.ResultJson.text;

import java.util.List;
import loopwright.sizing.StabilitySweep;

/** Stability against one value after the other as JSON, for scripts. */
public final class StabilityJson {
  private StabilityJson() {}

  /** The whole text, with a line break at its end. */
  public static String write(String hookup, List<StabilitySweep> sweeps) {
    return JsonWriter.write(
        Json.block(
            List.of(
                member("hookup", text(hookup)),
                member("sweeps", list(sweeps, StabilityJson::sweep)))));
  }

  private static Json sweep(StabilitySweep sweep) {
    return Json.block(
        List.of(
            member("path", text(sweep.path())),
            member("unit", text(sweep.unit().symbol())),
            member("says", text(sweep.says())),
            member("points", list(sweep.points(), StabilityJson::point))));
  }

  private static Json point(StabilitySweep.Point point) {
    return Json.block(
        List.of(
            member("value", number(point.value())),
            member("present", Json.truth(point.present())),
            member("stable", Json.truth(point.stable())),
            member("phaseMargin", number(point.phaseMargin())),
            member("growth", number(point.growth())),
            member("frequency", number(point.frequency()))));
  }
}
