package loopwright.view.study;

import java.awt.BorderLayout;
import java.awt.Dimension;
import java.util.List;
import java.util.Optional;
import java.util.function.Consumer;
import javax.swing.JButton;
import javax.swing.JPanel;
import javax.swing.JScrollPane;
import javax.swing.JTable;
import javax.swing.JTextArea;
import javax.swing.ListSelectionModel;
import javax.swing.SwingConstants;
import javax.swing.table.AbstractTableModel;
import javax.swing.table.DefaultTableCellRenderer;
import loopwright.view.theme.Theme;

/** Proposals in a table, the words of the chosen one beneath, and a button that applies it. */
final class ProposalTable extends JPanel {
  private static final int WORDS_HEIGHT = 92;

  private final List<String> columns;
  private final Rows rows;
  private final JTable table;
  private final JTextArea words = Theme.style(new JTextArea(), "says");
  private final JButton apply = Theme.style(new JButton("Apply"), "pill");
  private transient List<Proposal> proposals = List.of();

  /**
   * @param title of the table, for whoever hears it
   * @param columns headings; the first column is words, the others are numbers
   * @param onApply makes the changes of a proposal
   */
  ProposalTable(String title, List<String> columns, Consumer<Proposal> onApply) {
    super(new BorderLayout(0, 8));
    this.columns = columns;
    rows = new Rows();
    table = new JTable(rows);
    Theme.style(this, "plain");
    table.setName("proposals");
    table.setSelectionMode(ListSelectionModel.SINGLE_SELECTION);
    table.getAccessibleContext().setAccessibleName(title);
    table.setFillsViewportHeight(true);
    table.getSelectionModel().addListSelectionListener(event -> showChosen());
    DefaultTableCellRenderer right = new DefaultTableCellRenderer();
    right.setHorizontalAlignment(SwingConstants.RIGHT);
    for (int column = 1; column < columns.size(); column++) {
      table.getColumnModel().getColumn(column).setCellRenderer(right);
    }
    for (int column = 0; column < columns.size(); column++) {
      table.getColumnModel().getColumn(column).setPreferredWidth(width(column));
    }
    words.setName("words");
    words.setEditable(false);
    words.setLineWrap(true);
    words.setWrapStyleWord(true);
    apply.setName("apply");
    apply.setMnemonic('A');
    apply.setEnabled(false);
    apply.addActionListener(event -> chosen().ifPresent(onApply));
    add(new JScrollPane(table), BorderLayout.CENTER);
    add(foot(), BorderLayout.SOUTH);
  }

  /** Words need more room than numbers, and some units more than others. */
  private int width(int column) {
    return switch (columns.get(column)) {
      case "Noise" -> 105;
      case "Matters most" -> 240;
      case "Verdict" -> 120;
      case "Predicted or chosen" -> 170;
      case "Demand or choice", "Resistor" -> 330;
      default -> column == 0 ? 200 : 80;
    };
  }

  private JPanel foot() {
    JPanel foot = Theme.style(new JPanel(new BorderLayout(12, 0)), "plain");
    JScrollPane scroll = new JScrollPane(words);
    scroll.setPreferredSize(new Dimension(0, WORDS_HEIGHT));
    foot.add(scroll, BorderLayout.CENTER);
    JPanel button = Theme.style(new JPanel(new BorderLayout()), "plain");
    button.add(apply, BorderLayout.NORTH);
    foot.add(button, BorderLayout.EAST);
    return foot;
  }

  /**
   * Shows other proposals, the first one chosen.
   *
   * @param otherwise what to say when there is none
   */
  void show(List<Proposal> wanted, String otherwise) {
    proposals = List.copyOf(wanted);
    rows.fireTableDataChanged();
    words.setText(otherwise);
    apply.setEnabled(false);
    if (!proposals.isEmpty()) {
      table.setRowSelectionInterval(0, 0);
    }
  }

  /** Hides the button where nothing is ever applied. */
  ProposalTable withoutApply() {
    apply.setVisible(false);
    return this;
  }

  /** The row that is chosen. */
  int chosenRow() {
    return table.getSelectedRow();
  }

  private Optional<Proposal> chosen() {
    int row = table.getSelectedRow();
    return row < 0 || row >= proposals.size() ? Optional.empty() : Optional.of(proposals.get(row));
  }

  private void showChosen() {
    chosen()
        .ifPresent(
            proposal -> {
              words.setText(proposal.says());
              words.setCaretPosition(0);
              apply.setEnabled(!proposal.changes().isEmpty());
            });
  }

  /** The proposals as rows. */
  private final class Rows extends AbstractTableModel {
    @Override
    public int getRowCount() {
      return proposals.size();
    }

    @Override
    public int getColumnCount() {
      return columns.size();
    }

    @Override
    public String getColumnName(int column) {
      return columns.get(column);
    }

    @Override
    public Object getValueAt(int row, int column) {
      return proposals.get(row).cells().get(column);
    }
  }
}
