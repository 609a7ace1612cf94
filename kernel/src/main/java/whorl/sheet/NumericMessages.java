package whorl.sheet;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import whorl.check.Meaning;
import whorl.check.Mentions;
import whorl.diagnostic.Diagnostic;
import whorl.diagnostic.Source;
import whorl.diagnostic.Span;
import whorl.eval.NumericFailure;
import whorl.eval.Value;
import whorl.units.Dimension;
import whorl.units.Unit;

/** The messages about formulas that have no value: the one place for their wording. */
final class NumericMessages {
  private NumericMessages() {}

  /**
   * Why a statement has no value.
   *
   * @param given what went into it
   */
  static Diagnostic of(NumericFailure failure, Node node, List<Given> given, Results results) {
    boolean inBody = !failure.inFunction().isEmpty();
    Source text = node.source();
    Span span = failure.span();
    if (inBody) {
      text = results.definingNode(failure.inFunction()).map(Node::source).orElse(node.source());
      span =
          Mentions.ofCall(failure.inFunction(), node.statement()).orElse(node.statement().span());
    }
    NumericFailure.Call call = failure.call();
    if (call != null
        && results.of(failure.inFunction()).orElse(null) instanceof Result.Callable f) {
      return routine(call, f.checked().meaning(), failure.operand(), span);
    }
    NumericFailure.Refused refused = failure.refused();
    if (refused != null) {
      return Diagnostic.of(
          code(failure.reason()),
          (inBody ? "In " + failure.inFunction() + ", " : "")
              + refused.rule()
              + ": "
              + refused.reason(),
          span,
          with(given),
          refused.fix());
    }
    String part = text.slice(failure.span());
    String where = inBody ? "In " + failure.inFunction() + ", " : "";
    return Diagnostic.of(
        code(failure.reason()),
        sentence(where, problem(failure, part)),
        span,
        with(given),
        fix(failure.reason(), part));
  }

  private static Diagnostic routine(
      NumericFailure.Call call, Meaning.Function function, double gave, Span span) {
    var arguments = new ArrayList<String>();
    for (int i = 0; i < function.parameters().size(); i++) {
      Meaning.Parameter parameter = function.parameters().get(i);
      double value = parameter.unit().fromSi(call.arguments().get(i));
      arguments.add(stated(parameter.name(), Digits.of(value), parameter.unit()));
    }
    return Diagnostic.of(
        code(NumericFailure.Reason.ROUTINE_WITHOUT_VALUE),
        function.name()
            + " gives no number"
            + (arguments.isEmpty() ? "." : " for " + String.join(", ", arguments) + "."),
        span,
        "Its Java code " + said(call, gave),
        fix(NumericFailure.Reason.ROUTINE_WITHOUT_VALUE, ""));
  }

  private static String said(NumericFailure.Call call, double gave) {
    if (call.said().isEmpty()) {
      return Double.isNaN(gave)
          ? "returns NaN, which is no number."
          : "returns a number that is too large.";
    }
    return "says: "
        + (call.said().length() <= 300 ? call.said() : call.said().substring(0, 298) + " …");
  }

  private static String sentence(String where, String problem) {
    return where.isEmpty()
        ? problem.substring(0, 1).toUpperCase(java.util.Locale.ROOT) + problem.substring(1)
        : where + problem;
  }

  private static String code(NumericFailure.Reason reason) {
    return reason.name().toLowerCase(java.util.Locale.ROOT).replace('_', '-');
  }

  private static String problem(NumericFailure failure, String part) {
    String value = Digits.of(failure.operand());
    return switch (failure.reason()) {
      case DIVISION_BY_ZERO -> "division by zero: `" + part + "` is 0.";
      case OVERFLOW -> "the result of `" + part + "` is too large for a number.";
      case ROOT_OF_NEGATIVE ->
          "the root of a negative number: `" + part + "` is " + value + " in SI units.";
      case LOGARITHM_OF_NON_POSITIVE ->
          "the logarithm needs a number above zero, but `" + part + "` is " + value + ".";
      case ARC_OUT_OF_RANGE ->
          "the sine or cosine of an angle lies between −1 and 1, but `"
              + part
              + "` is "
              + value
              + ".";
      case DIRECTION_OF_ZERO -> "`" + part + "` has length zero, and so no direction.";
      case ZERO_TO_NEGATIVE_POWER ->
          "division by zero: `" + part + "` is 0 and stands under a negative power.";
      case ROUTINE_WITHOUT_VALUE, REFUSED -> "`" + part + "` gives no number.";
      case INTERRUPTED -> "the calculation was interrupted.";
      case TOO_LONG -> "the calculation takes too many operations and was stopped.";
      case TOO_DEEP -> "functions call each other too deeply.";
    };
  }

  private static String fix(NumericFailure.Reason reason, String part) {
    return switch (reason) {
      case DIVISION_BY_ZERO, ZERO_TO_NEGATIVE_POWER, ROUTINE_WITHOUT_VALUE ->
          "Check what goes in, or treat the case by itself: if … then … else …";
      case OVERFLOW -> "Check the units and the exponents of what goes in.";
      case ROOT_OF_NEGATIVE, LOGARITHM_OF_NON_POSITIVE, ARC_OUT_OF_RANGE ->
          "Check what goes in: the formula holds only where `" + part + "` is in range.";
      case DIRECTION_OF_ZERO, REFUSED -> "Check what goes in.";
      case INTERRUPTED -> "The sheet is as it was.";
      case TOO_LONG -> "Functions that call each other many times over make many operations.";
      case TOO_DEEP -> "Give intermediate results names of their own.";
    };
  }

  private static String with(List<Given> given) {
    List<String> numbers = given.stream().flatMap(each -> named(each).stream()).toList();
    return numbers.isEmpty() ? "" : "Here " + String.join(", ", numbers) + ".";
  }

  private static Optional<String> named(Given given) {
    Quantity quantity = given.quantity();
    if (!(quantity.value() instanceof Value.Real real)) {
      return Optional.empty();
    }
    String digits =
        quantity.written() == null
            ? Digits.of(quantity.unit().fromSi(real.value()))
            : quantity.written();
    return Optional.of(stated(given.name(), digits, quantity.unit()));
  }

  private static String stated(String name, String digits, Unit unit) {
    boolean plain = unit.dimension().equals(Dimension.ONE) && unit.symbol().equals("1");
    return name + " = " + digits + (plain ? "" : " " + unit.symbol());
  }
}
