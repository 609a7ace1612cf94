package whorl.units.kind;

import java.util.List;
import java.util.Locale;
import java.util.Optional;
import whorl.units.Rational;

/** The words for each reason. */
final class Wording implements Refusal.Cases<Explanation> {
  private static final Kind FREQUENCY = Kind.named("frequency");
  private static final Kind NUMBER = Kind.named("number");
  private static final Kind ANGLE = Kind.named("angle");

  private final Context context;
  private final TurnWording turns;

  Wording(Context context) {
    this.context = context;
    this.turns = new TurnWording(context);
  }

  static String number(Rational value) {
    return value.isInteger() ? value.toString() : String.valueOf(value.doubleValue());
  }

  static String capital(String sentence) {
    return sentence.substring(0, 1).toUpperCase(Locale.ROOT) + sentence.substring(1);
  }

  static String lower(String sentence) {
    return sentence.substring(0, 1).toLowerCase(Locale.ROOT) + sentence.substring(1);
  }

  @Override
  public Explanation wrongKind(Refusal.WrongKind refusal) {
    Readings found = refusal.found();
    if (refusal.wanted().isEmpty()) {
      return new Explanation(
          declaration("a quantity in " + CoherentUnit.text(refusal.dimension(), false), found),
          "",
          "");
    }
    String problem = declaration(refusal.wanted().get(0).withArticle(), found);
    return slip(found, refusal.wanted(), problem)
        .orElseGet(() -> mended(found, refusal.wanted()).about(problem));
  }

  private String declaration(String wanted, Readings found) {
    if (context.declared().isEmpty()) {
      return capital(wanted + " is wanted here, but this is " + found.withArticle() + ".");
    }
    return context.declared()
        + " is declared as "
        + wanted
        + ", but its right side is "
        + found.withArticle()
        + ".";
  }

  /** A mistake in the turns, unless more is known of just these kinds. */
  private Optional<Explanation> slip(Readings found, List<Kind> wanted, String problem) {
    boolean advised =
        Advice.on(found.namedKinds(), wanted).isPresent() && context.insideOf(FREQUENCY).isEmpty();
    return advised ? Optional.empty() : turns.slip(found, wanted, problem);
  }

  /** What makes the kind wanted of what is there; reason and fix only. */
  private Explanation mended(Readings found, List<Kind> wanted) {
    return repaired(found, wanted)
        .or(() -> CloserKind.lackingUnit(context.factors(), wanted).map(Wording::lackingUnit))
        .orElseGet(() -> difference(found, wanted, context.part(0, "it")));
  }

  /** A slip in one place; a further factor of the sheet is likelier than a third power. */
  private Optional<Explanation> repaired(Readings found, List<Kind> wanted) {
    return Repair.of(context.factors(), wanted)
        .filter(
            repair ->
                repair.slip() != Repair.Slip.HIGH_EXPONENT
                    || Difference.between(found.namedKinds(), wanted)
                        .filter(d -> context.hasOther(d.by(), context.part(0, "")))
                        .isEmpty())
        .map(repair -> new Explanation("", "", sentence(repair, wanted.get(0))));
  }

  private static String sentence(Repair repair, Kind wanted) {
    String what =
        switch (repair.slip()) {
          case UPSIDE_DOWN -> "Turn it upside down";
          case ROOT -> "Take the root";
          case EXPONENT, HIGH_EXPONENT -> "Check the exponent of `" + repair.factor() + "`";
          case WRONG_SIDE ->
              "Check on which side of the fraction bar `" + repair.factor() + "` stands";
          case TOO_MANY -> "Leave out `" + repair.factor() + "`";
        };
    return what + "; " + wanted.withArticle() + " would be " + repair.formula();
  }

  private static Explanation lackingUnit(CloserKind closer) {
    return new Explanation(
        "",
        "`" + closer.factor() + "` is a plain number here.",
        "Write its unit if it is "
            + closer.kind().withArticle()
            + ", such as "
            + Readings.of(closer.kind()).unit()
            + ".");
  }

  /** How kinds differ and how one is made of the other; reason and fix only. */
  private Explanation difference(Readings found, List<Kind> wanted, String text) {
    Optional<Advice> advice = Advice.on(found.kinds(), wanted);
    if (advice.isPresent()) {
      return new Explanation("", advice.get().difference(), advice.get().way(context, text));
    }
    if (found.dimension().equals(wanted.get(0).dimension())) {
      return new Explanation("", sameUnit(found, wanted.get(0)), "");
    }
    if (wanted.equals(List.of(NUMBER))) {
      return new Explanation(
          "", "", "Divide by another quantity of its kind, so that a number is left.");
    }
    return Difference.between(found.namedKinds(), wanted)
        .filter(difference -> !isCancelled(difference))
        .map(difference -> new Explanation("", "", sentence(difference, text)))
        .orElseGet(() -> units(found, wanted.get(0)));
  }

  /** Whether dividing by it would only take away a factor that stands there. */
  private boolean isCancelled(Difference difference) {
    Rational opposite = Rational.of(difference.divided() ? 1 : -1);
    return context.factors().stream()
        .anyMatch(
            factor ->
                factor.exponent().equals(opposite)
                    && factor.operand().readings().kinds().contains(difference.by()));
  }

  private static String sameUnit(Readings found, Kind wanted) {
    return found.kinds().stream().allMatch(Kind::isInternal)
        ? "The units agree, but quantities of these kinds do not make " + wanted.withArticle() + "."
        : "Both are in " + unit(found) + ", but they are different kinds of quantity.";
  }

  /** Says the units, unless they stand in the problem for want of a name. */
  private Explanation units(Readings found, Kind wanted) {
    if (wanted.isInternal()) {
      return new Explanation("", "", "");
    }
    return new Explanation(
        "",
        "It comes out in "
            + found.unit()
            + "; "
            + wanted.withArticle()
            + " is in "
            + Readings.of(wanted).unit()
            + ".",
        "");
  }

  private String sentence(Difference difference, String text) {
    String by = context.nameFor(difference.by(), text);
    return "They differ by "
        + difference.by().withArticle()
        + ". "
        + capital(difference.found().withArticle())
        + (difference.divided() ? " over " : " times ")
        + difference.by().withArticle()
        + " is "
        + difference.wanted().withArticle()
        + ": "
        + FactorText.dividend(text)
        + (difference.divided() ? " / " : " * ")
        + by;
  }

  @Override
  public Explanation unlike(Refusal.Unlike refusal) {
    Readings left = refusal.left();
    Readings right = refusal.right();
    String problem =
        switch (refusal.joining()) {
          case ADD -> "Cannot add " + left.withArticle() + " and " + right.withArticle() + ".";
          case SUBTRACT ->
              "Cannot subtract " + right.withArticle() + " from " + left.withArticle() + ".";
          case COMPARE ->
              "Cannot compare " + left.withArticle() + " with " + right.withArticle() + ".";
        };
    Explanation difference =
        mixedCycles(left, right)
            .or(() -> advice(left, right))
            .orElseGet(() -> plainDifference(left, right));
    return new Explanation(problem, difference.reason(), difference.fix());
  }

  private Optional<Explanation> mixedCycles(Readings left, Readings right) {
    boolean leftCycles = left.kinds().contains(FREQUENCY);
    boolean rightCycles = right.kinds().contains(FREQUENCY);
    if (leftCycles == rightCycles || !left.dimension().equals(right.dimension())) {
      return Optional.empty();
    }
    return Optional.of(turns.cyclesForRadians(1, context.part(leftCycles ? 0 : 1, "f")));
  }

  private Optional<Explanation> advice(Readings left, Readings right) {
    return Advice.onEither(left.kinds(), right.kinds())
        .map(
            advice -> {
              int found = left.kinds().contains(advice.found()) ? 0 : 1;
              String text = context.part(found, advice.found().symbol());
              return new Explanation("", advice.difference(), advice.way(context, text));
            });
  }

  private Explanation plainDifference(Readings left, Readings right) {
    if (left.dimension().equals(right.dimension())) {
      return new Explanation(
          "", "Both are in " + unit(left) + ", but they are different kinds of quantity.", "");
    }
    return Difference.between(left.namedKinds(), right.namedKinds())
        .map(difference -> new Explanation("", "", sentence(difference, context.part(0, "it"))))
        .orElseGet(
            () ->
                new Explanation(
                    "", "One is in " + left.unit() + ", the other in " + right.unit() + ".", ""));
  }

  private static String unit(Readings readings) {
    return CoherentUnit.text(readings.dimension(), false);
  }

  @Override
  public Explanation wrongArgument(Refusal.WrongArgument refusal) {
    Readings found = refusal.found();
    return switch (refusal.function()) {
      case SINE -> angleNeeded(found);
      case ARC -> numberNeeded("An arc function takes", found);
      case EXPONENTIAL -> exponent(found);
      case LOGARITHM -> numberNeeded("A logarithm takes", found);
      case VARIABLE_POWER -> numberNeeded("A power with an exponent worked out takes", found);
    };
  }

  private Explanation angleNeeded(Readings found) {
    String problem = "An angle is needed here, but this is " + found.withArticle() + ".";
    Optional<Explanation> cycles =
        TurnSlip.between(found, ANGLE).flatMap(slip -> turns.angleOfCycles(problem));
    return cycles.orElseGet(() -> mended(found, List.of(ANGLE)).about(problem));
  }

  private Explanation numberNeeded(String taker, Readings found) {
    return difference(found, List.of(NUMBER), context.part(0, "it"))
        .about(taker + " a plain number, but this is " + found.withArticle() + ".");
  }

  private Explanation exponent(Readings found) {
    String taker = "An exponential function takes";
    if (!found.dimension().isOne()) {
      return new Explanation(
          numberNeeded(taker, found).problem(), "An exponent is a plain number.", plain(found));
    }
    return context
        .insideOf(FREQUENCY)
        .map(
            cycles ->
                new Explanation(
                    taker + " a plain number or an angle, but this is " + found.withArticle() + ".",
                    "A decay has a rate in 1/s, an oscillation an angle.",
                    "Write 2*pi*" + cycles + " for " + cycles + " where an angle is meant."))
        .orElseGet(() -> numberNeeded(taker, found));
  }

  /** How a quantity becomes a number: by what differs, or over its like. */
  private String plain(Readings found) {
    String text = context.part(0, "it");
    return Difference.between(found.namedKinds(), List.of(NUMBER, ANGLE))
        .map(
            difference ->
                (difference.divided() ? "Divide by " : "Multiply by ")
                    + difference.by().withArticle()
                    + ": "
                    + FactorText.dividend(text)
                    + (difference.divided() ? " / " : " * ")
                    + context.nameFor(difference.by(), text))
        .orElse("Divide by a reference quantity of the same kind.");
  }

  @Override
  public Explanation numericValue(Refusal.NumericValue refusal) {
    return new Explanation(
        number(refusal.constant()) + " belongs to a formula between bare numbers in fixed units.",
        "Here the quantities carry their units, and the sheet converts.",
        refusal
            .formula()
            .or(() -> without(refusal.constant()))
            .map(formula -> "Leave the constant out: " + formula)
            .orElse("Leave the constant out."));
  }

  /** The product without a constant, and without numbers of turns, which go with it. */
  private Optional<String> without(Rational constant) {
    boolean turned = context.factors().stream().anyMatch(Wording::isPi);
    List<Powered> left =
        context.factors().stream()
            .filter(factor -> !isPi(factor))
            .filter(factor -> !isNumber(factor, turned, constant))
            .toList();
    return left.isEmpty() ? Optional.empty() : Optional.of(FactorText.product(left));
  }

  private static boolean isNumber(Powered factor, boolean any, Rational constant) {
    return factor.operand().value().filter(value -> any || value.equals(constant)).isPresent();
  }

  private static boolean isPi(Powered factor) {
    return factor.operand().readings().equals(Readings.PI);
  }

  @Override
  public Explanation flywheelEffect(Refusal.FlywheelEffect refusal) {
    return new Explanation(
        "A flywheel effect GD² stands where a moment of inertia is needed.",
        "GD² is four times the moment of inertia.",
        context
            .insideOf(Kind.named("flywheel_effect"))
            .map(name -> "Write " + name + "/4 for " + name)
            .orElse("Write GD2/4"));
  }

  @Override
  public Explanation temperatureReading(Refusal.TemperatureReading refusal) {
    return new Explanation(
        "A temperature in °C or °F cannot be multiplied or divided.",
        "It is a point on a scale whose zero is arbitrary.",
        "Use a difference in K: T_2 - T_1, or T_1 - (-273.15 degC) from absolute zero");
  }

  @Override
  public Explanation temperatureSum(Refusal.TemperatureSum refusal) {
    return new Explanation(
        refusal.joining() == Joining.ADD
            ? "Two temperatures in °C or °F cannot be added."
            : "A temperature in °C or °F and a difference do not go together here.",
        "Such a temperature is a point on a scale whose zero is arbitrary.",
        "Take one temperature from another, which gives a difference, or add a difference in K.");
  }

  @Override
  public Explanation wrongCharacter(Refusal.WrongCharacter refusal) {
    String found = refusal.found().withArticle();
    return refusal.cross()
        ? new Explanation(
            "A cross product is a vector and never " + found + ".",
            "The work of a force is the dot product with the way gone.",
            "Write · or dot(…).")
        : new Explanation(
            "A dot product is a number with a unit and never " + found + ".",
            "The moment of a force is the cross product of arm and force.",
            "Write × or cross(…).");
  }

  @Override
  public Explanation fractionalPower(Refusal.FractionalPower refusal) {
    return new Explanation(
        capital(refusal.base().withArticle())
            + " cannot be raised to the power "
            + number(refusal.exponent())
            + ".",
        "Powers like this stem from formulas fitted to numbers in fixed units.",
        "Divide by a reference quantity first, such as (v/v_0)^" + number(refusal.exponent()));
  }

  @Override
  public Explanation tooManyFactors(Refusal.TooManyFactors refusal) {
    return new Explanation(
        "This product has "
            + refusal.factors()
            + " different factors; at most "
            + refusal.most()
            + " can be checked together.",
        "",
        "Give a part of it a name of its own.");
  }
}
