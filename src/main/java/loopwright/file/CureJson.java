package loopwright.file;

import static loopwright.file.ResultJson.list;
import static loopwright.file.ResultJson.member;
import static loopwright.file.ResultJson.number;
import static loopwright.file.ResultJson.text;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import loopwright.predict.FigureValue;
import loopwright.sizing.Cure;
import loopwright.sizing.CureSearch;
import loopwright.sizing.Cures;

/** Cures as JSON, for scripts: SI numbers; a number that does not exist is null. */
public final class CureJson {
  private CureJson() {}

  /** The whole text, with a line break at its end. */
  public static String write(Cures cures) {
    return JsonWriter.write(
        Json.block(
            List.of(
                member("cures", list(cures.cures(), CureJson::cure)),
                member("cannot", list(cures.cannot(), CureJson::cannot)))));
  }

  private static Json cure(Cure cure) {
    List<Json.Member> members = new ArrayList<>();
    members.add(member("changes", ChangeJson.of(cure.changes())));
    members.add(member("worstPhaseMargin", number(cure.worstPhaseMargin())));
    members.add(member("cornerPhaseMargin", number(cure.cornerPhaseMargin())));
    for (String key : CureSearch.costKeys()) {
      FigureValue value = cure.figures().get(key);
      members.add(member(key, number(value == null ? OptionalDouble.empty() : value.number())));
    }
    members.add(member("says", text(cure.says())));
    return Json.block(members);
  }

  private static Json cannot(Cures.Cannot cannot) {
    return Json.block(
        List.of(member("kind", text(cannot.kind())), member("says", text(cannot.says()))));
  }
}
