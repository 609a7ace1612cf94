package whorl.check;

import java.util.Arrays;
import java.util.Map;
import java.util.Optional;
import java.util.function.Function;
import java.util.stream.Collectors;

/** The functions at hand in every sheet, with what they take. */
enum FunctionAtHand {
  SQRT("sqrt", 1),
  CBRT("cbrt", 1),
  EXP("exp", 1),
  LN("ln", 1),
  LOG10("log10", 1),
  SIN("sin", 1),
  COS("cos", 1),
  TAN("tan", 1),
  ASIN("asin", 1),
  ACOS("acos", 1),
  ATAN("atan", 1),
  ATAN2("atan2", 2),
  ABS("abs", 1),
  MIN("min", -2),
  MAX("max", -2),
  FLOOR("floor", 1),
  CEIL("ceil", 1),
  ROUND("round", 1),
  ANGLE("angle", 2),
  UNIT("unit", 1),
  CROSS("cross", 2),
  DOT("dot", 2);

  private static final Map<String, FunctionAtHand> BY_NAME =
      Arrays.stream(values()).collect(Collectors.toMap(FunctionAtHand::word, Function.identity()));

  private final String word;
  private final int arguments;

  FunctionAtHand(String word, int arguments) {
    this.word = word;
    this.arguments = arguments;
  }

  /** The function that a name calls, unless the sheet hides it. */
  static Optional<FunctionAtHand> named(String name) {
    return Optional.ofNullable(BY_NAME.get(name));
  }

  /** Its name. */
  String word() {
    return word;
  }

  /** Whether it can be called with this many arguments. */
  boolean takes(int count) {
    return arguments >= 0 ? count == arguments : count >= -arguments;
  }

  /** How many arguments it takes, in words. */
  String takesWords() {
    return switch (arguments) {
      case 1 -> "one argument";
      case 2 -> "two arguments";
      default -> "two arguments or more";
    };
  }
}
