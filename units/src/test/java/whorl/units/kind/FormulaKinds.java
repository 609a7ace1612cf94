package whorl.units.kind;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import whorl.units.Dimension;
import whorl.units.Rational;

/** Judges a formula of a check table: walks its tree as a checker of formulas does. */
final class FormulaKinds {
  private final Map<String, Operand> names = new HashMap<>();

  /** Ends the walk at the first part refused. */
  private static final class RefusedException extends RuntimeException {
    private static final long serialVersionUID = 1L;
    private final transient Judgement.Refused refused;

    RefusedException(Judgement.Refused refused) {
      this.refused = refused;
    }
  }

  /**
   * @param inputs names with their kinds, as {@code I:rotational_inertia w:angular_velocity}; a
   *     dimension in brackets, as {@code [M_L^-1]}, for an untagged quantity
   */
  FormulaKinds(String inputs) {
    names.put("pi", Operand.of(Readings.PI));
    for (String input : inputs.isBlank() ? new String[0] : inputs.strip().split(" +", -1)) {
      int colon = input.indexOf(":");
      names.put(input.substring(0, colon), operand(input.substring(colon + 1)));
    }
  }

  private static Operand operand(String kind) {
    return kind.startsWith("[")
        ? Operand.of(
            Readings.untagged(Dimension.of(kind.substring(1, kind.length() - 1).replace('_', ' '))))
        : Operand.of(Kind.named(kind));
  }

  /** Judges {@code y = right side}, or a right side alone, declared as a kind unless "untagged". */
  static Judgement judge(String formula, String inputs, String expectedKind) {
    int equals = formula.indexOf(" = ");
    String right = equals < 0 ? formula : formula.substring(equals + 3);
    try {
      Operand value = new FormulaKinds(inputs).operand(Formula.parse(right));
      if (expectedKind.equals("untagged")) {
        return Judgement.accepted(value);
      }
      Kind kind = Kind.named(expectedKind);
      return KindAlgebra.assigned(value, List.of(kind), kind.dimension());
    } catch (RefusedException e) {
      return e.refused;
    }
  }

  static Operand accepted(Judgement judgement) {
    return judgement.match(
        new Judgement.Cases<>() {
          @Override
          public Operand accepted(Judgement.Accepted accepted) {
            return accepted.operand();
          }

          @Override
          public Operand refused(Judgement.Refused refused) {
            throw new RefusedException(refused);
          }
        });
  }

  Operand operand(Formula formula) {
    if (formula instanceof Formula.Numeral numeral) {
      return Operand.numeral(numeral.value());
    }
    if (formula instanceof Formula.Name name) {
      return Optional.ofNullable(names.get(name.name()))
          .orElseThrow(() -> new IllegalArgumentException("no input is named " + name.name()));
    }
    if (formula instanceof Formula.Negative negative) {
      Operand operand = operand(negative.operand());
      return new Operand(operand.readings(), operand.value().map(Rational::negate).orElse(null));
    }
    if (formula instanceof Formula.Call call) {
      return accepted(call(call));
    }
    return accepted(pair((Formula.Pair) formula));
  }

  private Judgement pair(Formula.Pair pair) {
    return switch (pair.operator()) {
      case '+' -> KindAlgebra.plus(operand(pair.left()), operand(pair.right()));
      case '-' -> KindAlgebra.minus(operand(pair.left()), operand(pair.right()));
      case '<', '>' -> KindAlgebra.compared(operand(pair.left()), operand(pair.right()));
      case '^' ->
          exponent(pair)
              .map(exponent -> KindAlgebra.product(factors(pair)))
              .orElseGet(
                  () -> KindAlgebra.variablePower(operand(pair.left()), operand(pair.right())));
      default -> KindAlgebra.product(factors(pair));
    };
  }

  private Judgement call(Formula.Call call) {
    Operand first = operand(call.arguments().get(0));
    return switch (call.function()) {
      case "sqrt" -> KindAlgebra.root(first, 2);
      case "cbrt" -> KindAlgebra.root(first, 3);
      case "sin", "cos", "tan" -> KindAlgebra.sineOf(first);
      case "asin", "acos", "atan" -> KindAlgebra.arcOf(first);
      case "exp", "sinh", "cosh", "tanh" -> KindAlgebra.exponentialOf(first);
      case "ln", "log10" -> KindAlgebra.logarithmOf(first);
      case "abs" -> Judgement.accepted(first);
      case "min", "max", "atan2" -> {
        Operand met = accepted(KindAlgebra.compared(first, operand(call.arguments().get(1))));
        yield call.function().equals("atan2")
            ? Judgement.accepted(Readings.of(Kind.named("angle")))
            : Judgement.accepted(met);
      }
      default -> throw new IllegalArgumentException("no function is named " + call.function());
    };
  }

  /** The factors of a product, flattened. */
  private List<Powered> factors(Formula formula) {
    List<Powered> factors = new ArrayList<>();
    flatten(formula, Rational.ONE, factors);
    return factors;
  }

  private void flatten(Formula formula, Rational exponent, List<Powered> factors) {
    if (formula instanceof Formula.Negative negative) {
      flatten(negative.operand(), exponent, factors);
    } else if (formula instanceof Formula.Pair pair && "*/".indexOf(pair.operator()) >= 0) {
      flatten(pair.left(), exponent, factors);
      flatten(pair.right(), pair.operator() == '*' ? exponent : exponent.negate(), factors);
    } else if (formula instanceof Formula.Pair pair
        && pair.operator() == '^'
        && exponent(pair).isPresent()) {
      Rational power = exponent(pair).get();
      if (power.isInteger()) {
        flatten(pair.left(), exponent.times(power), factors);
      } else {
        factors.add(new Powered(pair, operand(pair.left()), exponent.times(power)));
      }
    } else {
      factors.add(new Powered(formula, operand(formula), exponent));
    }
  }

  /** The exponent of a power if it is made of numerals. */
  private Optional<Rational> exponent(Formula.Pair power) {
    return operand(power.right()).value();
  }
}
