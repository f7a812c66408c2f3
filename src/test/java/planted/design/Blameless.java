package planted.design;

/** Breaks nothing, and imports from above. */
public record Blameless(planted.quantity.Blameless value) {}
