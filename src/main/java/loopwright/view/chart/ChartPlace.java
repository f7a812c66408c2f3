package loopwright.view.chart;

import java.awt.Component;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Locale;
import javax.swing.JFileChooser;
import javax.swing.JOptionPane;
import javax.swing.filechooser.FileNameExtensionFilter;
import loopwright.file.AtomicFile;
import loopwright.file.FileException;

/** Asks where a plot is to be saved, and saves it there. */
final class ChartPlace {
  private static final int LONGEST = 60;

  private final Component beside;

  /**
   * @param beside the dialogs stand beside it
   */
  ChartPlace(Component beside) {
    this.beside = beside;
  }

  /** Asks and saves. */
  void save(String suffix, String title, byte[] content) {
    JFileChooser chooser = new JFileChooser();
    chooser.setDialogTitle("Save plot");
    chooser.setFileFilter(
        new FileNameExtensionFilter(
            suffix.toUpperCase(Locale.ROOT) + " (*." + suffix + ")", suffix));
    chooser.setSelectedFile(
        chooser.getCurrentDirectory().toPath().resolve(fileName(title, suffix)).toFile());
    if (chooser.showSaveDialog(beside) != JFileChooser.APPROVE_OPTION) {
      return;
    }
    Path file = withSuffix(chooser.getSelectedFile().toPath(), suffix);
    if (Files.exists(file) && !mayReplace(file)) {
      return;
    }
    try {
      AtomicFile.write(file, content);
    } catch (FileException e) {
      JOptionPane.showMessageDialog(beside, e.getMessage(), "Save plot", JOptionPane.ERROR_MESSAGE);
    }
  }

  /** A name that any system takes, made of a title. */
  static String fileName(String title, String suffix) {
    String plain = title.strip().toLowerCase(Locale.ROOT).replaceAll("[^\\p{L}\\p{N}]+", "-");
    String trimmed = plain.replaceAll("^-|-$", "");
    String name = trimmed.isEmpty() ? "plot" : trimmed;
    return name.substring(0, Math.min(LONGEST, name.length())) + "." + suffix;
  }

  static Path withSuffix(Path file, String suffix) {
    String name = file.getFileName().toString();
    return name.toLowerCase(Locale.ROOT).endsWith("." + suffix)
        ? file
        : file.resolveSibling(name + "." + suffix);
  }

  private boolean mayReplace(Path file) {
    return JOptionPane.showConfirmDialog(
            beside,
            file.getFileName() + " is there already. Replace it?",
            "Save plot",
            JOptionPane.YES_NO_OPTION,
            JOptionPane.WARNING_MESSAGE)
        == JOptionPane.YES_OPTION;
  }
}
