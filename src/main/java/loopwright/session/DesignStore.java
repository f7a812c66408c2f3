package loopwright.session;

import java.io.IOException;
import java.nio.file.Path;
import loopwright.design.Design;

/** Where designs are kept. */
public interface DesignStore {
  /**
   * Reads a design.
   *
   * @throws IOException when it cannot be read; the message is a sentence for a person
   */
  Stored open(Path path) throws IOException;

  /**
   * Writes a design that was never stored before.
   *
   * @throws IOException when it cannot be written; nothing is then lost of what was there
   */
  Stored create(Path path, Design design) throws IOException;

  /** A design as it is stored, with whatever the store needs to keep of its spelling. */
  interface Stored {
    /** The design. */
    Design design();

    /**
     * Writes a changed design, keeping what was not changed as its author wrote it.
     *
     * @throws IOException when it cannot be written; nothing is then lost of what was there
     */
    Stored save(Path path, Design design) throws IOException;
  }
}
