package loopwright.file;

import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;

/** The checksum SHA-256 (FIPS 180-4). */
final class Sha256 {
  private Sha256() {}

  /** Of bytes, as 64 hexadecimal digits in small letters. */
  static String of(byte[] content) {
    try {
      return HexFormat.of().formatHex(MessageDigest.getInstance("SHA-256").digest(content));
    } catch (NoSuchAlgorithmException e) {
      throw new IllegalStateException("every Java has SHA-256", e);
    }
  }
}
