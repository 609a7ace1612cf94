package whorl.syntax;

import java.util.List;
import whorl.diagnostic.Diagnostic;
import whorl.syntax.Token.Kind;

/** A place in the tokens of a line; it never moves behind the end. */
final class Cursor {
  private final List<Token> tokens;
  private int index;

  Cursor(List<Token> tokens) {
    this.tokens = tokens;
  }

  Token peek() {
    return tokens.get(index);
  }

  /** The token some places ahead, or the end. */
  Token peek(int ahead) {
    return tokens.get(Math.min(index + ahead, tokens.size() - 1));
  }

  /** The token in front of this place; not to be asked at the start. */
  Token previous() {
    return tokens.get(index - 1);
  }

  boolean atStart() {
    return index == 0;
  }

  Token take() {
    Token token = tokens.get(index);
    if (!token.is(Kind.END)) {
      index++;
    }
    return token;
  }

  void skip(int count) {
    index = Math.min(index + count, tokens.size() - 1);
  }

  boolean at(Kind kind) {
    return peek().is(kind);
  }

  boolean atWord(String word) {
    return peek().isWord(word);
  }

  boolean accept(Kind kind) {
    boolean found = at(kind);
    if (found) {
      index++;
    }
    return found;
  }

  boolean acceptWord(String word) {
    boolean found = atWord(word);
    if (found) {
      index++;
    }
    return found;
  }

  boolean atEnd() {
    return at(Kind.END);
  }

  /** The tokens from here on. */
  List<Token> rest() {
    return tokens.subList(index, tokens.size());
  }

  /** How many tokens away what closes the parenthesis or bracket here is, or -1. */
  int closing() {
    return Shapes.closing(rest(), 0);
  }

  /**
   * A refusal of what stands here. Where a character or number that cannot stand is next, nothing
   * in front of it was wrong, and its own message says more.
   */
  Refusal refusal(Diagnostic diagnostic) {
    Diagnostic wrong = peek().wrong();
    return new Refusal(wrong == null ? diagnostic : wrong);
  }
}
