package loopwright.view.form;

import java.awt.BorderLayout;
import java.util.ArrayList;
import java.util.Enumeration;
import java.util.List;
import java.util.Optional;
import java.util.function.Consumer;
import java.util.function.Function;
import java.util.function.Supplier;
import javax.swing.JButton;
import javax.swing.JLabel;
import javax.swing.JPanel;
import javax.swing.JScrollPane;
import javax.swing.JSplitPane;
import javax.swing.JTextField;
import javax.swing.JTree;
import javax.swing.tree.DefaultMutableTreeNode;
import javax.swing.tree.DefaultTreeModel;
import javax.swing.tree.TreePath;
import javax.swing.tree.TreeSelectionModel;
import loopwright.design.Design;
import loopwright.design.DesignException;
import loopwright.design.DesignPath;
import loopwright.part.Shelf;
import loopwright.session.Edit;
import loopwright.session.Snapshot;
import loopwright.view.form.Containers.Container;
import loopwright.view.theme.Theme;
import net.miginfocom.swing.MigLayout;

/**
 * Every field of the design: a tree of its blocks, lists and entries, and the form of what is
 * chosen in it. Entries are added, copied, renamed and removed here.
 */
public final class WholePanel extends JPanel {
  private static final List<String> BLOCKS =
      List.of("", "rails", "surroundings", "amplifier", "tolerances", "drawer", "bench.record");

  private final transient Supplier<Snapshot> now;
  private final transient Consumer<Edit> listener;
  private final DefaultMutableTreeNode root = new DefaultMutableTreeNode(Place.block(""));
  private final DefaultTreeModel model = new DefaultTreeModel(root);
  private final JTree tree = new JTree(model);
  private final RowsPanel rows;
  private final JTextField name = new JTextField();
  private final JLabel complaint = Theme.style(new JLabel(" "), "failing");
  private transient Design shown;
  private boolean filling;

  /** A node of the tree: a block, a container, or an entry of one. */
  private record Place(String path, Optional<Container> container, String key, String title) {
    static Place block(String path) {
      return new Place(path, Optional.empty(), "", title(path));
    }

    static Place of(Container container) {
      return new Place(container.path(), Optional.of(container), "", title(container.path()));
    }

    static Place entry(Container container, String key) {
      return new Place(container.path() + "." + key, Optional.of(container), key, key);
    }

    private static String title(String path) {
      String last = path.substring(path.lastIndexOf('.') + 1);
      return path.isEmpty() ? "Design" : Labels.humanised(last);
    }

    boolean isContainer() {
      return container.isPresent() && key.isEmpty();
    }

    @Override
    public String toString() {
      return title;
    }
  }

  /**
   * @param now the present moment
   * @param shelf parts to choose from beside those of the design
   * @param listener takes the edits that a person makes
   */
  public WholePanel(Supplier<Snapshot> now, Shelf shelf, Consumer<Edit> listener) {
    super(new BorderLayout(0, 8));
    Theme.style(this, "card");
    this.now = now;
    this.listener = listener;
    rows = new RowsPanel(() -> now.get().design(), shelf, new Labels(), listener);
    tree.setName("whole.tree");
    tree.getAccessibleContext().setAccessibleName("Parts of the design");
    tree.getSelectionModel().setSelectionMode(TreeSelectionModel.SINGLE_TREE_SELECTION);
    tree.addTreeSelectionListener(
        event -> {
          if (!filling) {
            showRows();
          }
        });
    JPanel column = new Column();
    column.add(rows, "growx, wmin 0");
    JScrollPane form = new JScrollPane(column);
    form.getVerticalScrollBar().setUnitIncrement(16);
    JSplitPane split = new JSplitPane(JSplitPane.HORIZONTAL_SPLIT, new JScrollPane(tree), form);
    split.setDividerLocation(260);
    add(split, BorderLayout.CENTER);
    add(foot(), BorderLayout.SOUTH);
    show(now.get());
    tree.setSelectionRow(0);
  }

  private JPanel foot() {
    JPanel foot =
        Theme.style(new JPanel(new MigLayout("insets 0, fillx, wrap 1", "[grow,fill]")), "plain");
    JPanel buttons = Theme.style(new JPanel(new MigLayout("insets 0")), "plain");
    buttons.add(button("Add entry", "add", 'A', this::add));
    buttons.add(button("Copy entry", "copy", 'C', this::copy));
    buttons.add(button("Remove entry", "remove", 'R', this::remove));
    JLabel label = new JLabel("Name");
    label.setDisplayedMnemonic('N');
    label.setLabelFor(name);
    name.setName("whole.name");
    name.addActionListener(event -> rename());
    buttons.add(label, "gapleft 14");
    buttons.add(name, "w 160!");
    buttons.add(button("Rename", "rename", 'E', this::rename));
    complaint.setName("whole.complaint");
    foot.add(buttons);
    foot.add(complaint, "wmin 0");
    return foot;
  }

  private static JButton button(String text, String key, char mnemonic, Runnable action) {
    JButton button = Theme.style(new JButton(text), "pill");
    button.setName("whole." + key);
    button.setMnemonic(mnemonic);
    button.addActionListener(event -> action.run());
    return button;
  }

  /** Shows another moment. */
  public void show(Snapshot snapshot) {
    if (snapshot.design().equals(shown)) {
      return;
    }
    shown = snapshot.design();
    Optional<String> chosen = chosen().map(Place::path);
    filling = true;
    root.removeAllChildren();
    for (String block : BLOCKS) {
      if (!block.isEmpty() && DesignPath.find(shown, block).isPresent()) {
        DefaultMutableTreeNode node = new DefaultMutableTreeNode(Place.block(block));
        root.add(node);
        if (!block.startsWith("bench")) {
          addContainers(node, block);
        }
      }
    }
    Containers.in(shown, "").stream()
        .filter(container -> BLOCKS.stream().noneMatch(b -> within(container.path(), b)))
        .forEach(container -> addContainer(root, container));
    model.reload();
    for (int i = 0; i < tree.getRowCount() && i < 40; i++) {
      if (tree.getPathForRow(i).getPathCount() < 2) {
        tree.expandRow(i);
      }
    }
    filling = false;
    chosen.ifPresent(this::select);
    showRows();
  }

  private static boolean within(String path, String block) {
    return !block.isEmpty() && !block.startsWith("bench") && path.startsWith(block + ".");
  }

  private void addContainers(DefaultMutableTreeNode node, String block) {
    Containers.in(shown, block).forEach(container -> addContainer(node, container));
  }

  private void addContainer(DefaultMutableTreeNode parent, Container container) {
    DefaultMutableTreeNode node = new DefaultMutableTreeNode(Place.of(container));
    parent.add(node);
    for (String key : Containers.keys(shown, container)) {
      Place entry = Place.entry(container, key);
      DefaultMutableTreeNode child = new DefaultMutableTreeNode(entry);
      node.add(child);
      addContainers(child, entry.path());
    }
  }

  /** Chooses the place of a path, if it is there. */
  void select(String path) {
    Enumeration<?> nodes = root.depthFirstEnumeration();
    while (nodes.hasMoreElements()) {
      DefaultMutableTreeNode node = (DefaultMutableTreeNode) nodes.nextElement();
      if (((Place) node.getUserObject()).path().equals(path)) {
        tree.setSelectionPath(new TreePath(node.getPath()));
        tree.scrollPathToVisible(new TreePath(node.getPath()));
        return;
      }
    }
  }

  /** Every place of the tree. */
  List<String> places() {
    List<String> places = new ArrayList<>();
    Enumeration<?> nodes = root.preorderEnumeration();
    while (nodes.hasMoreElements()) {
      Place place = (Place) ((DefaultMutableTreeNode) nodes.nextElement()).getUserObject();
      if (!place.isContainer()) {
        places.add(place.path());
      }
    }
    return places;
  }

  private Optional<Place> chosen() {
    return Optional.ofNullable((DefaultMutableTreeNode) tree.getLastSelectedPathComponent())
        .map(node -> (Place) node.getUserObject());
  }

  private void showRows() {
    complaint.setText(" ");
    Optional<Place> place = chosen();
    name.setText(place.map(Place::key).orElse(""));
    rows.show(
        place
            .filter(chosen -> !chosen.isContainer())
            .map(chosen -> Row.whole(shown, chosen.path()))
            .orElse(List.of()));
  }

  private void add() {
    attempt(place -> WholeEdits.add(shown, place.container().orElseThrow(), Optional.empty()));
  }

  private void copy() {
    attempt(
        place -> {
          if (place.key().isEmpty()) {
            throw new DesignException(place.path(), "found a list, expected one of its entries");
          }
          return WholeEdits.add(shown, place.container().orElseThrow(), Optional.of(place.key()));
        });
  }

  private void remove() {
    attempt(
        place -> {
          if (place.key().isEmpty()) {
            throw new DesignException(place.path(), "found a list, expected one of its entries");
          }
          return WholeEdits.remove(shown, place.container().orElseThrow(), place.key());
        });
  }

  private void rename() {
    String wanted = name.getText().strip();
    attempt(
        place -> WholeEdits.rename(shown, place.container().orElseThrow(), place.key(), wanted));
  }

  private void attempt(Function<Place, Edit> edit) {
    Optional<Place> place = chosen().filter(chosen -> chosen.container().isPresent());
    if (place.isEmpty()) {
      complaint.setText("Choose a list, or an entry of one, in the tree.");
      return;
    }
    try {
      listener.accept(edit.apply(place.get()));
      complaint.setText(" ");
    } catch (DesignException e) {
      complaint.setText(e.problems().get(0).message());
    }
  }
}
