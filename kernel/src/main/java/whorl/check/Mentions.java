package whorl.check;

import java.util.ArrayList;
import java.util.Optional;
import whorl.diagnostic.Span;
import whorl.syntax.Expr;
import whorl.syntax.Statement;

/** Finds where a statement mentions a name. */
public final class Mentions {
  private Mentions() {}

  /** The first place where a statement names something, alone or as the function of a call. */
  public static Optional<Span> ofName(String name, Statement statement) {
    return first(
        statement,
        expr -> {
          if (expr instanceof Expr.Name mention && mention.name().equals(name)) {
            return Optional.of(mention.span());
          }
          return expr instanceof Expr.Call call && call.function().name().equals(name)
              ? Optional.of(call.function().span())
              : Optional.empty();
        });
  }

  /** The first call of a function in a statement, with its arguments. */
  public static Optional<Span> ofCall(String function, Statement statement) {
    return first(
        statement,
        expr ->
            expr instanceof Expr.Call call && call.function().name().equals(function)
                ? Optional.of(call.span())
                : Optional.empty());
  }

  /** Whether a text in quotes, such as the name of a file, stands in a statement. */
  public static boolean ofText(Statement statement) {
    return first(
            statement,
            expr -> expr instanceof Expr.Text text ? Optional.of(text.span()) : Optional.empty())
        .isPresent();
  }

  private static Optional<Span> first(Statement statement, Seeker seeker) {
    var found = new ArrayList<Span>();
    for (Expr root : Expressions.of(statement)) {
      Expressions.walk(root, expr -> seeker.seek(expr).ifPresent(found::add));
    }
    return found.stream().findFirst();
  }

  @FunctionalInterface
  private interface Seeker {
    Optional<Span> seek(Expr expr);
  }
}
