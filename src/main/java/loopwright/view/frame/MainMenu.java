package loopwright.view.frame;

import java.awt.event.ActionEvent;
import java.awt.event.InputEvent;
import java.awt.event.KeyEvent;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Consumer;
import javax.swing.ButtonGroup;
import javax.swing.JMenu;
import javax.swing.JMenuBar;
import javax.swing.JMenuItem;
import javax.swing.JRadioButtonMenuItem;
import javax.swing.KeyStroke;
import loopwright.design.Design;
import loopwright.design.Hookup;
import loopwright.session.Snapshot;
import loopwright.view.study.Studies;
import loopwright.view.theme.Theme;

/** The menu bar. */
final class MainMenu extends JMenuBar {
  private static final int SHORTCUTS = 9;

  private final JMenuItem undo;
  private final JMenuItem redo;
  private final JMenu hookups = new JMenu("Hookup");
  private final JMenu recent = new JMenu("Open recent");
  private final transient Commands commands;
  private final transient Consumer<String> chooseHookup;
  private transient List<String> names = List.of();

  /**
   * @param commands carried out by the items
   * @param theme the present theme
   * @param chooseTheme takes the theme that a person chooses
   * @param chooseHookup takes the hookup that a person chooses
   * @param studies opens the dialogs that work something out
   * @param beginnings designs to begin with, by a short name
   * @param quit leaves the program
   */
  MainMenu(
      Commands commands,
      Theme theme,
      Consumer<Theme> chooseTheme,
      Consumer<String> chooseHookup,
      Studies studies,
      Map<String, Design> beginnings,
      Runnable quit) {
    this.chooseHookup = chooseHookup;
    undo = item("Undo", "edit.undo", 'U', control(KeyEvent.VK_Z), commands::undo);
    redo = item("Redo", "edit.redo", 'R', controlShift(KeyEvent.VK_Z), commands::redo);
    this.commands = commands;
    add(fileMenu(commands, studies, beginnings, quit));
    add(
        menu(
            "Edit",
            'E',
            undo,
            redo,
            item("Whole design…", "edit.whole", 'W', control(KeyEvent.VK_E), studies::whole),
            item("Copy this hookup", "edit.copyHookup", 'C', null, commands::copyHookup),
            item("Remove this hookup", "edit.removeHookup", 'M', null, commands::removeHookup)));
    add(viewMenu(commands, studies, theme, chooseTheme));
    add(workMenu(studies));
    add(menu("Help", 'H', item("About Loopwright", "help.about", 'A', null, commands::about)));
  }

  /** Offers the files that were open lately. */
  void showRecent(List<Path> files) {
    FileMenus.fill(recent, files, commands::openFile);
  }

  private JMenu fileMenu(
      Commands commands, Studies studies, Map<String, Design> beginnings, Runnable quit) {
    recent.setName("file.recent");
    recent.setMnemonic('R');
    recent.setEnabled(false);
    JMenu file =
        menu(
            "File",
            'F',
            FileMenus.beginnings(beginnings, commands::begin),
            item(
                "New from specification…",
                "file.first",
                'I',
                control(KeyEvent.VK_N),
                () -> studies.first(commands::take)),
            item("Open…", "file.open", 'O', control(KeyEvent.VK_O), commands::open),
            recent,
            item("Save", "file.save", 'S', control(KeyEvent.VK_S), commands::save),
            item("Save as…", "file.saveAs", 'A', controlShift(KeyEvent.VK_S), commands::saveAs));
    file.addSeparator();
    file.add(item("Bench sheet…", "file.sheet", 'B', control(KeyEvent.VK_P), studies::sheet));
    file.addSeparator();
    file.add(item("Quit", "file.quit", 'Q', control(KeyEvent.VK_Q), quit));
    return file;
  }

  private JMenu viewMenu(
      Commands commands, Studies studies, Theme present, Consumer<Theme> chooseTheme) {
    JMenu view = menu("View", 'V');
    ButtonGroup group = new ButtonGroup();
    for (Theme theme : Theme.values()) {
      String title = theme == Theme.LIGHT ? "Light" : "Dark";
      JMenuItem item = new JRadioButtonMenuItem(title, theme == present);
      prepare(item, "view." + title.toLowerCase(java.util.Locale.ROOT), title.charAt(0), null);
      item.addActionListener(event -> chooseTheme.accept(theme));
      group.add(item);
      view.add(item);
    }
    view.addSeparator();
    hookups.setMnemonic('H');
    hookups.setName("view.hookup");
    view.add(hookups);
    view.add(item("Schematic…", "view.schematic", 'S', null, studies::schematic));
    view.add(item("Parts: printed and modelled…", "view.parts", 'P', null, commands::parts));
    return view;
  }

  private static JMenu workMenu(Studies studies) {
    return menu(
        "Work out",
        'W',
        item("Size a divider…", "work.divider", 'D', control(KeyEvent.VK_D), studies::divider),
        item("Trim offset and gain…", "work.trim", 'R', control(KeyEvent.VK_J), studies::trim),
        item("Cure an oscillation…", "work.cure", 'C', control(KeyEvent.VK_K), studies::cure),
        item("Stability…", "work.stability", 'T', control(KeyEvent.VK_L), studies::stability),
        item("Steps and oscillation…", "work.time", 'O', control(KeyEvent.VK_R), studies::time),
        item("Distortion…", "work.distortion", 'I', null, studies::distortion),
        item("Noise and impedance…", "work.spectra", 'N', null, studies::spectra),
        item("Heat…", "work.heat", 'H', control(KeyEvent.VK_H), studies::heat),
        item("Spread…", "work.spread", 'S', control(KeyEvent.VK_T), studies::spread),
        item(
            "Bench: compare and explain…",
            "work.bench",
            'B',
            control(KeyEvent.VK_B),
            studies::bench));
  }

  /** Shows what can be undone, and the hookups. */
  void show(Snapshot snapshot) {
    name(undo, "Undo", snapshot.undoable());
    name(redo, "Redo", snapshot.redoable());
    List<String> wanted = snapshot.design().hookups().stream().map(Hookup::name).toList();
    if (!wanted.equals(names)) {
      names = wanted;
      rebuildHookups();
    }
    for (int i = 0; i < hookups.getItemCount(); i++) {
      hookups.getItem(i).setSelected(names.get(i).equals(snapshot.hookup()));
    }
  }

  private static void name(JMenuItem item, String what, Optional<String> edit) {
    item.setEnabled(edit.isPresent());
    item.setText(edit.map(named -> what + " " + named).orElse(what));
  }

  private void rebuildHookups() {
    hookups.removeAll();
    ButtonGroup group = new ButtonGroup();
    for (int i = 0; i < names.size(); i++) {
      String name = names.get(i);
      JMenuItem item = new JRadioButtonMenuItem(name);
      item.setName("view.hookup." + name);
      if (i < SHORTCUTS) {
        item.setAccelerator(control(KeyEvent.VK_1 + i));
      }
      item.addActionListener(event -> chooseHookup.accept(name));
      group.add(item);
      hookups.add(item);
    }
  }

  private static JMenu menu(String title, char mnemonic, JMenuItem... items) {
    JMenu menu = new JMenu(title);
    menu.setName(title.toLowerCase(java.util.Locale.ROOT).replace(' ', '-'));
    menu.setMnemonic(mnemonic);
    for (JMenuItem item : items) {
      menu.add(item);
    }
    return menu;
  }

  private static JMenuItem item(
      String title, String name, char mnemonic, KeyStroke accelerator, Runnable action) {
    JMenuItem item = new JMenuItem(title);
    prepare(item, name, mnemonic, accelerator);
    item.addActionListener((ActionEvent event) -> action.run());
    return item;
  }

  private static void prepare(JMenuItem item, String name, char mnemonic, KeyStroke accelerator) {
    item.setName(name);
    item.setMnemonic(mnemonic);
    item.setAccelerator(accelerator);
  }

  private static KeyStroke control(int key) {
    return KeyStroke.getKeyStroke(key, InputEvent.CTRL_DOWN_MASK);
  }

  private static KeyStroke controlShift(int key) {
    return KeyStroke.getKeyStroke(key, InputEvent.CTRL_DOWN_MASK | InputEvent.SHIFT_DOWN_MASK);
  }
}
