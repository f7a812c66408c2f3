package loopwright.view.form;

import java.awt.BorderLayout;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Consumer;
import javax.swing.JComboBox;
import javax.swing.JPanel;
import javax.swing.JScrollPane;
import javax.swing.ScrollPaneConstants;
import loopwright.design.Design;
import loopwright.part.Shelf;
import loopwright.session.Edit;
import loopwright.session.Snapshot;
import loopwright.view.theme.Theme;

/** The form of the chosen block of the design, and beneath it what its devices do at rest. */
public final class FormPanel extends JPanel {
  private final transient Labels labels = new Labels();
  private final JComboBox<Titled> chooser = new JComboBox<>();
  private final RowsPanel rows;
  private final RestPanel rest = new RestPanel(labels);
  private final transient List<Consumer<String>> selectListeners = new ArrayList<>();
  private transient Optional<Snapshot> shown = Optional.empty();
  private String selected = "amplifier.inputPair";
  private boolean filling;

  /** A block by its title. */
  private record Titled(Block block, String title) {
    @Override
    public String toString() {
      return title;
    }
  }

  /**
   * @param shelf parts to choose from beside those of the design
   * @param listener takes the edits that a person makes
   */
  public FormPanel(Shelf shelf, Consumer<Edit> listener) {
    super(new BorderLayout(0, 8));
    Theme.style(this, "card");
    rows = new RowsPanel(() -> shown.orElseThrow().design(), shelf, labels, listener);
    chooser.setName("block");
    chooser.setMaximumRowCount(20);
    chooser.getAccessibleContext().setAccessibleName("Part of the design to edit");
    chooser.addActionListener(
        event -> {
          if (!filling && chooser.getSelectedItem() instanceof Titled titled) {
            choose(titled.block().id());
          }
        });
    add(chooser, BorderLayout.NORTH);
    add(scrolling(), BorderLayout.CENTER);
  }

  private JScrollPane scrolling() {
    JPanel column = new Column();
    column.add(rows, "growx, wmin 0");
    column.add(rest, "growx, wmin 0");
    JScrollPane scroll =
        new JScrollPane(
            column,
            ScrollPaneConstants.VERTICAL_SCROLLBAR_AS_NEEDED,
            ScrollPaneConstants.HORIZONTAL_SCROLLBAR_NEVER);
    scroll.getVerticalScrollBar().setUnitIncrement(16);
    scroll.setBorder(null);
    return scroll;
  }

  /** Calls the listener with the id of a block that a person chooses here. */
  public void onSelect(Consumer<String> listener) {
    selectListeners.add(listener);
  }

  /** Shows the form of a block; one that the design does not have is passed over. */
  public void select(String id) {
    if (shown.isEmpty()) {
      selected = id;
    } else if (blocks(shown.get()).stream().anyMatch(block -> block.id().equals(id))) {
      selected = id;
      show(shown.get());
    }
  }

  /**
   * The id of the block that has a form for a place, if there is one.
   *
   * @param where a path of the design, the role of a device, or the name of a block
   */
  public Optional<String> blockAt(String where) {
    return shown.flatMap(snapshot -> Block.holding(blocks(snapshot), where).map(Block::id));
  }

  /** Shows the present state of the chosen block. */
  public void show(Snapshot snapshot) {
    shown = Optional.of(snapshot);
    List<Block> blocks = blocks(snapshot);
    Block block =
        blocks.stream()
            .filter(candidate -> candidate.id().equals(selected))
            .findFirst()
            .orElse(blocks.get(1));
    fillChooser(blocks, block);
    rows.show(Row.of(snapshot.design(), block.path()));
    rest.show(snapshot, block);
  }

  private static List<Block> blocks(Snapshot snapshot) {
    Design design = snapshot.design();
    return Block.of(design, snapshot.hookup());
  }

  private void fillChooser(List<Block> blocks, Block block) {
    filling = true;
    List<Titled> titles =
        blocks.stream().map(each -> new Titled(each, labels.block(each.id()))).toList();
    List<Titled> present = new ArrayList<>();
    for (int i = 0; i < chooser.getItemCount(); i++) {
      present.add(chooser.getItemAt(i));
    }
    if (!titles.equals(present)) {
      chooser.removeAllItems();
      titles.forEach(chooser::addItem);
    }
    chooser.setSelectedItem(new Titled(block, labels.block(block.id())));
    filling = false;
  }

  private void choose(String id) {
    if (!id.equals(selected)) {
      select(id);
      selectListeners.forEach(listener -> listener.accept(id));
    }
  }
}
