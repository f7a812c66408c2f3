package loopwright.file;

import java.io.IOException;
import java.nio.file.DirectoryStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import loopwright.design.DesignException;
import loopwright.part.PartRecord;
import loopwright.part.RecordShelf;
import loopwright.part.Shelf;

/**
 * The user's own records before those that ship with the program.
 *
 * @param shelf all records; the user's win
 * @param problems what is wrong with files of the user's folder, a sentence each; such a file does
 *     not hide the others
 */
public record Shelves(Shelf shelf, List<String> problems) {
  /** Keeps its own copy of the problems. */
  public Shelves {
    problems = List.copyOf(problems);
  }

  /** The user's own folder: {@code .loopwright/shelf} at home. */
  public static Path usersFolder() {
    return Path.of(System.getProperty("user.home"), ".loopwright", "shelf");
  }

  /**
   * Reads every {@code .json} file of a folder, in the order of their names, and what ships.
   *
   * @param folder the user's own; need not be there
   */
  public static Shelves load(Path folder) {
    ShelfFile reader = new ShelfFile();
    Map<String, PartRecord> own = new LinkedHashMap<>();
    List<String> problems = new ArrayList<>();
    for (Path file : files(folder, problems)) {
      try {
        RecordShelf records = reader.read(file);
        records.names().forEach(name -> own.put(name, records.find(name).orElseThrow()));
      } catch (FileException e) {
        problems.add(e.getMessage());
      } catch (DesignException e) {
        problems.add(file + ": " + e.getMessage());
      }
    }
    return new Shelves(new RecordShelf(own).before(reader.shipped()), problems);
  }

  private static List<Path> files(Path folder, List<String> problems) {
    List<Path> files = new ArrayList<>();
    if (Files.isDirectory(folder)) {
      try (DirectoryStream<Path> stream = Files.newDirectoryStream(folder, "*.json")) {
        stream.forEach(files::add);
      } catch (IOException e) {
        problems.add(folder + ": the folder cannot be read");
      }
      files.sort(null);
    }
    return files;
  }
}
