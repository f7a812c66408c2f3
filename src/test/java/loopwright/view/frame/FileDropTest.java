package loopwright.view.frame;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.datatransfer.DataFlavor;
import java.awt.datatransfer.StringSelection;
import java.awt.datatransfer.Transferable;
import java.io.File;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import javax.swing.JPanel;
import javax.swing.TransferHandler.TransferSupport;
import org.junit.jupiter.api.Test;

/** A file that is dropped is opened; anything else is not taken. */
class FileDropTest {
  private final List<Path> dropped = new ArrayList<>();
  private final FileDrop drop = new FileDrop(dropped::add);

  /** Files as a desktop hands them over. */
  private record Files(List<File> files) implements Transferable {
    @Override
    public DataFlavor[] getTransferDataFlavors() {
      return new DataFlavor[] {DataFlavor.javaFileListFlavor};
    }

    @Override
    public boolean isDataFlavorSupported(DataFlavor flavor) {
      return flavor.equals(DataFlavor.javaFileListFlavor);
    }

    @Override
    public Object getTransferData(DataFlavor flavor) {
      return files;
    }
  }

  private boolean offer(Transferable what) {
    TransferSupport support = new TransferSupport(new JPanel(), what);
    return drop.canImport(support) && drop.importData(support);
  }

  @Test
  void theFirstFileIsTaken() {
    assertThat(offer(new Files(List.of(new File("coil.json"), new File("other.json"))))).isTrue();
    assertThat(dropped).containsExactly(Path.of("coil.json"));
  }

  @Test
  void textAndEmptyHandsAreNotTaken() {
    assertThat(offer(new StringSelection("coil.json"))).isFalse();
    assertThat(offer(new Files(List.of()))).isFalse();
    assertThat(dropped).isEmpty();
  }
}
