package loopwright.file;

import static loopwright.file.ResultJson.list;
import static loopwright.file.ResultJson.member;
import static loopwright.file.ResultJson.number;
import static loopwright.file.ResultJson.text;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import loopwright.spread.Band;
import loopwright.spread.HookupSpread;

/** Bands as JSON, for scripts: SI numbers; a number that does not exist is null, with a reason. */
public final class SpreadJson {
  private SpreadJson() {}

  /** The whole text, with a line break at its end. */
  public static String write(List<HookupSpread> spreads) {
    return JsonWriter.write(
        Json.block(List.of(member("hookups", list(spreads, SpreadJson::hookup)))));
  }

  private static Json hookup(HookupSpread spread) {
    List<Json.Member> members = new ArrayList<>();
    members.add(member("name", text(spread.name())));
    members.add(member("nodes", bands(spread.nodes(), false)));
    members.add(member("figures", bands(spread.figures(), true)));
    members.add(member("yield", number(spread.yield())));
    members.add(member("remark", text(spread.yieldSays())));
    members.add(member("unsolved", Json.number(Integer.toString(spread.unsolved()))));
    return Json.block(members);
  }

  private static Json bands(Map<String, Band> bands, boolean ofFigures) {
    List<Json.Member> members = new ArrayList<>();
    bands.forEach((name, band) -> members.add(member(name, band(band, ofFigures))));
    return Json.block(members);
  }

  private static Json band(Band band, boolean ofFigure) {
    List<Json.Member> members = new ArrayList<>();
    members.add(member("nominal", number(band.nominal())));
    members.add(member("low", number(band.low())));
    members.add(member("high", number(band.high())));
    if (ofFigure) {
      members.add(member("samples", Json.number(Integer.toString(band.samples()))));
      members.add(member("matters", list(band.matters(), SpreadJson::matter)));
    }
    if (!band.reason().isBlank()) {
      members.add(member("reason", text(band.reason())));
    }
    return Json.block(members);
  }

  private static Json matter(Band.Matter matter) {
    return Json.block(
        List.of(member("part", text(matter.part())), member("share", number(matter.share()))));
  }
}
