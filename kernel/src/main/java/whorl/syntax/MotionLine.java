package whorl.syntax;

import org.jspecify.annotations.Nullable;
import whorl.diagnostic.Span;

/** A line of a motion as written. */
public sealed interface MotionLine {
  /** Where it stands, without its remark. */
  Span span();

  /** The remark behind it, or empty. */
  String remark();

  /** Answers one question for every form of line. */
  <R> R match(Cases<R> cases);

  /**
   * The forms of line, one method each.
   *
   * @param <R> type of the answer
   */
  interface Cases<R> {
    R start(Start start);

    R attitude(Attitude attitude);

    R equation(Equation equation);

    R local(Local local);

    R stop(Stop stop);

    R limit(Limit limit);

    R body(Body body);

    R load(Load load);
  }

  /** {@code state [unit] starts value}. */
  record Start(
      Span span, Expr.Name state, Statement.@Nullable Bracket bracket, Expr value, String remark)
      implements MotionLine {
    @Override
    public <R> R match(Cases<R> cases) {
      return cases.start(this);
    }
  }

  /** {@code turned angle about axis}. */
  record Turn(Span span, Expr angle, Expr about) {}

  /**
   * {@code body starts spin rate, turned angle about axis}.
   *
   * @param spin angular velocity at the start, or null where the body starts at rest
   * @param turn how the body stands at the start, or null where it stands unturned
   */
  record Attitude(
      Span span, Expr.Name body, @Nullable Expr spin, @Nullable Turn turn, String remark)
      implements MotionLine {
    @Override
    public <R> R match(Cases<R> cases) {
      return cases.attitude(this);
    }
  }

  /**
   * {@code rate = value}.
   *
   * @param rate a rate of a state, a rate of a product ({@code (I*ω)'}), or a product whose last
   *     factor is the rate of a state ({@code I * ω'})
   */
  record Equation(Span span, Expr rate, Expr value, String remark) implements MotionLine {
    @Override
    public <R> R match(Cases<R> cases) {
      return cases.equation(this);
    }
  }

  /** {@code name [unit] = value}, known within the motion only. */
  record Local(
      Span span, Expr.Name name, Statement.@Nullable Bracket bracket, Expr value, String remark)
      implements MotionLine {
    @Override
    public <R> R match(Cases<R> cases) {
      return cases.local(this);
    }
  }

  /** {@code stop when condition}. */
  record Stop(Span span, Expr condition, String remark) implements MotionLine {
    @Override
    public <R> R match(Cases<R> cases) {
      return cases.stop(this);
    }
  }

  /** {@code within time}. */
  record Limit(Span span, Expr time, String remark) implements MotionLine {
    @Override
    public <R> R match(Cases<R> cases) {
      return cases.limit(this);
    }
  }

  /** {@code body name about point}. */
  record Body(Span span, Expr.Name name, Expr about, String remark) implements MotionLine {
    @Override
    public <R> R match(Cases<R> cases) {
      return cases.body(this);
    }
  }

  /** {@code load moment}. */
  record Load(Span span, Expr value, String remark) implements MotionLine {
    @Override
    public <R> R match(Cases<R> cases) {
      return cases.load(this);
    }
  }
}
