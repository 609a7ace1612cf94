package whorl.report;

import java.util.ArrayList;
import java.util.List;
import whorl.diagnostic.Span;
import whorl.syntax.Expr;
import whorl.units.UnitText;

/** Builds expressions for tests as they come out of a parser, but for their places. */
final class Trees {
  static final Span NOWHERE = new Span(0, 0);

  private Trees() {}

  static Expr.Numeral num(String digits) {
    return new Expr.Numeral(NOWHERE, digits, Double.parseDouble(digits), null);
  }

  static Expr.Numeral num(String digits, String unit) {
    var text = new UnitText(List.of(new UnitText.Power(unit, 1)), List.of());
    return new Expr.Numeral(
        NOWHERE, digits, Double.parseDouble(digits), new Expr.UnitAt(NOWHERE, text));
  }

  static Expr.Name name(String name) {
    return new Expr.Name(NOWHERE, name);
  }

  /** A product read from a list of operands, numerals and joints: {@code a "*" b "/" c}. */
  static Expr product(Object... parts) {
    var factors = new ArrayList<Expr.Factor>();
    Expr.Joint joint = Expr.Joint.TIMES;
    for (Object part : parts) {
      if (part instanceof String sign) {
        joint =
            switch (sign) {
              case "*" -> Expr.Joint.TIMES;
              case "/" -> Expr.Joint.OVER;
              case "×" -> Expr.Joint.CROSS;
              case "·" -> Expr.Joint.DOT;
              default -> throw new IllegalArgumentException("no joint: " + sign);
            };
      } else {
        factors.add(new Expr.Factor(joint, (Expr) part));
      }
    }
    return new Expr.Product(NOWHERE, factors);
  }

  /** A sum read from a list of operands and signs. */
  static Expr sum(Object... parts) {
    var terms = new ArrayList<Expr.Term>();
    boolean subtracted = false;
    for (Object part : parts) {
      if (part instanceof String sign) {
        subtracted = sign.equals("-");
      } else {
        terms.add(new Expr.Term(subtracted, (Expr) part));
      }
    }
    return new Expr.Sum(NOWHERE, terms);
  }

  static Expr power(Expr base, Expr exponent) {
    return new Expr.Power(NOWHERE, base, exponent);
  }

  static Expr squared(Expr base) {
    return power(base, num("2"));
  }

  static Expr minus(Expr operand) {
    return new Expr.Negation(NOWHERE, operand);
  }

  static Expr call(String function, Expr... arguments) {
    return new Expr.Call(
        NOWHERE,
        name(function),
        List.of(arguments).stream().map(a -> new Expr.Argument(NOWHERE, null, a)).toList(),
        null);
  }

  static Expr vector(Expr x, Expr y, Expr z) {
    return new Expr.Vector(NOWHERE, x, y, z);
  }

  static Expr magnitude(Expr operand) {
    return new Expr.Magnitude(NOWHERE, operand);
  }

  static Expr.Comparison compare(Expr left, Expr.Relation relation, Expr right) {
    return new Expr.Comparison(NOWHERE, left, relation, right);
  }
}
