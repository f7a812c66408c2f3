package loopwright.file;

import java.util.List;
import loopwright.quantity.Unit;

/** The unit that a value may carry, where it may depend on the value's neighbours in the file. */
interface UnitRule {
  /** The units that fit; empty when a neighbour is at fault that is complained of elsewhere. */
  List<Unit> units(Spot spot);

  /** What is wanted, with its article, where no spot is known. */
  String expected();

  /** Always the same unit. */
  static UnitRule always(Unit unit) {
    return new UnitRule() {
      @Override
      public List<Unit> units(Spot spot) {
        return List.of(unit);
      }

      @Override
      public String expected() {
        return unit.expectation();
      }
    };
  }
}
