package whorl.syntax;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import org.jspecify.annotations.Nullable;
import whorl.diagnostic.Diagnostic;
import whorl.diagnostic.Interruption;
import whorl.diagnostic.Span;
import whorl.syntax.Token.Kind;

/**
 * Expressions, by recursive descent: one method a rule, the rule above it. The first mistake leaves
 * by a {@link Refusal}. A complete expression ends where no rule goes on; what may follow is the
 * caller's business, who asks {@link #unexpected()} for the message where nothing fits.
 */
final class ExpressionParser {
  /** Parentheses, signs, powers, calls and choices inside one another, at most. */
  static final int DEEPEST = 200;

  private final Cursor cursor;
  private final SyntaxMessages messages;
  private final UnitScanner units;
  private final boolean motion;
  private final Deque<Token> open = new ArrayDeque<>();
  private @Nullable Token bar;
  private int depth;
  private Operand last = new Operand(new Span(0, 0), Form.OTHER);

  /** What the operand read last looks like, for the message about what follows it. */
  private enum Form {
    NUMBER,
    WITH_UNIT,
    NAME,
    PART,
    OTHER
  }

  private record Operand(Span span, Form form) {}

  /**
   * A parser at a cursor.
   *
   * @param motion whether names may carry a prime
   */
  ExpressionParser(Cursor cursor, SyntaxMessages messages, UnitScanner units, boolean motion) {
    this.cursor = cursor;
    this.messages = messages;
    this.units = units;
    this.motion = motion;
  }

  // expression = "if" comparison-or "then" expression "else" expression | comparison-or
  Expr expression() {
    return cursor.atWord("if") ? choice() : anyOf();
  }

  private Expr choice() {
    Token start = cursor.take();
    enter(start);
    Expr condition = anyOf();
    if (!cursor.acceptWord("then")) {
      throw missing(messages.choiceWithoutThen(placeOfMissing()));
    }
    Expr then = expression();
    if (!cursor.acceptWord("else")) {
      throw missing(messages.choiceWithoutElse(placeOfMissing()));
    }
    Expr otherwise = expression();
    leave();
    return new Expr.Choice(since(start), condition, then, otherwise);
  }

  // comparison-or = comparison-and { "or" comparison-and }
  private Expr anyOf() {
    Token start = cursor.peek();
    Expr first = allOf();
    return cursor.atWord("or") ? anyOf(start, first) : first;
  }

  private Expr anyOf(Token start, Expr first) {
    var conditions = new ArrayList<Expr>(List.of(first));
    while (cursor.acceptWord("or")) {
      conditions.add(allOf());
    }
    return new Expr.AnyOf(since(start), conditions);
  }

  // comparison-and = comparison { "and" comparison }
  private Expr allOf() {
    Token start = cursor.peek();
    Expr first = comparison();
    return cursor.atWord("and") ? allOf(start, first) : first;
  }

  private Expr allOf(Token start, Expr first) {
    var conditions = new ArrayList<Expr>(List.of(first));
    while (cursor.acceptWord("and")) {
      conditions.add(comparison());
    }
    return new Expr.AllOf(since(start), conditions);
  }

  // comparison = tolerance [ ("<" | "≤" | ">" | "≥") tolerance ]
  private Expr comparison() {
    Token start = cursor.peek();
    Expr left = tolerance();
    return cursor.peek().kind().isRelation() ? comparison(start, left) : left;
  }

  private Expr comparison(Token start, Expr left) {
    var relation = relation(cursor.take());
    Span leftSpan = since(start);
    Token middle = cursor.peek();
    Expr right = tolerance();
    if (cursor.peek().kind().isRelation()) {
      Token again = cursor.peek();
      throw cursor.refusal(
          messages.compareChain(start.span().to(again.span()), leftSpan, since(middle)));
    }
    return new Expr.Comparison(since(start), left, relation, right);
  }

  static Expr.Relation relation(Token sign) {
    return switch (sign.kind()) {
      case LESS -> Expr.Relation.LESS;
      case AT_MOST -> Expr.Relation.AT_MOST;
      case MORE -> Expr.Relation.MORE;
      case AT_LEAST -> Expr.Relation.AT_LEAST;
      default -> throw new IllegalArgumentException("no relation: " + sign);
    };
  }

  // tolerance = sum [ ("±" | "+-") product [ "(" "k" "=" number ")" ] ]
  private Expr tolerance() {
    Token start = cursor.peek();
    Expr value = sum();
    return cursor.at(Kind.PLUS_MINUS) ? tolerance(start, value) : value;
  }

  private Expr tolerance(Token start, Expr value) {
    Span valueSpan = since(start);
    cursor.take();
    Token halfStart = cursor.peek();
    Expr half = product();
    Span halfSpan = since(halfStart);
    if (isCoverageCall(half) && halfStart.is(Kind.NAME)) {
      throw cursor.refusal(messages.coverageCall(halfSpan));
    }
    Expr.Numeral coverage = coverage();
    Token again = cursor.peek();
    if (again.is(Kind.PLUS_MINUS)) {
      throw cursor.refusal(messages.toleranceChain(start.span().to(again.span())));
    }
    if (again.is(Kind.PLUS) || again.is(Kind.MINUS)) {
      throw cursor.refusal(
          messages.toleranceSum(start.span().to(again.span()), valueSpan, halfSpan, again.span()));
    }
    if (value instanceof Expr.Numeral share
        && half instanceof Expr.Numeral part
        && isPercent(share)
        && isPercent(part)) {
      throw cursor.refusal(messages.tolerancePercent(since(start), share, part));
    }
    return new Expr.Tolerance(since(start), value, half, coverage);
  }

  private static boolean isCoverageCall(Expr half) {
    return half instanceof Expr.Call call
        && call.arguments().stream()
            .anyMatch(argument -> argument.name() != null && argument.name().name().equals("k"));
  }

  private static boolean isPercent(Expr.Numeral number) {
    Expr.UnitAt unit = number.unit();
    return unit != null && unit.text().plain().equals("%");
  }

  private Expr.@Nullable Numeral coverage() {
    if (!cursor.at(Kind.OPEN) || !cursor.peek(1).isWord("k") || !cursor.peek(2).is(Kind.EQUALS)) {
      return null;
    }
    Token number = cursor.peek(3);
    boolean positive = number.is(Kind.NUMBER) && Double.parseDouble(number.text()) > 0;
    if (!positive || !cursor.peek(4).is(Kind.CLOSE)) {
      Token misplaced = positive ? cursor.peek(4) : number;
      Span place = cursor.peek().span().to(misplaced.span());
      cursor.skip(positive ? 4 : 3);
      throw cursor.refusal(messages.coverageForm(place));
    }
    cursor.skip(5);
    return numeral(number, null);
  }

  // sum = product { ("+" | "-") product }
  Expr sum() {
    Token start = cursor.peek();
    Expr first = product();
    return cursor.at(Kind.PLUS) || cursor.at(Kind.MINUS) ? sum(start, first) : first;
  }

  private Expr sum(Token start, Expr first) {
    var terms = new ArrayList<Expr.Term>(List.of(new Expr.Term(false, first)));
    while (cursor.at(Kind.PLUS) || cursor.at(Kind.MINUS)) {
      boolean subtracted = cursor.take().is(Kind.MINUS);
      terms.add(new Expr.Term(subtracted, product()));
    }
    return new Expr.Sum(since(start), terms);
  }

  // product = signed { ("*" | "/" | "×" | "·") signed }
  Expr product() {
    Token start = cursor.peek();
    Expr first = signed(false);
    Expr.Joint joint = joint(cursor.peek());
    return joint == null ? first : product(start, first, joint);
  }

  private Expr product(Token start, Expr first, Expr.Joint firstJoint) {
    Expr.Joint joint = firstJoint;
    var factors = new ArrayList<Expr.Factor>(List.of(new Expr.Factor(Expr.Joint.TIMES, first)));
    Token left = start;
    Expr previous = first;
    while (joint != null) {
      Span leftSpan = since(left);
      Token sign = cursor.take();
      left = cursor.peek();
      Expr factor = signed(false);
      if (joint == Expr.Joint.OVER) {
        refuseFraction(leftSpan, previous, sign, left, factor);
      }
      factors.add(new Expr.Factor(joint, factor));
      previous = factor;
      joint = joint(cursor.peek());
    }
    return new Expr.Product(since(start), factors);
  }

  private static Expr.@Nullable Joint joint(Token sign) {
    return switch (sign.kind()) {
      case TIMES -> Expr.Joint.TIMES;
      case OVER -> Expr.Joint.OVER;
      case CROSS -> Expr.Joint.CROSS;
      case RAISED_DOT -> Expr.Joint.DOT;
      default -> null;
    };
  }

  /** Refuses {@code 1/2 in}, which many mean as half an inch. */
  private void refuseFraction(Span left, Expr over, Token slash, Token start, Expr factor) {
    boolean blanks = left.end() < slash.span().start() && slash.span().end() < start.span().start();
    if (!carriesUnit(factor, start) || (blanks && !BareNumbers.isPlain(over))) {
      return;
    }
    Expr.UnitAt unit = unitOf(factor);
    Span number = new Span(start.span().start(), unit.span().start());
    throw cursor.refusal(messages.unitFraction(left.to(unit.span()), left, number, unit));
  }

  /**
   * Whether an operand that begins at a token carries a unit of its own, not one in parentheses.
   */
  private static boolean carriesUnit(Expr operand, Token start) {
    boolean carries =
        operand instanceof Expr.InUnit
            || (operand instanceof Expr.Numeral number && number.unit() != null);
    return carries && operand.span().start() == start.span().start();
  }

  private static Expr.UnitAt unitOf(Expr operand) {
    if (operand instanceof Expr.InUnit inUnit) {
      return inUnit.unit();
    }
    if (operand instanceof Expr.Numeral number && number.unit() != null) {
      return number.unit();
    }
    throw new IllegalArgumentException("no unit: " + operand);
  }

  // signed = ("-" | "+") signed | powered
  private Expr signed(boolean exponent) {
    return cursor.at(Kind.MINUS) || cursor.at(Kind.PLUS) ? afterSign(exponent) : powered(exponent);
  }

  private Expr afterSign(boolean exponent) {
    Token sign = cursor.take();
    enter(sign);
    Token number = cursor.peek();
    Expr operand = signed(exponent);
    leave();
    if (sign.is(Kind.PLUS)) {
      return operand;
    }
    // The sign of a reading belongs to it: -20 degC is twenty degrees below zero.
    if (operand instanceof Expr.Numeral reading
        && reading.unit() != null
        && number.is(Kind.NUMBER)
        && carriesUnit(reading, number)) {
      return new Expr.Numeral(
          since(sign), "-" + reading.digits(), -reading.value(), reading.unit());
    }
    return new Expr.Negation(since(sign), operand);
  }

  // powered = postfix [ "^" signed | superscripts ]
  private Expr powered(boolean exponent) {
    Token start = cursor.peek();
    Expr operand = postfix(exponent);
    return cursor.at(Kind.CARET) || cursor.at(Kind.RAISED)
        ? power(start, operand, exponent)
        : operand;
  }

  private Expr power(Token start, Expr operand, boolean exponent) {
    Token sign = cursor.peek();
    if (carriesUnit(operand, start)) {
      Span number = new Span(start.span().start(), unitOf(operand).span().start());
      Span whole = start.span().to(units.exponentSpan());
      throw cursor.refusal(
          messages.unitPowerBlank(whole, number, unitOf(operand), units.exponentSpan()));
    }
    Span baseSpan = since(start);
    Expr raisedTo;
    if (sign.is(Kind.RAISED)) {
      if (exponent) {
        throw cursor.refusal(messages.powerChain(start.span().to(sign.span())));
      }
      raisedTo = raised(cursor.take());
    } else {
      cursor.take();
      if (cursor.at(Kind.RAISED)) {
        throw cursor.refusal(messages.powerChain(sign.span().to(cursor.peek().span())));
      }
      enter(sign);
      raisedTo = signed(true);
      leave();
    }
    Token again = cursor.peek();
    if (sign.is(Kind.RAISED) && (again.is(Kind.CARET) || again.is(Kind.RAISED))) {
      throw cursor.refusal(messages.powerChain(start.span().to(again.span())));
    }
    Span power = since(start);
    refuseUnitOfExponent(start, raisedTo, power, operand, baseSpan);
    last = new Operand(power, Form.OTHER);
    return new Expr.Power(power, operand, raisedTo);
  }

  private Expr raised(Token token) {
    if (!token.text().matches("[-+]?[0-9]+")) {
      throw cursor.refusal(messages.raisedForm(token.span()));
    }
    boolean negative = token.text().startsWith("-");
    String digits = token.text().replaceFirst("^[-+]", "");
    Expr number = new Expr.Numeral(token.span(), digits, Double.parseDouble(digits), null);
    return negative ? new Expr.Negation(token.span(), number) : number;
  }

  /**
   * Refuses {@code 10^6 rev}: an exponent takes no unit, and the power needs parentheses for one.
   */
  private void refuseUnitOfExponent(
      Token start, Expr exponent, Span power, Expr base, Span baseSpan) {
    Expr bare = exponent instanceof Expr.Negation negation ? negation.operand() : exponent;
    if (bare instanceof Expr.InUnit inUnit && inUnit.span().end() == power.end()) {
      Span unit = inUnit.unit().span();
      Span number = new Span(start.span().start(), unit.start());
      throw cursor.refusal(messages.unitExponent(power, number, baseSpan, unit));
    }
    boolean number = bare instanceof Expr.Numeral numeral && numeral.unit() == null;
    if (!number || cursor.previous().is(Kind.CLOSE) || !units.isAhead()) {
      return;
    }
    boolean product = !BareNumbers.isPlain(base) && units.isName(cursor.peek());
    if (!product) {
      Span unit = cursor.peek().span();
      throw cursor.refusal(messages.unitExponent(power.to(unit), power, baseSpan, unit));
    }
  }

  /** A value with its parts and frame, {@code rotor.L @ ship}, without operators. */
  Expr term() {
    return postfix(false);
  }

  // postfix = primary { "." name | "'" | "@" name { "." name } }
  private Expr postfix(boolean exponent) {
    Token start = cursor.peek();
    Expr operand = primary(exponent);
    boolean number = start.is(Kind.NUMBER) || carriesUnit(operand, start);
    Form form = formOf(operand, start);
    int length = 0;
    while (true) {
      Token sign = cursor.peek();
      if (sign.is(Kind.DOT)) {
        operand = part(start, operand, number);
        form = Form.PART;
      } else if (sign.is(Kind.PRIME)) {
        operand = rate(start, operand);
        form = Form.OTHER;
      } else if (sign.is(Kind.AT)) {
        operand = inFrame(start, operand);
        form = Form.OTHER;
      } else {
        last = new Operand(since(start), form);
        return operand;
      }
      number = false;
      if (depth + ++length > DEEPEST) {
        throw cursor.refusal(messages.depth(sign.span(), DEEPEST));
      }
    }
  }

  private static Form formOf(Expr operand, Token start) {
    if (start.is(Kind.OPEN)) {
      return carriesUnit(operand, start) ? Form.WITH_UNIT : Form.OTHER;
    }
    if (operand instanceof Expr.Numeral number) {
      return number.unit() == null ? Form.NUMBER : Form.WITH_UNIT;
    }
    return operand instanceof Expr.Name ? Form.NAME : Form.OTHER;
  }

  private Expr part(Token start, Expr of, boolean number) {
    Token before = cursor.previous();
    Token dot = cursor.take();
    Token word = cursor.peek();
    Span owner = new Span(start.span().start(), before.span().end());
    if (number) {
      Span part = word.is(Kind.NAME) && dot.touches(word) ? dot.span().to(word.span()) : dot.span();
      throw cursor.refusal(messages.partOfNumber(part, owner));
    }
    if (!before.touches(dot) || !dot.touches(word) || !word.is(Kind.NAME)) {
      throw cursor.refusal(messages.partForm(dot.span(), owner, word));
    }
    if (word.isReservedWord()) {
      throw cursor.refusal(messages.reserved(word.span(), word.text()));
    }
    cursor.take();
    if (cursor.at(Kind.OPEN) && word.touches(cursor.peek())) {
      throw cursor.refusal(messages.callOfPart(since(start), owner, word.span()));
    }
    return new Expr.Part(since(start), of, word.name());
  }

  private Expr rate(Token start, Expr of) {
    Token before = cursor.previous();
    Token prime = cursor.peek();
    boolean state = motion && start.is(Kind.NAME) && of instanceof Expr.Name;
    boolean group =
        motion
            && start.is(Kind.OPEN)
            && before.is(Kind.CLOSE)
            && (of instanceof Expr.Product || of instanceof Expr.Name || of instanceof Expr.Part);
    if (!(of instanceof Expr.Part || state || group) || !before.touches(prime)) {
      throw cursor.refusal(
          messages.prime(prime.span(), of instanceof Expr.Rate, start.is(Kind.NUMBER)));
    }
    cursor.take();
    return new Expr.Rate(since(start), of);
  }

  private Expr inFrame(Token start, Expr vector) {
    cursor.take();
    Token frameStart = cursor.peek();
    Expr frame = freeName("the name of a frame");
    int length = 0;
    while (cursor.at(Kind.DOT)) {
      if (++length > DEEPEST) {
        throw cursor.refusal(messages.depth(cursor.peek().span(), DEEPEST));
      }
      frame = part(frameStart, frame, false);
    }
    return new Expr.InFrame(since(start), vector, frame);
  }

  /** A name that is no reserved word. */
  Expr.Name freeName(String wanted) {
    Token word = cursor.peek();
    if (word.isReservedWord()) {
      throw cursor.refusal(messages.reserved(word.span(), word.text()));
    }
    if (!word.is(Kind.NAME)) {
      throw expected(wanted);
    }
    cursor.take();
    return word.name();
  }

  // primary = number [ bare ] | group [ bare ] | vector [ bare ] | "|" sum "|" | name | call
  //         | text | "true" | "false"
  private Expr primary(boolean exponent) {
    Interruption.poll();
    Token token = cursor.peek();
    return switch (token.kind()) {
      case NUMBER -> number(exponent);
      case OPEN -> group();
      case BAR -> magnitude();
      case NAME -> word();
      case TEXT -> throw cursor.refusal(messages.textPlace(token.span()));
      case UNIT_SIGN -> throw cursor.refusal(messages.unitPlace(token.span()));
      case OPEN_BRACKET -> throw cursor.refusal(messages.bracketPlace(bracketSpan()));
      case END -> throw unfinished();
      default -> throw cursor.refusal(messages.operand(token.span()));
    };
  }

  private Expr number(boolean exponent) {
    Token token = cursor.take();
    return numeral(token, exponent ? null : units.behindNumber(token.span()));
  }

  private Expr.Numeral numeral(Token token, Expr.@Nullable UnitAt unit) {
    Span span = unit == null ? token.span() : token.span().to(unit.span());
    return new Expr.Numeral(span, token.text(), Double.parseDouble(token.text()), unit);
  }

  // group = "(" expression ")"      vector = "(" expression "," expression "," expression ")"
  private Expr group() {
    Token start = cursor.take();
    enter(start);
    if (cursor.at(Kind.CLOSE)) {
      throw cursor.refusal(messages.emptyGroup(start.span().to(cursor.peek().span())));
    }
    open.push(start);
    var parts = new ArrayList<Expr>(List.of(expression()));
    while (cursor.accept(Kind.COMMA)) {
      parts.add(expression());
    }
    close(start);
    leave();
    Span whole = since(start);
    if (parts.size() != 1 && parts.size() != 3) {
      throw cursor.refusal(messages.vectorSize(whole, parts.size()));
    }
    Expr group =
        parts.size() == 1
            ? parts.get(0)
            : new Expr.Vector(whole, parts.get(0), parts.get(1), parts.get(2));
    Expr.UnitAt unit = units.behindGroup(whole);
    return unit == null ? group : new Expr.InUnit(since(start), group, unit);
  }

  private void close(Token start) {
    if (cursor.accept(Kind.CLOSE)) {
      open.pop();
      return;
    }
    Token here = cursor.peek();
    boolean anotherStatement = here.opensLine() && Shapes.defines(cursor.rest());
    if (here.is(Kind.END) || anotherStatement) {
      throw cursor.refusal(messages.open(start.span(), "(", ")"));
    }
    throw unexpected();
  }

  // "|" sum "|"
  private Expr magnitude() {
    Token start = cursor.peek();
    if (bar != null) {
      throw cursor.refusal(messages.barsNest(start.span(), bar.span()));
    }
    cursor.take();
    bar = start;
    Expr operand = sum();
    bar = null;
    if (!cursor.accept(Kind.BAR)) {
      if (cursor.atEnd()) {
        throw cursor.refusal(messages.barOpen(start.span()));
      }
      if (cursor.at(Kind.TWO_BARS)) {
        throw cursor.refusal(messages.barsTouch(cursor.peek().span()));
      }
      throw unexpected();
    }
    return new Expr.Magnitude(since(start), operand);
  }

  // name | call | "true" | "false"
  private Expr word() {
    Token word = cursor.peek();
    if (word.isWord("true") || word.isWord("false")) {
      cursor.take();
      return new Expr.Truth(word.span(), word.isWord("true"));
    }
    if (word.isWord("if") || Words.CONNECTING.contains(word.text())) {
      throw cursor.refusal(
          word.isWord("if") ? messages.choiceInside(word.span()) : messages.operand(word.span()));
    }
    if (word.isReservedWord()) {
      throw cursor.refusal(messages.reserved(word.span(), word.text()));
    }
    cursor.take();
    if (word.isWord("not") && beginsOperand(cursor.peek())) {
      throw cursor.refusal(messages.not(word.span()));
    }
    if (cursor.at(Kind.OPEN) && word.touches(cursor.peek())) {
      return call(word);
    }
    return word.name();
  }

  /** Whether an operand begins with a token that no operator can be. */
  static boolean beginsOperand(Token token) {
    return switch (token.kind()) {
      case NAME ->
          token.isFreeName() || token.isWord("if") || token.isWord("true") || token.isWord("false");
      case NUMBER, OPEN, BAR, TEXT -> true;
      default -> false;
    };
  }

  // call = name "(" [ argument { "," argument } ] [ "over" name ] ")"
  private Expr call(Token function) {
    Token start = cursor.take();
    enter(start);
    open.push(start);
    var arguments = new ArrayList<Expr.Argument>();
    Expr.Name over = null;
    if (!cursor.at(Kind.CLOSE)) {
      var named = new HashSet<String>();
      do {
        arguments.add(argument(named));
      } while (cursor.accept(Kind.COMMA));
      if (cursor.acceptWord("over")) {
        over = freeName("the name of a case set or a motion");
      }
    }
    close(start);
    leave();
    return new Expr.Call(since(function), function.name(), arguments, over);
  }

  // argument = [ name "=" ] expression; named ones last
  private Expr.Argument argument(Set<String> named) {
    Token start = cursor.peek();
    if (start.isFreeName() && cursor.peek(1).is(Kind.EQUALS)) {
      Expr.Name name = cursor.take().name();
      cursor.take();
      if (!named.add(name.name())) {
        throw cursor.refusal(messages.argumentTwice(start.span(), name.name()));
      }
      Expr value = argumentValue();
      return new Expr.Argument(since(start), name, value);
    }
    Expr value = argumentValue();
    if (!named.isEmpty()) {
      throw cursor.refusal(messages.argumentOrder(since(start)));
    }
    return new Expr.Argument(since(start), null, value);
  }

  private Expr argumentValue() {
    Token token = cursor.peek();
    if (token.is(Kind.TEXT)) {
      cursor.take();
      last = new Operand(token.span(), Form.OTHER);
      return new Expr.Text(token.span(), token.text());
    }
    return expression();
  }

  private void enter(Token token) {
    if (++depth > DEEPEST) {
      throw cursor.refusal(messages.depth(token.span(), DEEPEST));
    }
  }

  private void leave() {
    depth--;
  }

  private Span since(Token start) {
    return start.span().to(cursor.previous().span());
  }

  /** A bracket here, up to what closes it. */
  private Span bracketSpan() {
    int close = cursor.closing();
    return cursor.peek().span().to(cursor.peek(Math.max(close, 0)).span());
  }

  private Refusal missing(Diagnostic diagnostic) {
    return open.isEmpty() || !cursor.atEnd() ? cursor.refusal(diagnostic) : unfinished();
  }

  /** The token here, or at the end of the statement the one in front. */
  Span placeOfMissing() {
    return cursor.atEnd() && !cursor.atStart() ? cursor.previous().span() : cursor.peek().span();
  }

  private Refusal unfinished() {
    Token opened = open.peek();
    return cursor.refusal(
        opened == null
            ? messages.unfinished(placeOfMissing())
            : messages.open(opened.span(), "(", ")"));
  }

  /** Something is missing here that the statement needs. */
  Refusal expected(String wanted) {
    return cursor.refusal(messages.expected(placeOfMissing(), wanted, cursor.atEnd()));
  }

  /** What stands here cannot follow the complete expression in front of it. */
  Refusal unexpected() {
    return cursor.refusal(follower(cursor.peek()));
  }

  private Diagnostic follower(Token token) {
    Span here = token.span();
    return switch (token.kind()) {
      case FOREIGN, TWO_BARS -> messages.operatorForeign(here, token.text());
      case EQUALS -> messages.assignmentPlace(here);
      case CLOSE, CLOSE_BRACKET -> messages.closeWithoutOpen(here, token.text());
      case OPEN_BRACKET ->
          last.form() == Form.NUMBER
              ? messages.bracketBehindNumber(bracketSpan(), last.span())
              : messages.bracketPlace(bracketSpan());
      case TEXT -> messages.textPlace(here);
      case UNIT_SIGN -> messages.unitPlace(here);
      case PRIME -> messages.prime(here, false, last.form() == Form.NUMBER);
      case NUMBER ->
          last.form() == Form.NUMBER || last.form() == Form.WITH_UNIT
              ? messages.numberAfterNumber(last.span().to(here), last.span(), here)
              : messages.impliedProduct(here, last.span(), here);
      case OPEN ->
          last.form() == Form.NAME
              ? messages.callBlank(here, last.span())
              : messages.impliedProduct(here, last.span(), here);
      case BAR -> messages.impliedProduct(here, last.span(), here);
      case NAME -> word(token);
      case COMMA ->
          cursor.previous().touches(token)
                  && cursor.previous().is(Kind.NUMBER)
                  && token.touches(cursor.peek(1))
                  && cursor.peek(1).is(Kind.NUMBER)
              ? decimalComma()
              : messages.trailing(here);
      default -> messages.trailing(here);
    };
  }

  private Diagnostic word(Token word) {
    Span here = word.span();
    if (word.isReservedWord()) {
      return messages.trailing(here);
    }
    return switch (last.form()) {
      case NUMBER -> messages.impliedProduct(last.span().to(here), last.span(), here);
      case WITH_UNIT ->
          messages.secondWord(last.span().to(here), last.span(), here, units.isSymbol(word));
      default -> messages.impliedProduct(here, last.span(), here);
    };
  }

  /** A comma between two numbers that touch it, {@code 1,5}. */
  private Diagnostic decimalComma() {
    return messages.numberComma(cursor.previous().span().to(cursor.peek(1).span()));
  }

  /** Takes a comma between values in a list; a decimal comma is refused. */
  boolean acceptListComma() {
    if (!cursor.at(Kind.COMMA)) {
      return false;
    }
    if (cursor.previous().is(Kind.NUMBER)
        && cursor.previous().touches(cursor.peek())
        && cursor.peek().touches(cursor.peek(1))
        && cursor.peek(1).is(Kind.NUMBER)) {
      throw cursor.refusal(decimalComma());
    }
    cursor.take();
    return true;
  }
}
