package planted.quantity;

/** Breaks nothing. */
public record Blameless(double value) {}
