package whorl.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import whorl.laws.Laws;
import whorl.report.Layout.Binding;
import whorl.syntax.Expr;

/**
 * Lays out an expression by the customs of ISO 80000-1 and ISO 80000-2: one-letter symbols italic
 * and vectors bold italic, subscripts, words, numbers, units and functions upright.
 *
 * <p>A denominator takes all factors to its left up to the denominator before, so that {@code pi/4
 * * d^2 / k} is two fractions side by side and {@code m*g*l / I} is one.
 */
final class FormulaLayout implements Expr.Cases<Layout> {
  private static final Set<String> PI = Set.of("pi", "π");

  private final Set<String> vectors;
  private final boolean stacking;

  private FormulaLayout(Set<String> vectors, boolean stacking) {
    this.vectors = vectors;
    this.stacking = stacking;
  }

  /**
   * Lays out an expression.
   *
   * @param vectors the names that stand for vectors
   */
  static Layout of(Expr expression, Set<String> vectors) {
    return new FormulaLayout(vectors, true).lay(expression);
  }

  /**
   * Lays out a name: what follows its first low line is a subscript, further low lines part the
   * subscript with commas.
   */
  static Layout.Symbol symbol(String name, boolean vector) {
    int line = name.indexOf('_');
    String base = line < 0 ? name : name.substring(0, line);
    String subscript = line < 0 ? "" : String.join(", ", name.substring(line + 1).split("_"));
    return new Layout.Symbol(base, face(base, vector), subscript);
  }

  private static Layout.Face face(String base, boolean vector) {
    if (vector) {
      return Layout.Face.BOLD_ITALIC;
    }
    long letters = base.codePoints().filter(Character::isLetter).count();
    return letters == 1 && !PI.contains(base) ? Layout.Face.ITALIC : Layout.Face.UPRIGHT;
  }

  private Layout lay(Expr expression) {
    return expression.match(this);
  }

  private FormulaLayout flat() {
    return stacking ? new FormulaLayout(vectors, false) : this;
  }

  /** Lays out an operand, in parentheses if it holds together less tightly than its place needs. */
  private Layout operand(Expr expression, Binding needed) {
    Layout layout = lay(expression);
    return layout.binding().compareTo(needed) < 0 ? group(flat().lay(expression)) : layout;
  }

  private static Layout group(Layout body) {
    return new Layout.Group(List.of(body));
  }

  @Override
  public Layout numeral(Expr.Numeral numeral) {
    Layout number = new Layout.Upright(Figures.asWritten(numeral.digits()).text());
    return numeral.unit() == null
        ? number
        : new Layout.Measure(number, UnitSigns.of(numeral.unit().text()));
  }

  @Override
  public Layout inUnit(Expr.InUnit inUnit) {
    Layout body = flat().lay(inUnit.group());
    Layout group = body instanceof Layout.Group ? body : group(body);
    return new Layout.Measure(group, UnitSigns.of(inUnit.unit().text()));
  }

  @Override
  public Layout name(Expr.Name name) {
    String text = name.name();
    return PI.contains(text)
        ? new Layout.Symbol("π", Layout.Face.UPRIGHT, "")
        : symbol(text, vectors.contains(text));
  }

  @Override
  public Layout part(Expr.Part part) {
    return side(
        operand(part.of(), Binding.ATOM),
        new Layout.Upright("."),
        symbol(part.name().name(), false));
  }

  @Override
  public Layout rate(Expr.Rate rate) {
    return side(operand(rate.of(), Binding.ATOM), new Layout.Upright("′"));
  }

  @Override
  public Layout inFrame(Expr.InFrame inFrame) {
    // As a factor it needs parentheses, or the next factor would seem to belong to the frame.
    return new Layout.SideBySide(
        Binding.PRODUCT,
        List.of(
            operand(inFrame.vector(), Binding.ATOM),
            new Layout.Upright(" @ "),
            operand(inFrame.frame(), Binding.ATOM)));
  }

  /** A line does not end within a named argument. */
  static final String NAMED = "\u00A0=\u00A0";

  private static Layout side(Layout... pieces) {
    return new Layout.SideBySide(Binding.ATOM, List.of(pieces));
  }

  @Override
  public Layout vector(Expr.Vector vector) {
    FormulaLayout flat = flat();
    return new Layout.Group(
        List.of(flat.lay(vector.x()), flat.lay(vector.y()), flat.lay(vector.z())));
  }

  @Override
  public Layout negation(Expr.Negation negation) {
    return new Layout.SideBySide(
        Binding.SIGN, List.of(new Layout.Upright("−"), operand(negation.operand(), Binding.POWER)));
  }

  @Override
  public Layout sum(Expr.Sum sum) {
    var terms = new ArrayList<Layout.Term>();
    for (Expr.Term term : sum.terms()) {
      boolean first = terms.isEmpty();
      Layout value = operand(term.value(), Binding.PRODUCT);
      // A sign directly behind another sign is read once too often or not at all.
      boolean signed = !first && isSigned(value);
      String sign = term.subtracted() ? "−" : first ? "" : "+";
      terms.add(new Layout.Term(sign, signed ? group(value) : value));
    }
    return new Layout.Terms(Binding.SUM, terms);
  }

  /** Whether a sign stands in front; in {@code −20 °C} it belongs to the number. */
  private static boolean isSigned(Layout value) {
    return value instanceof Layout.Measure measure
        ? isSigned(measure.value())
        : value.binding() == Binding.SIGN;
  }

  @Override
  public Layout product(Expr.Product product) {
    FormulaLayout flat = flat();
    var done = new ArrayList<Layout.Factor>();
    var over = new ArrayList<Expr.Factor>();
    var under = new ArrayList<Expr>();
    for (Expr.Factor factor : product.factors()) {
      if (factor.joint() == Expr.Joint.OVER) {
        under.add(factor.value());
        continue;
      }
      if (!under.isEmpty()) {
        done.add(flat.fraction(over, under, stacking));
        over.clear();
        under.clear();
      }
      over.add(factor);
    }
    if (under.isEmpty()) {
      for (Expr.Factor factor : over) {
        done.add(factor(factor, done.isEmpty()));
      }
    } else {
      done.add(flat.fraction(over, under, stacking));
    }
    return done.size() == 1 ? done.get(0).value() : new Layout.Product(done);
  }

  private Layout.Factor factor(Expr.Factor factor, boolean first) {
    Layout value = operand(factor.value(), Binding.MEASURE);
    boolean signed = !first && isSigned(value);
    return new Layout.Factor(joint(factor.joint()), signed ? group(value) : value);
  }

  private Layout.Factor fraction(List<Expr.Factor> over, List<Expr> under, boolean stacked) {
    var above = new ArrayList<Layout.Factor>();
    for (Expr.Factor factor : over) {
      // A lone sum stands above the bar without parentheses.
      above.add(
          over.size() == 1
              ? new Layout.Factor(joint(factor.joint()), lay(factor.value()))
              : factor(factor, above.isEmpty()));
    }
    var below = new ArrayList<Layout.Factor>();
    for (Expr value : under) {
      below.add(
          new Layout.Factor(
              Layout.Joint.TIMES,
              under.size() == 1 ? lay(value) : operand(value, Binding.MEASURE)));
    }
    return new Layout.Factor(
        above.get(0).joint(), new Layout.Fraction(joined(above), joined(below), stacked));
  }

  private static Layout joined(List<Layout.Factor> factors) {
    return factors.size() == 1 ? factors.get(0).value() : new Layout.Product(factors);
  }

  private static Layout.Joint joint(Expr.Joint joint) {
    return switch (joint) {
      case TIMES, OVER -> Layout.Joint.TIMES;
      case CROSS -> Layout.Joint.CROSS;
      case DOT -> Layout.Joint.DOT;
    };
  }

  @Override
  public Layout power(Expr.Power power) {
    return new Layout.Raised(operand(power.base(), Binding.ATOM), flat().lay(power.exponent()));
  }

  @Override
  public Layout magnitude(Expr.Magnitude magnitude) {
    return new Layout.Bars(lay(magnitude.operand()));
  }

  @Override
  public Layout tolerance(Expr.Tolerance tolerance) {
    Layout limits =
        new Layout.Terms(
            Binding.TOLERANCE,
            List.of(
                new Layout.Term("", operand(tolerance.value(), Binding.PRODUCT)),
                new Layout.Term("±", operand(tolerance.half(), Binding.PRODUCT))));
    Expr.Numeral coverage = tolerance.coverage();
    return coverage == null
        ? limits
        : new Layout.SideBySide(
            Binding.TOLERANCE,
            List.of(limits, new Layout.Upright(" (k = " + coverage.digits() + ")")));
  }

  @Override
  public Layout comparison(Expr.Comparison comparison) {
    return new Layout.Terms(
        Binding.COMPARISON,
        List.of(
            new Layout.Term("", operand(comparison.left(), Binding.TOLERANCE)),
            new Layout.Term(
                comparison.relation().sign(), operand(comparison.right(), Binding.TOLERANCE))));
  }

  @Override
  public Layout allOf(Expr.AllOf allOf) {
    return conditions("and", Binding.ALL_OF, allOf.conditions());
  }

  @Override
  public Layout anyOf(Expr.AnyOf anyOf) {
    return conditions("or", Binding.ANY_OF, anyOf.conditions());
  }

  private Layout conditions(String word, Binding binding, List<Expr> conditions) {
    var terms = new ArrayList<Layout.Term>();
    for (Expr condition : conditions) {
      terms.add(
          new Layout.Term(terms.isEmpty() ? "" : word, operand(condition, Binding.COMPARISON)));
    }
    return new Layout.Terms(binding, terms);
  }

  @Override
  public Layout choice(Expr.Choice choice) {
    FormulaLayout flat = flat();
    var branches = new ArrayList<Layout.Branch>();
    Expr rest = choice;
    while (rest instanceof Expr.Choice next) {
      branches.add(new Layout.Branch(flat.lay(next.then()), flat.lay(next.condition())));
      rest = next.otherwise();
    }
    return new Layout.Branches(branches, flat.lay(rest));
  }

  @Override
  public Layout call(Expr.Call call) {
    FormulaLayout flat = flat();
    String function = call.function().name();
    if (call.arguments().size() == 1 && call.arguments().get(0).name() == null) {
      Layout argument = flat.lay(call.arguments().get(0).value());
      Optional<Layout> sign =
          switch (function) {
            case "sqrt" -> Optional.of(new Layout.Root(false, argument));
            case "cbrt" -> Optional.of(new Layout.Root(true, argument));
            case "abs" -> Optional.of(new Layout.Bars(argument));
            default -> Optional.empty();
          };
      if (sign.isPresent()) {
        return sign.get();
      }
    }
    var arguments = new ArrayList<Layout>();
    for (Expr.Argument argument : call.arguments()) {
      Layout value = flat.lay(argument.value());
      Expr.Name name = argument.name();
      arguments.add(
          name == null
              ? value
              : side(symbol(name.name(), false), new Layout.Upright(NAMED), value));
    }
    Expr.Name over = call.over();
    if (over != null && !arguments.isEmpty()) {
      int last = arguments.size() - 1;
      arguments.set(
          last,
          side(arguments.get(last), new Layout.Upright(" over "), symbol(over.name(), false)));
    }
    // The words of a law are no subscript.
    Layout called =
        Laws.named(function).isEmpty()
            ? symbol(function, false)
            : new Layout.Symbol(function, Layout.Face.UPRIGHT, "");
    return side(called, new Layout.Group(arguments));
  }

  @Override
  public Layout text(Expr.Text text) {
    return new Layout.Upright("“" + text.value() + "”");
  }

  @Override
  public Layout truth(Expr.Truth truth) {
    return new Layout.Upright(Boolean.toString(truth.value()));
  }
}
