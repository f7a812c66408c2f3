package loopwright.file;

import static loopwright.file.ResultJson.list;
import static loopwright.file.ResultJson.member;
import static loopwright.file.ResultJson.number;
import static loopwright.file.ResultJson.text;

import java.util.List;
import loopwright.design.Change;
import loopwright.quantity.Quantity;
import loopwright.quantity.QuantityException;

/**
 * Changes to a design as JSON: values as SI numbers where they are numbers, else as text; null
 * takes away what stands there.
 */
final class ChangeJson {
  private ChangeJson() {}

  static Json of(List<Change> changes) {
    return list(changes, ChangeJson::of);
  }

  private static Json of(Change change) {
    return Json.block(
        List.of(member("path", text(change.path())), member("value", value(change.value()))));
  }

  private static Json value(String written) {
    if (written.isBlank()) {
      return ResultJson.nothing();
    }
    try {
      return number(Quantity.parseAny(written).quantity().value());
    } catch (QuantityException e) {
      return text(written);
    }
  }
}
