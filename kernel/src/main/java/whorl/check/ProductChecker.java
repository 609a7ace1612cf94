package whorl.check;

import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;
import whorl.diagnostic.Span;
import whorl.laws.ThingSort;
import whorl.syntax.Expr;
import whorl.units.Rational;
import whorl.units.kind.Kind;

/**
 * Checks a product. Stretches without a product of two vectors are judged whole by the kind
 * algebra, so that the order of factors never matters; a cross or dot product of vectors closes the
 * stretch to its left.
 */
final class ProductChecker {
  private static final Kind INERTIA = Kind.named("rotational_inertia");

  private final ExpressionChecker checker;
  private final Expr.Product product;

  /** Factors of the open stretch as the kind algebra needs them. */
  private final KindFactors kinds = new KindFactors();

  private final List<Operation.Factor> reals = new ArrayList<>();
  private Operation.@Nullable Vector vector;
  private Operation.@Nullable Thing tensor;

  private @Nullable Reference reference;
  private @Nullable Reference ofVectors;
  private @Nullable Anchor frame;
  private boolean framed;

  /** Whether factors are taken about different things, so that the product is about neither. */
  private boolean differ;

  private Span span;

  ProductChecker(ExpressionChecker checker, Expr.Product product) {
    this.checker = checker;
    this.product = product;
    this.span = product.factors().get(0).value().span();
  }

  Typed typed() {
    for (Expr.Factor factor : product.factors()) {
      Typed next = checker.check(factor.value());
      if (next.operation() instanceof Operation.Truth) {
        throw CheckMessages.conditionForNumber(factor.value());
      }
      if (next.type() instanceof Type.Thing) {
        throw SpaceMessages.thingForNumber(factor.value(), next.type());
      }
      boolean second = next.operation() instanceof Operation.Vector && vector != null;
      switch (factor.joint()) {
        case TIMES -> {
          if (second) {
            throw CheckMessages.twoVectors(product.span(), span, factor.value());
          }
          take(factor, next);
        }
        case OVER -> {
          if (next.operation() instanceof Operation.Vector) {
            throw CheckMessages.overVector(factor.value());
          } else if (next.type() instanceof Type.Tensor) {
            throw SpaceMessages.overTensor(factor.value());
          }
          take(factor, next);
        }
        case CROSS -> {
          if (!second) {
            throw CheckMessages.crossNeedsVectors(span, vector != null, factor.value());
          }
          note(next);
          close(Kinds.cross(closed(), next, upTo(factor)), factor);
        }
        case DOT -> {
          if (second) {
            note(next);
            close(Kinds.dot(closed(), next, upTo(factor)), factor);
          } else {
            take(factor, next);
          }
        }
      }
      span = span.to(factor.value().span());
    }
    return closed();
  }

  /** The product from its start to a factor. */
  private Expr.Product upTo(Expr.Factor last) {
    int end = product.factors().indexOf(last) + 1;
    return new Expr.Product(span.to(last.value().span()), product.factors().subList(0, end));
  }

  private void take(Expr.Factor factor, Typed next) {
    boolean divisor = factor.joint() == Expr.Joint.OVER;
    kinds.add(factor.value(), next, divisor ? Rational.of(-1) : Rational.ONE);
    note(next);
    if (next.operation() instanceof Operation.Vector operand) {
      vector = operand;
    } else if (next.operation() instanceof Operation.Thing operand) {
      if (tensor != null) {
        throw SpaceMessages.twoTensors(factor.value());
      }
      tensor = operand;
    } else {
      reals.add(new Operation.Factor(divisor, (Operation.Real) next.operation()));
    }
  }

  /** What the factors are taken about, and the frame of the first vector or tensor. */
  private void note(Typed factor) {
    Reference about = factor.type().about();
    if (about != null) {
      differ |= reference != null && !reference.sameAs(about);
      reference = about.ofUnknown();
      // A number about an axis says nothing of a vector that it stretches.
      ofVectors = factor.type() instanceof Type.Real ? ofVectors : reference;
    }
    if (!framed && factor.type() instanceof Type.Vector seen) {
      frame = seen.frame();
      framed = true;
    } else if (!framed && factor.type() instanceof Type.Tensor seen) {
      frame = seen.frame();
      framed = true;
    }
  }

  /** Starts a new stretch with the product of two vectors as its first factor. */
  private void close(Typed joined, Expr.Factor last) {
    kinds.restart(span.to(last.value().span()), joined);
    reals.clear();
    vector = null;
    if (joined.operation() instanceof Operation.Vector cross) {
      vector = cross;
    } else {
      reals.add(new Operation.Factor(false, (Operation.Real) joined.operation()));
    }
  }

  private Typed closed() {
    if (tensor != null && vector != null) {
      vector = new Operation.VectorUse(span, SpaceRule.TENSOR_TIMES_VECTOR.on(tensor, vector));
      tensor = null;
    }
    if (tensor != null) {
      return settled(tensorProduct(tensor));
    } else if (vector == null) {
      Operation.Real whole =
          reals.size() == 1 && !reals.get(0).divisor()
              ? reals.get(0).value()
              : new Operation.Product(span, reals);
      return settled(Kinds.product(kinds.list(), product, whole, checker::remark));
    }
    Operation.Vector whole = reals.isEmpty() ? vector : new Operation.Scaled(span, vector, reals);
    return settled(Kinds.product(kinds.list(), product, whole, checker::remark));
  }

  /** A tensor times numbers, which must leave it a tensor. */
  private Typed tensorProduct(Operation.Thing factor) {
    if (reals.isEmpty()) {
      return Typed.of(factor);
    }
    var whole = new Operation.Product(span, reals);
    Typed judged = Kinds.product(kinds.list(), product, whole, checker::remark);
    if (!Kinds.fits(judged, List.of(INERTIA))) {
      throw SpaceMessages.noTensor(product, judged);
    }
    return Typed.of(
        new Operation.ThingUse(span, ThingSort.INERTIA, SpaceRule.TENSOR_SCALED.on(factor, whole)));
  }

  /** The product with what it is taken about and the frame that it is seen from. */
  private Typed settled(Typed typed) {
    Reference about = typed.type() instanceof Type.Vector ? ofVectors : reference;
    return typed.about(differ ? null : about).seenFrom(frame);
  }
}
