package whorl.check;

import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import org.jspecify.annotations.Nullable;
import whorl.diagnostic.Diagnostic;
import whorl.diagnostic.Span;
import whorl.syntax.Expr;
import whorl.syntax.Printer;
import whorl.syntax.Statement;
import whorl.units.Unit;
import whorl.units.UnknownUnitException;
import whorl.units.kind.Kind;
import whorl.units.kind.Readings;

/**
 * The messages about characters, calls, units and what this version leaves out. What the kind
 * algebra refuses is worded in {@link KindMessages}.
 */
final class CheckMessages {
  private CheckMessages() {}

  private static CheckFailure failure(
      String code, String problem, Span span, String reason, String fix) {
    return new CheckFailure(Diagnostic.of(code, problem, span, reason, fix));
  }

  private static String text(Expr expr) {
    return Printer.expression(expr);
  }

  // What this version does not work out.

  static Diagnostic notAvailable(String what, Span span) {
    return Diagnostic.of(
        "not-available",
        what + " is not available in this version of Whorl.",
        span,
        "It is part of the language and was read, but nothing is worked out for it yet.",
        "Take it out, or put # in front of the line to keep it as a remark.");
  }

  static CheckFailure textHasNoUse(Expr.Text text) {
    return failure(
        "text",
        "A text in quotes stands where a number is needed.",
        text.span(),
        "A text is the name of a file, and only laws that read one take it.",
        "");
  }

  static CheckFailure noFileName(Expr.Text name) {
    return failure(
        "file-name", "This is not the name of a file.", name.span(), "", "Check its characters.");
  }

  static CheckFailure fileOutside(Expr.Text name) {
    return failure(
        "file-outside",
        "The file “" + name.value() + "” does not lie below the folder of the note.",
        name.span(),
        "A note reads only files that travel with it.",
        "Copy the file into the folder of the note, and name it from there.");
  }

  /** What looks odd in a formula that is sound. */
  static Diagnostic remark(String sentence, Expr place) {
    return Diagnostic.of("remark", quoted(place) + ": " + sentence, place.span(), "", "");
  }

  // Characters: number, vector, condition.

  static CheckFailure vectorForNumber(Expr expr) {
    return failure(
        "vector-for-number",
        "A vector stands where a number is needed.",
        expr.span(),
        "",
        "Take its magnitude |v|, or a part of it: v.x, v.y, v.z.");
  }

  static CheckFailure conditionForNumber(Expr expr) {
    return conditionForNumber(expr.span());
  }

  static CheckFailure conditionForNumber(Span span) {
    return failure(
        "condition-for-number",
        "A condition stands where a number is needed.",
        span,
        "A condition holds or does not hold; it has no value to calculate with.",
        "Choose a number by it: if condition then 1 else 0");
  }

  static CheckFailure notACondition(Expr expr, Typed found) {
    return failure(
        "not-a-condition",
        "A condition is needed here, but " + quoted(expr) + " is " + described(found) + ".",
        expr.span(),
        "",
        "Compare it with something: " + text(expr) + " <= …");
  }

  static CheckFailure conditionWithUnit(Expr expr, Statement.Bracket bracket) {
    return new CheckFailure(
        Diagnostic.of(
                "condition-with-unit",
                "A condition has no unit.",
                bracket.span(),
                "It holds or does not hold.",
                "Leave out the bracket [" + bracket.unit().typeset() + "].")
            .with(expr.span(), "a condition"));
  }

  static CheckFailure mixedCharacters(Span left, Typed first, Span right, Typed second) {
    return new CheckFailure(
        new Diagnostic(
            "mixed-characters",
            "Cannot put together " + character(first) + " and " + character(second) + ".",
            left,
            character(first),
            List.of(new Diagnostic.Label(right, character(second))),
            "",
            "A vector becomes a number by its magnitude |v| or a part such as v.x."));
  }

  private static String character(Typed typed) {
    if (typed.type() instanceof Type.Vector) {
      return "a vector";
    } else if (typed.operation() instanceof Operation.Thing thing) {
      return thing.sort().withArticle();
    }
    return typed.type() instanceof Type.Truth ? "a condition" : "a number";
  }

  static String described(Typed typed) {
    if (typed.type() instanceof Type.Truth) {
      return "a condition";
    } else if (typed.operation() instanceof Operation.Thing thing) {
      return thing.sort().withArticle();
    }
    Readings readings = typed.operand().readings();
    Optional<Kind> kind = readings.kinds().stream().filter(k -> !k.isInternal()).findFirst();
    String words = kind.map(Kind::withArticle).orElse("a quantity");
    return typed.type() instanceof Type.Vector ? "a vector (" + words + ")" : words;
  }

  private static String quoted(Expr expr) {
    return "`" + text(expr) + "`";
  }

  static CheckFailure twoVectors(Span span, Span left, Expr right) {
    return new CheckFailure(
        new Diagnostic(
            "two-vectors",
            "* between two vectors has two readings.",
            span,
            "",
            List.of(
                new Diagnostic.Label(left, "vector"), new Diagnostic.Label(right.span(), "vector")),
            "A moment is a cross product, work is a dot product.",
            "Write × (or cross(a, b)) for the one, · (or dot(a, b)) for the other."));
  }

  static CheckFailure overVector(Expr divisor) {
    return failure(
        "over-vector",
        "A vector cannot divide.",
        divisor.span(),
        "",
        "Divide by its magnitude |" + text(divisor) + "| or by one of its parts.");
  }

  static CheckFailure crossNeedsVectors(Span left, boolean leftIsVector, Expr right) {
    return failure(
        "cross-needs-vectors",
        "× is the product of two vectors, but a number stands "
            + (leftIsVector ? "on its right." : "on its left."),
        leftIsVector ? right.span() : left,
        "",
        "Multiply numbers with *.");
  }

  static CheckFailure vectorNeeded(FunctionAtHand function, Expr argument) {
    return failure(
        "vector-needed",
        function.word() + " takes vectors, but " + quoted(argument) + " is none.",
        argument.span(),
        "",
        "A vector is written with three parts: (x, y, z).");
  }

  static CheckFailure noParts(Expr.Part part, Typed whole) {
    String name = part.name().name();
    if (whole.type() instanceof Type.Vector) {
      return failure(
          "no-part",
          "A vector has the parts .x, .y and .z, but no ." + name + ".",
          part.name().span(),
          "",
          "");
    }
    return failure(
        "no-part",
        quoted(part.of()) + " is " + described(whole) + " and has no part ." + name + ".",
        part.name().span(),
        "Parts are read from vectors: v.x, v.y, v.z.",
        "");
  }

  // Numbers and units.

  static CheckFailure tooLarge(Span span) {
    return failure(
        "overflow", "This quantity is too large for a number in SI units.", span, "", "");
  }

  static CheckFailure unknownUnit(UnknownUnitException unknown, Span span) {
    String near =
        unknown.near().isEmpty()
            ? ""
            : "Near it are " + unknown.near().stream().collect(Collectors.joining(", ")) + ".";
    return failure(
        "unit-unknown",
        "No unit is called " + unknown.symbol() + ".",
        span,
        near,
        unknown.usualSpelling().map(usual -> "Write " + usual + ".").orElse(""));
  }

  static CheckFailure exponentTooLarge(Span span) {
    return failure(
        "unit-exponent",
        "The exponents of this unit add up to more than any quantity has.",
        span,
        "",
        "Check them: a fourth power is already rare.");
  }

  static CheckFailure unitBehindQuantity(Expr.InUnit inUnit, String kind) {
    String group = text(inUnit.group());
    return failure(
        "unit-behind-quantity",
        "The unit "
            + inUnit.unit().text().typeset()
            + " stands behind "
            + "something that already is "
            + kind
            + ".",
        inUnit.unit().span(),
        "A unit makes a quantity of a plain number; `" + group + "` already has one.",
        "To show it in "
            + inUnit.unit().text().typeset()
            + ", put the unit in brackets behind the"
            + " name that it defines.");
  }

  static CheckFailure unknownKind(String words, Statement.Bracket bracket, Unit unit) {
    Span span = bracket.kindSpan() == null ? bracket.span() : bracket.kindSpan();
    List<String> fitting =
        Kind.all().stream()
            .filter(kind -> !kind.isInternal() && kind.dimension().equals(unit.dimension()))
            .map(Kind::words)
            .toList();
    return failure(
        "kind-unknown",
        "No kind of quantity is called “" + words + "”.",
        span,
        fitting.isEmpty()
            ? ""
            : "In " + unit.symbol() + " can be: " + String.join(", ", fitting) + ".",
        "");
  }

  static CheckFailure kindNotInUnit(Kind kind, Statement.Bracket bracket, Unit unit) {
    return failure(
        "kind-not-in-unit",
        Kinds.capital(kind.withArticle()) + " is not measured in " + unit.symbol() + ".",
        bracket.span(),
        "",
        Kinds.usualUnit(Readings.of(kind))
            .map(usual -> "Its usual unit is " + usual.symbol() + ".")
            .orElse(""));
  }

  static CheckFailure noUnit(Span span, Readings readings) {
    return failure(
        "no-unit",
        "This comes out in a root of a unit (" + readings.unit() + ") and cannot stand by itself.",
        span,
        "Such a quantity has a meaning only within a larger formula.",
        "Use it there, without a name of its own.");
  }

  static CheckFailure numberNeeded(
      String function, Expr argument, Typed found, Optional<Unit> unit) {
    return failure(
        "number-needed",
        function
            + " needs a plain number, but "
            + quoted(argument)
            + " is "
            + described(found)
            + ".",
        argument.span(),
        "What a rounded quantity is depends on its unit.",
        unit.map(
                shown ->
                    "Divide by the unit first: "
                        + function
                        + "("
                        + text(argument)
                        + " / (1 "
                        + shown.text().plain()
                        + "))")
            .orElse(""));
  }

  // Calls.

  static CheckFailure functionWithoutArguments(Expr.Name name) {
    return failure(
        "function-without-arguments",
        name.name() + " is a function and needs its arguments.",
        name.span(),
        "",
        "Write " + name.name() + "(…).");
  }

  static CheckFailure notAFunction(Expr.Call call) {
    String name = call.function().name();
    return failure(
        "not-a-function",
        name + " is a quantity, not a function.",
        call.function().span(),
        "",
        "To multiply, write " + name + " * (…).");
  }

  static CheckFailure noSuchParameter(Expr.Argument argument, Meaning.Function function) {
    Expr.@Nullable Name name = argument.name();
    return failure(
        "no-such-parameter",
        function.name() + " has no parameter " + (name == null ? "" : name.name()) + ".",
        name == null ? argument.span() : name.span(),
        "It is called as " + head(function) + ".",
        "");
  }

  static CheckFailure tooManyArguments(Expr.Argument argument, Meaning.Function function) {
    return failure(
        "argument-count",
        function.name() + " takes " + counted(function.parameters().size()) + "; this one is more.",
        argument.span(),
        "It is called as " + head(function) + ".",
        "");
  }

  static CheckFailure argumentTwice(
      Expr.Argument argument, String parameter, Meaning.Function function) {
    return failure(
        "argument-twice",
        "The parameter " + parameter + " of " + function.name() + " is given twice.",
        argument.span(),
        "It is called as " + head(function) + ".",
        "");
  }

  static CheckFailure argumentMissing(Expr.Call call, String parameter, Meaning.Function function) {
    return failure(
        "argument-count",
        "The call of " + function.name() + " leaves out " + parameter + ".",
        call.span(),
        "It is called as " + head(function) + ".",
        "");
  }

  private static String counted(int count) {
    return switch (count) {
      case 1 -> "one argument";
      case 2 -> "two arguments";
      case 3 -> "three arguments";
      default -> count + " arguments";
    };
  }

  private static String head(Meaning.Function function) {
    return function.name()
        + function.parameters().stream()
            .map(
                parameter ->
                    parameter.name()
                        + (parameter.unit().equals(Unit.ONE)
                            ? ""
                            : " [" + parameter.unit().symbol() + "]"))
            .collect(Collectors.joining(", ", "(", ")"));
  }

  static CheckFailure namedArgumentAtHand(Expr.Argument argument, FunctionAtHand function) {
    return failure(
        "no-such-parameter",
        "The function " + function.word() + " takes its arguments in order, without names.",
        argument.span(),
        "",
        "Leave out the name: " + function.word() + "(" + text(argument.value()) + ")");
  }

  static CheckFailure argumentCount(Expr.Call call, FunctionAtHand function) {
    int count = call.arguments().size();
    return failure(
        "argument-count",
        function.word()
            + " takes "
            + function.takesWords()
            + ", but here "
            + (count == 1 ? "stands one." : "stand " + (count == 0 ? "none" : count) + "."),
        call.span(),
        "",
        "");
  }
}
