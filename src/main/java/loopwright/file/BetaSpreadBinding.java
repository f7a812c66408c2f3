package loopwright.file;

import loopwright.design.DesignException;
import loopwright.design.Tolerances.BetaSpread;
import loopwright.quantity.Quantity;

/** How current gain spreads: the word {@code datasheet}, or a fraction. */
record BetaSpreadBinding(Binding<Quantity> fraction) implements Binding<BetaSpread> {
  private static final String DATASHEET = "datasheet";

  @Override
  public BetaSpread read(Json json, Spot spot) {
    if (json instanceof Json.Text text && text.value().equals(DATASHEET)) {
      return new BetaSpread.FromDatasheet();
    }
    try {
      return new BetaSpread.ByFraction(fraction.read(json, spot));
    } catch (DesignException e) {
      throw spot.misfit(json, expected());
    }
  }

  @Override
  public Json write(BetaSpread value) {
    return value instanceof BetaSpread.ByFraction by
        ? fraction.write(by.fraction())
        : Json.text(DATASHEET);
  }

  @Override
  public String expected() {
    return "\"" + DATASHEET + "\" or a fraction from 0 to 1, such as 0.3 or 30%";
  }
}
