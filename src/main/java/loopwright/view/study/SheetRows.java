package loopwright.view.study;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.BiConsumer;
import java.util.stream.IntStream;
import javax.swing.table.AbstractTableModel;
import loopwright.design.Design;
import loopwright.design.Reading;
import loopwright.session.NodeReadings;
import loopwright.sheet.BenchSheet;
import loopwright.sheet.SheetNode;

/** The nodes of a sheet as rows, with what was read of them. */
final class SheetRows extends AbstractTableModel {
  static final int EXPECTED = 2;
  static final int READ = 5;

  private static final List<String> COLUMNS =
      List.of("Node", "At", "Expected", "Low", "High", "Read", "Reads");

  /** A node whose prediction has no band is within it so near: 0.5 % and 3 mV of a meter. */
  private static final double SHARE = 0.005;

  private static final double VOLTS = 3e-3;

  private final transient BiConsumer<Integer, String> onRead;
  private transient Optional<BenchSheet> sheet = Optional.empty();
  private transient List<Optional<Reading>> readings = List.of();

  /**
   * @param onRead takes what a person typed in a row
   */
  SheetRows(BiConsumer<Integer, String> onRead) {
    this.onRead = onRead;
  }

  Optional<BenchSheet> sheet() {
    return sheet;
  }

  /** Shows a sheet with the readings of a design. */
  void show(Optional<BenchSheet> shown, Design design) {
    boolean same = sheet.map(BenchSheet::nodes).equals(shown.map(BenchSheet::nodes));
    sheet = shown;
    readings =
        nodes().stream()
            .map(node -> NodeReadings.newest(design, shown.orElseThrow().hookup(), node.name()))
            .toList();
    // The chosen row stays chosen while values come in.
    if (same && getRowCount() > 0) {
      fireTableRowsUpdated(0, getRowCount() - 1);
    } else {
      fireTableDataChanged();
    }
  }

  private List<SheetNode> nodes() {
    return sheet.map(BenchSheet::nodes).orElse(List.of());
  }

  /**
   * What is to be said about the reading in a row; empty where it is within its band, or absent.
   */
  String says(int row) {
    SheetNode node = nodes().get(row);
    return switch (verdict(row)) {
      case "high" -> node.name() + " reads high. Suspect: " + node.ifHigh() + ".";
      case "low" -> node.name() + " reads low. Suspect: " + node.ifLow() + ".";
      default -> "";
    };
  }

  /** The nodes that read high or low. */
  List<String> off() {
    return IntStream.range(0, getRowCount())
        .filter(row -> !says(row).isEmpty())
        .mapToObj(row -> nodes().get(row).name())
        .toList();
  }

  private String verdict(int row) {
    Optional<Reading> reading = readings.get(row);
    OptionalDouble expected = nodes().get(row).volts().value().number();
    if (reading.isEmpty() || expected.isEmpty()) {
      return "";
    }
    double read = reading.get().value().value();
    double meter = VOLTS + SHARE * Math.abs(read);
    double high = nodes().get(row).volts().high().orElse(expected.getAsDouble());
    double low = nodes().get(row).volts().low().orElse(expected.getAsDouble());
    return read > high + meter ? "high" : read < low - meter ? "low" : "within";
  }

  @Override
  public int getRowCount() {
    return nodes().size();
  }

  @Override
  public int getColumnCount() {
    return COLUMNS.size();
  }

  @Override
  public String getColumnName(int column) {
    return COLUMNS.get(column);
  }

  @Override
  public boolean isCellEditable(int row, int column) {
    return column == READ;
  }

  @Override
  public Object getValueAt(int row, int column) {
    SheetNode node = nodes().get(row);
    return switch (column) {
      case 0 -> node.name();
      case 1 -> String.join(", ", node.at());
      case EXPECTED -> Numbers.text(node.volts().value().number(), node.volts().unit());
      case 3 -> Numbers.text(node.volts().low(), node.volts().unit());
      case 4 -> Numbers.text(node.volts().high(), node.volts().unit());
      case READ -> readings.get(row).map(reading -> reading.value().spelling()).orElse("");
      default -> verdict(row);
    };
  }

  @Override
  public void setValueAt(Object value, int row, int column) {
    String text = String.valueOf(value);
    if (!text.equals(getValueAt(row, column))) {
      onRead.accept(row, text);
    }
  }
}
