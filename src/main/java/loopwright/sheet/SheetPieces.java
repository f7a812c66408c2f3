package loopwright.sheet;

import java.awt.Graphics2D;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Unit;
import loopwright.sheet.Piece.Beside;
import loopwright.sheet.Piece.Column;
import loopwright.sheet.Piece.Fit;
import loopwright.sheet.Piece.Grid;
import loopwright.sheet.Piece.Heading;
import loopwright.sheet.Piece.Pictures;
import loopwright.sheet.Piece.Points;
import loopwright.sheet.Piece.Steps;
import loopwright.sheet.Piece.Subheading;
import loopwright.sheet.Piece.Words;

/** The sheet in the order in which it is worked through. */
final class SheetPieces {
  private static final double HALF = 0.5;
  private static final double WIDEST = 520;
  private static final double HIGHEST = 230;

  private SheetPieces() {}

  /** The line under the title. */
  static String subtitle(BenchSheet sheet) {
    return "Bench sheet of "
        + sheet.date()
        + ", hookup \u201C"
        + sheet.hookup()
        + "\u201D, rails "
        + EngineeringFormat.format(sheet.design().rails().positive().value(), Unit.VOLT)
        + " and "
        + EngineeringFormat.format(sheet.design().rails().negative().value(), Unit.VOLT)
        + ", ambient "
        + EngineeringFormat.format(sheet.design().surroundings().ambient().value(), Unit.CELSIUS)
        + ". "
        + sheet.bands();
  }

  /** The line at the foot of every page. */
  static String foot(BenchSheet sheet) {
    return "Design checksum (SHA-256) " + sheet.checksum();
  }

  /**
   * The whole of it.
   *
   * @param further whether figures are told that need no reading of their own
   */
  static List<Piece> of(BenchSheet sheet, boolean further) {
    List<Piece> pieces = new ArrayList<>();
    pieces.add(new Heading("Schematic"));
    pieces.add(new Pictures(List.of(schematic(sheet))));
    pieces.add(new Heading("Parts"));
    int half = (sheet.parts().size() + 1) / 2;
    pieces.add(
        new Beside(
            List.of(parts(sheet.parts().subList(0, half))),
            HALF,
            List.of(parts(sheet.parts().subList(half, sheet.parts().size())))));
    if (!sheet.pinouts().isEmpty()) {
      pieces.add(new Heading("Pinouts"));
      pieces.add(new Pictures(sheet.pinouts().stream().map(PinoutPicture::of).toList()));
    }
    pieces.add(new Heading("Cautions"));
    pieces.add(new Points(sheet.cautions()));
    if (!sheet.unpowered().isEmpty()) {
      pieces.add(new Heading("Before power"));
      pieces.add(new Steps(sheet.unpowered()));
    }
    if (!sheet.powerUp().isEmpty()) {
      pieces.add(new Heading("First power"));
      pieces.add(new Steps(sheet.powerUp()));
    }
    pieces.add(new Heading("Nodes at rest, hookup \u201C" + sheet.hookup() + "\u201D"));
    sheet
        .failure()
        .ifPresentOrElse(
            reason ->
                pieces.add(
                    new Words(
                        "The circuit finds no operating point, so there is nothing to expect: "
                            + reason
                            + ".")),
            () -> pieces.add(nodes(sheet)));
    pieces.add(new Heading("Hookups to build"));
    pieces.add(
        new Words(
            "For every hookup: "
                + GeneratorWords.display(sheet.design())
                + " Resistance behind the generator includes its own. "
                + ProbeWords.USUAL
                + " "
                + OscillationWatch.CHECK));
    pieces.addAll(hookups(sheet.hookups(), further));
    pieces.add(
        new Words(
            "Built by ______________________   Date ________________   Instruments"
                + " ______________________________________"));
    return pieces;
  }

  private static Piece parts(List<SheetPart> parts) {
    return new Grid(
        "Parts by value",
        List.of(
            new Column("Value", Fit.TEXT),
            new Column("No.", Fit.NUMBER),
            new Column("Part", Fit.WRAPPED),
            new Column("Designators", Fit.WRAPPED)),
        parts.stream()
            .map(
                part ->
                    List.of(
                        part.value(),
                        Integer.toString(part.designators().size()),
                        part.what(),
                        String.join(" ", part.designators())))
            .toList());
  }

  private static Piece nodes(BenchSheet sheet) {
    return new Grid(
        "Node voltages to ground at rest",
        List.of(
            new Column("Node", Fit.TEXT),
            new Column("At", Fit.WRAPPED),
            new Column("Expected", Fit.NUMBER),
            new Column("Low", Fit.NUMBER),
            new Column("High", Fit.NUMBER),
            new Column("Read", Fit.BOX),
            new Column("If high suspect", Fit.WRAPPED),
            new Column("If low suspect", Fit.WRAPPED)),
        sheet.nodes().stream()
            .map(
                node ->
                    List.of(
                        PartSays.node(node.name()),
                        String.join(", ", node.at()),
                        node.volts().says(),
                        node.volts().lowSays(),
                        node.volts().highSays(),
                        "",
                        node.ifHigh(),
                        node.ifLow()))
            .toList());
  }

  /** Two cards side by side; one that is left over has its words beside its table. */
  private static List<Piece> hookups(List<SheetHookup> hookups, boolean further) {
    List<Piece> pieces = new ArrayList<>();
    for (int i = 0; i < hookups.size(); i += 2) {
      SheetHookup one = hookups.get(i);
      if (i + 1 < hookups.size()) {
        pieces.add(new Beside(card(one, further), HALF, card(hookups.get(i + 1), further)));
      } else {
        pieces.add(new Beside(says(one), HALF, shows(one, further)));
      }
    }
    return pieces;
  }

  private static List<Piece> card(SheetHookup hookup, boolean further) {
    List<Piece> pieces = new ArrayList<>(says(hookup));
    pieces.addAll(shows(hookup, further));
    return pieces;
  }

  private static List<Piece> says(SheetHookup hookup) {
    return List.of(
        new Subheading("Hookup \u201C" + hookup.name() + "\u201D"),
        new Words(hookup.build()),
        new Words(String.join(" ", hookup.settings())),
        new Words(String.join(" ", hookup.watch())));
  }

  private static List<Piece> shows(SheetHookup hookup, boolean further) {
    List<Piece> pieces = new ArrayList<>();
    if (!hookup.shows().isEmpty()) {
      pieces.add(
          new Grid(
              "What meter and scope should show in hookup " + hookup.name(),
              List.of(
                  new Column("Should show", Fit.WRAPPED),
                  new Column("Expected", Fit.NUMBER),
                  new Column("Low", Fit.NUMBER),
                  new Column("High", Fit.NUMBER),
                  new Column("Read", Fit.BOX)),
              hookup.shows().stream()
                  .map(
                      look ->
                          List.of(
                              look.what(),
                              look.value().says(),
                              look.value().lowSays(),
                              look.value().highSays(),
                              ""))
                  .toList()));
    }
    if (further && !hookup.further().isEmpty()) {
      pieces.add(new Words("Also: " + String.join("; ", hookup.further()) + "."));
    }
    return pieces;
  }

  /** The schematic, as large as the width of the narrower paper and a part of its height allow. */
  private static Piece.Picture schematic(BenchSheet sheet) {
    SchematicDrawing drawing = SchematicDrawing.of(sheet.design(), sheet.hookup());
    double scale = Math.min(1, Math.min(WIDEST / drawing.width(), HIGHEST / drawing.height()));
    return new Piece.Picture(
        "Schematic of hookup " + sheet.hookup(),
        scale * drawing.width(),
        scale * drawing.height(),
        graphics -> {
          Graphics2D scaled = (Graphics2D) graphics.create();
          scaled.scale(scale, scale);
          drawing.paint(scaled, SchematicInk.PAPER, Optional.empty());
          scaled.dispose();
        });
  }
}
