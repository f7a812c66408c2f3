package loopwright.command;

import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.stream.Collectors;
import loopwright.design.Design;
import loopwright.predict.Catalogue;
import loopwright.predict.Figure;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Unit;
import loopwright.spread.Band;
import loopwright.spread.HookupSpread;

/** Bands as text for a person. */
final class SpreadText {
  private static final int MOST_PARTS = 3;

  private SpreadText() {}

  static String of(Design design, List<HookupSpread> spreads) {
    TextPage page = new TextPage().title(design.name());
    for (HookupSpread spread : spreads) {
      page.heading("Hookup " + spread.name() + ": figures, 95 % of the builds");
      page.table(figures(spread));
      page.heading("Nodes at rest");
      page.table(nodes(spread));
      spread.figures().forEach((key, band) -> matters(page, key, band));
      page.heading("Yield");
      page.paragraph(
          spread.yield().isPresent()
              ? EngineeringFormat.percent(spread.yield().getAsDouble()) + ": " + spread.yieldSays()
              : "None: " + spread.yieldSays() + ".");
      if (spread.unsolved() > 0) {
        page.paragraph(spread.unsolved() + " builds find no operating point.");
      }
    }
    return page.toString();
  }

  private static TextTable figures(HookupSpread spread) {
    TextTable table = new TextTable().row("figure", "nominal", "low", "high", "builds");
    for (Map.Entry<String, Band> entry : spread.figures().entrySet()) {
      Figure figure = Catalogue.find(entry.getKey()).orElseThrow();
      Band band = entry.getValue();
      if (band.samples() > 0) {
        table.row(
            figure.label(),
            text(band.nominal(), figure.unit()),
            text(band.low(), figure.unit()),
            text(band.high(), figure.unit()),
            Integer.toString(band.samples()));
      }
    }
    return table;
  }

  private static TextTable nodes(HookupSpread spread) {
    TextTable table = new TextTable().row("node", "nominal", "low", "high");
    spread
        .nodes()
        .forEach(
            (name, band) ->
                table.row(
                    name,
                    text(band.nominal(), Unit.VOLT),
                    text(band.low(), Unit.VOLT),
                    text(band.high(), Unit.VOLT)));
    return table;
  }

  private static void matters(TextPage page, String key, Band band) {
    if (band.matters().isEmpty()) {
      return;
    }
    String parts =
        band.matters().stream()
            .limit(MOST_PARTS)
            .map(matter -> matter.part() + " " + EngineeringFormat.percent(matter.share()))
            .collect(Collectors.joining(", "));
    page.paragraph(Catalogue.find(key).orElseThrow().label() + " depends on " + parts + ".");
  }

  private static String text(OptionalDouble value, Unit unit) {
    return value.isPresent() ? EngineeringFormat.format(value.getAsDouble(), unit) : "–";
  }
}
