package whorl.check;

import java.util.function.Supplier;
import org.jspecify.annotations.Nullable;
import whorl.syntax.Expr;

/** How what quantities are taken about goes through a formula. */
final class References {
  private References() {}

  /**
   * What two quantities that are added, compared or chosen between are taken about. A quantity that
   * is taken about nothing goes with any.
   *
   * @param leftText asked for only where it goes into a message
   */
  static @Nullable Reference shared(
      Typed left, Supplier<Expr> leftText, Typed right, Expr rightText) {
    Reference one = left.type().about();
    Reference other = right.type().about();
    if (one == null || other == null) {
      Reference known = one == null ? other : one;
      return known == null ? null : known.ofUnknown();
    }
    if (!one.sameAs(other)) {
      throw SpaceMessages.differentReferences(leftText.get(), left, one, rightText, right, other);
    }
    return one.ofUnknown();
  }
}
