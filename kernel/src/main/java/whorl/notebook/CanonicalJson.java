package whorl.notebook;

import com.google.gson.JsonArray;
import com.google.gson.JsonElement;
import com.google.gson.JsonObject;
import com.google.gson.JsonParser;
import com.google.gson.JsonPrimitive;
import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.TreeMap;
import java.util.regex.Pattern;

/**
 * Values in the form that Jupyter gives them when it saves a notebook, so that opening and saving
 * one there changes nothing: keys sorted, texts of several lines as a list of lines.
 */
final class CanonicalJson {
  private static final Pattern IN_LINES =
      Pattern.compile("text/.*|application/javascript|image/svg\\+xml");

  /** A line with its end, divided where Jupyter divides. */
  private static final Pattern LINE =
      Pattern.compile(
          "[^E]*(?:\\r\\n|[E])|[^E]+".replace("E", "\\n\\x0B\\f\\r\\x1C-\\x1E\\x85\\u2028\\u2029"));

  /** From this power of ten on JavaScript writes whole numbers with an exponent. */
  private static final int JAVASCRIPT_POWERS = 21;

  /** Below this power of ten Python writes numbers with an exponent. */
  private static final int PYTHON_POWERS = -4;

  private CanonicalJson() {}

  /** A text as a list of lines with their ends. */
  static JsonArray lines(String text) {
    var lines = new JsonArray();
    LINE.matcher(text).results().forEach(line -> lines.add(line.group()));
    return lines;
  }

  /** An output's forms by MIME type. */
  static JsonObject bundle(Map<String, JsonElement> data) {
    var bundle = new JsonObject();
    new TreeMap<>(data)
        .forEach(
            (type, value) -> {
              boolean inLines =
                  value instanceof JsonPrimitive text
                      && text.isString()
                      && IN_LINES.matcher(type).matches();
              bundle.add(type, inLines ? lines(value.getAsString()) : sorted(value));
            });
    return bundle;
  }

  /** The same value with the keys of its objects sorted and its numbers spelled as Jupyter does. */
  static JsonElement sorted(JsonElement value) {
    if (value instanceof JsonObject object) {
      var sorted = new JsonObject();
      new TreeMap<>(object.asMap()).forEach((key, member) -> sorted.add(key, sorted(member)));
      return sorted;
    }
    if (value instanceof JsonArray array) {
      var sorted = new JsonArray();
      array.forEach(element -> sorted.add(sorted(element)));
      return sorted;
    }
    boolean computed =
        value instanceof JsonPrimitive number
            && number.isNumber()
            && number.getAsNumber() instanceof Double;
    return computed ? JsonParser.parseString(spelled(value.getAsDouble())) : value;
  }

  /**
   * A number in the one spelling that passes unchanged through a front end in JavaScript and then
   * through Jupyter's server in Python.
   */
  static String spelled(double value) {
    BigDecimal digits = shortest(value).stripTrailingZeros();
    int exponent = digits.precision() - digits.scale() - 1;
    boolean whole = digits.scale() <= 0;
    if (whole ? exponent < JAVASCRIPT_POWERS : exponent >= PYTHON_POWERS) {
      return digits.toPlainString();
    }
    String mantissa = digits.movePointLeft(exponent).toPlainString();
    return String.format(
        Locale.ROOT, "%se%s%02d", mantissa, exponent < 0 ? "-" : "+", Math.abs(exponent));
  }

  /**
   * The shortest decimal that is read back as the number. (That of {@code Double.toString} is not
   * always the shortest before Java 19.)
   */
  private static BigDecimal shortest(double value) {
    var exact = new BigDecimal(value);
    // Of any shorter decimal the rounding to 15 digits is that decimal, save for the tiniest
    // numbers.
    int precision = Math.abs(value) < Double.MIN_NORMAL ? 1 : 15;
    while (true) {
      // At a power of two the nearest decimal may miss where the next one up does not.
      for (RoundingMode mode : List.of(RoundingMode.HALF_EVEN, RoundingMode.UP)) {
        BigDecimal rounded = exact.round(new MathContext(precision, mode));
        if (rounded.doubleValue() == value) {
          return rounded;
        }
      }
      precision++;
    }
  }
}
