package whorl.check;

import whorl.syntax.Expr;

/** Tells inputs from derived quantities. */
public final class InputForm {
  private InputForm() {}

  /** Whether a right side is an input: a number or vector written out, with its unit if any. */
  public static boolean isInput(Expr value) {
    return Expressions.isInput(value);
  }

  /** Whether a right side is made of bare numbers only, so that it takes the declared unit. */
  public static boolean isBare(Expr value) {
    return Expressions.isBare(value);
  }
}
