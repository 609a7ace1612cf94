package whorl.assist;

import java.util.List;
import java.util.Optional;
import whorl.syntax.Token;
import whorl.syntax.Token.Kind;
import whorl.units.UnitCatalogue;
import whorl.units.UnitReader;
import whorl.units.UnitSyntaxException;
import whorl.units.UnitText;
import whorl.units.UnknownUnitException;

/** Finds the whole unit that one of its symbols stands in. */
final class UnitSpan {
  private static final UnitCatalogue UNITS = UnitCatalogue.standard();

  private UnitSpan() {}

  /** A unit as read from a text; empty if it is none that is known. */
  static Optional<UnitText> read(String text) {
    try {
      UnitText unit = UnitReader.read(text);
      UNITS.resolve(unit);
      return Optional.of(unit);
    } catch (UnitSyntaxException | UnknownUnitException noUnit) {
      return Optional.empty();
    }
  }

  /** The unit in brackets that open with a token, or the symbol at the place if that is all. */
  static Optional<UnitText> inBrackets(WordAt at, int open) {
    int last = at.index();
    while (isOfUnit(at.tokens().get(last + 1))) {
      last++;
    }
    return read(at.text(open + 1, last)).or(() -> read(at.token().text()));
  }

  /** Whether a token can be part of a unit in brackets. */
  static boolean isOfUnit(Token token) {
    return switch (token.kind()) {
      case NAME, UNIT_SIGN, RAISED, CARET, NUMBER, OVER, TIMES, RAISED_DOT, DOT, OPEN, CLOSE ->
          true;
      default -> false;
    };
  }

  /** Whether a token can stand behind the last symbol of a unit. */
  static boolean isEndOfUnit(Token token) {
    return switch (token.kind()) {
      case RAISED, CARET, NUMBER, MINUS, CLOSE -> true;
      default -> false;
    };
  }

  /** The unit behind a number or group; the longest text from there that is one. */
  static Optional<UnitText> behindNumber(WordAt at, int holder) {
    List<Token> tokens = at.tokens();
    int last = at.index();
    while (isOfUnit(tokens.get(last + 1)) && tokens.get(last).touches(tokens.get(last + 1))) {
      last++;
    }
    for (int end = last; end >= at.index(); end--) {
      Optional<UnitText> unit = read(at.text(holder + 1, end));
      if (unit.isPresent() && !tokens.get(end).is(Kind.TIMES)) {
        return unit;
      }
    }
    return read(at.token().text());
  }
}
