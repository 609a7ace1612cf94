package whorl.check;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Stream;
import whorl.diagnostic.Diagnostic;
import whorl.diagnostic.Span;
import whorl.laws.Law;
import whorl.laws.Parameter;
import whorl.syntax.Expr;
import whorl.syntax.Printer;
import whorl.syntax.Statement;
import whorl.units.Dimension;
import whorl.units.Rational;
import whorl.units.Unit;
import whorl.units.UnitCatalogue;
import whorl.units.kind.Context;
import whorl.units.kind.Explanation;
import whorl.units.kind.Kind;
import whorl.units.kind.Powered;
import whorl.units.kind.Readings;
import whorl.units.kind.Refusal;

/**
 * Messages for what the kind algebra refuses: its explanation, put at the place of the mistake and
 * into the author's own names.
 */
final class KindMessages {
  private KindMessages() {}

  /** A part of a formula as the author wrote it. */
  record Part(Span span, Expr expr, Typed typed) {
    String text() {
      return Printer.expression(expr);
    }
  }

  static CheckFailure refused(Refusal refusal, Expr expr, List<Powered> factors) {
    return new CheckFailure(
        names ->
            diagnostic(
                Explanation.of(refusal, context(names, expr).madeOf(named(factors))),
                expr.span(),
                ""));
  }

  static CheckFailure unlike(Refusal refusal, Kinds.Together together, Part left, Part right) {
    return new CheckFailure(
        names -> {
          Context context = context(names, left.expr(), right.expr());
          Explanation explanation = Explanation.of(refusal, context);
          if (lacksUnit(left, right)) {
            explanation = missingUnit(explanation.problem(), left, right);
          } else if (lacksUnit(right, left)) {
            explanation = missingUnit(explanation.problem(), right, left);
          }
          explanation = about(together, explanation, left, right);
          return diagnostic(explanation, left.span(), label(left.typed()))
              .with(right.span(), label(right.typed()));
        });
  }

  private static Explanation about(
      Kinds.Together together, Explanation explanation, Part left, Part right) {
    String both =
        left.typed().operand().readings().withArticle()
            + " and "
            + right.typed().operand().readings().withArticle();
    String problem =
        switch (together) {
          case COMPARED -> explanation.problem();
          case EQUATED ->
              "The left side of the equation is "
                  + left.typed().operand().readings().withArticle()
                  + ", its right side "
                  + right.typed().operand().readings().withArticle()
                  + ".";
          case PARTS -> "The parts of a vector must be of one kind; here stand " + both + ".";
          case BRANCHES -> "Both choices must be of one kind; here stand " + both + ".";
        };
    String fix =
        together == Kinds.Together.EQUATED && explanation.fix().isEmpty()
            ? missingInertia(left.typed().operand().readings(), right.typed().operand().readings())
            : explanation.fix();
    return new Explanation(problem, explanation.reason(), fix);
  }

  /** What to do where a torque stands for the rate that it gives; else nothing. */
  private static String missingInertia(Readings rate, Readings cause) {
    // One unknown factor may be an inertia or a couple unbalance, so the general rule is silent.
    return rate.canBe(Kind.named("angular_acceleration")) && cause.canBe(Kind.named("torque"))
        ? "A torque gives an angular acceleration through the moment of inertia: divide by it."
        : "";
  }

  /** Whether a part is a bare number beside a quantity with a unit. */
  private static boolean lacksUnit(Part bare, Part other) {
    return Expressions.isBare(bare.expr())
        && !other.typed().operand().readings().dimension().isOne();
  }

  private static Explanation missingUnit(String problem, Part bare, Part other) {
    String example =
        Kinds.usualUnit(other.typed().operand().readings())
            .map(unit -> ", such as " + inUnit(bare, unit))
            .orElse(".");
    return new Explanation(
        problem, "`" + bare.text() + "` has no unit.", "Write it with its unit" + example);
  }

  private static String inUnit(Part bare, Unit unit) {
    String number = bare.expr() instanceof Expr.Numeral ? bare.text() : "(" + bare.text() + ")";
    return number + " " + unit.text().plain();
  }

  static CheckFailure functionAtHand(Refusal refusal, String function, Part argument) {
    return new CheckFailure(
        names ->
            diagnostic(
                Explanation.of(refusal, context(names, argument)),
                argument.span(),
                label(argument.typed())));
  }

  static CheckFailure declared(Refusal refusal, Part value, Declaration declaration) {
    return new CheckFailure(
        names -> {
          Context context = context(names, value);
          if (declaration.name() != null) {
            context = context.declaring(declaration.name().name());
          }
          Explanation explanation = Explanation.of(refusal, context);
          return diagnostic(
              loneNumeral(value)
                  .filter(numeral -> !declaration.unit().dimension().isOne())
                  .map(numeral -> withUnit(explanation.problem(), numeral, value, declaration))
                  .orElse(explanation),
              value.span(),
              found(value.typed(), declaration.unit().dimension()));
        });
  }

  /** The one number written out in a product that comes to a plain number and begins with it. */
  private static Optional<Expr.Numeral> loneNumeral(Part value) {
    var numerals = new ArrayList<Expr.Numeral>();
    var constants = new ArrayList<Expr.Name>();
    Expressions.walk(
        value.expr(),
        expr -> {
          if (expr instanceof Expr.Numeral numeral) {
            numerals.add(numeral);
          } else if (expr instanceof Expr.Name name
              && ConstantAtHand.named(name.name()).isPresent()) {
            constants.add(name);
          }
        });
    boolean lone =
        Kinds.isNumber(value.typed())
            && numerals.size() == 1
            && constants.isEmpty()
            && value.expr() instanceof Expr.Product product
            && product.factors().get(0).value().equals(numerals.get(0))
            && numerals.get(0).unit() == null;
    return lone ? Optional.of(numerals.get(0)) : Optional.empty();
  }

  private static Explanation withUnit(
      String problem, Expr.Numeral numeral, Part value, Declaration declaration) {
    String digits = Printer.expression(numeral);
    String rest = value.text().substring(digits.length());
    return new Explanation(
        problem,
        "`"
            + digits
            + "` has no unit: a number takes the declared one only where numbers alone stand on the"
            + " right side.",
        "Write the unit that it has, such as "
            + digits
            + " "
            + declaration.unit().text().plain()
            + rest);
  }

  static CheckFailure argument(
      Refusal refusal, Part value, Meaning.Parameter parameter, Meaning.Function function) {
    return new CheckFailure(
        names -> {
          String place = "The parameter " + parameter.name() + " of " + function.name();
          Readings found = value.typed().operand().readings();
          String problem =
              place
                  + " is "
                  + parameter.readings().withArticle()
                  + ", but "
                  + found.withArticle()
                  + " stands there.";
          Explanation explanation =
              Expressions.isBare(value.expr())
                  ? new Explanation(
                      "",
                      "`" + value.text() + "` has no unit.",
                      "Write it with its unit, such as " + inUnit(value, parameter.unit()))
                  : Explanation.of(refusal, context(names, value));
          return diagnostic(
              new Explanation(problem, explanation.reason(), explanation.fix()),
              value.span(),
              found(value.typed(), parameter.unit().dimension()));
        });
  }

  static CheckFailure lawArgument(
      Refusal refusal, Part value, List<Kind> kinds, Parameter parameter, Law law) {
    return new CheckFailure(
        names -> {
          Readings found = value.typed().operand().readings();
          String problem =
              law.name()
                  + " takes "
                  + parameter.sort().withArticle()
                  + " as "
                  + parameter.word()
                  + ", but "
                  + found.withArticle()
                  + " stands there.";
          Unit unit = UnitCatalogue.standard().usual(kinds.get(0));
          Explanation explanation =
              Expressions.isBare(value.expr())
                  ? new Explanation(
                      "",
                      "`" + value.text() + "` has no unit.",
                      "Write it with its unit, such as " + inUnit(value, unit))
                  : Explanation.of(refusal, context(names, value));
          return diagnostic(
              new Explanation(problem, explanation.reason(), explanation.fix()),
              value.span(),
              found(value.typed(), kinds.get(0).dimension()));
        });
  }

  static CheckFailure within(Refusal refusal, Part within, Statement.Reproduction reproduction) {
    return new CheckFailure(
        names ->
            diagnostic(
                new Explanation(
                    "The deviation allowed behind “within” is a fraction such as 0.5 %, or a"
                        + " quantity of the kind of the stated value.",
                    "Here it is " + within.typed().operand().readings().withArticle() + ".", ""),
                within.span(),
                label(within.typed())));
  }

  private static Diagnostic diagnostic(Explanation explanation, Span span, String label) {
    return Diagnostic.of(
            "kind", explanation.problem(), span, explanation.reason(), explanation.fix())
        .labelled(label);
  }

  /** What was found: its unit where the dimension is wrong, else its kind. */
  private static String found(Typed typed, Dimension wanted) {
    Readings readings = typed.operand().readings();
    return readings.dimension().equals(wanted) ? Kinds.words(readings) : readings.unit();
  }

  /** The kind of a part, or its unit where only the dimension is known. */
  private static String label(Typed typed) {
    Readings readings = typed.operand().readings();
    String words = Kinds.words(readings);
    return words.isEmpty() ? readings.unit() : words;
  }

  private static Context context(Map<String, Readings> names, Part part) {
    List<Powered> factors = part.typed().factors();
    var whole = new Powered(part.text(), part.typed().operand(), Rational.ONE);
    return context(names, part.expr()).madeOf(factors.isEmpty() ? List.of(whole) : named(factors));
  }

  /** The factors, if each has its text as the key: a product of two vectors has none. */
  private static List<Powered> named(List<Powered> factors) {
    return factors.stream().allMatch(factor -> factor.key() instanceof String)
        ? factors
        : List.of();
  }

  private static Context context(Map<String, Readings> names, Expr... parts) {
    Map<String, Readings> inside = new LinkedHashMap<>();
    for (Expr part : parts) {
      for (String name : namesIn(part)) {
        Readings readings = names.get(name);
        if (readings != null) {
          inside.put(name, readings);
        }
      }
    }
    return Context.NONE
        .of(Stream.of(parts).map(Printer::expression).toArray(String[]::new))
        .counting(WrittenNumbers.in(parts))
        .with(inside)
        .among(names);
  }

  private static List<String> namesIn(Expr root) {
    var names = new ArrayList<String>();
    Expressions.walk(
        root,
        expr -> {
          if (expr instanceof Expr.Name name) {
            names.add(name.name());
          }
        });
    return names;
  }
}
