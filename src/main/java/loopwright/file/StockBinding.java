package loopwright.file;

import java.util.List;
import loopwright.design.Drawer.Stock;
import loopwright.quantity.PreferredValues;
import loopwright.quantity.Quantity;

/** Values in stock: a list of them, or the name of a series of preferred values. */
record StockBinding(Binding<List<Quantity>> values) implements Binding<Stock> {
  @Override
  public Stock read(Json json, Spot spot) {
    if (json instanceof Json.Items) {
      return new Stock.Values(values.read(json, spot));
    }
    if (json instanceof Json.Text text && PreferredValues.named(text.value()).isPresent()) {
      return new Stock.Series(text.value());
    }
    throw spot.misfit(json, expected());
  }

  @Override
  public Json write(Stock value) {
    return value instanceof Stock.Values single
        ? values.write(single.values())
        : Json.text(((Stock.Series) value).series());
  }

  @Override
  public Json rewrite(Stock value, Before<Stock> before) {
    return value instanceof Stock.Values now && before.value() instanceof Stock.Values was
        ? values.rewrite(now.values(), new Before<>(was.values(), before.json()))
        : write(value);
  }

  @Override
  public String expected() {
    return "a list of values or a series, one of "
        + String.join(", ", List.of(PreferredValues.values()).stream().map(Enum::name).toList());
  }
}
