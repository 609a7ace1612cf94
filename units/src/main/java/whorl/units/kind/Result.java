package whorl.units.kind;

/**
 * What a rule makes of two operands.
 *
 * @param kind of the result
 * @param turns how many turns it has more than its operands together
 * @param taint what becomes of the account of turns
 * @param solid the operand whose π is the geometry of a section or a solid and ends here
 */
record Result(Kind kind, int turns, Taint taint, Solid solid) {

  /** The marks behind a result; explained at the head of {@code rules.txt}. */
  enum Taint {
    PASSES,
    BEGINS,
    ENDS,
    FORGOTTEN
  }

  /** Which operand stands in parentheses. */
  enum Solid {
    NONE,
    FIRST,
    SECOND;

    Solid swapped() {
      return switch (this) {
        case NONE -> NONE;
        case FIRST -> SECOND;
        case SECOND -> FIRST;
      };
    }
  }

  static Result of(Kind kind) {
    return new Result(kind, 0, Taint.PASSES, Solid.NONE);
  }

  /**
   * The reading of the result.
   *
   * @param sign 1 in a product, −1 in a quotient
   */
  Reading reading(Reading first, Reading second, int sign) {
    boolean tainted = first.tainted() || second.tainted();
    int turn = turns(first, Solid.FIRST) + sign * turns(second, Solid.SECOND) + turns;
    return switch (taint) {
      case PASSES -> new Reading(kind, turn, tainted);
      case BEGINS -> new Reading(kind, turn, true);
      case ENDS -> new Reading(kind, turn, turn != 0 || (first.tainted() && second.tainted()));
      case FORGOTTEN -> new Reading(kind, kind.has(Kind.Mark.RATE) ? turns : 0, false);
    };
  }

  private int turns(Reading operand, Solid place) {
    return solid == place && !operand.tainted() ? 0 : operand.turn();
  }

  /** The same for the operands in the other order. */
  Result swapped() {
    return new Result(kind, turns, taint, solid.swapped());
  }

  /**
   * What the same rule, solved for an operand, makes of this result over the other operand.
   *
   * @param operand for which it is solved
   * @param other whether the other operand, now the divisor, is in parentheses
   */
  Result solvedFor(Kind operand, boolean other) {
    return new Result(
        operand,
        -turns,
        taint == Taint.BEGINS ? Taint.BEGINS : Taint.PASSES,
        other ? Solid.SECOND : Solid.NONE);
  }

  /**
   * The same quotient upside down.
   *
   * @param reciprocal the kind of one over this result
   */
  Result reciprocal(Kind reciprocal) {
    return new Result(reciprocal, -turns, Taint.PASSES, solid.swapped());
  }
}
