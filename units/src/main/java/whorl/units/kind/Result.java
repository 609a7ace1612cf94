package whorl.units.kind;

import java.util.Objects;

/**
 * What a rule makes of two operands.
 *
 * @param kind of the result
 * @param turns how many turns it has more than its operands together
 * @param taint what becomes of the account of turns
 */
record Result(Kind kind, int turns, Taint taint) {

  /** The marks behind a result; explained at the head of {@code rules.txt}. */
  enum Taint {
    PASSES,
    BEGINS,
    ENDS,
    FORGOTTEN
  }

  static Result of(Kind kind) {
    return new Result(kind, 0, Taint.PASSES);
  }

  Result {
    Objects.requireNonNull(kind);
  }

  /** The reading of the result, given the account of its operands. */
  Reading reading(int operandTurns, boolean operandTaint) {
    int turn = operandTurns + turns;
    return switch (taint) {
      case PASSES -> new Reading(kind, turn, operandTaint);
      case BEGINS -> new Reading(kind, turn, true);
      case ENDS -> new Reading(kind, turn, operandTaint && turn != 0);
      case FORGOTTEN -> new Reading(kind, kind.has(Kind.Mark.RATE) ? turns : 0, false);
    };
  }

  /** What the same rule, solved for an operand, makes of this result and the other operand. */
  Result turnedRound(Kind operand) {
    return new Result(operand, -turns, taint == Taint.BEGINS ? Taint.BEGINS : Taint.PASSES);
  }
}
