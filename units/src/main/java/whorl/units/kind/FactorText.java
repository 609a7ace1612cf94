package whorl.units.kind;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import whorl.units.Rational;

/** Formulas made up of the author's texts, with parentheses where they are needed. */
final class FactorText {
  /** A name, a numeral, a call or a parenthesis: it needs no parentheses of its own. */
  private static final Pattern SIMPLE =
      Pattern.compile("[\\p{L}\\p{N}_.']*(\\([^()]*\\))?|\\([^()]*\\)");

  /** What may stand in front of a further factor as it is: products of texts without units. */
  private static final Pattern PRODUCT =
      Pattern.compile("(?!.*[\\p{L}\\p{N}.)] [\\p{L}°])-?[^-+/<>=,×·]*");

  private static final Pattern WORD = Pattern.compile("[\\p{L}_][\\p{L}\\p{N}_]*");

  private FactorText() {}

  /** The names in a text. */
  static Set<String> words(String text) {
    Set<String> words = new HashSet<>();
    Matcher word = WORD.matcher(text);
    while (word.find()) {
      words.add(word.group());
    }
    return words;
  }

  /** A text as a factor of a product. */
  static String factor(String text) {
    return SIMPLE.matcher(text).matches() ? text : "(" + text + ")";
  }

  /** A text as what stands above a fraction bar or in front of a further factor. */
  static String dividend(String text) {
    return PRODUCT.matcher(text).matches() ? text : factor(text);
  }

  /** The product of some factors, each with its text as the key. */
  static String product(List<Powered> factors) {
    List<String> over = new ArrayList<>();
    List<String> under = new ArrayList<>();
    for (Powered factor : factors) {
      boolean below = factor.exponent().signum() < 0;
      Rational size = below ? factor.exponent().negate() : factor.exponent();
      String text = factor(factor.key().toString());
      String power = size.equals(Rational.ONE) ? text : text + "^" + exponent(size);
      boolean one = factor.operand().value().filter(Rational.ONE::equals).isPresent();
      if (!one && !size.isZero()) {
        (below ? under : over).add(power);
      }
    }
    String dividend = over.isEmpty() ? "1" : String.join(" * ", over);
    if (under.isEmpty()) {
      return dividend;
    }
    String divisor = String.join(" * ", under);
    return dividend + " / " + (under.size() == 1 ? divisor : "(" + divisor + ")");
  }

  private static String exponent(Rational exponent) {
    return exponent.isInteger() ? exponent.toString() : "(" + exponent + ")";
  }
}
