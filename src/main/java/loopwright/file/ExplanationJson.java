package loopwright.file;

import static loopwright.file.ResultJson.list;
import static loopwright.file.ResultJson.member;
import static loopwright.file.ResultJson.nothing;
import static loopwright.file.ResultJson.number;
import static loopwright.file.ResultJson.text;

import java.util.ArrayList;
import java.util.List;
import loopwright.bench.Explanation;
import loopwright.bench.Explanations;
import loopwright.bench.NextReading;

/** Explanations as JSON, for scripts: best first. */
public final class ExplanationJson {
  private ExplanationJson() {}

  /** The whole text, with a line break at its end. */
  public static String write(Explanations explanations) {
    return JsonWriter.write(
        Json.block(
            List.of(
                member(
                    "explanations",
                    list(explanations.explanations(), ExplanationJson::explanation)),
                member(
                    "nextReading",
                    explanations.next().map(ExplanationJson::next).orElse(nothing())),
                member("remark", text(explanations.says())))));
  }

  private static Json explanation(Explanation explanation) {
    List<Json.Member> members = new ArrayList<>();
    members.add(member("kind", text(kind(explanation.kind()))));
    members.add(
        member("part", explanation.part().isEmpty() ? nothing() : text(explanation.part())));
    members.add(member("says", text(explanation.says())));
    members.add(member("value", number(explanation.value())));
    members.add(member("misfit", number(explanation.misfit())));
    members.add(member("probability", number(explanation.probability())));
    members.add(member("alike", list(explanation.alike(), ResultJson::text)));
    return Json.block(members);
  }

  private static String kind(Explanation.Kind kind) {
    return switch (kind) {
      case NO_FAULT -> "noFault";
      case DRIFT -> "drift";
      case FAULT -> "fault";
      case NONE_OF_THESE -> "noneOfThese";
    };
  }

  private static Json next(NextReading next) {
    return Json.block(
        List.of(
            member("quantity", text(next.quantity())),
            member("node", text(next.node())),
            member("hookup", text(next.hookup())),
            member("says", text(next.says()))));
  }
}
