package whorl.syntax;

import java.util.Optional;
import org.jspecify.annotations.Nullable;
import whorl.syntax.Token.Kind;

/** A line of a motion. */
final class MotionParser extends LineParser {
  MotionParser(LogicalLine line, Reading reading) {
    super(line, reading, true);
  }

  /** The name that a line of a motion gives a meaning to within it, if it does. */
  static Optional<String> localName(LogicalLine line) {
    return isNamed(line) && line.first().isFreeName()
        ? Optional.of(line.first().name().name())
        : Optional.empty();
  }

  private static boolean isNamed(LogicalLine line) {
    Token second = line.tokens().get(1);
    return line.first().is(Kind.NAME)
        && (second.is(Kind.EQUALS)
            || second.is(Kind.OPEN_BRACKET)
            || second.is(Kind.PRIME)
            || second.isWord("starts"));
  }

  MotionLine line() {
    refuseOperatorInFront();
    if (isNamed(line)) {
      return named();
    }
    if (cursor.atWord("stop") && cursor.peek(1).isWord("when")) {
      return stop();
    }
    if (isWord("within")) {
      return limit();
    }
    if (cursor.atWord("body") && cursor.peek(1).is(Kind.NAME)) {
      return body();
    }
    if (isWord("load")) {
      return load();
    }
    return weightedRate();
  }

  private boolean isWord(String word) {
    Token next = cursor.peek(1);
    return cursor.atWord(word)
        && (ExpressionParser.beginsOperand(next) || next.is(Kind.MINUS) || next.is(Kind.PLUS));
  }

  // name [ bracket ] "starts" … | name "'" "=" expression | name [ bracket ] "=" expression
  private MotionLine named() {
    if (cursor.peek(1).is(Kind.PRIME)) {
      Expr rate = expressions.term();
      return equation(rate);
    }
    Expr.Name name = definedName("a name");
    Statement.Bracket bracket = optionalBracket();
    if (cursor.acceptWord("starts")) {
      return starts(name, bracket);
    }
    sign(Kind.EQUALS, "`starts` and a value, or `=` and a value");
    Expr value = expressions.expression();
    end();
    return new MotionLine.Local(line.span(), name, bracket, value, line.remark());
  }

  private MotionLine equation(Expr rate) {
    sign(Kind.EQUALS, "`=` and what the rate is");
    Expr value = expressions.expression();
    end();
    return new MotionLine.Equation(line.span(), rate, value, line.remark());
  }

  // "starts" ( expression | "spin" sum [ "," turn ] | turn )
  private MotionLine starts(Expr.Name name, Statement.@Nullable Bracket bracket) {
    boolean spins = introducesValue("spin");
    if (!spins && !introducesValue("turned")) {
      Expr value = expressions.expression();
      end();
      return new MotionLine.Start(line.span(), name, bracket, value, line.remark());
    }
    if (bracket != null) {
      throw new Refusal(messages.bracketOfAttitude(bracket.span()));
    }
    Expr spin = null;
    if (spins) {
      cursor.take();
      spin = expressions.sum();
    }
    MotionLine.Turn turn = !spins || cursor.accept(Kind.COMMA) ? turn() : null;
    end();
    return new MotionLine.Attitude(line.span(), name, spin, turn, line.remark());
  }

  // turn = "turned" sum "about" postfix
  private MotionLine.Turn turn() {
    Token start = cursor.peek();
    word("turned", "`turned` with an angle, `about` and an axis");
    Expr angle = expressions.sum();
    word("about", "`about` and the axis of the turn");
    Expr about = expressions.term();
    return new MotionLine.Turn(since(start), angle, about);
  }

  // "stop" "when" expression
  private MotionLine stop() {
    cursor.skip(2);
    Expr condition = expressions.expression();
    end();
    return new MotionLine.Stop(line.span(), condition, line.remark());
  }

  // "within" sum
  private MotionLine limit() {
    cursor.take();
    Expr time = expressions.sum();
    end();
    return new MotionLine.Limit(line.span(), time, line.remark());
  }

  // "body" name "about" postfix
  private MotionLine body() {
    cursor.take();
    Expr.Name name = expressions.freeName("the name of a body");
    word("about", "`about` and the point or axis that stays in place");
    Expr about = expressions.term();
    end();
    return new MotionLine.Body(line.span(), name, about, line.remark());
  }

  // "load" expression
  private MotionLine load() {
    cursor.take();
    Expr value = expressions.expression();
    end();
    return new MotionLine.Load(line.span(), value, line.remark());
  }

  // ( "(" product ")" "'" | product "*" name "'" ) "=" expression
  private MotionLine weightedRate() {
    Token first = cursor.peek();
    if (first.isReservedWord()) {
      throw cursor.refusal(messages.motionLine(first.span()));
    }
    Expr rate = expressions.product();
    if (!cursor.at(Kind.EQUALS) || !isRate(rate)) {
      throw cursor.refusal(messages.motionLine(first.span()));
    }
    return equation(rate);
  }

  private static boolean isRate(Expr value) {
    if (value instanceof Expr.Product product) {
      Expr.Factor last = product.factors().get(product.factors().size() - 1);
      return last.joint() == Expr.Joint.TIMES
          && last.value() instanceof Expr.Rate rate
          && rate.of() instanceof Expr.Name;
    }
    return value instanceof Expr.Rate rate && !(rate.of() instanceof Expr.Part);
  }
}
