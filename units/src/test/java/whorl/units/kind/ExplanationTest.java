package whorl.units.kind;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;
import org.junit.jupiter.params.provider.CsvSource;
import whorl.units.Dimension;
import whorl.units.Rational;

class ExplanationTest {

  @ParameterizedTest(name = "{0} [{1}] = {2}")
  @CsvFileSource(resources = "explanations.csv")
  void refusalIsExplainedInTheAuthorsWords(
      String name,
      String kind,
      String formula,
      String inputs,
      String parts,
      String problem,
      String reason,
      String fix) {
    var judgement = FormulaKinds.judge(formula, orEmpty(inputs), kind);
    var refused = assertInstanceOf(Judgement.Refused.class, judgement);
    var context =
        Context.NONE
            .declaring(orEmpty(name))
            .of(parts.split(";", -1))
            .with(named(orEmpty(inputs)))
            .among(Map.of("T_brake", Readings.of(Kind.named("torque"))));
    assertEquals(
        new Explanation(problem, orEmpty(reason), orEmpty(fix)),
        Explanation.of(refused.refusal(), context));
  }

  private static String orEmpty(String column) {
    return column == null ? "" : column;
  }

  private static Map<String, Readings> named(String inputs) {
    Map<String, Readings> names = new LinkedHashMap<>();
    for (String input : inputs.isEmpty() ? new String[0] : inputs.split(" ", -1)) {
      int colon = input.indexOf(':');
      names.put(input.substring(0, colon), Readings.of(Kind.named(input.substring(colon + 1))));
    }
    return names;
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      textBlock =
          """
          false | radius * force | A dot product is a number with a unit and never a torque.
          true | energy * number | A cross product is a vector and never an energy.
          """)
  void vectorProductsAreToldApart(boolean cross, String factors, String problem) {
    String[] kinds = factors.split(" \\* ", -1);
    Operand left = Operand.of(Kind.named(kinds[0]));
    Operand right = Operand.of(Kind.named(kinds[1]));
    assertEquals(
        problem, problem(cross ? KindAlgebra.cross(left, right) : KindAlgebra.dot(left, right)));
  }

  private static String problem(Judgement judgement) {
    var refused = assertInstanceOf(Judgement.Refused.class, judgement);
    return Explanation.of(refused.refusal(), Context.NONE).problem();
  }

  @Test
  void withoutTheAuthorsWordsKindsSpeakForThemselves() {
    var refusal =
        new Refusal.WrongKind(
            Readings.of(Kind.named("angular_momentum")),
            List.of(Kind.named("time")),
            Dimension.of("T"));
    assertEquals(
        new Explanation(
            "A time is wanted here, but this is an angular momentum.",
            "",
            "They differ by a torque. An angular momentum over a torque is a time: it / T"),
        Explanation.of(refusal, Context.NONE));
  }

  @Test
  void whereNoKindIsWantedTheUnitIsNamed() {
    var refusal =
        new Refusal.WrongKind(Readings.of(Kind.named("mass")), List.of(), Dimension.of("M L^-3 T"));
    assertEquals(
        "q is declared as a quantity in kg·s/m³, but its right side is a mass.",
        Explanation.of(refusal, Context.NONE.declaring("q")).problem());
  }

  @Test
  void internalKindsAreSaidInUnits() {
    Readings squares = Readings.of(Kind.named("velocity_squared"));
    var refusal =
        new Refusal.WrongKind(
            squares, List.of(Kind.named("angular_velocity_squared")), Dimension.of("T^-2"));
    assertEquals(
        new Explanation(
            "q is declared as a quantity in rad²/s², but its right side is a quantity in m²/s².",
            "",
            ""),
        Explanation.of(refusal, Context.NONE.declaring("q")));
  }

  @Test
  void powerOfAnEmpiricalFitNamesTheWayOut() {
    var refusal =
        new Refusal.FractionalPower(Readings.of(Kind.named("velocity")), Rational.parse("2.8"));
    assertEquals(
        new Explanation(
            "A velocity cannot be raised to the power 2.8.",
            "Powers like this stem from formulas fitted to numbers in fixed units.",
            "Divide by a reference quantity first, such as (v/v_0)^2.8"),
        Explanation.of(refusal, Context.NONE));
  }

  @Test
  void productThatIsTooLongSaysItsNumbers() {
    assertEquals(
        "This product has 12 different factors; at most 9 can be checked together.",
        Explanation.of(new Refusal.TooManyFactors(12, 9), Context.NONE).problem());
  }

  @Test
  void conversionByHandIsRemarkedWithItsNumber() {
    assertEquals(
        "The 60 looks like a conversion from per minute to per second. An angular velocity carries"
            + " its unit, and no conversion is needed.",
        Explanation.of(new Remark(Rational.of(60), Kind.named("angular_velocity"))));
  }

  private static Context turning(String part, WrittenPi pi) {
    return Context.NONE
        .of(part)
        .with(Map.of("n", Readings.of(Kind.named("angular_velocity"))))
        .counting(new Context.Numbers(List.of(pi), List.of()));
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      textBlock =
          """
          2*pi*n/60 | 2*pi/60 | 1   | 1  | Leave out `2*pi/60`.
          pi*n      | pi      | 1/2 | 1  | Write 1/2 in place of `pi`.
          n/pi      | pi      | 1/2 | -1 | Divide by 2*pi: (n/pi)/(2*pi)
          """)
  void turnsTooManyAreTakenFromTheAuthorsOwnPi(
      String part, String text, String rest, int power, String fix) {
    var turned = new Reading(Kind.named("angular_velocity"), 1, true);
    Kind wanted = Kind.named("angular_velocity");
    var refusal =
        new Refusal.WrongKind(
            new Readings(wanted.dimension(), Set.of(turned)), List.of(wanted), wanted.dimension());
    var pi = new WrittenPi(text, Rational.parse(rest), power);
    assertEquals(fix, Explanation.of(refusal, turning(part, pi)).fix());
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      textBlock =
          """
          3.14   | Write pi in its place: 2*pi*f
          6.2832 | Write 2*pi in its place: 2*pi*f
          """)
  void roundedPiIsToldFromPi(String numeral, String fix) {
    Kind wanted = Kind.named("angular_velocity");
    var refusal =
        new Refusal.WrongKind(
            Readings.of(Kind.named("frequency")), List.of(wanted), wanted.dimension());
    var context =
        Context.NONE
            .of(numeral + "*f")
            .with(Map.of("f", Readings.of(Kind.named("frequency"))))
            .counting(new Context.Numbers(List.of(), List.of("2", numeral)));
    assertEquals(fix, Explanation.of(refusal, context).fix());
  }
}
