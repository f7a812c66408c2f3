package loopwright.file;

import loopwright.design.PartValue;
import loopwright.quantity.Quantity;

/** A resistor or capacitor: a plain value, or a block with its tolerance and measured value. */
record PartValueBinding(Binding<Quantity> plain, Binding<PartValue> block)
    implements Binding<PartValue> {
  @Override
  public PartValue read(Json json, Spot spot) {
    return json instanceof Json.Block
        ? block.read(json, spot)
        : PartValue.of(plain.read(json, spot));
  }

  @Override
  public Json write(PartValue value) {
    return value.equals(PartValue.of(value.value()))
        ? plain.write(value.value())
        : block.write(value);
  }

  @Override
  public Json rewrite(PartValue value, Before<PartValue> before) {
    return before.json() instanceof Json.Block ? block.rewrite(value, before) : write(value);
  }

  @Override
  public String expected() {
    return plain.expected();
  }
}
