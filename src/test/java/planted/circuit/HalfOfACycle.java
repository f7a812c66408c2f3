package planted.circuit;

import planted.solve.OtherHalf;

/** Needs what needs it. */
public record HalfOfACycle(OtherHalf other) {}
