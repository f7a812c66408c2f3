package loopwright.view.frame;

import java.awt.datatransfer.DataFlavor;
import java.awt.datatransfer.UnsupportedFlavorException;
import java.io.File;
import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import java.util.function.Consumer;
import javax.swing.TransferHandler;

/** Takes a file that is dropped onto the window. */
final class FileDrop extends TransferHandler {
  private final transient Consumer<Path> onDrop;

  /**
   * @param onDrop takes the first file that is dropped
   */
  FileDrop(Consumer<Path> onDrop) {
    this.onDrop = onDrop;
  }

  @Override
  public boolean canImport(TransferSupport support) {
    return support.isDataFlavorSupported(DataFlavor.javaFileListFlavor);
  }

  @Override
  public boolean importData(TransferSupport support) {
    if (!canImport(support)) {
      return false;
    }
    try {
      List<?> files =
          (List<?>) support.getTransferable().getTransferData(DataFlavor.javaFileListFlavor);
      if (files.isEmpty()) {
        return false;
      }
      onDrop.accept(((File) files.get(0)).toPath());
      return true;
    } catch (UnsupportedFlavorException | IOException e) {
      return false;
    }
  }
}
