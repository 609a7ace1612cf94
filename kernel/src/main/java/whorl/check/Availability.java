package whorl.check;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Predicate;
import whorl.diagnostic.Diagnostic;
import whorl.syntax.Expr;
import whorl.syntax.Statement;

/**
 * Finds what the language has but this version does not work out, so that it is answered plainly
 * and never ignored. A statement has at most one such message.
 */
public final class Availability {
  private static final Statement.Cases<String> WORDS = new WordOfGap();

  private Availability() {}

  /**
   * The first thing in a statement that this version does not work out, or none.
   *
   * @param defined whether the sheet gives a name its own meaning, which hides that of the language
   */
  public static List<Diagnostic> gaps(Statement statement, Predicate<String> defined) {
    if (statement instanceof Statement.Definition definition && !definition.changes().isEmpty()) {
      return List.of(CheckMessages.notAvailable("“with”", definition.changes().get(0).span()));
    }
    List<Expr> expressions = Expressions.of(statement);
    String word = statement.match(WORDS);
    if (!word.isEmpty()) {
      return List.of(CheckMessages.notAvailable("“" + word + "”", statement.span()));
    }
    var gaps = new ArrayList<Diagnostic>();
    for (Expr root : expressions) {
      Expressions.walk(root, expr -> gap(expr, defined).ifPresent(gaps::add));
    }
    return gaps.stream().limit(1).toList();
  }

  private static Optional<Diagnostic> gap(Expr expr, Predicate<String> defined) {
    if (expr instanceof Expr.Tolerance tolerance) {
      return Optional.of(CheckMessages.notAvailable("A tolerance with ±", tolerance.span()));
    } else if (expr instanceof Expr.Call call && call.over() != null) {
      return Optional.of(CheckMessages.notAvailable("“over” a case set", call.span()));
    } else if (expr instanceof Expr.Call call
        && Vocabulary.isLater(call.function().name())
        && !defined.test(call.function().name())) {
      return Optional.of(
          CheckMessages.notAvailable("“" + call.function().name() + "”", call.function().span()));
    }
    return Optional.empty();
  }

  /** The word by which a statement that is not available is known; empty for one that is. */
  private static final class WordOfGap implements Statement.Cases<String> {
    @Override
    public String definition(Statement.Definition definition) {
      return "";
    }

    @Override
    public String function(Statement.Function function) {
      return "";
    }

    @Override
    public String published(Statement.Published published) {
      return "";
    }

    @Override
    public String show(Statement.Show show) {
      return "";
    }

    @Override
    public String check(Statement.Check check) {
      return "";
    }

    @Override
    public String reproduction(Statement.Reproduction reproduction) {
      return "";
    }

    @Override
    public String assumption(Statement.Assumption assumption) {
      return "";
    }

    @Override
    public String caseSet(Statement.CaseSet caseSet) {
      return "cases";
    }

    @Override
    public String data(Statement.Data data) {
      return "data";
    }

    @Override
    public String motion(Statement.Motion motion) {
      return "";
    }

    @Override
    public String solve(Statement.Solve solve) {
      return "solve";
    }

    @Override
    public String vary(Statement.Vary vary) {
      return "vary";
    }

    @Override
    public String plot(Statement.Plot plot) {
      return "plot";
    }

    @Override
    public String sketch(Statement.Sketch sketch) {
      return "";
    }

    @Override
    public String spread(Statement.Spread spread) {
      return "spread";
    }

    @Override
    public String review(Statement.Review review) {
      return "review";
    }
  }
}
