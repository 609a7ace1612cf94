package whorl.check;

import java.util.List;
import org.jspecify.annotations.Nullable;
import whorl.diagnostic.Span;
import whorl.laws.Rule;
import whorl.laws.Sort;
import whorl.laws.ThingSort;
import whorl.syntax.Expr;
import whorl.syntax.Printer;
import whorl.units.kind.Kind;
import whorl.units.kind.Readings;

/**
 * Checks what only things in space have: parts, sums of points and of tensors, frames of vectors.
 */
final class Space {
  private static final Readings LENGTH = Readings.of(Kind.named("length"));

  private final ExpressionChecker checker;

  Space(ExpressionChecker checker) {
    this.checker = checker;
  }

  // What things are called.

  /** What an expression for a thing is known by; null where it depends on a parameter. */
  @Nullable Anchor anchor(Typed typed, Expr expr) {
    if (typed.type() instanceof Type.Thing thing && thing.identity() != null) {
      return thing.identity();
    }
    return checker.namesParameter(expr) ? null : new Anchor(Printer.expression(expr), expr);
  }

  /** The thing that an anchor is known by, worked out again where it is needed. */
  Typed at(Anchor anchor) {
    return checker.outside().check(anchor.expr());
  }

  // Uses of rules.

  /** A rule of one sort of result at work. */
  static Typed used(Span span, Operation.Use use, Sort gives) {
    if (gives instanceof Sort.Real real) {
      return Typed.of(new Operation.RealUse(span, use), readings(real.kinds()));
    } else if (gives instanceof Sort.Vector vector) {
      return Typed.of(new Operation.VectorUse(span, use), readings(vector.kinds()));
    }
    return Typed.of(new Operation.ThingUse(span, ((Sort.Thing) gives).sort(), use));
  }

  private static Readings readings(List<Kind> kinds) {
    return kinds.get(0) == Kind.named("number") ? Readings.NUMBER : Readings.of(kinds);
  }

  private static Operation.Use ofOne(Rule rule, Operation operand) {
    return new Operation.Use(rule, List.of(Operation.Argument.of(0, operand)));
  }

  // Parts.

  /** A part of a thing. */
  Typed part(Expr.Part part, Typed whole) {
    ThingSort sort = ((Operation.Thing) whole.operation()).sort();
    String name = part.name().name();
    PartOfThing rule = PartOfThing.named(sort).get(name);
    if (rule == null) {
      throw SpaceMessages.noPart(part, sort);
    }
    Typed typed = used(part.span(), ofOne(rule, seen(whole).operation()), rule.gives());
    if (whole.type() instanceof Type.Tensor tensor) {
      boolean axis = typed.type() instanceof Type.Vector;
      Reference reference = tensor.reference();
      return axis ? inFrame(typed, tensor.frame()) : typed.about(ofUnknown(reference));
    }
    Anchor of = ((Type.Thing) whole.type()).identity();
    if (of == null) {
      of = anchor(whole, part.of());
    }
    return of == null ? typed : partOf(of, part, typed);
  }

  /** The part of something that is known by a name. */
  private static Typed partOf(Anchor of, Expr.Part part, Typed typed) {
    if (typed.type() instanceof Type.Thing thing) {
      var expr = new Expr.Part(part.span(), of.expr(), part.name());
      // A body serves as its frame, so that both go by the name of the body.
      String text =
          thing.sort() == ThingSort.FRAME ? of.text() : of.text() + "." + part.name().name();
      return new Typed(
          typed.operation(), new Type.Thing(thing.sort(), new Anchor(text, expr)), null);
    } else if (typed.type() instanceof Type.Tensor) {
      var centre = new Expr.Name(part.name().span(), "centre");
      var expr = new Expr.Part(part.span(), of.expr(), centre);
      return typed.about(new Reference(new Anchor(of.text() + ".centre", expr), of));
    }
    return typed;
  }

  private static @Nullable Reference ofUnknown(@Nullable Reference reference) {
    return reference == null ? null : reference.ofUnknown();
  }

  /** The part of a thing by its name, as the author would have written it. */
  Typed partNamed(Typed whole, String name, Span span) {
    ThingSort sort = ((Operation.Thing) whole.operation()).sort();
    PartOfThing rule = PartOfThing.named(sort).get(name);
    if (rule == null) {
      throw new IllegalStateException(sort + " has no part " + name);
    }
    return used(span, ofOne(rule, whole.operation()), rule.gives());
  }

  // Frames.

  /**
   * A vector or tensor along the axes of the frame that it is seen from; anything else as it is.
   */
  Typed seen(Typed typed) {
    if (typed.type() instanceof Type.Vector vector && vector.frame() != null) {
      Operation frame = frame(at(vector.frame())).operation();
      return typed
          .seenFrom(null)
          .with(new Operation.VectorUse(typed.span(), SpaceRule.SEEN.on(frame, typed.operation())));
    } else if (typed.type() instanceof Type.Tensor tensor && tensor.frame() != null) {
      Operation frame = frame(at(tensor.frame())).operation();
      return typed
          .seenFrom(null)
          .with(
              new Operation.ThingUse(
                  typed.span(),
                  ThingSort.INERTIA,
                  SpaceRule.TENSOR_SEEN.on(frame, typed.operation())));
    }
    return typed;
  }

  /**
   * A vector that was worked out along the axes of a frame, as a vector of the world seen from it.
   */
  private Typed inFrame(Typed typed, @Nullable Anchor frame) {
    if (frame == null) {
      return typed;
    }
    Operation operation =
        new Operation.VectorUse(
            typed.span(), SpaceRule.STATED.on(frame(at(frame)).operation(), typed.operation()));
    return typed.with(operation).seenFrom(frame);
  }

  /** A frame, or that of a body; null for anything else. */
  static boolean servesAsFrame(Typed typed) {
    return typed.type() instanceof Type.Thing thing
        && (thing.sort() == ThingSort.FRAME || thing.sort() == ThingSort.BODY);
  }

  /** What serves as a frame, as one. */
  Typed frame(Typed typed) {
    return typed.operation() instanceof Operation.Thing thing && thing.sort() == ThingSort.BODY
        ? partNamed(typed, "frame", typed.span())
        : typed;
  }

  /**
   * {@code v @ ship}: what is written out by its parts is stated in the frame, else seen from it.
   */
  Typed inFrame(Expr.InFrame inFrame) {
    Typed what = checker.check(inFrame.vector());
    Typed where = checker.check(inFrame.frame());
    if (!servesAsFrame(where)) {
      throw SpaceMessages.notAFrame(inFrame, where);
    }
    Anchor anchor = anchor(where, inFrame.frame());
    Operation frame = frame(where).operation();
    Span span = inFrame.span();
    if (what.type() instanceof Type.Vector) {
      return isWrittenOut(inFrame.vector())
          ? what.with(new Operation.VectorUse(span, SpaceRule.STATED.on(frame, what.operation())))
              .seenFrom(anchor)
          : what.seenFrom(anchor);
    } else if (what.type() instanceof Type.Tensor) {
      return what.seenFrom(anchor);
    } else if (isPoint(what)) {
      var use = SpaceRule.FROM_ORIGIN.on(frame, what.operation());
      return Typed.of(new Operation.VectorUse(span, use), LENGTH).seenFrom(anchor);
    }
    throw SpaceMessages.nothingInFrame(inFrame, what);
  }

  /** Whether a vector is written out by its parts, so that it is in no frame yet. */
  static boolean isWrittenOut(Expr expr) {
    if (expr instanceof Expr.InUnit inUnit) {
      return isWrittenOut(inUnit.group());
    } else if (expr instanceof Expr.Negation negation) {
      return isWrittenOut(negation.operand());
    }
    return expr instanceof Expr.Vector;
  }

  private static boolean isPoint(Typed typed) {
    return typed.type() instanceof Type.Thing thing && thing.sort() == ThingSort.POINT;
  }

  // Sums.

  /** A sum with things in space among its terms. */
  Typed sum(Expr.Sum sum, List<Typed> terms) {
    Expr.Term first = sum.terms().get(0);
    Typed total = terms.get(0);
    if (first.subtracted()) {
      throw SpaceMessages.thingForNumber(first.value(), total.type());
    }
    for (int i = 1; i < terms.size(); i++) {
      Expr.Term term = sum.terms().get(i);
      Expr before = SumChecker.upTo(sum, i);
      total = added(total, before, term, terms.get(i), before.span().to(term.value().span()));
    }
    return total;
  }

  private Typed added(Typed total, Expr before, Expr.Term term, Typed next, Span span) {
    Expr nextText = term.value();
    if (total.type() instanceof Type.Tensor left && next.type() instanceof Type.Tensor) {
      Reference shared = References.shared(total, () -> before, next, nextText);
      SpaceRule rule = term.subtracted() ? SpaceRule.TENSOR_DIFFERENCE : SpaceRule.TENSOR_SUM;
      Operation.Use use = rule.on(total.operation(), next.operation());
      return Typed.of(new Operation.ThingUse(span, ThingSort.INERTIA, use))
          .about(shared)
          .seenFrom(left.frame());
    } else if (isPoint(total) && isPoint(next) && term.subtracted()) {
      Operation.Use use = SpaceRule.DIFFERENCE.on(total.operation(), next.operation());
      return Typed.of(new Operation.VectorUse(span, use), LENGTH);
    } else if (isPoint(total) && next.type() instanceof Type.Vector) {
      return displaced(total, term, next, nextText, span);
    } else if (total.type() instanceof Type.Vector && isPoint(next) && !term.subtracted()) {
      return displaced(next, new Expr.Term(false, before), total, before, span);
    } else if (total.type() instanceof Type.Vector && next.type() instanceof Type.Vector) {
      Typed sum = Kinds.added(total, () -> before, term.subtracted(), next, nextText);
      return sum.with(
          new Operation.VectorSum(
              span,
              List.of(
                  new Operation.VectorTerm(false, (Operation.Vector) total.operation()),
                  new Operation.VectorTerm(
                      term.subtracted(), (Operation.Vector) next.operation()))));
    }
    throw SpaceMessages.noSum(before, total, term, next);
  }

  private static Typed displaced(Typed point, Expr.Term term, Typed by, Expr byText, Span span) {
    Kinds.meetLength(by, byText);
    Operation.Vector vector = (Operation.Vector) by.operation();
    Operation signed =
        term.subtracted() ? new Operation.VectorNegation(byText.span(), vector) : vector;
    return Typed.of(
        new Operation.ThingUse(
            span, ThingSort.POINT, SpaceRule.DISPLACED.on(point.operation(), signed)));
  }
}
