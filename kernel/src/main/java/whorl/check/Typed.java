package whorl.check;

import java.util.List;
import org.jspecify.annotations.Nullable;
import whorl.diagnostic.Span;
import whorl.laws.ThingSort;
import whorl.units.Rational;
import whorl.units.kind.Kind;
import whorl.units.kind.Operand;
import whorl.units.kind.Powered;
import whorl.units.kind.Readings;

/**
 * A checked expression: what to work out and what comes out.
 *
 * @param literal the exact value, where the expression is made of bare numbers only
 * @param factors for a product or an integer power, the factors it consists of, so that a product
 *     around it is judged by all of them at once; empty for anything else
 */
record Typed(Operation operation, Type type, @Nullable Rational literal, List<Powered> factors) {

  private static final Readings INERTIA = Readings.of(Kind.named("rotational_inertia"));

  /** Copies the factors. */
  Typed {
    factors = List.copyOf(factors);
  }

  Typed(Operation operation, Type type, @Nullable Rational literal) {
    this(operation, type, literal, List.of());
  }

  static Typed of(Operation.Real operation, Readings readings) {
    return new Typed(operation, new Type.Real(readings), null);
  }

  static Typed of(Operation.Vector operation, Readings readings) {
    return new Typed(operation, new Type.Vector(readings), null);
  }

  static Typed of(Operation.Thing operation) {
    return new Typed(
        operation,
        operation.sort() == ThingSort.INERTIA
            ? new Type.Tensor(null, null)
            : new Type.Thing(operation.sort()),
        null);
  }

  static Typed of(Operation.Truth operation) {
    return new Typed(operation, new Type.Truth(), null);
  }

  /** What the kind algebra needs to know of it; only for numbers and vectors. */
  Operand operand() {
    if (type instanceof Type.Real real) {
      return new Operand(real.readings(), literal);
    } else if (type instanceof Type.Vector vector) {
      return Operand.of(vector.readings());
    } else if (type instanceof Type.Tensor) {
      return Operand.of(INERTIA);
    }
    throw new IllegalStateException("only numbers and vectors have a kind of quantity: " + type);
  }

  /** The same operation with other readings. */
  Typed read(Operand operand) {
    return read(operation, operand);
  }

  /** Another operation of the same character, with other readings. */
  Typed read(Operation other, Operand operand) {
    Type read =
        type instanceof Type.Vector vector
            ? new Type.Vector(operand.readings(), vector.reference(), vector.frame())
            : new Type.Real(operand.readings(), type.about());
    return new Typed(other, read, operand.literal());
  }

  /** Whether both are numbers, or both vectors. */
  boolean isLike(Typed other) {
    return (operation instanceof Operation.Real && other.operation instanceof Operation.Real)
        || (operation instanceof Operation.Vector && other.operation instanceof Operation.Vector);
  }

  /** The same worked out otherwise, by an operation of the same character. */
  Typed with(Operation other) {
    return new Typed(other, type, null);
  }

  /** The same taken about something, if a quantity of its kind can be. */
  Typed about(@Nullable Reference reference) {
    if (type instanceof Type.Real real) {
      return new Typed(operation, new Type.Real(real.readings(), reference), literal, factors);
    } else if (type instanceof Type.Vector vector) {
      return new Typed(
          operation,
          new Type.Vector(vector.readings(), reference, vector.frame()),
          literal,
          factors);
    } else if (type instanceof Type.Tensor tensor) {
      return new Typed(operation, new Type.Tensor(reference, tensor.frame()), null);
    }
    return this;
  }

  /** The same seen from a frame; null for the world. */
  Typed seenFrom(@Nullable Anchor frame) {
    if (type instanceof Type.Vector vector) {
      return new Typed(
          operation,
          new Type.Vector(vector.readings(), vector.reference(), frame),
          literal,
          factors);
    }
    return type instanceof Type.Tensor tensor
        ? new Typed(operation, new Type.Tensor(tensor.reference(), frame), null)
        : this;
  }

  /** The same with the factors that it consists of. */
  Typed madeOf(List<Powered> made) {
    return new Typed(operation, type, literal, made);
  }

  Span span() {
    return operation.span();
  }
}
