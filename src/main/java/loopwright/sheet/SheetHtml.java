package loopwright.sheet;

import java.util.List;

/** The sheet as one self-contained HTML file, which is well-formed XML too. */
final class SheetHtml {
  private static final String FAMILY = SheetFonts.REGULAR.getFamily();

  private final StringBuilder html = new StringBuilder();
  private final SvgPicture pictures = new SvgPicture();

  private SheetHtml() {}

  /** The whole file; equal sheets give equal text. */
  static String of(BenchSheet sheet, Paper paper) {
    SheetHtml body = new SheetHtml();
    body.element("h1", sheet.title());
    body.element("p class=\"subtitle\"", SheetPieces.subtitle(sheet));
    body.pieces(SheetPieces.of(sheet, true));
    body.element("p class=\"foot\"", SheetPieces.foot(sheet));
    String content = body.html.toString();
    return head(sheet, paper, content) + content + "</main>\n</body>\n</html>\n";
  }

  private static String head(BenchSheet sheet, Paper paper, String content) {
    return "<!DOCTYPE html>\n"
        + "<html xmlns=\"http://www.w3.org/1999/xhtml\" lang=\"en\">\n<head>\n"
        + "<meta charset=\"utf-8\"/>\n"
        + "<meta name=\"viewport\" content=\"width=device-width, initial-scale=1\"/>\n"
        + "<title>"
        + HtmlText.escaped(sheet.title())
        + "</title>\n"
        + sheet.author().map(author -> meta("author", author)).orElse("")
        + meta("description", SheetPieces.subtitle(sheet))
        + meta("keywords", "checksum " + sheet.checksum())
        + "<style>\n"
        + WebFont.rule(FAMILY, false, content)
        + "\n"
        + WebFont.rule(FAMILY, true, content)
        + "\n"
        + style(paper)
        + "</style>\n</head>\n<body>\n<main>\n";
  }

  private static String meta(String name, String content) {
    return "<meta name=\"" + name + "\" content=\"" + HtmlText.escaped(content) + "\"/>\n";
  }

  /** Black on white with thin rules: it is made to be printed. */
  private static String style(Paper paper) {
    return """
        @page { size: %s; margin: 12mm; }
        body { margin: 0; color: #000; background: #fff; font: 8.5pt/1.3 "%s", sans-serif;
          font-variant-ligatures: none; }
        main { max-width: %.0fpt; margin: 0 auto; padding: 12pt; }
        h1 { font-size: 15pt; margin: 0; overflow-wrap: anywhere; }
        h2 { font-size: 10.5pt; margin: 10pt 0 4pt; border-bottom: 0.5pt solid #000; break-after: avoid; }
        h3 { font-size: 8.5pt; margin: 4pt 0 0; break-after: avoid; overflow-wrap: anywhere; }
        p, ol, ul { margin: 2pt 0 4pt; } ol { padding-left: 18pt; } ul { padding-left: 12pt; }
        table { border-collapse: collapse; width: 100%%; margin: 2pt 0 6pt; }
        caption { text-align: left; font-size: 7.5pt; }
        tbody th { font-weight: normal; }
        th, td { text-align: left; vertical-align: top; padding: 1pt 4pt 1pt 0; border-bottom: 0.4pt solid #000;
          overflow-wrap: anywhere; }
        thead { display: table-header-group; } tr, svg { break-inside: avoid; }
        .number { text-align: right; } .number, .text { white-space: nowrap; }
        td.box { border-left: 0.4pt solid #000; border-right: 0.4pt solid #000; min-width: 62pt; height: 16pt; }
        .beside { display: flex; gap: 14pt; align-items: flex-start; } .beside > div { min-width: 0; }
        svg { max-width: 100%%; height: auto; } .foot { font-size: 7pt; overflow-wrap: anywhere; }
        @media print { main { max-width: none; padding: 0; } }
        @media (max-width: 480pt) { .beside { display: block; } }
        """
        .formatted(paper.says(), FAMILY, paper.width());
  }

  private void pieces(List<Piece> pieces) {
    pieces.forEach(this::piece);
  }

  private void piece(Piece piece) {
    if (piece instanceof Piece.Heading heading) {
      element("h2", heading.text());
    } else if (piece instanceof Piece.Subheading heading) {
      element("h3", heading.text());
    } else if (piece instanceof Piece.Words words) {
      element("p", words.text());
    } else if (piece instanceof Piece.Steps steps) {
      list("ol", steps.steps());
    } else if (piece instanceof Piece.Points points) {
      list("ul", points.points());
    } else if (piece instanceof Piece.Grid grid) {
      grid(grid);
    } else if (piece instanceof Piece.Pictures row) {
      html.append("<div>\n");
      row.pictures().forEach(picture -> html.append(pictures.of(picture)).append('\n'));
      html.append("</div>\n");
    } else if (piece instanceof Piece.Beside beside) {
      html.append("<div class=\"beside\">\n");
      side(beside.share(), beside.left());
      side(1 - beside.share(), beside.right());
      html.append("</div>\n");
    }
  }

  private void side(double share, List<Piece> pieces) {
    html.append("<div style=\"flex: ").append(share).append("\">\n");
    pieces(pieces);
    html.append("</div>\n");
  }

  private void list(String kind, List<String> sentences) {
    html.append('<').append(kind).append(">\n");
    sentences.forEach(sentence -> element("li", sentence));
    html.append("</").append(kind).append(">\n");
  }

  private void grid(Piece.Grid grid) {
    html.append("<table>\n");
    element("caption", grid.says());
    html.append("<thead><tr>");
    for (Piece.Column column : grid.columns()) {
      html.append("<th scope=\"col\"").append(look(column)).append('>');
      html.append(HtmlText.escaped(column.title())).append("</th>");
    }
    html.append("</tr></thead>\n<tbody>\n");
    grid.rows().forEach(row -> row(grid, row));
    html.append("</tbody>\n</table>\n");
  }

  /** The first cell names its row. */
  private void row(Piece.Grid grid, List<String> cells) {
    html.append("<tr>");
    for (int i = 0; i < cells.size(); i++) {
      String tag = i == 0 ? "th" : "td";
      html.append('<').append(tag).append(i == 0 ? " scope=\"row\"" : "");
      html.append(look(grid.columns().get(i))).append('>');
      html.append(HtmlText.escaped(cells.get(i))).append("</").append(tag).append('>');
    }
    html.append("</tr>\n");
  }

  private static String look(Piece.Column column) {
    return switch (column.fit()) {
      case TEXT -> " class=\"text\"";
      case NUMBER -> " class=\"number\"";
      case BOX -> " class=\"box\"";
      case WRAPPED -> "";
    };
  }

  private void element(String tag, String text) {
    html.append('<').append(tag).append('>').append(HtmlText.escaped(text));
    html.append("</").append(tag.split(" ")[0]).append(">\n");
  }
}
