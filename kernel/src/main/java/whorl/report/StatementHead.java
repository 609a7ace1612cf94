package whorl.report;

import whorl.syntax.Expr;
import whorl.syntax.Statement;

/**
 * What a statement is about and the formula it states, for a row that has no result.
 *
 * @param quantity its symbol or its word
 * @param rule its formula
 */
record StatementHead(Line quantity, Expr rule) {
  static final Statement.Cases<StatementHead> READER =
      new Statement.Cases<>() {
        @Override
        public StatementHead definition(Statement.Definition definition) {
          return new StatementHead(
              StepRows.symbol(definition.name().name(), false), definition.value());
        }

        @Override
        public StatementHead function(Statement.Function function) {
          return new StatementHead(StepRows.symbol(function.name().name(), false), function.body());
        }

        @Override
        public StatementHead show(Statement.Show show) {
          return new StatementHead(word("show"), show.value());
        }

        @Override
        public StatementHead check(Statement.Check check) {
          return new StatementHead(word("check"), check.condition());
        }

        @Override
        public StatementHead reproduction(Statement.Reproduction reproduction) {
          return new StatementHead(word("check"), reproduction.value());
        }

        @Override
        public StatementHead assumption(Statement.Assumption assumption) {
          return new StatementHead(word("assume"), assumption.condition());
        }
      };

  private static Line word(String word) {
    return Line.of(Piece.quiet(word));
  }
}
