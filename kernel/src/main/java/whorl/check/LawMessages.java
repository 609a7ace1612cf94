package whorl.check;

import java.util.List;
import java.util.stream.Collectors;
import org.jspecify.annotations.Nullable;
import whorl.diagnostic.Diagnostic;
import whorl.diagnostic.Span;
import whorl.laws.Law;
import whorl.laws.Need;
import whorl.laws.Parameter;
import whorl.laws.Sort;
import whorl.laws.ThingSort;
import whorl.syntax.Expr;
import whorl.syntax.Printer;

/** The messages about calls of laws. */
final class LawMessages {
  private LawMessages() {}

  private static CheckFailure failure(
      String code, String problem, Span span, String reason, String fix) {
    return new CheckFailure(Diagnostic.of(code, problem, span, reason, fix));
  }

  private static String calledAs(Law law) {
    return "It is called as " + law.head() + ".";
  }

  private static String calledAs(List<Law> laws) {
    return "It is called as "
        + laws.stream().map(Law::head).distinct().collect(Collectors.joining(" or "))
        + ".";
  }

  private static String either(List<Parameter> parameters) {
    return parameters.stream().map(Parameter::word).collect(Collectors.joining(" or "));
  }

  static CheckFailure noSuchParameter(Expr.Argument argument, Law law) {
    Expr.@Nullable Name name = argument.name();
    return failure(
        "no-such-parameter",
        law.name() + " has no parameter " + (name == null ? "" : name.name()) + ".",
        name == null ? argument.span() : name.span(),
        calledAs(law),
        "");
  }

  static CheckFailure tooMany(Expr.Argument argument, Law law) {
    return failure(
        "argument-count",
        law.name() + " takes no further argument.",
        argument.span(),
        calledAs(law),
        "");
  }

  static CheckFailure twice(Expr.Argument argument, Parameter parameter, Law law) {
    return failure(
        "argument-twice",
        parameter.word() + " of " + law.name() + " is given twice.",
        argument.span(),
        calledAs(law),
        "");
  }

  static CheckFailure missing(Expr.Call call, Parameter parameter, Law law) {
    return failure(
        "argument-count",
        "The call of "
            + law.name()
            + " leaves out "
            + parameter.word()
            + ", "
            + parameter.explanation()
            + ".",
        call.span(),
        calledAs(law),
        "");
  }

  static CheckFailure noneOf(Expr.Call call, List<Parameter> group, Law law) {
    return failure(
        "argument-count",
        "The call of " + law.name() + " leaves out " + either(group) + ".",
        call.span(),
        calledAs(law),
        "Give one of them by name.");
  }

  static CheckFailure severalOf(Expr.Call call, List<Parameter> given, Law law) {
    return failure(
        "argument-twice",
        law.name()
            + " is given "
            + given.stream().map(Parameter::word).collect(Collectors.joining(" and "))
            + ", of which each tells the other.",
        call.span(),
        calledAs(law),
        "Keep the one that the drawing or the scale shows; a check can compare the other.");
  }

  static CheckFailure noForm(Expr.Call call, List<Law> laws) {
    return failure(
        "argument-count",
        laws.get(0).name() + " is not called with these arguments.",
        call.span(),
        calledAs(laws),
        "");
  }

  static CheckFailure noFormFor(Expr.Call call, List<Law> laws, Typed found) {
    String takes =
        laws.stream()
            .map(law -> law.parameters().get(0).sort().withArticle())
            .distinct()
            .collect(Collectors.joining(", or "));
    return failure(
        "argument-sort",
        laws.get(0).name()
            + " takes "
            + takes
            + ", but "
            + CheckMessages.described(found)
            + " stands there.",
        call.arguments().get(0).span(),
        calledAs(laws),
        "");
  }

  static CheckFailure wrongCharacter(Expr value, Typed found, Parameter parameter, List<Law> laws) {
    List<Sort> sorts =
        laws.stream()
            .flatMap(law -> law.parameters().stream())
            .filter(other -> other.word().equals(parameter.word()))
            .map(Parameter::sort)
            .distinct()
            .toList();
    boolean centre =
        found.type() instanceof Type.Thing thing
            && thing.sort() == ThingSort.BODY
            && sorts.contains(new Sort.Thing(ThingSort.POINT));
    return failure(
        "argument-sort",
        laws.get(0).name()
            + " takes "
            + sorts.stream().map(Sort::withArticle).collect(Collectors.joining(" or "))
            + " as "
            + parameter.word()
            + ", but "
            + CheckMessages.described(found)
            + " stands there.",
        value.span(),
        "",
        centre ? "Its centre of mass is " + Printer.expression(value) + ".centre" : "");
  }

  /** What a transfer needs and the quantity does not tell. */
  static CheckFailure demanded(
      Expr.Call call, Law law, Parameter parameter, Expr source, Typed quantity) {
    String text = Printer.expression(source);
    var need = (Need.Known) parameter.need();
    String reason =
        switch (need.supply()) {
          case PLACE ->
              "`"
                  + text
                  + "` does not say what it is about"
                  + (quantity.type().about() == null
                      ? ": a plain formula goes with any reference."
                      : " in a way that fits.");
          case MASS -> "It is not known of which body `" + text + "` is, so its mass is not known.";
          case CENTRE ->
              "It is not known of which body `"
                  + text
                  + "` is. The transfer starts from the centre"
                  + " of mass: m d² is added on the way from it and taken off on the way to it.";
          case FORCE -> "It is not known of which force `" + text + "` is the moment.";
          case MOMENTUM -> "An angular momentum does not tell the momentum of its matter.";
        };
    return failure(
        "argument-demanded",
        "To move `"
            + text
            + "`, "
            + parameter.word()
            + " is needed: "
            + parameter.explanation()
            + ".",
        call.span(),
        reason,
        "Name it: " + parameter.word() + " = …");
  }
}
