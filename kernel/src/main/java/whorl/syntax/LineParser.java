package whorl.syntax;

import java.util.Set;
import org.jspecify.annotations.Nullable;
import whorl.diagnostic.Span;
import whorl.syntax.Token.Kind;

/** What the readers of statements and of the lines of their blocks have in common. */
abstract class LineParser {
  /** Constants that no definition may change. */
  private static final Set<String> CONSTANTS = Set.of("π", "g_n");

  final LogicalLine line;
  final SyntaxMessages messages;
  final Cursor cursor;
  final UnitScanner units;
  final ExpressionParser expressions;

  /**
   * A reader of one line.
   *
   * @param motion whether names may carry a prime
   */
  LineParser(LogicalLine line, Reading reading, boolean motion) {
    this.line = line;
    this.messages = reading.messages();
    this.cursor = new Cursor(line.tokens());
    this.units =
        new UnitScanner(cursor, messages, reading.names(), reading.units(), reading.unitWords());
    this.expressions = new ExpressionParser(cursor, messages, units, motion);
  }

  final Span since(Token start) {
    return start.span().to(cursor.previous().span());
  }

  /** Refuses what stands behind a complete line. */
  final void end() {
    if (!cursor.atEnd()) {
      throw expressions.unexpected();
    }
  }

  /** Refuses what stands behind a complete line that does not end in an expression. */
  final void endOfHead() {
    if (!cursor.atEnd()) {
      throw cursor.refusal(messages.trailing(cursor.peek().span()));
    }
  }

  final void word(String word, String wanted) {
    if (!cursor.acceptWord(word)) {
      throw expressions.expected(wanted);
    }
  }

  final void sign(Kind kind, String wanted) {
    if (!cursor.accept(kind)) {
      throw expressions.expected(wanted);
    }
  }

  /** A name that the line gives a meaning to. */
  final Expr.Name definedName(String wanted) {
    Token word = cursor.peek();
    Expr.Name name = expressions.freeName(wanted);
    if (CONSTANTS.contains(name.name())) {
      throw new Refusal(messages.constant(word.span()));
    }
    return name;
  }

  final Statement.@Nullable Bracket optionalBracket() {
    return cursor.at(Kind.OPEN_BRACKET) ? units.bracket() : null;
  }

  /** Whether a word that may also be a name is followed by what makes it a word: a new value. */
  final boolean introducesValue(String word) {
    Token next = cursor.peek(1);
    boolean call = next.is(Kind.OPEN) && cursor.peek().touches(next);
    return cursor.atWord(word) && ExpressionParser.beginsOperand(next) && !call;
  }

  /** Refuses a line that goes on what an earlier one left complete. */
  final void refuseOperatorInFront() {
    Token first = line.first();
    boolean connects = first.is(Kind.NAME) && Words.CONNECTING.contains(first.text());
    if (first.kind().isOperator() || connects) {
      boolean sign = first.is(Kind.MINUS);
      throw cursor.refusal(messages.lineOperator(first.span(), sign ? line.span() : null));
    }
  }
}
