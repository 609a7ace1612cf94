package whorl.units;

import java.util.ArrayList;
import java.util.List;
import java.util.Objects;
import java.util.Set;
import org.jspecify.annotations.Nullable;
import whorl.units.UnitSyntaxException.Reason;

/**
 * Reads one UCUM code member by member.
 *
 * <pre>
 * term      = [ "/" ] component { ( "." | "/" ) component }          worked from left to right
 * component = "(" term ")" | digits | "10*" power | atom [ power ]
 * power     = [ "+" | "-" ] digits
 * </pre>
 *
 * An atom ends at an operator, a parenthesis or its power; inside square brackets and braces any
 * character may stand. Source: UCUM specification, version 2.1, sections 2 to 12.
 */
final class UcumReader {

  private static final int LONGEST_CODE = 200;
  private static final int DEEPEST = 20;
  private static final int LARGEST_POWER_OF_TEN = 99;

  /** What people write in braces for a revolution. */
  private static final Set<String> TURNS =
      Set.of(
          "{rev}", "{revs}", "{revolution}", "{revolutions}", "{r}", "{rot}", "{turn}", "{turns}");

  /** What the catalogue knows of atoms. */
  interface Atoms {
    /** The unit of an atom with its prefix; null if there is none. */
    @Nullable UnitText unit(String atom);

    /** The longest code with a number in it that stands here for a unit of its own; or empty. */
    String numericCode(String code, int start);

    /** Whether a symbol of the catalogue may take a prefix. */
    boolean takesPrefix(String symbol);
  }

  private final String code;
  private final Atoms atoms;
  private final List<UnitText.Power> members = new ArrayList<>();
  private Rational factor = Rational.ONE;
  private int at;
  private int depth;

  UcumReader(String code, Atoms atoms) {
    this.code = code;
    this.atoms = atoms;
  }

  /** Whether a code is an atom, which may be raised to a power, and no term. */
  static boolean isAtom(String code) {
    return code.charAt(0) != '{' && endOfAtom(code, 0) == code.length();
  }

  UnitText unit() {
    if (code.isBlank()) {
      throw refused(Reason.EMPTY, 0, code.length(), null);
    }
    if (code.length() > LONGEST_CODE) {
      throw refused(Reason.TOO_LONG, 0, code.codePointCount(0, code.length()), null);
    }
    refuseForeignCharacters();
    term(1);
    if (at < code.length()) {
      throw refused(Reason.PARENTHESIS, at, 1, null);
    }
    return UnitText.product(withFactor());
  }

  /** A code is ASCII without blanks; once that is known, chars are code points. */
  private void refuseForeignCharacters() {
    for (int i = 0; i < code.length(); i++) {
      char c = code.charAt(i);
      if (c <= ' ' || c > '~') {
        throw refused(Reason.CHARACTER, code.codePointCount(0, i), 1, null);
      }
    }
  }

  private void term(int sign) {
    if (++depth > DEEPEST) {
      throw refused(Reason.TOO_LONG, 0, code.length(), null);
    }
    int direction = sign;
    if (peek() == '/') {
      at++;
      direction = -sign;
    }
    component(direction, direction == sign);
    while (peek() == '.' || peek() == '/') {
      boolean multiplied = peek() == '.';
      at++;
      component(multiplied ? sign : -sign, multiplied);
    }
    depth--;
  }

  /**
   * Reads a component.
   *
   * @param multiplied whether what follows on the right could as well stand in one parenthesis with
   *     it, so that a code of several members may be taken as one
   */
  private void component(int sign, boolean multiplied) {
    int start = at;
    String numeric = multiplied ? atoms.numericCode(code, at) : "";
    if (!numeric.isEmpty()) {
      at += numeric.length();
      add(Objects.requireNonNull(atoms.unit(numeric)), sign, start);
    } else if (peek() == '(') {
      at++;
      term(sign);
      if (peek() != ')') {
        throw refused(Reason.PARENTHESIS, start, 1, null);
      }
      at++;
    } else if (code.startsWith("10*", at) || code.startsWith("10^", at)) {
      at += 3;
      factor = factor.times(Rational.of(10).power(sign * power(start, LARGEST_POWER_OF_TEN)));
    } else if (isDigit(peek())) {
      number(sign);
    } else {
      atom(sign);
    }
  }

  private void number(int sign) {
    int start = at;
    while (isDigit(peek())) {
      at++;
    }
    Rational value = Rational.parse(code.substring(start, at));
    if (value.isZero()) {
      throw refused(Reason.NUMBER, start, at - start, null);
    }
    factor = factor.times(value.power(sign));
  }

  private void atom(int sign) {
    int start = at;
    at = endOfAtom(code, start);
    String atom = code.substring(start, at);
    if (atom.isEmpty()) {
      throw refused(Reason.MEMBER_MISSING, at, at < code.length() ? 1 : 0, null);
    }
    @Nullable UnitText unit = atoms.unit(atom);
    if (unit == null) {
      int brace = atom.indexOf('{');
      throw brace < 0
          ? refused(Reason.UNKNOWN_CODE, start, at - start, null)
          : refused(Reason.ANNOTATION, start + brace, at - start - brace, withoutAnnotation(atom));
    }
    add(unit, sign * power(at, UnitText.LARGEST_EXPONENT), start);
  }

  private void add(UnitText unit, int exponent, int start) {
    for (UnitText.Power member : unit.members()) {
      members.add(power(member, exponent, start));
    }
  }

  private UnitText.Power power(UnitText.Power member, int outer, int start) {
    int exponent = member.exponent() * outer;
    if (Math.abs(exponent) > UnitText.LARGEST_EXPONENT) {
      throw refused(Reason.EXPONENT_RANGE, start, at - start, null);
    }
    return new UnitText.Power(member.symbol(), exponent);
  }

  /** Only the braces of a revolution have a counterpart; what other braces mean nobody can know. */
  private @Nullable String withoutAnnotation(String atom) {
    return TURNS.contains(atom) ? code.replace(atom, "circ") : null;
  }

  private static int endOfAtom(String code, int start) {
    int end = start;
    while (end < code.length() && "./()+-0123456789".indexOf(code.charAt(end)) < 0) {
      int close = -1;
      if (code.charAt(end) == '[') {
        close = code.indexOf(']', end);
      } else if (code.charAt(end) == '{') {
        close = code.indexOf('}', end);
      }
      end = Math.max(end, close) + 1;
    }
    return end;
  }

  /** The power at this place; one if none is written. */
  private int power(int start, int largest) {
    boolean negative = peek() == '-';
    boolean signed = negative || peek() == '+';
    int first = signed ? at + 1 : at;
    int value = 0;
    int end = first;
    while (end < code.length() && isDigit(code.charAt(end))) {
      value = Math.min(10 * value + code.charAt(end) - '0', largest + 1);
      end++;
    }
    if (end == first && !signed) {
      return 1;
    }
    at = end;
    if (value == 0) {
      throw refused(Reason.EXPONENT, start, Math.max(1, end - start), null);
    }
    if (value > largest) {
      throw refused(Reason.EXPONENT_RANGE, start, end - start, null);
    }
    return negative ? -value : value;
  }

  /** The members, the first that can take it with the prefix for the numeric factor. */
  private List<UnitText.Power> withFactor() {
    if (factor.equals(Rational.ONE)) {
      return members;
    }
    for (Prefix prefix : Prefix.values()) {
      for (int i = 0; i < members.size(); i++) {
        UnitText.Power member = members.get(i);
        boolean fits =
            Math.abs(member.exponent()) == 1
                && prefix.factor().power(member.exponent()).equals(Factor.of(factor));
        String symbol = prefix.symbol() + member.symbol();
        if (fits && atoms.takesPrefix(member.symbol())) {
          members.set(i, new UnitText.Power(symbol, member.exponent()));
          return members;
        }
      }
    }
    throw refused(Reason.NUMBER, 0, code.length(), null);
  }

  private int peek() {
    return at < code.length() ? code.charAt(at) : -1;
  }

  private static boolean isDigit(int c) {
    return c >= '0' && c <= '9';
  }

  private UnitSyntaxException refused(
      Reason reason, int offset, int length, @Nullable String suggestion) {
    return new UnitSyntaxException(reason, code, offset, length, suggestion);
  }
}
