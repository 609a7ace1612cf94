package whorl.assist;

import java.util.List;
import whorl.syntax.Token;
import whorl.syntax.Token.Kind;
import whorl.units.UnitCatalogue;

/** What may stand in a place of a line, told from what stands in front of it. */
sealed interface Place {
  /**
   * A symbol of a unit in brackets.
   *
   * @param open the opening bracket among the tokens of the line
   */
  record InBrackets(int open) implements Place {}

  /**
   * A word of the kind that is named behind a unit in brackets.
   *
   * @param comma the comma in front
   */
  record KindWord(int open, int comma) implements Place {}

  /**
   * A symbol of a unit behind a number or a group.
   *
   * @param holder the number, or what closes the group
   */
  record BehindNumber(int holder) implements Place {}

  /**
   * A part of what stands in front of a dot.
   *
   * @param dot the dot
   */
  record Part(int dot) implements Place {}

  /** A name, a number, a call. */
  record Operand() implements Place {}

  /** A word that goes on with a line behind a complete operand. */
  record BehindOperand() implements Place {}

  /** A place where nothing can be offered, as in an exponent of a unit. */
  record Nowhere() implements Place {}

  /** The place of a token in a line. */
  static Place of(List<Token> tokens, int index) {
    int open = openBracket(tokens, index);
    if (open >= 0) {
      int comma = comma(tokens, open, index);
      return comma < 0 ? new InBrackets(open) : new KindWord(open, comma);
    }
    int holder = holder(tokens, index);
    if (holder >= 0) {
      return new BehindNumber(holder);
    }
    if (isBroken(tokens, index) || isExponentOfUnit(tokens, index)) {
      return new Nowhere();
    }
    if (index == 0 || !endsOperand(tokens, index - 1)) {
      return index > 1 && tokens.get(index - 1).is(Kind.DOT) && endsOperand(tokens, index - 2)
          ? new Part(index - 1)
          : new Operand();
    }
    return new BehindOperand();
  }

  /** Whether a character or number that cannot stand touches the word. */
  private static boolean isBroken(List<Token> tokens, int index) {
    return index > 0
        && tokens.get(index - 1).is(Kind.WRONG)
        && tokens.get(index - 1).touches(tokens.get(index));
  }

  private static boolean isExponentOfUnit(List<Token> tokens, int index) {
    int caret = caret(tokens, index);
    return caret > 0 && isSymbol(tokens.get(caret - 1)) && holder(tokens, caret - 1) >= 0;
  }

  /** The bracket that is open in front of a token, or -1. */
  private static int openBracket(List<Token> tokens, int index) {
    for (int i = index - 1; i >= 0; i--) {
      switch (tokens.get(i).kind()) {
        case OPEN_BRACKET -> {
          return i;
        }
        case NAME, UNIT_SIGN, RAISED, CARET, NUMBER, OVER, TIMES, RAISED_DOT, DOT, MINUS, PLUS -> {}
        case OPEN, CLOSE, COMMA -> {}
        default -> {
          return -1;
        }
      }
    }
    return -1;
  }

  private static int comma(List<Token> tokens, int open, int index) {
    for (int i = open + 1; i < index; i++) {
      if (tokens.get(i).is(Kind.COMMA)) {
        return i;
      }
    }
    return -1;
  }

  /** The number or group that a unit with a symbol in this place would belong to, or -1. */
  static int holder(List<Token> tokens, int index) {
    int symbol = index;
    while (symbol > 0) {
      int before = symbol - 1;
      if (holdsUnit(tokens, before)
          && tokens.get(before).span().gapTo(tokens.get(symbol).span()).length() <= 1) {
        return before;
      }
      int join = tokens.get(before).is(Kind.OPEN) ? before - 1 : before;
      if (join < 1 || !isJoin(tokens, join, before)) {
        return -1;
      }
      symbol = symbolEndingAt(tokens, join - 1);
      if (symbol < 0 || !touchAll(tokens, symbol, before + 1)) {
        return -1;
      }
    }
    return -1;
  }

  private static boolean isJoin(List<Token> tokens, int join, int before) {
    Kind kind = tokens.get(join).kind();
    return join < before
        ? kind == Kind.OVER
        : kind == Kind.OVER || kind == Kind.TIMES || kind == Kind.RAISED_DOT || kind == Kind.DOT;
  }

  /** Whether a unit may follow: a number that is no exponent, or the end of a group. */
  private static boolean holdsUnit(List<Token> tokens, int index) {
    Token token = tokens.get(index);
    if (token.is(Kind.NUMBER)) {
      return !isExponent(tokens, index);
    }
    if (!token.is(Kind.CLOSE)) {
      return false;
    }
    int open = opening(tokens, index);
    boolean call =
        open > 0
            && tokens.get(open - 1).is(Kind.NAME)
            && tokens.get(open - 1).touches(tokens.get(open))
            && !tokens.get(open - 1).isReservedWord();
    return open >= 0 && !call;
  }

  private static boolean isExponent(List<Token> tokens, int number) {
    return caret(tokens, number) >= 0;
  }

  /** The caret of an exponent, or -1 where a token is none. */
  private static int caret(List<Token> tokens, int exponent) {
    int sign = exponent - 1;
    if (sign > 0 && (tokens.get(sign).is(Kind.MINUS) || tokens.get(sign).is(Kind.PLUS))) {
      sign--;
    }
    return sign >= 0 && tokens.get(sign).is(Kind.CARET) ? sign : -1;
  }

  /** The symbol of a unit that ends in a token, with its exponent, or -1. */
  private static int symbolEndingAt(List<Token> tokens, int index) {
    int symbol = index;
    if (tokens.get(index).is(Kind.RAISED)) {
      symbol = index - 1;
    } else if (tokens.get(index).is(Kind.NUMBER)) {
      symbol = caret(tokens, index) - 1;
    }
    return symbol >= 0 && isSymbol(tokens.get(symbol)) ? symbol : -1;
  }

  private static boolean isSymbol(Token token) {
    return (token.is(Kind.NAME) || token.is(Kind.UNIT_SIGN))
        && UnitCatalogue.standard().knows(token.text());
  }

  private static boolean touchAll(List<Token> tokens, int first, int last) {
    for (int i = first; i < last; i++) {
      if (!tokens.get(i).touches(tokens.get(i + 1))) {
        return false;
      }
    }
    return true;
  }

  /** The parenthesis that one closes, or -1. */
  static int opening(List<Token> tokens, int close) {
    int depth = 0;
    for (int i = close; i >= 0; i--) {
      if (tokens.get(i).is(Kind.CLOSE)) {
        depth++;
      } else if (tokens.get(i).is(Kind.OPEN) && --depth == 0) {
        return i;
      }
    }
    return -1;
  }

  /** Whether a token ends an operand, so that no other can follow it. */
  private static boolean endsOperand(List<Token> tokens, int index) {
    Token token = tokens.get(index);
    return switch (token.kind()) {
      case NUMBER, RAISED, UNIT_SIGN, TEXT, CLOSE, CLOSE_BRACKET, PRIME -> true;
      case NAME -> !introduces(tokens, index);
      case BAR ->
          tokens.subList(0, index + 1).stream().filter(t -> t.is(Kind.BAR)).count() % 2 == 0;
      default -> false;
    };
  }

  /** Whether a word asks for an operand behind it. */
  private static boolean introduces(List<Token> tokens, int index) {
    Token word = tokens.get(index);
    if (word.isReservedWord()) {
      return !word.isWord("true") && !word.isWord("false");
    }
    boolean inCheck = tokens.get(0).isWord("check");
    return inCheck
        && ((index == 1 && word.isWord("nominal"))
            || (word.isWord("within")
                && tokens.subList(0, index).stream().anyMatch(token -> token.is(Kind.EQUALS))));
  }
}
