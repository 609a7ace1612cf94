package whorl.check;

import java.util.List;
import org.jspecify.annotations.Nullable;
import whorl.units.kind.Kind;
import whorl.units.kind.Readings;

/**
 * What a moment, an angular momentum or an inertia is taken about.
 *
 * @param about the point or axis
 * @param of the body or bound force that it was worked out from, which can tell the mass, the
 *     centre or the force that a transfer needs; null where it is no longer known
 */
public record Reference(Anchor about, @Nullable Anchor of) {
  private static final List<Kind> REFERRED =
      List.of(
          Kind.named("torque"), Kind.named("angular_momentum"), Kind.named("rotational_inertia"));

  /** The reference of a quantity, or null where its kind can have none. */
  static @Nullable Reference kept(@Nullable Reference reference, Readings readings) {
    return reference != null && REFERRED.stream().anyMatch(readings::canBe) ? reference : null;
  }

  /** The same of what is no longer the quantity of the whole body or force. */
  Reference ofUnknown() {
    return new Reference(about, null);
  }

  boolean sameAs(Reference other) {
    return about.sameAs(other.about);
  }
}
