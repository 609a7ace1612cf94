package whorl.check;

import java.util.ArrayList;
import java.util.Optional;
import whorl.diagnostic.Span;
import whorl.syntax.Expr;
import whorl.syntax.Statement;

/** Finds where a statement calls a function. */
public final class CallSites {
  private CallSites() {}

  /** The first call of a function in a statement, if it calls it itself. */
  public static Optional<Span> of(String function, Statement statement) {
    var sites = new ArrayList<Span>();
    for (Expr root : Expressions.of(statement)) {
      Expressions.walk(
          root,
          expr -> {
            if (expr instanceof Expr.Call call && call.function().name().equals(function)) {
              sites.add(call.span());
            }
          });
    }
    return sites.stream().findFirst();
  }
}
