package whorl.eval;

import java.util.ArrayList;
import java.util.List;
import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;
import whorl.check.Operation;

/**
 * The numbers and things of a motion at an instant, with the formulas that read them. Formulas are
 * added first, then made ready together.
 */
final class MotionFrame {
  private final double[] numbers;
  private final Object[] things;
  private final List<Operation> formulas = new ArrayList<>();
  private Procedure[] procedures = {};
  private Activation[] activations = {};

  MotionFrame(double[] numbers, Object[] things) {
    this.numbers = numbers.clone();
    this.things = things.clone();
  }

  /** Adds a formula, and gives the number under which it is worked out. */
  int formula(Operation operation) {
    formulas.add(operation);
    return formulas.size() - 1;
  }

  /** Makes all formulas ready. */
  void ready(Meter meter) {
    procedures = new CodeWriter().write(formulas);
    activations = new Activation[formulas.size()];
    for (int i = 0; i < activations.length; i++) {
      activations[i] = Activation.of(procedures, i, numbers, things, meter);
    }
  }

  double[] numbers() {
    return numbers;
  }

  Object[] things() {
    return things;
  }

  double real(int formula) {
    return ((Code.Real) procedures[formula].code()).in(activations[formula]);
  }

  boolean truth(int formula) {
    return ((Code.Truth) procedures[formula].code()).in(activations[formula]);
  }

  Vector3D vector(int formula) {
    Value.Vector value = ((Code.Vector) procedures[formula].code()).in(activations[formula]);
    return new Vector3D(value.x(), value.y(), value.z());
  }

  Object thing(int formula) {
    return ((Code.Thing) procedures[formula].code()).in(activations[formula]);
  }

  void put(int slot, double number) {
    numbers[slot] = number;
  }

  void put(int slot, Object thing) {
    things[slot] = thing;
  }

  /** Works a formula out into a slot. */
  void store(int formula, int slot) {
    store(formula, numbers, slot);
  }

  /** Works a formula of a number, a vector or a condition out into some places of an array. */
  void store(int formula, double[] into, int slot) {
    Code code = procedures[formula].code();
    Activation activation = activations[formula];
    if (code instanceof Code.Real real) {
      into[slot] = real.in(activation);
    } else if (code instanceof Code.Vector vector) {
      Value.Vector value = vector.in(activation);
      into[slot] = value.x();
      into[slot + 1] = value.y();
      into[slot + 2] = value.z();
    } else {
      into[slot] = ((Code.Truth) code).in(activation) ? 1 : 0;
    }
  }
}
