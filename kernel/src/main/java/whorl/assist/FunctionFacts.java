package whorl.assist;

import java.util.List;
import java.util.Optional;
import whorl.report.InfoCard;
import whorl.report.InfoCard.Fact;

/**
 * What there is to say of a function at hand.
 *
 * @param head its name with its arguments
 * @param gist what it is, in a few words
 * @param formula what it works out; empty where the gist says it
 * @param takes its arguments and their kinds
 * @param gives the kind of its result
 * @param valid for which arguments it has a value; empty for all
 * @param example a line with it that stands by itself, if need be with a motion above it
 */
record FunctionFacts(
    String head,
    String gist,
    String formula,
    String takes,
    String gives,
    String valid,
    String example) {
  private static final String NUMBER = "x, a number";
  private static final String ANGLE = "x, an angle";
  private static final String NUMBERS = "a course of numbers, such as run_up.ω of a motion run_up";
  private static final String ANY = "a course, such as run_up.ω of a motion run_up";
  private static final String SAME = "a quantity of the kind of the course";
  private static final String ONE_KIND = "two or more quantities of one kind";

  private static final List<FunctionFacts> ALL =
      List.of(
          new FunctionFacts(
              "sqrt(x)",
              "square root",
              "√x",
              "x, a quantity of any kind",
              "the quantity whose square x is, as a length for an area",
              "x ≥ 0",
              "sqrt(9 m^2)"),
          new FunctionFacts(
              "cbrt(x)",
              "cube root",
              "∛x",
              "x, a quantity of any kind",
              "the quantity whose cube x is, as a length for a volume",
              "",
              "cbrt(27 m^3)"),
          new FunctionFacts(
              "exp(x)",
              "exponential function",
              "e to the power x",
              "x, a number or an angle, as in exp(μ*θ)",
              "a number",
              "x below 709.78, where the result becomes too large",
              "exp(0.3 * 180 deg)"),
          new FunctionFacts(
              "ln(x)", "natural logarithm", "ln x", NUMBER, "a number", "x > 0", "ln(2.5)"),
          new FunctionFacts(
              "log10(x)",
              "logarithm to base 10",
              "lg x",
              NUMBER,
              "a number",
              "x > 0",
              "log10(1000)"),
          new FunctionFacts(
              "sin(x)", "sine", "sin x", ANGLE, "a number from −1 to 1", "", "sin(30 deg)"),
          new FunctionFacts(
              "cos(x)", "cosine", "cos x", ANGLE, "a number from −1 to 1", "", "cos(30 deg)"),
          new FunctionFacts(
              "tan(x)",
              "tangent",
              "tan x = sin x / cos x",
              ANGLE,
              "a number",
              "x away from 90°, 270° and so on, where it grows beyond any limit",
              "tan(30 deg)"),
          new FunctionFacts(
              "asin(x)",
              "angle of a sine",
              "arcsin x",
              NUMBER,
              "an angle from −90° to 90°",
              "−1 ≤ x ≤ 1",
              "asin(0.5) [deg]"),
          new FunctionFacts(
              "acos(x)",
              "angle of a cosine",
              "arccos x",
              NUMBER,
              "an angle from 0° to 180°",
              "−1 ≤ x ≤ 1",
              "acos(0.5) [deg]"),
          new FunctionFacts(
              "atan(x)",
              "angle of a tangent",
              "arctan x",
              NUMBER,
              "an angle from −90° to 90°",
              "",
              "atan(1) [deg]"),
          new FunctionFacts(
              "atan2(y, x)",
              "angle of a point",
              "the angle from the x axis to the point (x, y)",
              "y, then x, two quantities of one kind",
              "an angle from −180° to 180°",
              "x and y not both zero",
              "atan2(3 m, 4 m) [deg]"),
          new FunctionFacts(
              "abs(x)",
              "size",
              "|x|",
              "x, a quantity or a vector of any kind",
              "a quantity of the same kind, not negative",
              "",
              "abs(3 m - 5 m)"),
          new FunctionFacts(
              "min(a, b, …)",
              "least of several values",
              "the least of a, b, …",
              ONE_KIND,
              "a quantity of that kind",
              "",
              "min(3 m, 250 cm)"),
          new FunctionFacts(
              "max(a, b, …)",
              "largest of several values",
              "the largest of a, b, …",
              ONE_KIND,
              "a quantity of that kind",
              "",
              "max(3 m, 250 cm)"),
          new FunctionFacts(
              "floor(x)",
              "next whole number below",
              "⌊x⌋",
              NUMBER,
              "the largest whole number that is not above x",
              "",
              "floor(7 m / (2 m))"),
          new FunctionFacts(
              "ceil(x)",
              "next whole number above",
              "⌈x⌉",
              NUMBER,
              "the least whole number that is not below x",
              "",
              "ceil(7 m / (2 m))"),
          new FunctionFacts(
              "round(x)",
              "nearest whole number",
              "x to the nearest whole number",
              NUMBER,
              "a whole number; halves go away from zero",
              "",
              "round(7 m / (2 m))"),
          new FunctionFacts(
              "angle(a, b)",
              "angle between two vectors",
              "arccos(a·b / (|a|·|b|))",
              "two vectors of any kinds",
              "an angle from 0° to 180°",
              "neither vector zero",
              "angle((1, 0, 0), (1, 1, 0)) [deg]"),
          new FunctionFacts(
              "unit(v)",
              "direction of a vector",
              "v/|v|",
              "v, a vector of any kind",
              "a vector of numbers, of size 1",
              "v not zero",
              "unit((3, 4, 0) m)"),
          new FunctionFacts(
              "cross(a, b)",
              "cross product",
              "a × b",
              "two vectors",
              "a vector, upright on both, as a torque for a lever arm and a force",
              "",
              "cross((0, 0, 2) m, (3, 0, 0) N) [N·m]"),
          new FunctionFacts(
              "dot(a, b)",
              "dot product",
              "a · b",
              "two vectors",
              "a quantity, as an energy for a force and a path",
              "",
              "dot((3, 0, 0) N, (2, 0, 0) m) [J]"),
          ofCourse("first(course)", "value at the start of a motion", ANY, SAME, "first(run_up.ω)"),
          ofCourse("last(course)", "value at the end of a motion", ANY, SAME, "last(run_up.ω)"),
          ofCourse(
              "peak(course)", "largest value during a motion", NUMBERS, SAME, "peak(run_up.ω)"),
          ofCourse(
              "least(course)", "least value during a motion", NUMBERS, SAME, "least(run_up.ω)"),
          ofCourse(
              "mean(course)", "mean over the time of a motion", NUMBERS, SAME, "mean(run_up.ω)"),
          ofCourse(
              "rms(course)",
              "root of the mean square over the time of a motion",
              NUMBERS,
              SAME,
              "rms(run_up.ω)"),
          ofCourse(
              "at(course, time)",
              "value at a time of a motion",
              ANY + ", and a time from its start",
              SAME,
              "at(run_up.ω, 3 s)"),
          ofCourse(
              "when(course, value)",
              "time at which a value is first reached",
              NUMBERS + ", and a value of its kind",
              "a time",
              "when(run_up.ω, 30 rpm)"));

  private static FunctionFacts ofCourse(
      String head, String gist, String takes, String gives, String call) {
    String motion = "motion run_up\n    ω [rpm] starts 0\n    ω' = 1 rad/s^2\n    within 10 s\n";
    return new FunctionFacts(head, gist, "", takes, gives, "", motion + call);
  }

  /** All functions at hand. */
  static List<FunctionFacts> all() {
    return ALL;
  }

  /** The function of a name, if there is one at hand. */
  static Optional<FunctionFacts> named(String name) {
    return ALL.stream().filter(function -> function.name().equals(name)).findFirst();
  }

  /** All of it on a card. */
  InfoCard card() {
    return new InfoCard(
        head,
        gist,
        List.of(
            new Fact("formula", formula.isEmpty() ? List.of() : List.of(formula)),
            Fact.of("takes", takes),
            Fact.of("gives", gives),
            new Fact("valid for", valid.isEmpty() ? List.of() : List.of(valid)),
            new Fact("example", example.lines().toList())));
  }

  /** Its name. */
  String name() {
    return head.substring(0, head.indexOf('('));
  }
}
