package whorl.units.kind;

import java.util.List;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import whorl.units.Dimension;
import whorl.units.Rational;

/**
 * Follows kinds of quantity through a formula, before any value is known: what a product, a sum or
 * a function of quantities may be read as, and what is refused.
 *
 * <p>A caller walks the tree of a formula. <em>Products are flattened first</em>, because whether
 * {@code 2*pi*r*f} is a velocity shows only when all factors are seen together:
 *
 * <ul>
 *   <li>A product or quotient inside a product gives its factors to it, those below a fraction bar
 *       with their exponents negated: {@code a/(b*c)} is a, b⁻¹, c⁻¹.
 *   <li>A power with an integer exponent multiplies the exponents of its base's factors: {@code
 *       (2*pi*f)^2} is 2², π², f². A power with any other exponent is one factor, its base judged
 *       by itself: {@code (k/I)^(1/2)} is (k/I)^½, and so is a root by its name.
 *   <li>A sign is left out.
 *   <li>A bare numeral is a factor with its exact value ({@link Operand#numeral}), and the name of
 *       π is {@link Readings#PI}. A numeral with a unit is a quantity of the unit's kind.
 *   <li>Anything else, as a name, a call or a sum in parentheses, is one factor.
 *   <li>The factors stay in the order written: a flywheel effect with a 4 right behind the bar, as
 *       in {@code GD2/4*w^2}, is read as an inertia.
 * </ul>
 *
 * <p>All methods are pure.
 */
public final class KindAlgebra {
  private static final Kind ANGLE = Kind.named("angle");
  private static final Kind NUMBER = Kind.named("number");
  private static final Kind ENERGY = Kind.named("energy");
  private static final Kind TORQUE = Kind.named("torque");
  private static final Readings SINE = Readings.of(Kind.named("sine"));

  private KindAlgebra() {}

  /** A product of powers, flattened as told above. */
  public static Judgement product(List<Powered> factors) {
    return Multiplication.of(factors);
  }

  /** {@code left + right}. */
  public static Judgement plus(Operand left, Operand right) {
    return Meeting.of(Joining.ADD, left, right);
  }

  /** {@code left - right}. */
  public static Judgement minus(Operand left, Operand right) {
    return Meeting.of(Joining.SUBTRACT, left, right);
  }

  /**
   * Two quantities that are compared, of which one is chosen, or that are the sides of an angle.
   * The operand accepted is what both may be read as.
   */
  public static Judgement compared(Operand left, Operand right) {
    return Meeting.of(Joining.COMPARE, left, right);
  }

  /**
   * A root.
   *
   * @param degree 2 for a square root, 3 for a cube root
   */
  public static Judgement root(Operand radicand, int degree) {
    return power(radicand, Rational.of(1, degree));
  }

  /** A power with an exponent known before run time. */
  public static Judgement power(Operand base, Rational exponent) {
    return product(List.of(new Powered(base, base, exponent)));
  }

  /** A power whose exponent is worked out: both must be plain numbers. */
  public static Judgement variablePower(Operand base, Operand exponent) {
    for (Operand operand : List.of(base, exponent)) {
      if (!isNumber(operand)) {
        return wrong(FunctionFamily.VARIABLE_POWER, operand);
      }
    }
    return Judgement.accepted(Readings.NUMBER);
  }

  /** Sine, cosine or tangent of an angle. */
  public static Judgement sineOf(Operand angle) {
    return angle.isZero() || angle.readings().canBe(ANGLE)
        ? Judgement.accepted(SINE)
        : wrong(FunctionFamily.SINE, angle);
  }

  /** The angle whose sine, cosine or tangent is a number. */
  public static Judgement arcOf(Operand number) {
    return isNumber(number)
        ? Judgement.accepted(Readings.of(ANGLE))
        : wrong(FunctionFamily.ARC, number);
  }

  /**
   * The exponential function or one of its hyperbolic kin. It takes a number, or an angle as in the
   * belt formula {@code exp(mu*th)}; a number of cycles is none of these.
   */
  public static Judgement exponentialOf(Operand operand) {
    Readings readings = operand.readings();
    boolean cycles = readings.all(reading -> reading.tainted() && reading.turn() != 0);
    return !cycles && (isNumber(operand) || readings.canBe(ANGLE))
        ? Judgement.accepted(Readings.NUMBER)
        : wrong(FunctionFamily.EXPONENTIAL, operand);
  }

  /** A logarithm of a number. */
  public static Judgement logarithmOf(Operand number) {
    return isNumber(number)
        ? Judgement.accepted(Readings.NUMBER)
        : wrong(FunctionFamily.LOGARITHM, number);
  }

  private static boolean isNumber(Operand operand) {
    return operand.readings().canBe(NUMBER);
  }

  private static Judgement wrong(FunctionFamily function, Operand found) {
    return Judgement.refused(new Refusal.WrongArgument(function, found.readings()));
  }

  /** A cross product of two vectors. It is never an energy. */
  public static Judgement cross(Operand left, Operand right) {
    return vectorProduct(left, right, true, ENERGY);
  }

  /** A dot product of two vectors. With two that have a dimension it is never a torque. */
  public static Judgement dot(Operand left, Operand right) {
    boolean direction = left.readings().dimension().isOne() || right.readings().dimension().isOne();
    return vectorProduct(left, right, false, direction ? null : TORQUE);
  }

  private static Judgement vectorProduct(
      Operand left, Operand right, boolean cross, @Nullable Kind excluded) {
    Judgement product =
        product(
            List.of(
                new Powered("left", left, Rational.ONE),
                new Powered("right", right, Rational.ONE)));
    if (excluded == null) {
      return product;
    }
    return product.match(new CharacterFilter(cross, excluded));
  }

  /** Leaves out readings that a vector product of that character cannot have. */
  private record CharacterFilter(boolean cross, Kind excluded)
      implements Judgement.Cases<Judgement> {
    @Override
    public Judgement accepted(Judgement.Accepted accepted) {
      Readings found = accepted.operand().readings();
      Readings left = found.where(reading -> reading.kind() != excluded);
      return left.isUntagged() && !found.isUntagged()
          ? Judgement.refused(new Refusal.WrongCharacter(cross, found))
          : Judgement.accepted(left);
    }

    @Override
    public Judgement refused(Judgement.Refused refused) {
      return refused;
    }
  }

  /**
   * A quantity declared to be of one of some kinds.
   *
   * @param wanted the kinds that the declared unit may serve, the usual one first; empty where the
   *     unit tells no more than a dimension
   * @param dimension of the declared unit
   * @return accepted as the first kind that fits
   */
  public static Judgement assigned(Operand value, List<Kind> wanted, Dimension dimension) {
    Readings found = value.readings();
    boolean anyKind = wanted.isEmpty() && found.dimension().equals(dimension);
    if (anyKind) {
      return Judgement.accepted(value);
    }
    Optional<Kind> kind = wanted.stream().filter(k -> value.isZero() || found.canBe(k)).findFirst();
    return kind.<Judgement>map(k -> Judgement.accepted(Readings.of(k)))
        .orElseGet(() -> Judgement.refused(new Refusal.WrongKind(found, wanted, dimension)));
  }

  /**
   * A quantity declared with a compound of units that no kind is named for, as {@code N²·m²·s²}.
   *
   * @param unit the readings of the compound, by {@link #unit}
   */
  public static Judgement assigned(Operand value, Readings unit) {
    Judgement meeting = compared(value, Operand.of(unit));
    Readings found = value.readings();
    return meeting.match(
        new Judgement.Cases<>() {
          @Override
          public Judgement accepted(Judgement.Accepted accepted) {
            return accepted;
          }

          @Override
          public Judgement refused(Judgement.Refused refused) {
            return Judgement.refused(new Refusal.WrongKind(found, unit.kinds(), unit.dimension()));
          }
        });
  }

  /**
   * The readings of a compound of units, each with the readings of a quantity measured in it. A
   * unit says nothing of turns that its text does not name: where a second may be one per radian,
   * only the dimension is certain.
   */
  public static Readings unit(List<Powered> members) {
    return product(members)
        .match(
            new Judgement.Cases<>() {
              @Override
              public Readings accepted(Judgement.Accepted accepted) {
                Readings found = accepted.operand().readings();
                boolean open =
                    found.readings().stream().anyMatch(r -> r.tainted() && r.turn() != 0);
                return open ? Readings.untagged(found.dimension()) : found;
              }

              @Override
              public Readings refused(Judgement.Refused refused) {
                return Readings.untagged(dimension(members));
              }
            });
  }

  private static Dimension dimension(List<Powered> members) {
    Dimension dimension = Dimension.ONE;
    for (Powered member : members) {
      Dimension power = member.operand().readings().dimension().power(member.exponent());
      dimension = dimension.times(power);
    }
    return dimension;
  }
}
