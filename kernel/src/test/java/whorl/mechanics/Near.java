package whorl.mechanics;

import static org.junit.jupiter.api.Assertions.assertAll;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;
import org.junit.jupiter.api.function.Executable;
import whorl.mechanics.reference.InertiaTensor;

/** Assertions on vectors and tensors, and on what is refused. */
public final class Near {
  private Near() {}

  /** Each part within a distance. */
  public static void assertNear(Vector3D expected, Vector3D actual, double distance) {
    assertTrue(
        expected.distance(actual) <= distance, () -> "expected " + expected + " but was " + actual);
  }

  /** Each element within a share of the largest. */
  public static void assertNear(InertiaTensor expected, InertiaTensor actual, double share) {
    double size = Math.max(expected.xx(), Math.max(expected.yy(), expected.zz()));
    double slack = share * size;
    assertAll(
        () -> assertEquals(expected.xx(), actual.xx(), slack, "xx"),
        () -> assertEquals(expected.yy(), actual.yy(), slack, "yy"),
        () -> assertEquals(expected.zz(), actual.zz(), slack, "zz"),
        () -> assertEquals(expected.xy(), actual.xy(), slack, "xy"),
        () -> assertEquals(expected.yz(), actual.yz(), slack, "yz"),
        () -> assertEquals(expected.zx(), actual.zx(), slack, "zx"));
  }

  /** Refused, with a subject and with words in the message. */
  public static Refusal assertRefused(String subject, String words, Executable attempt) {
    Refusal refusal = assertThrows(Refusal.class, attempt);
    assertEquals(subject, refusal.subject());
    String message = refusal.reason() + " " + refusal.fix();
    assertTrue(message.contains(words), message);
    return refusal;
  }
}
