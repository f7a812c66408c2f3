package loopwright.view.frame;

import java.awt.Component;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.ZoneId;
import java.time.format.DateTimeFormatter;
import java.util.Locale;
import java.util.Optional;
import javax.swing.JFileChooser;
import javax.swing.JOptionPane;
import javax.swing.JTextArea;
import javax.swing.filechooser.FileNameExtensionFilter;
import loopwright.design.Design;
import loopwright.file.Recovery;
import loopwright.view.theme.Theme;

/** Asks in dialogs before the window. */
final class SwingDialogs implements Dialogs {
  private static final String SUFFIX = ".json";
  private static final int COLUMNS = 46;
  private static final DateTimeFormatter WHEN =
      DateTimeFormatter.ofPattern("d MMMM yyyy, HH:mm", Locale.ENGLISH)
          .withZone(ZoneId.systemDefault());

  private final Component window;

  SwingDialogs(Component window) {
    this.window = window;
  }

  @Override
  public Optional<Path> fileToOpen(Optional<Path> present) {
    JFileChooser chooser = chooser("Open design", present);
    return chooser.showOpenDialog(window) == JFileChooser.APPROVE_OPTION
        ? Optional.of(chooser.getSelectedFile().toPath())
        : Optional.empty();
  }

  @Override
  public Optional<Path> fileToSave(Optional<Path> present, String name) {
    JFileChooser chooser = chooser("Save design as", present);
    if (present.isEmpty()) {
      chooser.setSelectedFile(
          chooser.getCurrentDirectory().toPath().resolve(fileName(name)).toFile());
    }
    if (chooser.showSaveDialog(window) != JFileChooser.APPROVE_OPTION) {
      return Optional.empty();
    }
    Path chosen = withSuffix(chooser.getSelectedFile().toPath());
    return !Files.exists(chosen) || mayReplace(chosen) ? Optional.of(chosen) : Optional.empty();
  }

  private static JFileChooser chooser(String title, Optional<Path> present) {
    JFileChooser chooser = new JFileChooser();
    chooser.setDialogTitle(title);
    chooser.setFileFilter(new FileNameExtensionFilter("Designs (*.json)", "json"));
    present.ifPresent(path -> chooser.setSelectedFile(path.toAbsolutePath().toFile()));
    return chooser;
  }

  /** A file name that any system takes, made of the design's name. */
  static String fileName(String name) {
    String plain =
        name.strip().toLowerCase(java.util.Locale.ROOT).replaceAll("[^\\p{L}\\p{N}]+", "-");
    String trimmed = plain.replaceAll("^-|-$", "");
    return (trimmed.isEmpty() ? "design" : trimmed) + SUFFIX;
  }

  static Path withSuffix(Path path) {
    String name = path.getFileName().toString();
    return name.contains(".") ? path : path.resolveSibling(name + SUFFIX);
  }

  private boolean mayReplace(Path file) {
    return JOptionPane.showConfirmDialog(
            window,
            file.getFileName() + " is there already. Replace it?",
            "Save design as",
            JOptionPane.YES_NO_OPTION,
            JOptionPane.WARNING_MESSAGE)
        == JOptionPane.YES_OPTION;
  }

  @Override
  public Answer unsaved(String name) {
    Object[] choices = {"Save", "Do not save", "Cancel"};
    int chosen =
        JOptionPane.showOptionDialog(
            window,
            "“" + name + "” has unsaved edits. Save them?",
            "Unsaved edits",
            JOptionPane.DEFAULT_OPTION,
            JOptionPane.QUESTION_MESSAGE,
            null,
            choices,
            choices[0]);
    return switch (chosen) {
      case 0 -> Answer.SAVE;
      case 1 -> Answer.DISCARD;
      default -> Answer.CANCEL;
    };
  }

  @Override
  public Kept left(Recovery.Left left) {
    Object[] choices = {"Restore", "Discard", "Ask again later"};
    String of = left.of().map(path -> " (" + path.getFileName() + ")").orElse("");
    int chosen =
        JOptionPane.showOptionDialog(
            window,
            "The program ended before “"
                + left.design().name()
                + "”"
                + of
                + " was saved.\nIts state of "
                + WHEN.format(left.when())
                + " was kept. Restore it?",
            "Unsaved work",
            JOptionPane.DEFAULT_OPTION,
            JOptionPane.QUESTION_MESSAGE,
            null,
            choices,
            choices[0]);
    return switch (chosen) {
      case 0 -> Kept.RESTORE;
      case 1 -> Kept.DISCARD;
      default -> Kept.LATER;
    };
  }

  @Override
  public boolean mayOverwrite(Path file) {
    return JOptionPane.showConfirmDialog(
            window,
            file.getFileName()
                + " was changed by something else since it was opened here.\nOverwrite it? "
                + "Otherwise it can be saved under another name.",
            "Changed on disk",
            JOptionPane.YES_NO_OPTION,
            JOptionPane.WARNING_MESSAGE)
        == JOptionPane.YES_OPTION;
  }

  @Override
  public void complain(String what, String why) {
    JOptionPane.showMessageDialog(window, wrapped(why), what, JOptionPane.ERROR_MESSAGE);
  }

  @Override
  public void about() {
    JOptionPane.showMessageDialog(
        window, wrapped(About.TEXT), "About Loopwright", JOptionPane.PLAIN_MESSAGE);
  }

  @Override
  public void parts(Design design) {
    JOptionPane.showMessageDialog(
        window, new PartsPanel(design), "Parts of " + design.name(), JOptionPane.PLAIN_MESSAGE);
  }

  private static JTextArea wrapped(String text) {
    JTextArea area = Theme.style(new JTextArea(text), "message");
    area.setColumns(COLUMNS);
    area.setEditable(false);
    area.setLineWrap(true);
    area.setWrapStyleWord(true);
    // A text area knows its height only once it knows its width.
    area.setSize(area.getPreferredSize().width, Short.MAX_VALUE);
    area.setPreferredSize(
        new java.awt.Dimension(area.getPreferredSize().width, area.getPreferredSize().height));
    return area;
  }
}
