package loopwright.view.chart;

import loopwright.quantity.Unit;

/** An axis that knows what its numbers are. */
interface UnitAxis {
  /** Unit of its values. */
  Unit unit();
}
