package loopwright.view.frame;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.function.Consumer;
import javax.swing.JMenu;
import javax.swing.JMenuItem;
import loopwright.design.Design;

/** The menus of beginnings and of recent files. */
final class FileMenus {
  private static final int MNEMONICS = 9;

  private FileMenus() {}

  /** A menu of designs to begin with. */
  static JMenu beginnings(Map<String, Design> beginnings, Consumer<Design> onBegin) {
    JMenu menu = new JMenu("New from");
    menu.setName("file.new");
    menu.setMnemonic('N');
    menu.setEnabled(!beginnings.isEmpty());
    beginnings.forEach(
        (name, design) -> {
          JMenuItem item = new JMenuItem(design.name());
          item.setName("file.new." + name);
          item.addActionListener(event -> onBegin.accept(design));
          menu.add(item);
        });
    return menu;
  }

  /** Fills the menu of recent files; one that is gone is there, but cannot be chosen. */
  static void fill(JMenu menu, List<Path> recent, Consumer<Path> onOpen) {
    menu.removeAll();
    menu.setEnabled(!recent.isEmpty());
    for (int i = 0; i < recent.size(); i++) {
      Path file = recent.get(i);
      boolean there = Files.isRegularFile(file);
      String number = i < MNEMONICS ? (i + 1) + "  " : "";
      JMenuItem item =
          new JMenuItem(number + file.getFileName() + (there ? "" : " (not there any more)"));
      if (i < MNEMONICS) {
        item.setMnemonic('1' + i);
      }
      item.setName("file.recent." + i);
      item.setToolTipText(file.toString());
      item.setEnabled(there);
      item.addActionListener(event -> onOpen.accept(file));
      menu.add(item);
    }
  }
}
