package whorl.units.kind;

import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.regex.Pattern;
import whorl.units.Rational;

/**
 * A refusal in the words of an engineer. All wording about kinds is here and in {@code advice.txt}.
 *
 * @param problem what is wrong, one sentence
 * @param reason why, or empty
 * @param fix what to do, or empty
 */
public record Explanation(String problem, String reason, String fix) {

  /** Puts a refusal into words. */
  public static Explanation of(Refusal refusal, Context context) {
    return refusal.match(new Wording(context));
  }

  /** Puts a remark into words. */
  public static String of(Remark remark) {
    return "The "
        + number(remark.numeral())
        + " looks like a conversion from per minute to per second. "
        + capital(remark.kind().withArticle())
        + " carries its unit, and no conversion is needed.";
  }

  private static String number(Rational value) {
    double decimal = value.doubleValue();
    return value.isInteger() ? value.toString() : String.valueOf(decimal);
  }

  private static String capital(String sentence) {
    return sentence.substring(0, 1).toUpperCase(Locale.ROOT) + sentence.substring(1);
  }

  /** One method for each reason. */
  private static final class Wording implements Refusal.Cases<Explanation> {
    private static final Kind FREQUENCY = Kind.named("frequency");
    private static final Kind ANGULAR_VELOCITY = Kind.named("angular_velocity");
    private static final Kind TIME = Kind.named("time");
    private static final Kind NUMBER = Kind.named("number");
    private static final Kind ANGLE = Kind.named("angle");

    /** A name, a numeral, a call or a parenthesis: it needs no parentheses of its own. */
    private static final Pattern SIMPLE = Pattern.compile("[\\p{L}\\p{N}_.]+(\\([^()]*\\))?");

    private static final Pattern PI = Pattern.compile("\\b(pi|π)\\b");

    private static final String CYCLES_AND_RADIANS =
        "Hz counts cycles, rad/s counts radians; one cycle is 2π rad: ";

    private final Context context;

    Wording(Context context) {
      this.context = context;
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
      Kind wanted = refusal.wanted().get(0);
      Optional<Advice> advice = Advice.on(found.kinds(), refusal.wanted());
      if (advice.isEmpty() || context.insideOf(FREQUENCY).isPresent()) {
        Optional<Explanation> slip = turnSlip(found, wanted);
        if (slip.isPresent()) {
          return slip.get();
        }
      }
      Explanation difference = difference(found, refusal.wanted(), context.part(0, "it"));
      return new Explanation(
          declaration(wanted.withArticle(), found), difference.reason(), difference.fix());
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

    /** The factor 2π is missing, or there too often. */
    private Optional<Explanation> turnSlip(Readings found, Kind wanted) {
      Optional<TurnSlip> slip = TurnSlip.between(found, wanted);
      if (slip.isEmpty()) {
        return Optional.empty();
      }
      int shortfall = slip.get().shortfall();
      Optional<String> cycles = context.insideOf(FREQUENCY);
      Optional<String> radians = context.insideOf(ANGULAR_VELOCITY);
      if (wanted == ANGULAR_VELOCITY && found.kinds().contains(FREQUENCY)) {
        return Optional.of(cyclesForRadians(context.part(0, cycles.orElse("f"))));
      }
      if (wanted == FREQUENCY && found.kinds().contains(ANGULAR_VELOCITY)) {
        return Optional.of(radiansForCycles(context.part(0, radians.orElse("ω"))));
      }
      if (cycles.isPresent() && radians.isPresent()) {
        return Optional.of(
            new Explanation(
                "A factor 2π is missing between " + cycles.get() + " and " + radians.get() + ".",
                cycles.get() + " counts cycles, " + radians.get() + " radians.",
                "Write 2*pi*" + cycles.get() + " for " + cycles.get()));
      }
      if (cycles.isPresent()) {
        return Optional.of(cyclesForRadians(cycles.get()));
      }
      return Optional.of(
          shortfall > 0 ? missing(wanted, shortfall) : tooMany(wanted, -shortfall, radians));
    }

    private Explanation cyclesForRadians(String text) {
      boolean divided = PI.matcher(text).find();
      return new Explanation(
          "A frequency stands where an angular velocity is needed.",
          "",
          CYCLES_AND_RADIANS + (divided ? "leave out 2*pi" : "write 2*pi*" + inProduct(text)));
    }

    private Explanation radiansForCycles(String text) {
      return new Explanation(
          "An angular velocity stands where a frequency is needed.",
          "",
          CYCLES_AND_RADIANS + "write " + inProduct(text) + "/(2*pi)");
    }

    private Explanation missing(Kind wanted, int turns) {
      String problem =
          "A factor " + power(turns) + " is missing to make this " + wanted.withArticle() + ".";
      if (wanted == TIME) {
        return new Explanation(
            problem,
            "A number over an angular velocity is a time per radian; one turn is 2π rad.",
            "For the time of one turn multiply by 2*pi; count revolutions as an angle, as 1e6 rev");
      }
      return new Explanation(
          problem, "It counts radians; one turn is 2π rad.", "Multiply by " + written(turns));
    }

    private Explanation tooMany(Kind wanted, int turns, Optional<String> radians) {
      String problem =
          "To be " + wanted.withArticle() + ", this has a factor " + power(turns) + " too many.";
      return radians
          .map(
              name ->
                  new Explanation(
                      problem,
                      name
                          + " is an angular velocity: whether in rpm or rad/s, it counts radians,"
                          + " and the sheet converts.",
                      "Leave out " + written(turns)))
          .orElseGet(
              () ->
                  new Explanation(
                      problem,
                      "An angle counts radians; one turn is 2π rad.",
                      "Divide by " + written(turns) + ", or leave it out"));
    }

    private static String power(int turns) {
      return turns == 1 ? "2π" : "(2π)^" + turns;
    }

    private static String written(int turns) {
      return turns == 1 ? "2*pi" : "(2*pi)^" + turns;
    }

    private static String inProduct(String text) {
      return SIMPLE.matcher(text).matches() ? text : "(" + text + ")";
    }

    /** How kinds differ and how one is made of the other; reason and fix only. */
    private Explanation difference(Readings found, List<Kind> wanted, String text) {
      Optional<Advice> advice = Advice.on(found.kinds(), wanted);
      if (advice.isPresent()) {
        return new Explanation(
            "", advice.get().difference(), advice.get().way(context, inProduct(text)));
      }
      if (found.dimension().equals(wanted.get(0).dimension())) {
        return new Explanation("", sameUnit(found, wanted.get(0)), "");
      }
      if (wanted.equals(List.of(NUMBER))) {
        return new Explanation(
            "", "", "Divide by another quantity of its kind, so that a number is left");
      }
      return Difference.between(found.kinds(), wanted)
          .map(difference -> new Explanation("", "", sentence(difference, text)))
          .orElseGet(() -> units(found, wanted.get(0)));
    }

    private static String sameUnit(Readings found, Kind wanted) {
      return found.kinds().stream().allMatch(Kind::isInternal)
          ? "The units agree, but quantities of these kinds do not make "
              + wanted.withArticle()
              + "."
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
      String by = context.nameOf(difference.by());
      return "They differ by "
          + difference.by().withArticle()
          + ". "
          + capital(difference.found().withArticle())
          + (difference.divided() ? " over " : " times ")
          + difference.by().withArticle()
          + " is "
          + difference.wanted().withArticle()
          + ": "
          + text
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
      return Optional.of(cyclesForRadians(context.part(leftCycles ? 0 : 1, "f")));
    }

    private Optional<Explanation> advice(Readings left, Readings right) {
      return Advice.onEither(left.kinds(), right.kinds())
          .map(
              advice -> {
                int found = left.kinds().contains(advice.found()) ? 0 : 1;
                String text = inProduct(context.part(found, advice.found().symbol()));
                return new Explanation("", advice.difference(), advice.way(context, text));
              });
    }

    private Explanation plainDifference(Readings left, Readings right) {
      if (left.dimension().equals(right.dimension())) {
        return new Explanation(
            "", "Both are in " + unit(left) + ", but they are different kinds of quantity.", "");
      }
      return Difference.between(left.kinds(), right.kinds())
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
      Optional<String> cycles = context.insideOf(FREQUENCY);
      if (cycles.isPresent() && TurnSlip.between(found, ANGLE).isPresent()) {
        return new Explanation(
            "An angle is needed here, but this counts cycles.",
            "",
            CYCLES_AND_RADIANS + "write 2*pi*" + inProduct(cycles.get()));
      }
      Explanation difference = difference(found, List.of(ANGLE), context.part(0, "it"));
      return new Explanation(problem, difference.reason(), difference.fix());
    }

    private Explanation numberNeeded(String taker, Readings found) {
      Explanation difference = difference(found, List.of(NUMBER), context.part(0, "it"));
      return new Explanation(
          taker + " a plain number, but this is " + found.withArticle() + ".",
          difference.reason(),
          difference.fix());
    }

    private Explanation exponent(Readings found) {
      if (found.dimension().isOne() && context.insideOf(FREQUENCY).isPresent()) {
        return new Explanation(
            "An exponential function takes a plain number or an angle, but this counts cycles.",
            "",
            "A decay has a rate in 1/s; for an angle write 2*pi*"
                + context.insideOf(FREQUENCY).orElse("f"));
      }
      return numberNeeded("An exponential function takes", found);
    }

    @Override
    public Explanation numericValue(Refusal.NumericValue refusal) {
      return new Explanation(
          number(refusal.constant()) + " belongs to a formula between bare numbers in fixed units.",
          "Here the quantities carry their units, and the sheet converts.",
          "Leave the constant out: " + refusal.formula());
    }

    @Override
    public Explanation flywheelEffect(Refusal.FlywheelEffect refusal) {
      return new Explanation(
          "A flywheel effect GD² stands where a moment of inertia is needed.",
          "GD² is four times the moment of inertia.",
          "Write " + context.insideOf(Kind.named("flywheel_effect")).orElse("GD2") + "/4");
    }

    @Override
    public Explanation temperatureReading(Refusal.TemperatureReading refusal) {
      return new Explanation(
          "A temperature in °C or °F cannot be multiplied or divided.",
          "It is a point on a scale whose zero is arbitrary.",
          "Use a temperature difference in K, as T_2 - T_1");
    }

    @Override
    public Explanation temperatureSum(Refusal.TemperatureSum refusal) {
      return new Explanation(
          refusal.joining() == Joining.ADD
              ? "Two temperatures in °C or °F cannot be added."
              : "A temperature in °C or °F and a difference do not go together here.",
          "Such a temperature is a point on a scale whose zero is arbitrary.",
          "Temperature minus temperature is a difference; temperature plus or minus a difference is"
              + " a temperature");
    }

    @Override
    public Explanation wrongCharacter(Refusal.WrongCharacter refusal) {
      String found = refusal.found().withArticle();
      return refusal.cross()
          ? new Explanation(
              "A cross product is a vector and never " + found + ".",
              "The work of a force is the dot product with the way gone.",
              "Write · or dot(…)")
          : new Explanation(
              "A dot product is a number with a unit and never " + found + ".",
              "The moment of a force is the cross product of arm and force.",
              "Write × or cross(…)");
    }

    @Override
    public Explanation fractionalPower(Refusal.FractionalPower refusal) {
      return new Explanation(
          capital(refusal.base().withArticle())
              + " cannot be raised to the power "
              + number(refusal.exponent())
              + ".",
          "Powers like this stem from formulas fitted to numbers in fixed units.",
          "Divide by a reference quantity first, as (v/v_0)^" + number(refusal.exponent()));
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
          "Give a part of it a name of its own");
    }
  }
}
