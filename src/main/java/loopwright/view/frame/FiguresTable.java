package loopwright.view.frame;

import java.awt.Color;
import java.awt.Component;
import java.awt.Font;
import java.awt.FontMetrics;
import java.awt.event.MouseEvent;
import java.util.ArrayList;
import java.util.List;
import java.util.function.Consumer;
import javax.swing.BorderFactory;
import javax.swing.JTable;
import javax.swing.ListSelectionModel;
import javax.swing.SwingConstants;
import javax.swing.table.DefaultTableCellRenderer;
import javax.swing.table.TableColumn;
import loopwright.view.theme.Palette;

/** The table of figures: values as wide as they need, names on two lines where they must. */
final class FiguresTable extends JTable {
  private static final int PADDING = 10;
  private static final int NARROWEST = 52;

  private final FiguresModel model;

  /**
   * @param model the rows
   * @param complaint shows what is wrong with a measured value being typed
   */
  FiguresTable(FiguresModel model, Consumer<String> complaint) {
    super(model);
    this.model = model;
    setName("figures");
    getAccessibleContext().setAccessibleName("Figures: formula, solved, measured");
    setDefaultRenderer(FigureCell.class, new CellRenderer());
    setDefaultEditor(FigureCell.class, new MeasuredEditor(model, complaint));
    setSelectionMode(ListSelectionModel.SINGLE_SELECTION);
    setCellSelectionEnabled(true);
    setFillsViewportHeight(true);
    setSurrendersFocusOnKeystroke(true);
    putClientProperty("terminateEditOnFocusLost", true);
    getTableHeader().setReorderingAllowed(false);
    getTableHeader().setResizingAllowed(false);
    for (int i = 0; i < getColumnCount(); i++) {
      getColumnModel().getColumn(i).setHeaderRenderer(new HeaderRenderer());
    }
  }

  @Override
  public String getToolTipText(MouseEvent event) {
    int row = rowAtPoint(event.getPoint());
    int column = columnAtPoint(event.getPoint());
    return row < 0 || column < 0 ? null : model.getValueAt(row, column).hover();
  }

  /** Gives the values the room that they need, and the names what is left. */
  @Override
  public void doLayout() {
    int left = getWidth();
    for (int column = FiguresModel.FORMULA; column < getColumnCount(); column++) {
      int width = needed(column);
      left -= width;
      fix(column, width);
    }
    fix(FiguresModel.NAME, Math.max(left, NARROWEST));
    fitRows(Math.max(left, NARROWEST));
    super.doLayout();
  }

  private int needed(int column) {
    FontMetrics metrics = getFontMetrics(Palette.strong());
    int width =
        Math.max(
            NARROWEST,
            getFontMetrics(Palette.small()).stringWidth(getColumnName(column)) + PADDING);
    for (int row = 0; row < getRowCount(); row++) {
      String text = model.getValueAt(row, column).text();
      width = Math.max(width, metrics.stringWidth(text) + PADDING);
    }
    return width;
  }

  private void fix(int index, int width) {
    TableColumn column = getColumnModel().getColumn(index);
    column.setMinWidth(width);
    column.setMaxWidth(width);
    column.setPreferredWidth(width);
    column.setWidth(width);
  }

  private void fitRows(int width) {
    int small = getFontMetrics(Palette.small()).getHeight();
    for (int row = 0; row < getRowCount(); row++) {
      String name = model.getValueAt(row, FiguresModel.NAME).text();
      int lines = lines(name, width).size();
      int height = lines == 1 ? getRowHeight() : lines * small + PADDING / 2;
      if (getRowHeight(row) != height) {
        setRowHeight(row, height);
      }
    }
  }

  /** The name in one line of the normal font or, where there is no room, in lines of the small. */
  private List<String> lines(String name, int width) {
    if (fits(name, width)) {
      return List.of(name);
    }
    int room = width - PADDING;
    FontMetrics metrics = getFontMetrics(Palette.small());
    List<String> lines = new ArrayList<>();
    String line = "";
    for (String word : name.split(" ")) {
      String longer = line.isEmpty() ? word : line + " " + word;
      if (!line.isEmpty() && metrics.stringWidth(longer) > room) {
        lines.add(line);
        line = word;
      } else {
        line = longer;
      }
    }
    lines.add(line);
    return lines;
  }

  private boolean fits(String name, int width) {
    return getFontMetrics(Palette.normal()).stringWidth(name) <= width - PADDING;
  }

  /** Heads of columns in the small font, over the edge that the values keep to. */
  private static final class HeaderRenderer extends DefaultTableCellRenderer {
    @Override
    public Component getTableCellRendererComponent(
        JTable table, Object value, boolean selected, boolean focused, int row, int column) {
      super.getTableCellRendererComponent(table, value, false, false, row, column);
      setHorizontalAlignment(side(column));
      setFont(Palette.small());
      setForeground(Palette.quiet());
      setBackground(Palette.card());
      setBorder(BorderFactory.createEmptyBorder(2, 4, 4, 4));
      return this;
    }
  }

  /** Cells in their tone. */
  private final class CellRenderer extends DefaultTableCellRenderer {
    @Override
    public Component getTableCellRendererComponent(
        JTable table, Object value, boolean selected, boolean focused, int row, int column) {
      FigureCell cell = (FigureCell) value;
      super.getTableCellRendererComponent(table, cell, selected, focused, row, column);
      setHorizontalAlignment(side(column));
      setFont(font(cell, column));
      if (!selected) {
        setForeground(colour(cell.tone()));
      }
      setBorder(BorderFactory.createEmptyBorder(0, 4, 0, 4));
      return this;
    }

    private Font font(FigureCell cell, int column) {
      if (column == FiguresModel.NAME) {
        int width = getColumnModel().getColumn(column).getWidth();
        List<String> lines = lines(cell.text(), width);
        // A label breaks its text only when it is told that the text is HTML.
        setText("<html>" + String.join("<br>", lines) + "</html>");
        return fits(cell.text(), width) ? Palette.normal() : Palette.small();
      }
      boolean strong =
          cell.tone() == FigureCell.Tone.STRONG || cell.tone() == FigureCell.Tone.FAILS;
      return strong ? Palette.strong() : Palette.normal();
    }

    private Color colour(FigureCell.Tone tone) {
      return switch (tone) {
        case NORMAL, STRONG -> Palette.text();
        case QUIET -> Palette.quiet();
        case MEASURED -> Palette.accent();
        case RISKY -> Palette.risky();
        case FAILS -> Palette.fails();
      };
    }
  }

  private static int side(int column) {
    return column == FiguresModel.NAME ? SwingConstants.LEFT : SwingConstants.RIGHT;
  }
}
