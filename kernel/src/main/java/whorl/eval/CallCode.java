package whorl.eval;

import java.util.List;
import whorl.check.FrameSize;
import whorl.check.Operation;
import whorl.check.Operation.Body;

/**
 * A call of a function: works out the arguments from left to right into a fresh frame, whether the
 * body reads them or not, and then the body.
 *
 * @param number of the body among the procedures
 * @param frameSize the room of the body's frame
 * @param arguments in the order of their slots
 * @param level of the call in the body it stands in
 */
record CallCode(int number, FrameSize frameSize, List<Code> arguments, int level) {
  static CallCode of(Body callee, List<Operation> arguments, CodeWriter writer) {
    List<Code> codes = arguments.stream().map(writer::any).toList();
    return new CallCode(writer.numberOf(callee), callee.frame(), codes, writer.level());
  }

  /** A call whose body gives a number. */
  double real(Activation caller) {
    return ((Code.Real) code(caller)).in(activation(caller));
  }

  /** A call whose body gives a vector. */
  Value.Vector vector(Activation caller) {
    return ((Code.Vector) code(caller)).in(activation(caller));
  }

  /** A call whose body gives a truth value. */
  boolean truth(Activation caller) {
    return ((Code.Truth) code(caller)).in(activation(caller));
  }

  /** A call whose body gives a thing in space. */
  Object thing(Activation caller) {
    return ((Code.Thing) code(caller)).in(activation(caller));
  }

  private Code code(Activation caller) {
    return caller.procedure(number).code();
  }

  private Activation activation(Activation caller) {
    var frame = new Slots(frameSize);
    for (Code argument : arguments) {
      argument.store(caller, frame);
    }
    return caller.calling(caller.procedure(number), frame, level);
  }
}
