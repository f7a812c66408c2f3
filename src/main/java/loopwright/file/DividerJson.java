package loopwright.file;

import static loopwright.file.ResultJson.list;
import static loopwright.file.ResultJson.member;
import static loopwright.file.ResultJson.number;
import static loopwright.file.ResultJson.text;

import java.util.ArrayList;
import java.util.List;
import loopwright.predict.FigureValue;
import loopwright.sizing.DividerProposal;

/**
 * Dividers as JSON, for scripts: SI numbers; a number that does not exist is null, with a reason.
 */
public final class DividerJson {
  private DividerJson() {}

  /** The whole text, with a line break at its end. */
  public static String write(List<DividerProposal> dividers) {
    return JsonWriter.write(
        Json.block(List.of(member("dividers", list(dividers, DividerJson::divider)))));
  }

  private static Json divider(DividerProposal divider) {
    List<Json.Member> members = new ArrayList<>();
    List<String> reasons = new ArrayList<>();
    members.add(member("changes", ChangeJson.of(divider.changes())));
    add(members, reasons, "gain", divider.gain());
    add(members, reasons, "gainLow", divider.gainLow());
    add(members, reasons, "gainHigh", divider.gainHigh());
    add(members, reasons, "outputOffset", divider.outputOffset());
    add(members, reasons, "inputNoise", divider.inputNoise());
    members.add(member("dividerCurrent", number(divider.dividerCurrent())));
    add(members, reasons, "phaseMargin", divider.phaseMargin());
    members.add(member("score", number(divider.score())));
    if (Double.isInfinite(divider.score())) {
      reasons.add("score: not solved");
    }
    members.add(member("says", text(divider.says())));
    if (!reasons.isEmpty()) {
      members.add(member("reason", text(String.join("; ", reasons))));
    }
    return Json.block(members);
  }

  private static void add(
      List<Json.Member> members, List<String> reasons, String name, FigureValue value) {
    members.add(member(name, number(value.number())));
    if (value.number().isEmpty()) {
      reasons.add(name + ": " + value.says());
    }
  }
}
