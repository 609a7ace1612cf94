package whorl.syntax;

import java.util.ArrayList;
import java.util.List;
import java.util.SplittableRandom;
import whorl.diagnostic.Span;
import whorl.units.UnitText;
import whorl.units.UnitText.Power;

/** Random trees of every form, as a text can have them. */
final class RandomExpressions {
  private static final Span NOWHERE = new Span(0, 0);
  private static final List<String> NAMES =
      List.of("a", "m", "ω_max", "N", "in", "from", "g", "x1", "ΔT", "k", "spin");
  private static final List<String> PARTS = List.of("mass", "x", "ω", "L");
  private static final List<String> DIGITS = List.of("0", "2", "0.5e-3", "1000.25", "1e5", "007");
  private static final List<UnitText> UNITS =
      List.of(
          UnitText.of("m"),
          UnitText.of("degC"),
          UnitText.of("%"),
          UnitText.of("°"),
          new UnitText(List.of(new Power("kg", 1), new Power("m", 2)), List.of()),
          new UnitText(List.of(new Power("s", -1)), List.of()),
          new UnitText(List.of(new Power("m", 1)), List.of(new Power("s", 2))),
          new UnitText(List.of(new Power("J", 1)), List.of(new Power("kg", 1), new Power("K", 1))));

  private final SplittableRandom random;

  /** Bars do not stand inside bars. */
  private boolean inBars;

  RandomExpressions(SplittableRandom random) {
    this.random = random;
  }

  Expr expression(int depth) {
    return depth == 0 ? leaf() : branch(depth - 1);
  }

  private Expr leaf() {
    return switch (random.nextInt(8)) {
      case 0 -> new Expr.Truth(NOWHERE, random.nextBoolean());
      case 1, 2, 3 -> name();
      case 4 -> reading();
      default -> numeral(random.nextBoolean());
    };
  }

  private Expr branch(int depth) {
    return switch (random.nextInt(20)) {
      case 0 -> new Expr.InUnit(NOWHERE, expression(depth), unit());
      case 1 -> new Expr.Part(NOWHERE, expression(depth), partName());
      case 2 -> new Expr.Rate(NOWHERE, new Expr.Part(NOWHERE, expression(depth), partName()));
      case 3 -> new Expr.InFrame(NOWHERE, expression(depth), frame());
      case 4 -> new Expr.Vector(NOWHERE, expression(depth), expression(depth), expression(depth));
      case 5 -> negation(depth);
      case 6, 7 -> sum(depth);
      case 8, 9 -> product(depth);
      case 10, 11 -> new Expr.Power(NOWHERE, expression(depth), expression(depth));
      case 12 -> magnitude(depth);
      case 13 -> tolerance(depth);
      case 14 -> new Expr.Comparison(NOWHERE, expression(depth), relation(), expression(depth));
      case 15 -> new Expr.AllOf(NOWHERE, several(depth));
      case 16 -> new Expr.AnyOf(NOWHERE, several(depth));
      case 17 -> new Expr.Choice(NOWHERE, expression(depth), expression(depth), expression(depth));
      case 18 -> call(depth);
      default -> leaf();
    };
  }

  private <T> T one(List<T> choices) {
    return choices.get(random.nextInt(choices.size()));
  }

  private Expr.Name name() {
    return new Expr.Name(NOWHERE, one(NAMES));
  }

  private Expr.Name partName() {
    return new Expr.Name(NOWHERE, one(PARTS));
  }

  private Expr.UnitAt unit() {
    return new Expr.UnitAt(NOWHERE, one(UNITS));
  }

  private Expr.Numeral numeral(boolean withUnit) {
    String digits = one(DIGITS);
    return new Expr.Numeral(NOWHERE, digits, Double.parseDouble(digits), withUnit ? unit() : null);
  }

  /** A number below zero whose sign belongs to it. */
  private Expr.Numeral reading() {
    String digits = "-" + one(DIGITS);
    return new Expr.Numeral(NOWHERE, digits, Double.parseDouble(digits), unit());
  }

  private Expr frame() {
    Expr frame = name();
    return random.nextBoolean() ? frame : new Expr.Part(NOWHERE, frame, partName());
  }

  private Expr negation(int depth) {
    return new Expr.Negation(NOWHERE, expression(depth));
  }

  private Expr sum(int depth) {
    var terms = new ArrayList<Expr.Term>();
    terms.add(new Expr.Term(false, expression(depth)));
    for (int i = random.nextInt(1, 4); i > 0; i--) {
      terms.add(new Expr.Term(random.nextBoolean(), expression(depth)));
    }
    return new Expr.Sum(NOWHERE, terms);
  }

  private Expr product(int depth) {
    var factors = new ArrayList<Expr.Factor>();
    factors.add(new Expr.Factor(Expr.Joint.TIMES, expression(depth)));
    for (int i = random.nextInt(1, 4); i > 0; i--) {
      factors.add(new Expr.Factor(one(List.of(Expr.Joint.values())), expression(depth)));
    }
    return new Expr.Product(NOWHERE, factors);
  }

  private Expr magnitude(int depth) {
    if (inBars) {
      return leaf();
    }
    inBars = true;
    Expr operand = expression(depth);
    inBars = false;
    return new Expr.Magnitude(NOWHERE, operand);
  }

  private Expr tolerance(int depth) {
    Expr value = expression(depth);
    Expr half = expression(depth);
    // Percent of percent can be read in two ways and is refused.
    if (isPercent(value) && isPercent(half)) {
      half = name();
    }
    Expr.Numeral coverage = random.nextBoolean() ? new Expr.Numeral(NOWHERE, "2", 2, null) : null;
    return new Expr.Tolerance(NOWHERE, value, half, coverage);
  }

  private static boolean isPercent(Expr value) {
    return value instanceof Expr.Numeral number
        && number.unit() != null
        && number.unit().text().plain().equals("%");
  }

  private Expr.Relation relation() {
    return one(List.of(Expr.Relation.values()));
  }

  private List<Expr> several(int depth) {
    var values = new ArrayList<Expr>();
    for (int i = random.nextInt(2, 4); i > 0; i--) {
      values.add(expression(depth));
    }
    return values;
  }

  private Expr call(int depth) {
    var arguments = new ArrayList<Expr.Argument>();
    for (int i = random.nextInt(3); i > 0; i--) {
      arguments.add(new Expr.Argument(NOWHERE, null, expression(depth)));
    }
    if (random.nextBoolean()) {
      arguments.add(new Expr.Argument(NOWHERE, name(), expression(depth)));
    }
    if (random.nextInt(4) == 0) {
      var text = new Expr.Text(NOWHERE, "a # b.csv");
      arguments.add(0, new Expr.Argument(NOWHERE, null, text));
    }
    boolean over = !arguments.isEmpty() && random.nextInt(4) == 0;
    var function = new Expr.Name(NOWHERE, one(List.of("f", "min", "k", "m")));
    return new Expr.Call(NOWHERE, function, arguments, over ? name() : null);
  }
}
