package loopwright.view.study;

import java.awt.Component;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Locale;
import java.util.Optional;
import javax.swing.JFileChooser;
import javax.swing.JOptionPane;
import javax.swing.filechooser.FileNameExtensionFilter;
import loopwright.sheet.SheetFile;

/** Asks where a sheet is to be saved, and as what. */
final class SheetPlace {
  private final Component beside;
  private Optional<Path> last = Optional.empty();

  /**
   * @param beside the dialogs stand beside it
   */
  SheetPlace(Component beside) {
    this.beside = beside;
  }

  /** The file that a person chooses; empty when none is wanted. */
  Optional<Path> ask(String designName) {
    JFileChooser chooser = new JFileChooser();
    chooser.setDialogTitle("Save bench sheet");
    chooser.setAcceptAllFileFilterUsed(false);
    for (SheetFile kind : SheetFile.values()) {
      chooser.addChoosableFileFilter(
          new FileNameExtensionFilter(
              kind.name() + " (*" + kind.suffix() + ")", kind.suffix().substring(1)));
    }
    chooser.setFileFilter(chooser.getChoosableFileFilters()[0]);
    Path suggested = Path.of(fileName(designName));
    chooser.setSelectedFile(
        last.map(path -> path.resolveSibling(suggested))
            .orElse(chooser.getCurrentDirectory().toPath().resolve(suggested))
            .toFile());
    if (chooser.showSaveDialog(beside) != JFileChooser.APPROVE_OPTION) {
      return Optional.empty();
    }
    String wanted = ((FileNameExtensionFilter) chooser.getFileFilter()).getExtensions()[0];
    Path chosen = withSuffix(chooser.getSelectedFile().toPath(), wanted);
    last = Optional.of(chosen);
    return Files.exists(chosen) && !mayReplace(chosen) ? Optional.empty() : last;
  }

  /** A name that any system takes, made of the design's. */
  static String fileName(String designName) {
    String plain = designName.strip().toLowerCase(Locale.ROOT).replaceAll("[^\\p{L}\\p{N}]+", "-");
    String trimmed = plain.replaceAll("^-|-$", "");
    return (trimmed.isEmpty() ? "design" : trimmed) + "-sheet" + SheetFile.PDF.suffix();
  }

  /** The file itself where its name says what it is to be, else with the chosen suffix. */
  static Path withSuffix(Path file, String wanted) {
    String name = file.getFileName().toString();
    Optional<SheetFile> named = SheetFile.of(file);
    if (named.isPresent() && named.get().suffix().equals("." + wanted)) {
      return file;
    }
    String bare =
        named.map(kind -> name.substring(0, name.length() - kind.suffix().length())).orElse(name);
    return file.resolveSibling(bare + "." + wanted);
  }

  private boolean mayReplace(Path file) {
    return JOptionPane.showConfirmDialog(
            beside,
            file.getFileName() + " is there already. Replace it?",
            "Save bench sheet",
            JOptionPane.YES_NO_OPTION,
            JOptionPane.WARNING_MESSAGE)
        == JOptionPane.YES_OPTION;
  }
}
