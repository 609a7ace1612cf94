package whorl.units.kind;

import java.util.ArrayList;
import java.util.List;
import whorl.units.Rational;

/**
 * A formula as the check tables write it, parsed just well enough to try the algebra on it: names,
 * numerals, {@code + - * / ^}, calls, and one comparison.
 */
sealed interface Formula {

  record Numeral(Rational value) implements Formula {}

  record Name(String name) implements Formula {}

  record Negative(Formula operand) implements Formula {}

  record Pair(char operator, Formula left, Formula right) implements Formula {}

  record Call(String function, List<Formula> arguments) implements Formula {}

  static Formula parse(String text) {
    var parser = new Parser(text);
    Formula formula = parser.comparison();
    if (parser.peek() != Parser.END) {
      throw new IllegalArgumentException("cannot read \"" + text + "\" at " + parser.position);
    }
    return formula;
  }

  /** Recursive descent, one method per level of precedence. */
  final class Parser {
    private static final char END = '\0';
    private final String text;
    private int position;

    private Parser(String text) {
      this.text = text.replace(" ", "");
    }

    private char peek() {
      return position < text.length() ? text.charAt(position) : END;
    }

    private boolean take(char wanted) {
      boolean found = peek() == wanted;
      position += found ? 1 : 0;
      return found;
    }

    private Formula comparison() {
      Formula left = sum();
      for (char operator : new char[] {'<', '>'}) {
        if (take(operator)) {
          return new Pair(operator, left, sum());
        }
      }
      return left;
    }

    private Formula sum() {
      Formula sum = product();
      while (peek() == '+' || peek() == '-') {
        sum = new Pair(text.charAt(position++), sum, product());
      }
      return sum;
    }

    private Formula product() {
      Formula product = signed();
      while (peek() == '*' || peek() == '/') {
        product = new Pair(text.charAt(position++), product, signed());
      }
      return product;
    }

    private Formula signed() {
      return take('-') ? new Negative(signed()) : power();
    }

    private Formula power() {
      Formula base = primary();
      return take('^') ? new Pair('^', base, signed()) : base;
    }

    private Formula primary() {
      if (take('(')) {
        Formula inner = comparison();
        expect(')');
        return inner;
      }
      int start = position;
      boolean digit = Character.isDigit(peek());
      while (Character.isLetterOrDigit(peek()) || peek() == '_' || (digit && peek() == '.')) {
        position++;
      }
      String word = text.substring(start, position);
      if (digit) {
        return new Numeral(Rational.parse(word));
      }
      return take('(') ? new Call(word, arguments()) : new Name(word);
    }

    private List<Formula> arguments() {
      List<Formula> arguments = new ArrayList<>();
      do {
        arguments.add(comparison());
      } while (take(','));
      expect(')');
      return arguments;
    }

    private void expect(char wanted) {
      if (!take(wanted)) {
        throw new IllegalArgumentException(
            "\"" + text + "\" lacks a " + wanted + " at " + position);
      }
    }
  }
}
