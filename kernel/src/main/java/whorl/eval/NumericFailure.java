package whorl.eval;

import java.util.List;
import org.jspecify.annotations.Nullable;
import whorl.diagnostic.Span;

/**
 * Why a part of a formula has no value.
 *
 * @param reason what happened
 * @param span the part at fault: the divisor, the operand of the root, the operation that
 *     overflows; the whole formula where the evaluation was ended
 * @param inFunction name of the sheet's function in whose body the span stands, or empty
 * @param operand the number at fault, in coherent SI units: the divisor, the operand of the root,
 *     and where a result is too large the last number that went in; where the evaluation was ended,
 *     the number of operations or levels it had come to
 * @param call the call of a routine that gave no number; null in any other case
 * @param refused what a law said of an argument that it cannot take; null in any other case
 */
public record NumericFailure(
    Reason reason,
    Span span,
    String inFunction,
    double operand,
    @Nullable Call call,
    @Nullable Refused refused) {

  /**
   * A call of a routine that gave no number.
   *
   * @param arguments in coherent SI units
   * @param said what the routine said; empty where it gave infinity or NaN
   */
  public record Call(List<Double> arguments, String said) {
    /** Copies the arguments. */
    public Call {
      arguments = List.copyOf(arguments);
    }
  }

  /**
   * What a law said of an argument that it cannot take.
   *
   * @param rule the law
   * @param reason what is wrong, and why
   * @param fix what to do; may be empty
   */
  public record Refused(String rule, String reason, String fix) {}

  /** A failure of the sheet's own arithmetic. */
  public NumericFailure(Reason reason, Span span, String inFunction, double operand) {
    this(reason, span, inFunction, operand, null, null);
  }

  /** The ways in which a part can have no value. */
  public enum Reason {
    /** A divisor is zero. */
    DIVISION_BY_ZERO,
    /** The result is too large for a double. */
    OVERFLOW,
    /** An even root, or a fractional power, of a negative number. */
    ROOT_OF_NEGATIVE,
    /** The logarithm of a number that is not positive. */
    LOGARITHM_OF_NON_POSITIVE,
    /** The arc sine or arc cosine of a number beyond ±1. */
    ARC_OUT_OF_RANGE,
    /** The direction of, or an angle with, a vector of length zero; the angle of the point 0, 0. */
    DIRECTION_OF_ZERO,
    /** Zero to a negative power. */
    ZERO_TO_NEGATIVE_POWER,
    /** A routine gave infinity or NaN, which is the operand, or failed; the operand is then NaN. */
    ROUTINE_WITHOUT_VALUE,
    /** A law cannot take an argument. */
    REFUSED,
    /** The evaluation was interrupted. */
    INTERRUPTED,
    /** The evaluation took more operations than allowed. */
    TOO_LONG,
    /** Functions call functions more levels deep than allowed. */
    TOO_DEEP
  }
}
