package whorl.units.kind;

import java.util.Optional;

/** What the algebra finds of a part of a formula: how it may be read, or why it cannot be. */
public sealed interface Judgement {

  /** Answers one question for either outcome. */
  <R> R match(Cases<R> cases);

  /**
   * The outcomes.
   *
   * @param <R> type of the answer
   */
  interface Cases<R> {
    R accepted(Accepted accepted);

    R refused(Refused refused);
  }

  /**
   * The part can be read.
   *
   * @param operand what is known of it
   * @param remark what looks odd all the same
   */
  record Accepted(Operand operand, Optional<Remark> remark) implements Judgement {
    @Override
    public <R> R match(Cases<R> cases) {
      return cases.accepted(this);
    }
  }

  /** The part is refused. */
  record Refused(Refusal refusal) implements Judgement {
    @Override
    public <R> R match(Cases<R> cases) {
      return cases.refused(this);
    }
  }

  /** Accepted without a remark. */
  static Judgement accepted(Operand operand) {
    return new Accepted(operand, Optional.empty());
  }

  /** Accepted without a remark, its value not known before run time. */
  static Judgement accepted(Readings readings) {
    return accepted(Operand.of(readings));
  }

  /** Refused. */
  static Judgement refused(Refusal refusal) {
    return new Refused(refusal);
  }
}
