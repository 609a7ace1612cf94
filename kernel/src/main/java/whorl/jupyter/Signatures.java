package whorl.jupyter;

import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.Arrays;
import java.util.List;
import org.jspecify.annotations.Nullable;

/**
 * Signs messages, and tells whether one comes from somebody who knows the key. For any thread.
 *
 * <p>The keyed hash of RFC 2104 over SHA-256, written out, for to load the JDK's takes a tenth of a
 * second at every start.
 */
final class Signatures {
  private static final int BLOCK = 64;
  private static final int INNER_PAD = 0x36;
  private static final int OUTER_PAD = 0x5C;

  /** Both begun with the key and never used themselves, only copied; null without a key. */
  private final @Nullable MessageDigest inner;

  private final @Nullable MessageDigest outer;

  /** With a key; an empty one means that nothing is signed. */
  Signatures(String key) {
    byte[] bytes = key.getBytes(StandardCharsets.UTF_8);
    inner = bytes.length == 0 ? null : begun(bytes, INNER_PAD);
    outer = bytes.length == 0 ? null : begun(bytes, OUTER_PAD);
  }

  private static MessageDigest begun(byte[] key, int pad) {
    MessageDigest digest = sha256();
    byte[] block = Arrays.copyOf(key.length <= BLOCK ? key : sha256().digest(key), BLOCK);
    for (int i = 0; i < BLOCK; i++) {
      block[i] ^= (byte) pad;
    }
    digest.update(block);
    return digest;
  }

  private static MessageDigest sha256() {
    try {
      return MessageDigest.getInstance("SHA-256");
    } catch (NoSuchAlgorithmException e) {
      throw new IllegalStateException("every JDK has SHA-256", e);
    }
  }

  /** The signature of what the parts say, in hexadecimal digits; empty without a key. */
  byte[] of(List<byte[]> parts) {
    if (inner == null || outer == null) {
      return new byte[0];
    }
    MessageDigest message = copy(inner);
    parts.forEach(message::update);
    return hexadecimal(copy(outer).digest(message.digest()));
  }

  /** Whether the signature is that of the parts; how long it takes does not tell how near it is. */
  boolean isRight(byte[] signature, List<byte[]> parts) {
    return inner == null || MessageDigest.isEqual(of(parts), signature);
  }

  private static MessageDigest copy(MessageDigest digest) {
    try {
      return (MessageDigest) digest.clone();
    } catch (CloneNotSupportedException e) {
      throw new IllegalStateException("the JDK's own SHA-256 can be copied", e);
    }
  }

  private static byte[] hexadecimal(byte[] bytes) {
    byte[] digits = new byte[2 * bytes.length];
    for (int i = 0; i < bytes.length; i++) {
      digits[2 * i] = digit(bytes[i] >> 4);
      digits[2 * i + 1] = digit(bytes[i]);
    }
    return digits;
  }

  private static byte digit(int bits) {
    return (byte) Character.forDigit(bits & 0xF, 16);
  }
}
