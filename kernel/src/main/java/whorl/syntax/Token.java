package whorl.syntax;

import org.jspecify.annotations.Nullable;
import whorl.diagnostic.Diagnostic;
import whorl.diagnostic.Span;

/**
 * A token.
 *
 * @param text the text, with look-alike characters folded; of a remark or a text literal what
 *     stands inside; of a number the canonical digits; of a raised exponent the digits on the line
 * @param opensLine whether it is the first on its line
 * @param wrong what is wrong, for {@link Kind#WRONG} only
 */
public record Token(
    Kind kind, Span span, String text, boolean opensLine, @Nullable Diagnostic wrong) {
  /** The kinds of token. */
  public enum Kind {
    NAME,
    NUMBER,
    RAISED,
    UNIT_SIGN,
    TEXT,
    PLUS,
    MINUS,
    TIMES,
    OVER,
    CROSS,
    RAISED_DOT,
    PLUS_MINUS,
    CARET,
    LESS,
    AT_MOST,
    MORE,
    AT_LEAST,
    EQUALS,
    FOREIGN,
    OPEN,
    CLOSE,
    OPEN_BRACKET,
    CLOSE_BRACKET,
    COMMA,
    COLON,
    DOT,
    PRIME,
    AT,
    BAR,
    TWO_BARS,
    WRONG,
    REMARK,
    LINE_END,
    END;

    /** Whether it joins two operands, so that a line may end in it and none may begin with it. */
    public boolean isOperator() {
      return switch (this) {
        case PLUS,
            MINUS,
            TIMES,
            OVER,
            CROSS,
            RAISED_DOT,
            PLUS_MINUS,
            CARET,
            LESS,
            AT_MOST,
            MORE,
            AT_LEAST,
            FOREIGN,
            AT,
            COMMA,
            EQUALS ->
            true;
        default -> false;
      };
    }

    /** Whether it compares two sides. */
    public boolean isRelation() {
      return this == LESS || this == AT_MOST || this == MORE || this == AT_LEAST;
    }
  }

  /** Whether it is of this kind. */
  public boolean is(Kind other) {
    return kind == other;
  }

  /** Whether it is this word, in a place where the word has a meaning. */
  public boolean isWord(String word) {
    return kind == Kind.NAME && text.equals(word);
  }

  /** Whether it is a word that can be a name. */
  public boolean isFreeName() {
    return kind == Kind.NAME && !Words.isReserved(text);
  }

  /** Whether it is a word that cannot be a name. */
  public boolean isReservedWord() {
    return kind == Kind.NAME && Words.isReserved(text);
  }

  /** Whether another stands right behind, with no blank between. */
  public boolean touches(Token next) {
    return span.end() == next.span.start();
  }

  /** The name with spelled Greek letters folded. */
  public Expr.Name name() {
    return new Expr.Name(span, GreekNames.fold(text));
  }
}
