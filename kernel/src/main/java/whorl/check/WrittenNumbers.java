package whorl.check;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import whorl.diagnostic.Span;
import whorl.syntax.Expr;
import whorl.syntax.Printer;
import whorl.units.Rational;
import whorl.units.kind.Context;
import whorl.units.kind.WrittenPi;

/** Finds each π in a formula with the numbers that stand by it in the same product. */
final class WrittenNumbers {
  private static final String PI = "π";

  /** Numbers that turn rpm into rad/s beside π, each with the conversion of time that it holds. */
  private static final Map<Rational, Rational> CONVERSIONS =
      Map.of(
          Rational.of(60), Rational.of(60),
          Rational.of(30), Rational.of(60),
          Rational.of(60_000), Rational.of(60_000),
          Rational.of(30_000), Rational.of(60_000),
          Rational.of(3600), Rational.of(3600),
          Rational.of(900), Rational.of(3600));

  private static final List<Rational> POWERS_OF_TWO =
      List.of(Rational.of(2), Rational.of(4), Rational.of(8));

  private final List<WrittenPi> pi = new ArrayList<>();
  private final List<String> numerals = new ArrayList<>();

  private WrittenNumbers() {}

  /** The numbers in some parts of a formula. */
  static Context.Numbers in(Expr... parts) {
    var numbers = new WrittenNumbers();
    for (Expr part : parts) {
      numbers.visit(part, 1);
      Expressions.walk(part, numbers::addNumeral);
    }
    return new Context.Numbers(numbers.pi, numbers.numerals);
  }

  private void addNumeral(Expr expr) {
    if (expr instanceof Expr.Numeral numeral && numeral.unit() == null) {
      numerals.add(numeral.digits());
    }
  }

  /**
   * Visits what enters a formula as a factor of it.
   *
   * @param exponent to which it enters
   */
  private void visit(Expr expr, int exponent) {
    if (powerOfPi(expr).isPresent()) {
      addPi(expr.span(), List.of(new Expr.Factor(Expr.Joint.TIMES, expr)), exponent);
    } else if (expr instanceof Expr.Product product) {
      visitFactors(product, exponent);
    } else if (expr instanceof Expr.Power power) {
      whole(power.exponent()).ifPresent(raised -> visit(power.base(), exponent * raised));
    } else if (expr instanceof Expr.Negation || expr instanceof Expr.Sum) {
      Expressions.parts(expr).forEach(part -> visit(part, exponent));
    }
  }

  private void visitFactors(Expr.Product product, int exponent) {
    var numbers = new ArrayList<Expr.Factor>();
    for (Expr.Factor factor : product.factors()) {
      if (powerOfPi(factor.value()).isPresent() || isOfConversion(factor.value())) {
        numbers.add(factor);
      } else {
        visit(factor.value(), signed(factor, exponent));
      }
    }
    if (numbers.stream().anyMatch(factor -> powerOfPi(factor.value()).isPresent())) {
      addPi(product.span(), numbers, exponent);
    }
  }

  private void addPi(Span span, List<Expr.Factor> numbers, int exponent) {
    int power = 0;
    Rational rest = Rational.ONE;
    for (Expr.Factor factor : numbers) {
      int sign = signed(factor, 1);
      power += sign * powerOfPi(factor.value()).orElse(0);
      if (factor.value() instanceof Expr.Numeral numeral) {
        Rational value = Rational.parse(numeral.digits());
        Rational conversion = CONVERSIONS.getOrDefault(value, Rational.ONE);
        rest = rest.times(value.dividedBy(conversion).power(sign));
      }
    }
    var written = new Expr.Product(span, overFirst(numbers));
    Rational left = rest.dividedBy(Rational.of(2).power(power));
    String text = Printer.expression(written);
    pi.add(new WrittenPi(text, left, power * exponent));
  }

  private static List<Expr.Factor> overFirst(List<Expr.Factor> numbers) {
    var sorted = new ArrayList<Expr.Factor>();
    numbers.stream().filter(factor -> factor.joint() != Expr.Joint.OVER).forEach(sorted::add);
    if (sorted.isEmpty()) {
      numbers.forEach(factor -> sorted.add(new Expr.Factor(Expr.Joint.TIMES, factor.value())));
      return sorted;
    }
    numbers.stream().filter(factor -> factor.joint() == Expr.Joint.OVER).forEach(sorted::add);
    return sorted;
  }

  private static int signed(Expr.Factor factor, int exponent) {
    return factor.joint() == Expr.Joint.OVER ? -exponent : exponent;
  }

  private static boolean isOfConversion(Expr expr) {
    return expr instanceof Expr.Numeral numeral
        && numeral.unit() == null
        && isOfConversion(Rational.parse(numeral.digits()));
  }

  private static boolean isOfConversion(Rational number) {
    return CONVERSIONS.containsKey(number) || POWERS_OF_TWO.contains(number);
  }

  /** The exponent of a power of π. */
  private static Optional<Integer> powerOfPi(Expr expr) {
    if (expr instanceof Expr.Power power && isPi(power.base())) {
      return whole(power.exponent());
    }
    return isPi(expr) ? Optional.of(1) : Optional.empty();
  }

  private static boolean isPi(Expr expr) {
    return expr instanceof Expr.Name name && name.name().equals(PI);
  }

  /** A small whole number. */
  private static Optional<Integer> whole(Expr expr) {
    return expr instanceof Expr.Numeral numeral
            && numeral.unit() == null
            && numeral.digits().matches("\\d")
        ? Optional.of(Integer.parseInt(numeral.digits()))
        : Optional.empty();
  }
}
