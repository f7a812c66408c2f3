package loopwright.file;

import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.SplittableRandom;

/** A file spoilt by a seed: the same seed spoils the same file the same way. */
final class Mutant {
  private static final List<String> HOSTILE =
      List.of(
          "1e400",
          "-0",
          "NaN",
          "Infinity",
          "-1e-400",
          "9".repeat(500),
          "1e999999999",
          "null",
          "true",
          "[]",
          "{}",
          "\"\"",
          "\"NaN\"",
          "\"1e400\"",
          "\"4k7k\"",
          "\"../../etc/passwd\"",
          "\"<script>alert(1)</script>\"",
          "\"\\u0000\"",
          "\"\\ud800\"",
          "\"a.b\"",
          "\uFEFF",
          "\u202E",
          "{\"loopwright\":1,\"loopwright\":1}",
          "[".repeat(5000),
          "{\"a\":".repeat(5000));

  private Mutant() {}

  /** One to four changes to a text, as bytes, so that the encoding breaks too. */
  static byte[] of(String text, long seed) {
    SplittableRandom random = new SplittableRandom(seed);
    byte[] bytes = text.getBytes(StandardCharsets.UTF_8);
    int changes = 1 + random.nextInt(4);
    for (int i = 0; i < changes; i++) {
      bytes = changed(bytes, random);
    }
    return bytes;
  }

  private static byte[] changed(byte[] bytes, SplittableRandom random) {
    int from = random.nextInt(bytes.length + 1);
    int to = Math.min(bytes.length, from + random.nextInt(40));
    switch (random.nextInt(6)) {
      case 0: // a stretch is lost
        return spliced(bytes, from, to, new byte[0]);
      case 1: // a stretch stands twice
        return spliced(bytes, to, to, part(bytes, from, to));
      case 2: // one byte is another
        return spliced(
            bytes, from, Math.min(bytes.length, from + 1), new byte[] {(byte) random.nextInt(256)});
      case 3: // the end is cut off
        return random.nextInt(4) == 0 ? part(bytes, 0, from) : bytes;
      default: // a value is one that nobody means
        return withValue(bytes, from, random);
    }
  }

  private static byte[] withValue(byte[] bytes, int from, SplittableRandom random) {
    String text = new String(bytes, StandardCharsets.ISO_8859_1);
    int colon = text.indexOf(": ", from);
    int end = colon < 0 ? -1 : text.indexOf('\n', colon);
    byte[] value = HOSTILE.get(random.nextInt(HOSTILE.size())).getBytes(StandardCharsets.UTF_8);
    if (end < 0) {
      return spliced(bytes, from, from, value);
    }
    int stop = text.charAt(end - 1) == ',' ? end - 1 : end;
    return spliced(bytes, colon + 2, stop, value);
  }

  private static byte[] part(byte[] bytes, int from, int to) {
    return java.util.Arrays.copyOfRange(bytes, from, to);
  }

  private static byte[] spliced(byte[] bytes, int from, int to, byte[] between) {
    byte[] result = new byte[from + between.length + bytes.length - to];
    System.arraycopy(bytes, 0, result, 0, from);
    System.arraycopy(between, 0, result, from, between.length);
    System.arraycopy(bytes, to, result, from + between.length, bytes.length - to);
    return result;
  }
}
