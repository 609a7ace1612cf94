package whorl.syntax;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.function.Function;
import org.jspecify.annotations.Nullable;
import whorl.diagnostic.Span;
import whorl.syntax.Token.Kind;

/** A statement from its line and the block below it. */
final class StatementParser extends LineParser {
  private final Reading reading;
  private final List<LogicalLine> block;

  private StatementParser(LogicalLine line, List<LogicalLine> block, Reading reading) {
    super(line, reading, false);
    this.reading = reading;
    this.block = block;
  }

  /**
   * Reads a statement.
   *
   * @param line its line, at the margin
   * @param block the indented lines below
   * @throws Refusal at the first mistake of the line itself; mistakes of the block go to the
   *     reading
   */
  static Statement statement(LogicalLine line, List<LogicalLine> block, Reading reading) {
    Set<String> parameters =
        Shapes.definesFunction(line.tokens()) ? Shapes.parameters(line.tokens()) : Set.of();
    return new StatementParser(line, block, reading.with(parameters)).statement();
  }

  /**
   * Reads the head of a function that is worked out outside the sheet.
   *
   * @throws Refusal at the first mistake
   */
  static Statement head(LogicalLine line, Reading reading) {
    return new StatementParser(line, List.of(), reading).published();
  }

  private Statement statement() {
    Token first = line.first();
    if (first.isReservedWord() && Shapes.definesValue(line.tokens())) {
      throw cursor.refusal(messages.reserved(first.span(), first.text()));
    }
    refuseOperatorInFront();
    Statement statement =
        first.is(Kind.NAME) && Words.STATEMENTS.contains(first.text())
            ? wordStatement(cursor.take())
            : plainStatement();
    return statement;
  }

  private Statement wordStatement(Token word) {
    return switch (word.text()) {
      case "check" -> noBlock(check());
      case "assume" -> noBlock(assume());
      case "cases" -> cases();
      case "data" -> data();
      case "motion" -> motion();
      case "plot" -> noBlock(plot());
      case "sketch" -> noBlock(sketch());
      case "spread" -> noBlock(spread());
      case "review" -> noBlock(review());
      case "solve" -> noBlock(solve(null));
      case "vary" -> noBlock(vary(null));
      default -> throw new IllegalArgumentException("no statement word: " + word.text());
    };
  }

  private Statement plainStatement() {
    if (Shapes.definesValue(line.tokens())) {
      return noBlock(definition());
    }
    return noBlock(Shapes.definesFunction(line.tokens()) ? function() : show());
  }

  private Statement noBlock(Statement statement) {
    if (!block.isEmpty()) {
      throw new Refusal(Blocks.unexpected(block.get(0), messages));
    }
    return statement;
  }

  // definition = name [ bracket ] "=" ( expression [ "with" change { "," change } ] | solve | vary
  // )
  private Statement definition() {
    Expr.Name name = definedName("a name");
    Statement.Bracket bracket = optionalBracket();
    cursor.take();
    if (cursor.acceptWord("solve")) {
      return solve(new Statement.Target(since(line.first()), name, bracket));
    }
    if (cursor.acceptWord("vary")) {
      if (bracket != null) {
        throw new Refusal(messages.bracketOfTable(bracket.span()));
      }
      return vary(name);
    }
    Expr value = expressions.expression();
    List<Statement.Change> changes = changes();
    end();
    return new Statement.Definition(line.span(), name, bracket, value, changes, line.remark());
  }

  // change = name "=" expression
  private List<Statement.Change> changes() {
    if (!cursor.acceptWord("with")) {
      return List.of();
    }
    var changes = new ArrayList<Statement.Change>();
    do {
      Token start = cursor.peek();
      Expr.Name name = expressions.freeName("the name of what changes");
      sign(Kind.EQUALS, "`=` and a value");
      Expr value = expressions.expression();
      changes.add(new Statement.Change(since(start), name, value));
    } while (cursor.accept(Kind.COMMA));
    return changes;
  }

  // function = name "(" parameter { "," parameter } ")" [ bracket ] "=" expression
  private Statement function() {
    Expr.Name name = definedName("a name");
    List<Statement.Parameter> parameters = parameters();
    Statement.Bracket bracket = optionalBracket();
    cursor.take();
    Expr body = expressions.expression();
    end();
    return new Statement.Function(line.span(), name, parameters, bracket, body, line.remark());
  }

  // published = name "(" [ parameter { "," parameter } ] ")" bracket
  private Statement published() {
    Token start = cursor.peek();
    Expr.Name name = definedName("the head of a function, such as `f(x [m], k) [N]`");
    Token open = cursor.peek();
    if (!open.is(Kind.OPEN)) {
      throw cursor.refusal(messages.headWithoutParameters(start.span()));
    }
    if (!start.touches(open)) {
      throw new Refusal(messages.callBlank(start.span().gapTo(open.span()), start.span()));
    }
    boolean none = cursor.peek(1).is(Kind.CLOSE);
    List<Statement.Parameter> parameters = none ? List.of() : parameters();
    cursor.skip(none ? 2 : 0);
    Statement.Bracket bracket = optionalBracket();
    if (cursor.at(Kind.EQUALS)) {
      throw cursor.refusal(messages.headWithFormula(cursor.peek().span(), since(start)));
    }
    endOfHead();
    if (bracket == null) {
      throw new Refusal(messages.headWithoutUnit(line.span()));
    }
    return new Statement.Published(line.span(), name, parameters, bracket, line.remark());
  }

  // parameters = "(" parameter { "," parameter } ")"
  private List<Statement.Parameter> parameters() {
    cursor.take();
    var parameters = new ArrayList<Statement.Parameter>();
    var taken = new HashSet<String>();
    do {
      parameters.add(parameter(taken));
    } while (cursor.accept(Kind.COMMA));
    if (!cursor.accept(Kind.CLOSE)) {
      throw cursor.refusal(messages.parameterForm(cursor.peek().span()));
    }
    return parameters;
  }

  // parameter = name [ bracket ]
  private Statement.Parameter parameter(Set<String> taken) {
    Token start = cursor.peek();
    if (!start.is(Kind.NAME)) {
      throw cursor.refusal(messages.parameterForm(start.span()));
    }
    Expr.Name name = definedName("a name");
    if (!taken.add(name.name())) {
      throw cursor.refusal(messages.parameterTwice(start.span(), name.name()));
    }
    Statement.Bracket bracket = optionalBracket();
    return new Statement.Parameter(since(start), name, bracket);
  }

  // show = expression [ bracket ]
  private Statement show() {
    Token start = cursor.peek();
    Expr value = expressions.expression();
    if (value instanceof Expr.Name && cursor.at(Kind.NUMBER)) {
      throw cursor.refusal(messages.nothingDone(line.span(), since(start)));
    }
    Statement.Bracket bracket = shownIn(start, value);
    Token next = cursor.peek();
    boolean newValue =
        ExpressionParser.beginsOperand(next) || next.is(Kind.MINUS) || next.is(Kind.PLUS);
    if (bracket != null && value instanceof Expr.Name && newValue) {
      throw cursor.refusal(messages.nothingDone(line.span(), since(start)));
    }
    end();
    return new Statement.Show(line.span(), value, bracket, line.remark());
  }

  /** The bracket that says in which unit a value shows; bare numbers have no unit to show. */
  private Statement.@Nullable Bracket shownIn(Token start, Expr value) {
    if (!cursor.at(Kind.OPEN_BRACKET)) {
      return null;
    }
    Span shown = since(start);
    Statement.Bracket bracket = units.bracket();
    if (BareNumbers.isInput(value)) {
      throw new Refusal(messages.bracketOfNumber(since(start), shown, value, bracket.unit()));
    }
    return bracket;
  }

  // check = "check" [ "nominal" ] ( expression | sum "=" sum "within" sum )
  private Statement check() {
    boolean nominal = introducesValue("nominal");
    if (nominal) {
      cursor.take();
    }
    Expr value = expressions.expression();
    if (!cursor.at(Kind.EQUALS) || isCondition(value)) {
      end();
      return new Statement.Check(line.span(), nominal, value, line.remark());
    }
    cursor.take();
    Expr stated = expressions.sum();
    if (cursor.at(Kind.EQUALS)) {
      throw expressions.unexpected();
    }
    if (!cursor.acceptWord("within")) {
      throw cursor.refusal(messages.checkWithin(expressions.placeOfMissing(), line.span()));
    }
    Expr within = expressions.sum();
    end();
    return new Statement.Reproduction(line.span(), nominal, value, stated, within, line.remark());
  }

  private static boolean isCondition(Expr value) {
    return value instanceof Expr.Comparison
        || value instanceof Expr.AllOf
        || value instanceof Expr.AnyOf
        || value instanceof Expr.Choice
        || value instanceof Expr.Tolerance;
  }

  // assume = "assume" expression
  private Statement assume() {
    Expr condition = expressions.expression();
    end();
    return new Statement.Assumption(line.span(), condition, line.remark());
  }

  // cases = "cases" name ( ":" columns block | "from" text ":" columns )
  private Statement cases() {
    Expr.Name name = definedName("the name of the case set");
    Expr.Text file = file();
    List<Statement.Column> columns = columns();
    if (file != null) {
      return noBlock(
          new Statement.CaseSet(line.span(), name, file, columns, List.of(), line.remark()));
    }
    List<Statement.CaseRow> rows =
        rows(row -> new RowParser(row, reading).caseRow(columns.size()), Blocks.ROWS_OF_CASES);
    return new Statement.CaseSet(wholeSpan(), name, null, columns, rows, line.remark());
  }

  // data = "data" name ( ":" columns block | "from" text ":" columns )
  private Statement data() {
    Expr.Name name = definedName("the name of the data");
    Expr.Text file = file();
    List<Statement.Column> columns = columns();
    if (file != null) {
      return noBlock(
          new Statement.Data(line.span(), name, file, columns, List.of(), line.remark()));
    }
    List<Statement.DataRow> rows =
        rows(row -> new RowParser(row, reading).dataRow(columns.size()), Blocks.ROWS_OF_DATA);
    return new Statement.Data(wholeSpan(), name, null, columns, rows, line.remark());
  }

  private Expr.@Nullable Text file() {
    Expr.Text file = null;
    if (cursor.acceptWord("from")) {
      Token text = cursor.peek();
      if (!cursor.accept(Kind.TEXT)) {
        throw expressions.expected("the name of a file in quotes, `\"runs.csv\"`");
      }
      file = new Expr.Text(text.span(), text.text());
    }
    sign(
        Kind.COLON,
        file == null ? "`:` and the columns, or `from` and a file" : "`:` and the columns");
    return file;
  }

  // columns = name [ bracket ] { "," name [ bracket ] }
  private List<Statement.Column> columns() {
    var columns = new ArrayList<Statement.Column>();
    do {
      Token start = cursor.peek();
      Expr.Name name = definedName("the name of a column");
      Statement.Bracket bracket = optionalBracket();
      columns.add(new Statement.Column(since(start), name, bracket));
    } while (cursor.accept(Kind.COMMA));
    endOfHead();
    return columns;
  }

  private <T> List<T> rows(Function<LogicalLine, T> row, String wanted) {
    if (block.isEmpty()) {
      throw new Refusal(messages.blockEmpty(line.span(), wanted));
    }
    return Blocks.read(block, reading, row);
  }

  private Span wholeSpan() {
    return line.span().to(block.get(block.size() - 1).span());
  }

  // motion = "motion" name, block
  private Statement motion() {
    Expr.Name name = definedName("the name of the motion");
    endOfHead();
    var local = new HashSet<String>();
    for (LogicalLine row : block) {
      MotionParser.localName(row).ifPresent(local::add);
    }
    Reading inside = reading.with(local);
    List<MotionLine> lines =
        rows(row -> new MotionParser(row, inside).line(), Blocks.LINES_OF_MOTION);
    return new Statement.Motion(wholeSpan(), name, lines, line.remark());
  }

  // solve = "solve" unknown { "," unknown } [ "so" "that" condition { "and" condition } ]
  //         [ "for" ("least" | "most") sum ]
  private Statement solve(Statement.@Nullable Target target) {
    var unknowns = new ArrayList<Statement.Unknown>();
    do {
      unknowns.add(unknown());
    } while (cursor.accept(Kind.COMMA));
    var conditions = new ArrayList<Statement.Condition>();
    if (cursor.acceptWord("so")) {
      word("that", "`that`, as in `so that a = b`");
      do {
        conditions.add(condition());
      } while (cursor.acceptWord("and"));
    } else if (!cursor.atWord("for")) {
      throw expressions.expected(
          "`so that` and a condition, or `for least` or `for most` and a value");
    }
    Statement.Goal goal = goal();
    end();
    return new Statement.Solve(line.span(), target, unknowns, conditions, goal, line.remark());
  }

  // unknown = name "between" sum "and" sum
  private Statement.Unknown unknown() {
    Token start = cursor.peek();
    Expr.Name name = expressions.freeName("the name of the unknown");
    word("between", "`between` and two limits");
    Expr from = expressions.sum();
    word("and", "`and` and the upper limit");
    Expr to = expressions.sum();
    return new Statement.Unknown(since(start), name, from, to);
  }

  // condition = sum ( "=" | "<=" | ">=" | "<" | ">" ) sum
  private Statement.Condition condition() {
    Token start = cursor.peek();
    Expr left = expressions.sum();
    Span leftSpan = since(start);
    if (!isBalance(cursor.peek())) {
      throw expressions.expected("`=`, `<=` or `>=` and the other side");
    }
    Token sign = cursor.take();
    Token middle = cursor.peek();
    Expr right = expressions.sum();
    if (isBalance(cursor.peek())) {
      Span chain = start.span().to(cursor.peek().span());
      throw cursor.refusal(messages.compareChain(chain, leftSpan, since(middle)));
    }
    Expr.Relation relation = sign.is(Kind.EQUALS) ? null : ExpressionParser.relation(sign);
    return new Statement.Condition(since(start), left, relation, right);
  }

  private static boolean isBalance(Token sign) {
    return sign.is(Kind.EQUALS) || sign.kind().isRelation();
  }

  private Statement.@Nullable Goal goal() {
    Token start = cursor.peek();
    if (!cursor.acceptWord("for")) {
      return null;
    }
    boolean least = cursor.acceptWord("least");
    if (!least) {
      word("most", "`least` or `most`");
    }
    Expr value = expressions.sum();
    return new Statement.Goal(
        since(start), least ? Statement.Aim.LEAST : Statement.Aim.MOST, value);
  }

  // vary = "vary" range { "," range } ":" output { "," output }
  private Statement vary(Expr.@Nullable Name name) {
    var ranges = new ArrayList<Statement.Range>();
    do {
      ranges.add(range(true));
    } while (cursor.accept(Kind.COMMA));
    sign(Kind.COLON, "`:` and what to show");
    List<Statement.Output> outputs = outputs();
    end();
    return new Statement.Vary(line.span(), name, ranges, outputs, line.remark());
  }

  // range = name ( "from" sum "to" sum [ stride ] | "over" sum { "," sum } )
  private Statement.Range range(boolean strideNeeded) {
    Token start = cursor.peek();
    Expr.Name name = expressions.freeName("the name of an input");
    if (cursor.acceptWord("over")) {
      List<Expr> values = listedValues();
      return new Statement.Range.Listed(since(start), name, values);
    }
    if (!cursor.acceptWord("from")) {
      throw cursor.refusal(messages.rangeForm(start.span()));
    }
    Expr from = expressions.sum();
    word("to", "`to` and the last value");
    Expr to = expressions.sum();
    Statement.Stride stride = stride(strideNeeded);
    return new Statement.Range.Stretch(since(start), name, from, to, stride);
  }

  /** Values up to a colon, the end, or the next range. */
  private List<Expr> listedValues() {
    var values = new ArrayList<Expr>(List.of(expressions.sum()));
    while (cursor.at(Kind.COMMA)
        && !(cursor.peek(1).is(Kind.NAME)
            && (cursor.peek(2).isWord("from") || cursor.peek(2).isWord("over")))) {
      expressions.acceptListComma();
      values.add(expressions.sum());
    }
    return values;
  }

  // stride = "by" sum | "in" number "steps" [ "by" "ratio" ]
  private Statement.@Nullable Stride stride(boolean needed) {
    if (cursor.acceptWord("by")) {
      return new Statement.Stride.Equal(expressions.sum());
    }
    if (!cursor.acceptWord("in")) {
      if (needed) {
        throw expressions.expected("`by` and a step, or `in` and a number of steps");
      }
      return null;
    }
    Token number = cursor.peek();
    if (!number.is(Kind.NUMBER) || !number.text().matches("0*[1-9][0-9]{0,8}")) {
      throw expressions.expected("a whole number of steps");
    }
    cursor.take();
    word("steps", "`steps`");
    boolean ratio = cursor.acceptWord("by");
    if (ratio) {
      word("ratio", "`ratio`, as in `10 steps by ratio`");
    }
    return new Statement.Stride.Counted(Integer.parseInt(number.text()), ratio);
  }

  private List<Statement.Output> outputs() {
    var outputs = new ArrayList<Statement.Output>();
    do {
      outputs.add(output());
    } while (expressions.acceptListComma());
    return outputs;
  }

  // output = expression [ bracket ] | "checks"
  private Statement.Output output() {
    Token start = cursor.peek();
    if (start.isWord("checks")) {
      cursor.take();
      if (!cursor.atEnd() && !cursor.at(Kind.COMMA) && !cursor.atWord("against")) {
        throw cursor.refusal(messages.reserved(start.span(), start.text()));
      }
      return new Statement.Output.Checks(start.span());
    }
    Expr value = expressions.expression();
    Statement.Bracket bracket = shownIn(start, value);
    return new Statement.Output.Shown(since(start), value, bracket);
  }

  // plot = "plot" output { "," output } [ "against" ( range | postfix ) ]
  private Statement plot() {
    List<Statement.Output> outputs = outputs();
    Statement.Abscissa against = null;
    if (cursor.acceptWord("against")) {
      boolean range =
          cursor.at(Kind.NAME) && (cursor.peek(1).isWord("from") || cursor.peek(1).isWord("over"));
      against =
          range
              ? new Statement.Abscissa.OverRange(range(false))
              : new Statement.Abscissa.Along(expressions.term());
    }
    end();
    return new Statement.Plot(line.span(), outputs, against, line.remark());
  }

  // sketch = "sketch" postfix { "," postfix }
  private Statement sketch() {
    var things = new ArrayList<Expr>();
    do {
      if (!cursor.at(Kind.NAME)) {
        throw expressions.expected("the name of a body, a point, an axis or a vector");
      }
      things.add(expressions.term());
    } while (cursor.accept(Kind.COMMA));
    end();
    return new Statement.Sketch(line.span(), things, line.remark());
  }

  // spread = "spread" name
  private Statement spread() {
    Expr.Name name = expressions.freeName("the name of a result");
    endOfHead();
    return new Statement.Spread(line.span(), name, line.remark());
  }

  // review = "review"
  private Statement review() {
    if (!cursor.atEnd()) {
      throw cursor.refusal(messages.reviewOfSomething(cursor.peek().span()));
    }
    return new Statement.Review(line.span(), line.remark());
  }
}
