package loopwright.file;

import static loopwright.file.ResultJson.list;
import static loopwright.file.ResultJson.member;
import static loopwright.file.ResultJson.number;
import static loopwright.file.ResultJson.text;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/** What a written sheet is about, as JSON for scripts: SI numbers, null where there is none. */
public final class SheetJson {
  private SheetJson() {}

  /**
   * A node of the sheet.
   *
   * @param name of the node
   * @param expected V
   * @param low V
   * @param high V
   */
  public record Node(
      String name, OptionalDouble expected, OptionalDouble low, OptionalDouble high) {}

  /**
   * The whole text, with a line break at its end.
   *
   * @param file that was written
   * @param checksum of the design
   * @param hookup whose nodes they are
   * @param nodes in the order of the sheet
   * @param failure why there are none; empty where there are
   */
  public static String write(
      String file, String checksum, String hookup, List<Node> nodes, Optional<String> failure) {
    return JsonWriter.write(
        Json.block(
            List.of(
                member("file", text(file)),
                member("checksum", text(checksum)),
                member("hookup", text(hookup)),
                member("nodes", list(nodes, SheetJson::node)),
                member("reason", failure.map(ResultJson::text).orElseGet(ResultJson::nothing)))));
  }

  private static Json node(Node node) {
    return Json.block(
        List.of(
            member("name", text(node.name())),
            member("expected", number(node.expected())),
            member("low", number(node.low())),
            member("high", number(node.high()))));
  }
}
