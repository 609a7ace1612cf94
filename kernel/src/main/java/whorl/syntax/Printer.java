package whorl.syntax;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.Deque;
import java.util.List;
import java.util.function.Function;
import java.util.stream.Collectors;
import org.jspecify.annotations.Nullable;
import whorl.diagnostic.Span;

/**
 * Canonical text of what was read. Reading the text gives the same tree again: blanks and
 * parentheses are the same for the same tree, names and signs are folded, units keep the symbols of
 * their author, remarks stand two blanks behind their statement.
 */
public final class Printer {
  private static final String INDENT = "    ";
  private static final ExpressionPrinter EXPRESSIONS = new ExpressionPrinter();

  private Printer() {}

  /** An expression on one line. */
  public static String expression(Expr value) {
    return EXPRESSIONS.print(value);
  }

  /** A statement with its remark; a block on the lines below its head. */
  public static String statement(Statement statement) {
    return statement.match(new Statements(List.of(), true));
  }

  /** A statement without the remark behind it. */
  public static String unremarked(Statement statement) {
    return statement.match(new Statements(List.of(), false));
  }

  /** A whole text with the remarks that stand alone, one line each. */
  public static String text(Parsed parsed) {
    var lines = new ArrayList<String>();
    var remarks = new ArrayDeque<>(parsed.remarks());
    for (Statement statement : parsed.statements()) {
      takeBefore(statement.span().start(), remarks)
          .forEach(remark -> lines.add(remark(remark.text())));
      var inside = takeBefore(statement.span().end(), remarks);
      lines.add(statement.match(new Statements(inside, true)));
    }
    remarks.forEach(remark -> lines.add(remark(remark.text())));
    return String.join("\n", lines);
  }

  private static List<Remark> takeBefore(int offset, Deque<Remark> remarks) {
    var taken = new ArrayList<Remark>();
    while (!remarks.isEmpty() && remarks.element().span().start() < offset) {
      taken.add(remarks.remove());
    }
    return taken;
  }

  /** A line or more, and where it stood. */
  private record Placed(Span span, String text) {}

  private static String inOrder(List<Placed> parts) {
    return parts.stream()
        .sorted(Comparator.comparing(part -> part.span().start()))
        .map(Placed::text)
        .collect(Collectors.joining("\n"));
  }

  private static String remark(String text) {
    return text.isEmpty() ? "#" : "# " + text;
  }

  private static String remarked(String line, String remark) {
    return remark.isEmpty() ? line : line + "  " + remark(remark);
  }

  private static String bracket(Statement.@Nullable Bracket bracket) {
    if (bracket == null) {
      return "";
    }
    String kind = bracket.kind();
    return " [" + bracket.unit().plain() + (kind == null ? "" : ", " + kind) + "]";
  }

  private static String head(Expr.Name name, Statement.@Nullable Bracket bracket) {
    return name.name() + bracket(bracket);
  }

  private static <T> String list(List<T> parts, Function<T, String> text) {
    return parts.stream().map(text).collect(Collectors.joining(", "));
  }

  /** A value at the start of a line, which no sign may begin. */
  private static String atMargin(Expr value) {
    String text = expression(value);
    return text.startsWith("-") ? "(" + text + ")" : text;
  }

  /** A block; remarks inside keep their place between its lines. */
  private static String block(String head, List<Placed> rows, List<Remark> inside) {
    var lines = new ArrayList<>(rows);
    inside.forEach(remark -> lines.add(new Placed(remark.span(), remark(remark.text()))));
    return head + "\n" + INDENT + inOrder(lines).replace("\n", "\n" + INDENT);
  }

  /**
   * Statements.
   *
   * @param inside the remarks that stand between the lines of their blocks
   * @param withRemark whether with the remark behind them
   */
  private record Statements(List<Remark> inside, boolean withRemark)
      implements Statement.Cases<String> {
    private String said(String text, String remark) {
      return withRemark ? remarked(text, remark) : text;
    }

    @Override
    public String definition(Statement.Definition definition) {
      var changes = definition.changes();
      String text =
          head(definition.name(), definition.bracket())
              + " = "
              + expression(definition.value())
              + (changes.isEmpty() ? "" : " with " + list(changes, Statements::change));
      return said(text, definition.remark());
    }

    private static String change(Statement.Change change) {
      return change.name().name() + " = " + expression(change.value());
    }

    @Override
    public String function(Statement.Function function) {
      String text =
          function(function.name(), function.parameters(), function.bracket())
              + " = "
              + expression(function.body());
      return said(text, function.remark());
    }

    private static String function(
        Expr.Name name, List<Statement.Parameter> parameters, Statement.@Nullable Bracket bracket) {
      return name.name()
          + "("
          + list(parameters, one -> head(one.name(), one.bracket()))
          + ")"
          + bracket(bracket);
    }

    @Override
    public String published(Statement.Published published) {
      String text = function(published.name(), published.parameters(), published.bracket());
      return said(text, published.remark());
    }

    @Override
    public String show(Statement.Show show) {
      return said(atMargin(show.value()) + bracket(show.bracket()), show.remark());
    }

    @Override
    public String check(Statement.Check check) {
      return said(
          "check " + (check.nominal() ? "nominal " : "") + condition(check), check.remark());
    }

    /** The condition; a name that reads as the word {@code nominal} goes in parentheses. */
    private static String condition(Statement.Check check) {
      return checked(expression(check.condition()), check.nominal());
    }

    private static String checked(String text, boolean nominal) {
      boolean takenForWord = !nominal && text.matches("nominal (if|\\().*");
      return takenForWord ? "(" + text + ")" : text;
    }

    @Override
    public String reproduction(Statement.Reproduction reproduction) {
      String text =
          "check "
              + (reproduction.nominal() ? "nominal " : "")
              + expression(reproduction.value())
              + " = "
              + expression(reproduction.stated())
              + " within "
              + expression(reproduction.within());
      return said(text, reproduction.remark());
    }

    @Override
    public String assumption(Statement.Assumption assumption) {
      return said("assume " + expression(assumption.condition()), assumption.remark());
    }

    private static String columns(
        String word, Expr.Name name, Expr.@Nullable Text file, List<Statement.Column> columns) {
      return word
          + " "
          + name.name()
          + (file == null ? "" : " from " + expression(file))
          + ": "
          + list(columns, column -> head(column.name(), column.bracket()));
    }

    @Override
    public String caseSet(Statement.CaseSet set) {
      String head = said(columns("cases", set.name(), set.file(), set.columns()), set.remark());
      var rows = set.rows().stream().map(row -> new Placed(row.span(), row(row))).toList();
      return set.file() == null ? block(head, rows, inside) : head;
    }

    private static String row(Statement.CaseRow row) {
      return remarked(
          expression(row.label()) + " " + list(row.values(), Printer::expression), row.remark());
    }

    @Override
    public String data(Statement.Data data) {
      String head = said(columns("data", data.name(), data.file(), data.columns()), data.remark());
      var rows =
          data.rows().stream()
              .map(
                  row ->
                      new Placed(
                          row.span(),
                          remarked(list(row.values(), Printer::expression), row.remark())))
              .toList();
      return data.file() == null ? block(head, rows, inside) : head;
    }

    @Override
    public String motion(Statement.Motion motion) {
      var lines =
          motion.lines().stream()
              .map(
                  line ->
                      new Placed(
                          line.span(), remarked(line.match(new MotionLines()), line.remark())))
              .toList();
      return block(said("motion " + motion.name().name(), motion.remark()), lines, inside);
    }

    @Override
    public String solve(Statement.Solve solve) {
      var target = solve.target();
      var text = new StringBuilder();
      if (target != null) {
        text.append(head(target.name(), target.bracket())).append(" = ");
      }
      text.append("solve ").append(list(solve.unknowns(), Statements::unknown));
      if (!solve.conditions().isEmpty()) {
        text.append(" so that ")
            .append(
                solve.conditions().stream()
                    .map(Statements::balance)
                    .collect(Collectors.joining(" and ")));
      }
      var goal = solve.goal();
      if (goal != null) {
        text.append(goal.aim() == Statement.Aim.LEAST ? " for least " : " for most ")
            .append(expression(goal.value()));
      }
      return said(text.toString(), solve.remark());
    }

    private static String unknown(Statement.Unknown unknown) {
      return unknown.name().name()
          + " between "
          + expression(unknown.from())
          + " and "
          + expression(unknown.to());
    }

    private static String balance(Statement.Condition condition) {
      var relation = condition.relation();
      return expression(condition.left())
          + " "
          + (relation == null ? "=" : relation.sign())
          + " "
          + expression(condition.right());
    }

    @Override
    public String vary(Statement.Vary vary) {
      var name = vary.name();
      String text =
          (name == null ? "" : name.name() + " = ")
              + "vary "
              + list(vary.ranges(), Statements::range)
              + ": "
              + list(vary.outputs(), Statements::output);
      return said(text, vary.remark());
    }

    private static String range(Statement.Range range) {
      String name = range.name().name();
      if (range instanceof Statement.Range.Stretch stretch) {
        return name
            + " from "
            + expression(stretch.from())
            + " to "
            + expression(stretch.to())
            + stride(stretch.stride());
      }
      return name + " over " + list(((Statement.Range.Listed) range).values(), Printer::expression);
    }

    private static String stride(Statement.@Nullable Stride stride) {
      if (stride instanceof Statement.Stride.Equal equal) {
        return " by " + expression(equal.step());
      }
      if (stride instanceof Statement.Stride.Counted counted) {
        return " in " + counted.steps() + " steps" + (counted.byRatio() ? " by ratio" : "");
      }
      return "";
    }

    private static String output(Statement.Output output) {
      return output instanceof Statement.Output.Shown shown
          ? expression(shown.value()) + bracket(shown.bracket())
          : "checks";
    }

    @Override
    public String plot(Statement.Plot plot) {
      String text = "plot " + list(plot.outputs(), Statements::output) + against(plot.against());
      return said(text, plot.remark());
    }

    private static String against(Statement.@Nullable Abscissa against) {
      if (against instanceof Statement.Abscissa.OverRange over) {
        return " against " + range(over.range());
      }
      if (against instanceof Statement.Abscissa.Along along) {
        return " against " + expression(along.course());
      }
      return "";
    }

    @Override
    public String sketch(Statement.Sketch sketch) {
      return said("sketch " + list(sketch.things(), Printer::expression), sketch.remark());
    }

    @Override
    public String spread(Statement.Spread spread) {
      return said("spread " + spread.name().name(), spread.remark());
    }

    @Override
    public String review(Statement.Review review) {
      return said("review", review.remark());
    }
  }

  /** Lines of a motion, without their remarks. */
  private static final class MotionLines implements MotionLine.Cases<String> {
    @Override
    public String start(MotionLine.Start start) {
      return head(start.state(), start.bracket()) + " starts " + expression(start.value());
    }

    @Override
    public String attitude(MotionLine.Attitude attitude) {
      var spin = attitude.spin();
      var turn = attitude.turn();
      return attitude.body().name()
          + " starts "
          + (spin == null ? "" : "spin " + expression(spin))
          + (spin == null || turn == null ? "" : ", ")
          + (turn == null
              ? ""
              : "turned " + expression(turn.angle()) + " about " + expression(turn.about()));
    }

    @Override
    public String equation(MotionLine.Equation equation) {
      return rate(equation.rate()) + " = " + expression(equation.value());
    }

    /** A rate at the start of a line, which no sign may begin. */
    private static String rate(Expr rate) {
      String text = expression(rate);
      if (!text.startsWith("-") || !(rate instanceof Expr.Product product)) {
        return text;
      }
      String first = expression(product.factors().get(0).value());
      return "(" + first + ")" + text.substring(first.length());
    }

    @Override
    public String local(MotionLine.Local local) {
      return head(local.name(), local.bracket()) + " = " + expression(local.value());
    }

    @Override
    public String stop(MotionLine.Stop stop) {
      return "stop when " + expression(stop.condition());
    }

    @Override
    public String limit(MotionLine.Limit limit) {
      return "within " + expression(limit.time());
    }

    @Override
    public String body(MotionLine.Body body) {
      return "body " + body.name().name() + " about " + expression(body.about());
    }

    @Override
    public String load(MotionLine.Load load) {
      return "load " + expression(load.value());
    }
  }
}
