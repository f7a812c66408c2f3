package planted.solve;

import planted.circuit.HalfOfACycle;

/** Needs what needs it. */
public record OtherHalf(HalfOfACycle other) {}
