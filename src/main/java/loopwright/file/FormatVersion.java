package loopwright.file;

import loopwright.design.Design;

/**
 * The version of the format that a file says it is in. Version 1 is the first; there is nothing
 * older to bring forward yet. When version 2 comes, this is where a file of version 1 is turned
 * into one of version 2 before it is bound.
 */
final class FormatVersion {
  static final String MEMBER = "loopwright";

  private FormatVersion() {}

  /**
   * Checks that this program can read the file.
   *
   * @param file the whole of it
   * @param where name of the file, for messages
   * @throws FileException when the version is missing, no whole number, newer, or never was
   */
  static void check(Json.Block file, String where) {
    Json json =
        file.get(MEMBER)
            .orElseThrow(
                () ->
                    new FileException(
                        where
                            + ": found no field loopwright, expected the version of the format,"
                            + " \"loopwright\": "
                            + Design.VERSION));
    double version = json instanceof Json.Number number ? value(number) : Double.NaN;
    if (version != Math.rint(version)) {
      throw new FileException(
          where
              + ": loopwright: found "
              + json.found()
              + ", expected the version of the format, the whole number "
              + Design.VERSION);
    }
    if (version > Design.VERSION) {
      throw new FileException(
          where
              + ": this file is of format version "
              + json.found()
              + "; this program reads up to "
              + Design.VERSION);
    }
    if (version < 1) {
      throw new FileException(
          where
              + ": loopwright: found "
              + json.found()
              + ", expected the version of the format; the first was 1");
    }
  }

  private static double value(Json.Number number) {
    return Double.parseDouble(number.literal());
  }
}
