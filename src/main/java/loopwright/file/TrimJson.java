package loopwright.file;

import static loopwright.file.ResultJson.list;
import static loopwright.file.ResultJson.member;
import static loopwright.file.ResultJson.number;
import static loopwright.file.ResultJson.text;

import java.util.List;
import loopwright.propose.Trim;
import loopwright.propose.TrimAdvice;

/** Trim advice as JSON, for scripts: SI numbers; a number that does not exist is null. */
public final class TrimJson {
  private TrimJson() {}

  /** The whole text, with a line break at its end. */
  public static String write(TrimAdvice advice) {
    return JsonWriter.write(
        Json.block(
            List.of(
                member("outputOffset", number(advice.offset().number())),
                member("closedLoopGain", number(advice.gain().number())),
                member("offsetTrims", list(advice.offsetTrims(), TrimJson::trim)),
                member("gainTrims", list(advice.gainTrims(), TrimJson::trim)),
                member("best", advice.best().map(TrimJson::best).orElseGet(ResultJson::nothing)))));
  }

  private static Json trim(Trim trim) {
    return Json.block(
        List.of(
            member("path", text(trim.path())),
            member("present", number(trim.present())),
            member("perCent", number(trim.perCent())),
            member("needed", number(trim.needed())),
            member("says", text(trim.says()))));
  }

  private static Json best(TrimAdvice.Best best) {
    return Json.block(
        List.of(
            member("changes", ChangeJson.of(List.of(best.change()))),
            member("outputOffset", number(best.left())),
            member("closedLoopGain", number(best.gain())),
            member("says", text(best.says()))));
  }
}
