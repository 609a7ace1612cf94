package whorl.units;

import java.math.BigInteger;
import java.util.List;
import java.util.Objects;
import whorl.units.kind.Kind;
import whorl.units.kind.Readings;

/**
 * A unit of measurement: how it is written, its size, and what it may measure.
 *
 * <p>Values of this class come from {@link UnitCatalogue#resolve(UnitText)}.
 */
public final class Unit {

  /** Integers up to this are doubles without loss. */
  private static final BigInteger LARGEST_EXACT = BigInteger.ONE.shiftLeft(53);

  /** The unit one, of plain numbers. */
  public static final Unit ONE =
      new Unit(
          UnitText.ONE, Factor.ONE, Rational.ZERO, Dimension.ONE, List.of(Kind.named("number")));

  private final UnitText text;
  private final Factor factor;
  private final Rational zero;
  private final Dimension dimension;
  private final List<Kind> kinds;
  private final Readings readings;

  /** A value times multiplier over divisor is in SI units; one of the two is 1 if that is exact. */
  private final double multiplier;

  private final double divisor;

  /** Added to a reading before the factor. */
  private final double shift;

  Unit(
      UnitText text,
      Factor factor,
      Rational zero,
      Dimension dimension,
      List<Kind> kinds,
      Readings readings) {
    this.text = text;
    this.factor = factor;
    this.zero = zero;
    this.dimension = dimension;
    this.kinds = List.copyOf(kinds);
    this.readings = readings;
    Rational coefficient = factor.coefficient();
    boolean exact =
        factor.piExponent() == 0
            && coefficient.numerator().compareTo(LARGEST_EXACT) <= 0
            && coefficient.denominator().compareTo(LARGEST_EXACT) <= 0;
    this.multiplier = exact ? coefficient.numerator().doubleValue() : factor.doubleValue();
    this.divisor = exact ? coefficient.denominator().doubleValue() : 1;
    this.shift = zero.doubleValue();
  }

  /** A unit of some kinds of one dimension. */
  Unit(UnitText text, Factor factor, Rational zero, Dimension dimension, List<Kind> kinds) {
    this(text, factor, zero, dimension, kinds, Readings.of(kinds));
  }

  /** The same unit where it measures one kind only. */
  Unit serving(Kind kind) {
    return new Unit(text, factor, zero, dimension, List.of(kind));
  }

  /** The unit as written. */
  public UnitText text() {
    return text;
  }

  /** The unit with raised exponents, as {@code kg·m²/s}. */
  public String symbol() {
    return text.typeset();
  }

  /** The dimension of what is measured. */
  public Dimension dimension() {
    return dimension;
  }

  /** The exact size in coherent SI units. */
  public Factor factor() {
    return factor;
  }

  /** Whether this is a scale with a zero of its own, as {@code degC}, on which one reads. */
  public boolean isReading() {
    return !zero.isZero();
  }

  /** The kinds of quantity that the unit may measure, the usual one first; empty if not known. */
  public List<Kind> kinds() {
    return kinds;
  }

  /** How a quantity stated in this unit may be read. */
  public Readings readings() {
    return readings;
  }

  /** A value in this unit, converted to coherent SI units. */
  public double toSi(double value) {
    return (value + shift) * multiplier / divisor;
  }

  /** A value in coherent SI units, converted to this unit. */
  public double fromSi(double value) {
    return value * divisor / multiplier - shift;
  }

  /**
   * The coherent SI unit that measures the same: {@code rad/s} for {@code rpm}, {@code J} for
   * {@code kWh}, {@code m} for {@code in}. A product goes member by member, {@code N·m} for {@code
   * lbf·ft}, where the trade has no shorter way to write it.
   */
  public Unit coherent() {
    return UnitCatalogue.standard().coherent(this);
  }

  /** Units are equal that are written alike and measure the same. */
  @Override
  public boolean equals(Object other) {
    return other instanceof Unit that
        && text.equals(that.text)
        && factor.equals(that.factor)
        && zero.equals(that.zero)
        && dimension.equals(that.dimension)
        && kinds.equals(that.kinds);
  }

  @Override
  public int hashCode() {
    return Objects.hash(text, kinds);
  }

  @Override
  public String toString() {
    return text.plain();
  }
}
