package whorl.units.kind;

/**
 * One way to read a quantity: as a kind, together with what is known of its angle.
 *
 * <p>In the SI an angle has the unit one, so that radians vanish from the dimensions and with them
 * the difference between radians and turns, a factor of 2π. A reading keeps account of it:
 *
 * <ul>
 *   <li><b>turn</b> is the net power of 2π that is still unpaid. A π written in a formula pays one
 *       in, dividing by π takes one out. A frequency is an angular velocity that is one turn short
 *       ({@code f = ω/2π}); so a written 2π settles {@code 2*pi*f} to an angular velocity, and
 *       {@code w/(2*pi)} to a frequency.
 *   <li><b>tainted</b> says that rotation took part: a factor counted radians or cycles. Only then
 *       must the account come out even. An untainted π is the geometry of a circle, as in {@code
 *       pi*d^2/4}: it settles anywhere, and ends where the section or solid meets a density, a
 *       stress or a velocity.
 * </ul>
 *
 * <p>Normal form: a rotation rate is always tainted.
 *
 * @param kind as what the quantity is read
 * @param turn net power of 2π unpaid
 * @param tainted whether rotation took part
 */
public record Reading(Kind kind, int turn, boolean tainted) {

  /** Brings the reading to its normal form. */
  public Reading {
    tainted = tainted || kind.has(Kind.Mark.RATE);
  }

  /** The reading of a quantity that is stated to be of a kind. */
  public static Reading of(Kind kind) {
    return RuleBook.STANDARD.reading(kind);
  }

  /** Whether this is a number, a ratio or a count, of which nothing more is known. */
  boolean isPlainNumber() {
    return !tainted && kind.has(Kind.Mark.COUNT);
  }

  @Override
  public String toString() {
    return kind + (turn == 0 ? "" : " " + (turn > 0 ? "+" : "") + turn) + (tainted ? " #" : "");
  }
}
