package whorl.sheet;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.SplittableRandom;
import java.util.stream.Collectors;
import java.util.stream.LongStream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import whorl.diagnostic.Diagnostic;
import whorl.eval.Value;
import whorl.units.Rational;

/**
 * Formulas of mechanics put together at random from laws that hold: each must be accepted as what
 * it is and come to what exact fractions come to.
 */
class RandomFormulasTest {

  /** A kind with the unit that it is declared in and the ways to make it of others. */
  private record Recipe(String unit, List<String> ways) {}

  /** In a way, a word in braces is a kind. */
  private static final Map<String, Recipe> RECIPES = new LinkedHashMap<>();

  private static void recipe(String kind, String unit, String... ways) {
    RECIPES.put(kind, new Recipe(unit, List.of(ways)));
  }

  private static Recipe recipe(String kind) {
    return Optional.ofNullable(RECIPES.get(kind)).orElseThrow();
  }

  static {
    recipe("mass", "kg", "{density} * {volume}", "{inertia} / {area}");
    recipe("length", "m", "{velocity} * {time}", "{volume} / {area}", "{area} / {length}");
    recipe("time", "s", "{length} / {velocity}", "{momentum} / {force}");
    recipe("area", "m²", "{length} * {length}", "{volume} / {length}");
    recipe("volume", "m³", "{area} * {length}", "{mass} / {density}");
    recipe("density", "kg/m³", "{mass} / {volume}");
    recipe("velocity", "m/s", "{length} / {time}", "{angular velocity} * {length}");
    recipe("acceleration", "m/s²", "{velocity} / {time}", "{length} * {angular velocity}^2");
    recipe("angular velocity", "rad/s", "{angular momentum} / {inertia}", "{power} / {torque}");
    recipe("force", "N", "{mass} * {acceleration}", "{pressure} * {area}", "{momentum} / {time}");
    recipe("momentum", "kg·m/s", "{mass} * {velocity}");
    recipe("torque", "N·m", "{force} * {length}", "{inertia} * {angular velocity} / {time}");
    recipe("energy", "J", "1/2 * {mass} * {velocity}^2", "{power} * {time}", "{force} * {length}");
    recipe("power", "W", "{force} * {velocity}", "{torque} * {angular velocity}");
    recipe("inertia", "kg·m²", "{mass} * {length}^2", "1/2 * {mass} * {length}^2");
    recipe("angular momentum", "N·m·s", "{inertia} * {angular velocity}", "{torque} * {time}");
    recipe("pressure", "Pa", "{force} / {area}");
  }

  private final Map<String, Rational> inputs = new LinkedHashMap<>();
  private final StringBuilder sheet = new StringBuilder();

  private record Made(String text, Rational value) {}

  private Made input(SplittableRandom random, String kind) {
    // Small dyadic fractions are exact as doubles, so that only the operations round.
    long numerator = random.nextInt(1, 64);
    long denominator = 1L << random.nextInt(0, 5);
    String name = "q_" + inputs.size();
    var value = Rational.of(numerator, denominator);
    inputs.put(name, value);
    sheet
        .append(name + " [" + recipe(kind).unit() + "] = ")
        .append(value.doubleValue())
        .append('\n');
    return new Made(name, value);
  }

  private Made make(SplittableRandom random, String kind, int depth) {
    if (depth == 0 || random.nextInt(5) == 0) {
      return input(random, kind);
    }
    if (random.nextInt(4) == 0) {
      Made first = make(random, kind, depth - 1);
      Made second = make(random, kind, depth - 1);
      // A sum of positive terms does not cancel, so that the error stays relative.
      return new Made(
          "(" + first.text() + " + " + second.text() + ")", first.value().plus(second.value()));
    }
    List<String> ways = recipe(kind).ways();
    return way(random, ways.get(random.nextInt(ways.size())), depth - 1);
  }

  private Made way(SplittableRandom random, String way, int depth) {
    var text = new StringBuilder("(");
    var product = Rational.ONE;
    boolean divides = false;
    for (String token : way.replaceAll("\\{([a-z]+) ([a-z]+)}", "{$1_$2}").split(" ", -1)) {
      if (token.equals("*") || token.equals("/")) {
        divides = token.equals("/");
        text.append(' ').append(token).append(' ');
        continue;
      }
      Made factor;
      boolean squared = token.endsWith("^2");
      if (token.startsWith("{")) {
        String kind = token.substring(1, token.indexOf('}')).replace('_', ' ');
        factor = make(random, kind, depth);
      } else {
        factor = new Made(token, Rational.of(1, 2));
      }
      Rational value = squared ? factor.value().power(2) : factor.value();
      product = divides ? product.dividedBy(value) : product.times(value);
      text.append(factor.text()).append(squared ? "^2" : "");
    }
    return new Made(text.append(')').toString(), product);
  }

  static LongStream seeds() {
    return LongStream.range(0, 300);
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void wellKindedFormulasAgreeWithExactFractions(long seed) {
    var random = new SplittableRandom(seed);
    var kinds = new ArrayList<>(RECIPES.keySet());
    String kind = kinds.get(random.nextInt(kinds.size()));
    Made made = make(random, kind, 2);
    sheet.append("result [" + recipe(kind).unit() + "] = " + made.text());
    var fresh = new Sheet();
    CellOutcome outcome = fresh.run(new CellId("a"), "cell [1]", sheet.toString());
    assertEquals(
        "",
        outcome.errors().stream().map(Diagnostic::problem).collect(Collectors.joining("; ")),
        sheet.toString());
    double found = ((Value.Real) fresh.quantity("result").orElseThrow().value()).value();
    double exact = made.value().doubleValue();
    // Each of fewer than 64 operations rounds by half a unit in the last place.
    assertEquals(exact, found, 64 * Math.ulp(exact), sheet.toString());
  }
}
