package whorl.check;

import java.util.ArrayList;
import java.util.List;
import whorl.syntax.Expr;
import whorl.syntax.Statement;

/** The names that statements of all forms define, those that this version does not work out too. */
public final class DefinedNames {
  private DefinedNames() {}

  /** The names that a statement defines. */
  public static List<String> in(Statement statement) {
    return statement.match(new Names()).stream().map(Expr.Name::name).toList();
  }

  private static final class Names implements Statement.Cases<List<Expr.Name>> {
    @Override
    public List<Expr.Name> definition(Statement.Definition definition) {
      return List.of(definition.name());
    }

    @Override
    public List<Expr.Name> function(Statement.Function function) {
      return List.of(function.name());
    }

    @Override
    public List<Expr.Name> published(Statement.Published published) {
      return List.of(published.name());
    }

    @Override
    public List<Expr.Name> show(Statement.Show show) {
      return List.of();
    }

    @Override
    public List<Expr.Name> check(Statement.Check check) {
      return List.of();
    }

    @Override
    public List<Expr.Name> reproduction(Statement.Reproduction reproduction) {
      return List.of();
    }

    @Override
    public List<Expr.Name> assumption(Statement.Assumption assumption) {
      return List.of();
    }

    @Override
    public List<Expr.Name> caseSet(Statement.CaseSet caseSet) {
      var names = new ArrayList<Expr.Name>();
      names.add(caseSet.name());
      caseSet.columns().forEach(column -> names.add(column.name()));
      return names;
    }

    @Override
    public List<Expr.Name> data(Statement.Data data) {
      return List.of(data.name());
    }

    @Override
    public List<Expr.Name> motion(Statement.Motion motion) {
      return List.of(motion.name());
    }

    @Override
    public List<Expr.Name> solve(Statement.Solve solve) {
      Statement.Target target = solve.target();
      return target == null ? List.of() : List.of(target.name());
    }

    @Override
    public List<Expr.Name> vary(Statement.Vary vary) {
      Expr.Name name = vary.name();
      return name == null ? List.of() : List.of(name);
    }

    @Override
    public List<Expr.Name> plot(Statement.Plot plot) {
      return List.of();
    }

    @Override
    public List<Expr.Name> sketch(Statement.Sketch sketch) {
      return List.of();
    }

    @Override
    public List<Expr.Name> spread(Statement.Spread spread) {
      return List.of();
    }

    @Override
    public List<Expr.Name> review(Statement.Review review) {
      return List.of();
    }
  }
}
