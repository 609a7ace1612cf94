package whorl.check;

import java.util.List;
import java.util.stream.Collectors;
import whorl.diagnostic.Diagnostic;
import whorl.diagnostic.Span;
import whorl.laws.ThingSort;
import whorl.syntax.Expr;
import whorl.syntax.Printer;
import whorl.units.kind.Kind;
import whorl.units.kind.Readings;

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

  static CheckFailure cannotBeDrawn(Expr expr, Type found) {
    String what = "a number";
    String fix =
        "If it is the size of a vector, write that vector out, such as (0, 0, "
            + Printer.expression(expr)
            + ").";
    if (found instanceof Type.Tensor) {
      what = ThingSort.INERTIA.withArticle();
      fix = "Sketch the body that has it.";
    } else if (found instanceof Type.Truth) {
      what = "a condition";
      fix = "";
    }
    return failure(
        "not-drawable",
        what.replaceFirst("^a", "A") + " cannot be drawn.",
        expr.span(),
        "A sketch shows bodies, points, axes, frames, forces and vectors.",
        fix);
  }

  static CheckFailure thingForNumber(Expr expr, Type found) {
    return thingForNumber(expr.span(), found);
  }

  static CheckFailure thingForNumber(Span span, Type found) {
    return failure(
        "thing-for-number",
        capital(words(found)) + " stands where a number is needed.",
        span,
        partsOf(found instanceof Type.Thing thing ? thing.sort() : ThingSort.INERTIA),
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
                capital(words(found)) + " has no unit of its own.",
                bracket,
                "",
                "Leave out the bracket; its parts have units.")
            .with(value.span(), words(found)));
  }

  static CheckFailure noPart(Expr.Part part, ThingSort sort) {
    return failure(
        "no-part",
        capital(sort.withArticle()) + " has no part ." + part.name().name() + ".",
        part.name().span(),
        partsOf(sort),
        "");
  }

  private static String partsOf(ThingSort sort) {
    return PartOfThing.of(sort).stream()
        .map(part -> "." + part.name())
        .collect(Collectors.joining(", ", "Its parts are ", "."));
  }

  static CheckFailure notAFrame(Expr.InFrame inFrame, Typed found) {
    return failure(
        "not-a-frame",
        "A frame stands behind @, but `"
            + Printer.expression(inFrame.frame())
            + "` is "
            + CheckMessages.described(found)
            + ".",
        inFrame.frame().span(),
        "A vector is stated in a frame, or seen from it; a body serves as its own frame.",
        "Make a frame: frame(origin = …, turned = …, about = …)");
  }

  static CheckFailure nothingInFrame(Expr.InFrame inFrame, Typed found) {
    return failure(
        "nothing-in-frame",
        "`"
            + Printer.expression(inFrame.vector())
            + "` is "
            + CheckMessages.described(found)
            + ", which looks the same from every frame.",
        inFrame.vector().span(),
        "In front of @ stands a vector, an inertia tensor or a point.",
        "");
  }

  static CheckFailure noSum(Expr before, Typed total, Expr.Term term, Typed next) {
    String left = CheckMessages.described(total);
    String right = CheckMessages.described(next);
    return new CheckFailure(
        new Diagnostic(
            "no-sum",
            term.subtracted()
                ? "Cannot take " + right + " from " + left + "."
                : "Cannot add " + left + " and " + right + ".",
            before.span(),
            left,
            List.of(new Diagnostic.Label(term.value().span(), right)),
            "The difference of two points is a vector; a point plus a vector of length is a point;"
                + " tensors about one point add up.",
            bodies(total, next)
                ? "Bodies are joined by assembly(a, b) and taken out of each other by without(a, b)."
                : ""));
  }

  private static boolean bodies(Typed left, Typed right) {
    return List.of(left, right).stream()
        .allMatch(
            typed -> typed.type() instanceof Type.Thing thing && thing.sort() == ThingSort.BODY);
  }

  static CheckFailure displacedByNoLength(Expr text, Typed found) {
    return failure(
        "displaced-by-no-length",
        "A point is displaced by a length, but `"
            + Printer.expression(text)
            + "` is "
            + CheckMessages.described(found)
            + ".",
        text.span(),
        "",
        "Write the way that it is moved, such as A + (0, 0, 10) mm");
  }

  static CheckFailure overTensor(Expr divisor) {
    return failure(
        "over-tensor",
        "An inertia tensor cannot divide.",
        divisor.span(),
        "Division by a tensor would be the solution of three equations.",
        "Divide by the moment of inertia about an axis: inertia(body, about = axis)");
  }

  static CheckFailure twoTensors(Expr second) {
    return failure(
        "two-tensors",
        "The product of two inertia tensors has no use here.",
        second.span(),
        "",
        "");
  }

  static CheckFailure noTensor(Expr.Product product, Typed found) {
    return failure(
        "no-tensor",
        "This product of an inertia tensor is "
            + found.operand().readings().withArticle()
            + ", for which there is no tensor.",
        product.span(),
        "A tensor is multiplied by plain numbers, or by a vector, as in J*ω.",
        "");
  }

  /** Two quantities that are taken about different points or axes meet. */
  static CheckFailure differentReferences(
      Expr leftText, Typed left, Reference one, Expr rightText, Typed right, Reference other) {
    String first = one.about().text();
    String second = other.about().text();
    String what = left.type() instanceof Type.Tensor ? "inertia tensor" : kind(left);
    return new CheckFailure(
        new Diagnostic(
            "different-references",
            "`"
                + Printer.expression(leftText)
                + "` is taken about "
                + first
                + ", but `"
                + Printer.expression(rightText)
                + "` about "
                + second
                + ".",
            leftText.span(),
            "about " + first,
            List.of(new Diagnostic.Label(rightText.span(), "about " + second)),
            reason(what),
            isWhole(rightText, right)
                ? "Move one of them first: moved("
                    + Printer.expression(rightText)
                    + ", to = "
                    + first
                    + further(what, other)
                    + ")"
                : "Take both about one point or axis first, by moved(…, to = "
                    + first
                    + "), and then their parts or sizes."));
  }

  /** Whether it is a quantity that can be moved, and no part or size of one. */
  private static boolean isWhole(Expr text, Typed typed) {
    boolean part = text instanceof Expr.Part || text instanceof Expr.Magnitude;
    boolean scalarMoment = typed.type() instanceof Type.Real && !kind(typed).equals("inertia");
    return !part && !scalarMoment;
  }

  private static String kind(Typed typed) {
    Readings readings = typed.operand().readings();
    return readings.canBe(Kind.named("torque"))
        ? "torque"
        : readings.canBe(Kind.named("angular_momentum")) ? "angular momentum" : "inertia";
  }

  private static String reason(String what) {
    return switch (what) {
      case "torque" ->
          "The moment of the same forces changes with the point that it is taken about.";
      case "angular momentum" ->
          "The angular momentum of the same matter changes with the point that it is taken about.";
      default -> "Inertias add up only about one common axis or point.";
    };
  }

  /** What else the transfer needs, where it is not known. */
  private static String further(String what, Reference reference) {
    boolean known = reference.of() != null;
    return switch (what) {
      case "torque" -> known ? "" : ", force = …";
      case "angular momentum" -> ", momentum = …";
      default -> known ? "" : ", mass = …, centre = …";
    };
  }

  private static String capital(String words) {
    return Kinds.capital(words);
  }
}
