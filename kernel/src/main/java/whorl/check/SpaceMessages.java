package whorl.check;

import java.util.List;
import whorl.diagnostic.Diagnostic;
import whorl.diagnostic.Span;
import whorl.laws.ThingSort;
import whorl.syntax.Expr;

/** The messages about things in space and about what quantities are taken about. */
final class SpaceMessages {
  private SpaceMessages() {}

  private static CheckFailure failure(
      String code, String problem, Span span, String reason, String fix) {
    return new CheckFailure(Diagnostic.of(code, problem, span, reason, fix));
  }

  /** A thing in words, as {@code a point}. */
  static String words(Type type) {
    return type instanceof Type.Thing thing
        ? thing.sort().withArticle()
        : ThingSort.INERTIA.withArticle();
  }

  static CheckFailure thingForNumber(Expr expr, Type found) {
    return thingForNumber(expr.span(), found);
  }

  static CheckFailure thingForNumber(Span span, Type found) {
    return failure(
        "thing-for-number",
        words(found).replaceFirst("^a", "A") + " stands where a number is needed.",
        span,
        "",
        "");
  }

  static CheckFailure mixedThings(Expr.Choice choice, ThingSort then, ThingSort otherwise) {
    return new CheckFailure(
        new Diagnostic(
            "mixed-characters",
            "Cannot put together " + then.withArticle() + " and " + otherwise.withArticle() + ".",
            choice.then().span(),
            then.withArticle(),
            List.of(new Diagnostic.Label(choice.otherwise().span(), otherwise.withArticle())),
            "",
            ""));
  }

  static CheckFailure thingWithUnit(Expr value, Type found, Span bracket) {
    return new CheckFailure(
        Diagnostic.of(
                "thing-with-unit",
                words(found).replaceFirst("^a", "A") + " has no unit of its own.",
                bracket,
                "",
                "Leave out the bracket; its parts have units.")
            .with(value.span(), words(found)));
  }
}
