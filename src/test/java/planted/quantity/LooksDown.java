package planted.quantity;

import planted.solve.OtherHalf;

/** Breaks the order: a quantity that knows a solution. */
record LooksDown(OtherHalf solution) {}
