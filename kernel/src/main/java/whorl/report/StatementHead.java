package whorl.report;

import java.util.List;
import java.util.Set;
import whorl.syntax.Expr;
import whorl.syntax.Printer;
import whorl.syntax.Statement;

/**
 * What a statement is about and what it states, for a row that has no result.
 *
 * @param quantity its symbol or its word
 * @param rule its formula, or its first line where it is more than a formula
 */
record StatementHead(Line quantity, Line rule) {

  static StatementHead of(Statement statement) {
    return statement.match(new Reader());
  }

  private static final class Reader implements Statement.Cases<StatementHead> {
    @Override
    public StatementHead definition(Statement.Definition definition) {
      return formula(symbol(definition.name()), definition.value());
    }

    @Override
    public StatementHead function(Statement.Function function) {
      return formula(symbol(function.name()), function.body());
    }

    @Override
    public StatementHead published(Statement.Published published) {
      return firstLine(symbol(published.name()), published);
    }

    @Override
    public StatementHead show(Statement.Show show) {
      return formula(word("show"), show.value());
    }

    @Override
    public StatementHead check(Statement.Check check) {
      return formula(word("check"), check.condition());
    }

    @Override
    public StatementHead reproduction(Statement.Reproduction reproduction) {
      return formula(word("check"), reproduction.value());
    }

    @Override
    public StatementHead assumption(Statement.Assumption assumption) {
      return formula(word("assume"), assumption.condition());
    }

    @Override
    public StatementHead caseSet(Statement.CaseSet caseSet) {
      return firstLine(symbol(caseSet.name()), caseSet);
    }

    @Override
    public StatementHead data(Statement.Data data) {
      return firstLine(symbol(data.name()), data);
    }

    @Override
    public StatementHead motion(Statement.Motion motion) {
      return firstLine(symbol(motion.name()), motion);
    }

    @Override
    public StatementHead solve(Statement.Solve solve) {
      Statement.Target target = solve.target();
      return firstLine(target == null ? word("solve") : symbol(target.name()), solve);
    }

    @Override
    public StatementHead vary(Statement.Vary vary) {
      Expr.Name name = vary.name();
      return firstLine(name == null ? word("vary") : symbol(name), vary);
    }

    @Override
    public StatementHead plot(Statement.Plot plot) {
      return firstLine(word("plot"), plot);
    }

    @Override
    public StatementHead sketch(Statement.Sketch sketch) {
      return firstLine(word("sketch"), sketch);
    }

    @Override
    public StatementHead spread(Statement.Spread spread) {
      return firstLine(word("spread"), spread);
    }

    @Override
    public StatementHead review(Statement.Review review) {
      return firstLine(word("review"), review);
    }

    private static StatementHead formula(Line quantity, Expr rule) {
      return new StatementHead(
          quantity, Line.of(new Piece.Formula(FormulaLayout.of(rule, Set.of()))));
    }

    private static StatementHead firstLine(Line quantity, Statement statement) {
      List<String> lines = Printer.statement(statement).lines().toList();
      return new StatementHead(quantity, Line.of(Piece.words(lines.get(0))));
    }

    private static Line symbol(Expr.Name name) {
      return StepRows.symbol(name.name(), false);
    }

    private static Line word(String word) {
      return Line.of(Piece.quiet(word));
    }
  }
}
