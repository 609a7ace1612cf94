package whorl.jupyter;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.security.GeneralSecurityException;
import java.util.ArrayList;
import java.util.HexFormat;
import java.util.List;
import java.util.Random;
import javax.crypto.Mac;
import javax.crypto.spec.SecretKeySpec;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class SignaturesTest {
  private static byte[] bytes(String text) {
    return text.getBytes(StandardCharsets.UTF_8);
  }

  /** From RFC 4231, test case 2, and worked out by the JDK. */
  @Test
  void aSignatureIsTheKeyedHashInHexadecimalDigits() {
    assertEquals(
        "5bdcc146bf60754e6a042426089575c75a003f089d2739839dec58b964ec3843",
        new String(
            new Signatures("Jefe").of(List.of(bytes("what do ya want "), bytes("for nothing?"))),
            StandardCharsets.US_ASCII));
  }

  @ParameterizedTest
  @CsvSource({"1", "36", "63", "64", "65", "200"})
  void itIsThatOfTheJdkForKeysOfAnyLength(int length) throws GeneralSecurityException {
    var random = new Random(length);
    String key = "k".repeat(length);
    var parts = new ArrayList<byte[]>();
    Mac mac = Mac.getInstance("HmacSHA256");
    mac.init(new SecretKeySpec(bytes(key), "HmacSHA256"));
    for (int i = 0; i < 4; i++) {
      byte[] part = new byte[random.nextInt(1_000)];
      random.nextBytes(part);
      parts.add(part);
      mac.update(part);
    }
    assertEquals(
        HexFormat.of().formatHex(mac.doFinal()),
        new String(new Signatures(key).of(parts), StandardCharsets.US_ASCII));
  }

  @Test
  void onlyTheRightSignatureIsRight() {
    var signatures = new Signatures("k");
    List<byte[]> parts = List.of(bytes("a"), bytes("b"));
    byte[] right = signatures.of(parts);
    assertTrue(signatures.isRight(right, parts));
    assertFalse(signatures.isRight(right, List.of(bytes("a"), bytes("c"))));
    assertFalse(signatures.isRight(new byte[0], parts));
    assertFalse(new Signatures("other").isRight(right, parts));
  }

  @Test
  void withoutAKeyNothingIsSignedAndEverythingIsRight() {
    var signatures = new Signatures("");
    assertEquals(0, signatures.of(List.of(bytes("a"))).length);
    assertTrue(signatures.isRight(bytes("anything"), List.of(bytes("a"))));
  }
}
