package whorl.jupyter;

import java.nio.charset.StandardCharsets;
import java.security.GeneralSecurityException;
import java.security.MessageDigest;
import java.util.List;
import javax.crypto.Mac;
import javax.crypto.spec.SecretKeySpec;
import org.jspecify.annotations.Nullable;

/** Signs messages, and tells whether one comes from somebody who knows the key. For any thread. */
final class Signatures {
  private static final String ALGORITHM = "HmacSHA256";

  /** Knows the key and is never used itself, so that all threads may copy it; null for no key. */
  private final @Nullable Mac keyed;

  /** With a key; an empty one means that nothing is signed. */
  Signatures(String key) {
    keyed = key.isEmpty() ? null : keyed(key);
  }

  private static Mac keyed(String key) {
    try {
      Mac mac = Mac.getInstance(ALGORITHM);
      mac.init(new SecretKeySpec(key.getBytes(StandardCharsets.UTF_8), ALGORITHM));
      return mac;
    } catch (GeneralSecurityException e) {
      throw new IllegalStateException("every JDK has " + ALGORITHM, e);
    }
  }

  /** The signature of what the parts say, in hexadecimal digits; empty without a key. */
  byte[] of(List<byte[]> parts) {
    if (keyed == null) {
      return new byte[0];
    }
    try {
      var mac = (Mac) keyed.clone();
      parts.forEach(mac::update);
      return hexadecimal(mac.doFinal());
    } catch (CloneNotSupportedException e) {
      throw new IllegalStateException("the JDK's own " + ALGORITHM + " can be copied", e);
    }
  }

  /** Whether the signature is that of the parts; how long it takes does not tell how near it is. */
  boolean isRight(byte[] signature, List<byte[]> parts) {
    return keyed == null || MessageDigest.isEqual(of(parts), signature);
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
