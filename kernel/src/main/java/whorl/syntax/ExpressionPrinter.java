package whorl.syntax;

import java.util.List;
import java.util.stream.Collectors;

/**
 * Canonical text of expressions: one blank around operators, none inside units, powers and parts,
 * and parentheses only where the text would read otherwise without them.
 */
final class ExpressionPrinter implements Expr.Cases<String> {
  /** How tightly a form of expression holds together, from the loosest. */
  private enum Hold {
    CHOICE,
    ANY_OF,
    ALL_OF,
    COMPARISON,
    TOLERANCE,
    SUM,
    PRODUCT,
    SIGNED,
    POWER,
    POSTFIX,
    PRIMARY
  }

  private static final HoldOf HOLD_OF = new HoldOf();

  String print(Expr value) {
    return value.match(this);
  }

  private String print(Expr value, Hold least) {
    return value.match(HOLD_OF).compareTo(least) < 0 ? "(" + print(value) + ")" : print(value);
  }

  private String list(List<Expr> values, Hold least, String joint) {
    return values.stream().map(value -> print(value, least)).collect(Collectors.joining(joint));
  }

  /** A numeral, a group or a vector with a unit, which an exponent would take for itself. */
  private static boolean hasUnit(Expr value) {
    return value instanceof Expr.InUnit
        || (value instanceof Expr.Numeral number && number.unit() != null);
  }

  /** Whether an exponent would have to take a unit, which it does in parentheses only. */
  private static boolean takesUnit(Expr exponent) {
    if (exponent instanceof Expr.Negation negation) {
      return takesUnit(negation.operand());
    }
    return exponent instanceof Expr.InFrame inFrame
        ? takesUnit(inFrame.vector())
        : hasUnit(exponent);
  }

  private String grouped(Expr value) {
    return "(" + print(value) + ")";
  }

  @Override
  public String numeral(Expr.Numeral numeral) {
    Expr.UnitAt unit = numeral.unit();
    return unit == null ? numeral.digits() : numeral.digits() + " " + unit.text().plain();
  }

  @Override
  public String inUnit(Expr.InUnit inUnit) {
    Expr group = inUnit.group();
    String text = group instanceof Expr.Vector ? print(group) : grouped(group);
    return text + " " + inUnit.unit().text().plain();
  }

  @Override
  public String name(Expr.Name name) {
    return name.name();
  }

  @Override
  public String part(Expr.Part part) {
    Expr of = part.of();
    // A point behind a frame would belong to the frame, one behind a number to the number.
    boolean group = of instanceof Expr.InFrame || of instanceof Expr.Numeral || hasUnit(of);
    return (group ? grouped(of) : print(of, Hold.POSTFIX)) + "." + part.name().name();
  }

  @Override
  public String rate(Expr.Rate rate) {
    return print(rate.of(), Hold.POSTFIX) + "'";
  }

  @Override
  public String inFrame(Expr.InFrame inFrame) {
    return print(inFrame.vector(), Hold.POSTFIX) + " @ " + print(inFrame.frame());
  }

  @Override
  public String vector(Expr.Vector vector) {
    return "(" + list(List.of(vector.x(), vector.y(), vector.z()), Hold.CHOICE, ", ") + ")";
  }

  @Override
  public String negation(Expr.Negation negation) {
    Expr operand = negation.operand();
    // Right behind a sign a number with a unit would be a reading.
    boolean reading = operand instanceof Expr.Numeral number && number.unit() != null;
    return "-" + (reading ? grouped(operand) : print(operand, Hold.POWER));
  }

  @Override
  public String sum(Expr.Sum sum) {
    var text = new StringBuilder();
    for (Expr.Term term : sum.terms()) {
      if (text.length() > 0) {
        text.append(term.subtracted() ? " - " : " + ");
      }
      text.append(print(term.value(), Hold.PRODUCT));
    }
    return text.toString();
  }

  @Override
  public String product(Expr.Product product) {
    var text = new StringBuilder();
    Expr previous = null;
    for (Expr.Factor factor : product.factors()) {
      Expr value = factor.value();
      if (previous != null) {
        text.append(" ").append(sign(factor.joint())).append(" ");
      }
      boolean fraction =
          previous != null
              && factor.joint() == Expr.Joint.OVER
              && hasUnit(value)
              && BareNumbers.isPlain(previous);
      text.append(fraction ? grouped(value) : print(value, Hold.SIGNED));
      previous = value;
    }
    return text.toString();
  }

  private static String sign(Expr.Joint joint) {
    return switch (joint) {
      case TIMES -> "*";
      case OVER -> "/";
      case CROSS -> "×";
      case DOT -> "·";
    };
  }

  @Override
  public String power(Expr.Power power) {
    Expr base = power.base();
    Expr exponent = power.exponent();
    return (hasUnit(base) ? grouped(base) : print(base, Hold.POSTFIX))
        + "^"
        + (takesUnit(exponent) ? grouped(exponent) : print(exponent, Hold.SIGNED));
  }

  @Override
  public String magnitude(Expr.Magnitude magnitude) {
    return "|" + print(magnitude.operand(), Hold.SUM) + "|";
  }

  @Override
  public String tolerance(Expr.Tolerance tolerance) {
    Expr half = tolerance.half();
    boolean looksCovered =
        half instanceof Expr.Call call
            && call.arguments().stream()
                .anyMatch(
                    argument -> argument.name() != null && argument.name().name().equals("k"));
    String text =
        print(tolerance.value(), Hold.SUM)
            + " ± "
            + (looksCovered ? grouped(half) : print(half, Hold.PRODUCT));
    Expr.Numeral coverage = tolerance.coverage();
    return coverage == null ? text : text + " (k = " + print(coverage) + ")";
  }

  @Override
  public String comparison(Expr.Comparison comparison) {
    return print(comparison.left(), Hold.TOLERANCE)
        + " "
        + comparison.relation().sign()
        + " "
        + print(comparison.right(), Hold.TOLERANCE);
  }

  @Override
  public String allOf(Expr.AllOf allOf) {
    return list(allOf.conditions(), Hold.COMPARISON, " and ");
  }

  @Override
  public String anyOf(Expr.AnyOf anyOf) {
    return list(anyOf.conditions(), Hold.ALL_OF, " or ");
  }

  @Override
  public String choice(Expr.Choice choice) {
    return "if "
        + print(choice.condition(), Hold.ANY_OF)
        + " then "
        + print(choice.then())
        + " else "
        + print(choice.otherwise());
  }

  @Override
  public String call(Expr.Call call) {
    String arguments =
        call.arguments().stream().map(this::argument).collect(Collectors.joining(", "));
    Expr.Name over = call.over();
    return call.function().name()
        + "("
        + arguments
        + (over == null ? "" : " over " + over.name())
        + ")";
  }

  private String argument(Expr.Argument argument) {
    Expr.Name name = argument.name();
    return (name == null ? "" : name.name() + " = ") + print(argument.value());
  }

  @Override
  public String text(Expr.Text text) {
    return "\"" + text.value() + "\"";
  }

  @Override
  public String truth(Expr.Truth truth) {
    return truth.value() ? "true" : "false";
  }

  /** How tightly each form holds together. */
  private static final class HoldOf implements Expr.Cases<Hold> {
    @Override
    public Hold numeral(Expr.Numeral numeral) {
      return numeral.digits().startsWith("-") ? Hold.SIGNED : Hold.PRIMARY;
    }

    @Override
    public Hold inUnit(Expr.InUnit inUnit) {
      return Hold.PRIMARY;
    }

    @Override
    public Hold name(Expr.Name name) {
      return Hold.PRIMARY;
    }

    @Override
    public Hold part(Expr.Part part) {
      return Hold.POSTFIX;
    }

    @Override
    public Hold rate(Expr.Rate rate) {
      return Hold.POSTFIX;
    }

    @Override
    public Hold inFrame(Expr.InFrame inFrame) {
      return Hold.POSTFIX;
    }

    @Override
    public Hold vector(Expr.Vector vector) {
      return Hold.PRIMARY;
    }

    @Override
    public Hold negation(Expr.Negation negation) {
      return Hold.SIGNED;
    }

    @Override
    public Hold sum(Expr.Sum sum) {
      return Hold.SUM;
    }

    @Override
    public Hold product(Expr.Product product) {
      return Hold.PRODUCT;
    }

    @Override
    public Hold power(Expr.Power power) {
      return Hold.POWER;
    }

    @Override
    public Hold magnitude(Expr.Magnitude magnitude) {
      return Hold.PRIMARY;
    }

    @Override
    public Hold tolerance(Expr.Tolerance tolerance) {
      return Hold.TOLERANCE;
    }

    @Override
    public Hold comparison(Expr.Comparison comparison) {
      return Hold.COMPARISON;
    }

    @Override
    public Hold allOf(Expr.AllOf allOf) {
      return Hold.ALL_OF;
    }

    @Override
    public Hold anyOf(Expr.AnyOf anyOf) {
      return Hold.ANY_OF;
    }

    @Override
    public Hold choice(Expr.Choice choice) {
      return Hold.CHOICE;
    }

    @Override
    public Hold call(Expr.Call call) {
      return Hold.PRIMARY;
    }

    @Override
    public Hold text(Expr.Text text) {
      return Hold.PRIMARY;
    }

    @Override
    public Hold truth(Expr.Truth truth) {
      return Hold.PRIMARY;
    }
  }
}
