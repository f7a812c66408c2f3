package loopwright.design;

/** What kind of thing a field of a design holds. */
public enum Shape {
  /** A {@link loopwright.quantity.Quantity}. */
  QUANTITY,
  /** A {@link PartValue}: the value of a resistor or capacitor, with what is known of it. */
  PART_VALUE,
  /** Free text or a name. */
  TEXT,
  /** A whole number. */
  COUNT,
  /** True or false. */
  FLAG,
  /** One word of a fixed set: an enum. */
  CHOICE,
  /** A record with fields of its own. */
  BLOCK,
  /** One of several records, told apart by the field {@code kind}. */
  FAMILY,
  /** One of several records that are written in different forms and have no field {@code kind}. */
  ALTERNATIVES,
  /** A list; {@link Field#element()} says of what. */
  LIST,
  /** Things by name; {@link Field#element()} says of what. */
  MAP
}
