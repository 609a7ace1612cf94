package whorl.eval;

import java.util.List;
import whorl.check.CourseInput;
import whorl.check.FrameSize;
import whorl.check.Operation;

/**
 * A course in a formula: what stays the same is worked out once into a frame of its own, then the
 * body for every instant that is asked for.
 *
 * @param number of the body among the procedures
 * @param room of the body's frame
 * @param level of the course in the body it stands in
 */
record SampledCode(
    int number, FrameSize room, List<Captured> captures, List<CourseInput> courses, int level) {
  /** What is taken over into a slot of the frame. */
  record Captured(Code value, int slot) {}

  static SampledCode of(Operation.Sampled course, CodeWriter writer) {
    List<Captured> captures =
        course.captures().stream()
            .map(capture -> new Captured(writer.any(capture.value()), capture.slot()))
            .toList();
    return new SampledCode(
        writer.numberOf(course.body()),
        course.body().frame(),
        captures,
        course.courses(),
        writer.level());
  }

  /** The course with what goes in now. */
  Course in(Activation caller) {
    var frame = new Slots(room);
    for (Captured captured : captures) {
      frame.put(captured.slot(), captured.value().valueIn(caller));
    }
    Procedure body = caller.procedure(number);
    Activation activation = caller.calling(body, frame, level);
    return sampled(body, activation, courses);
  }

  /** The course that a body gives, whose activation serves for all instants. */
  static Course sampled(Procedure body, Activation activation, List<CourseInput> inputs) {
    Course[] sources = new Course[inputs.size()];
    for (int i = 0; i < sources.length; i++) {
      CourseInput input = inputs.get(i);
      Object source = activation.things()[input.source()];
      sources[i] = source instanceof Run run ? run.column(input.column()) : (Course) source;
    }
    int width = body.code() instanceof Code.Vector ? 3 : 1;
    return new Course(
        sources[0].run(),
        width,
        (time, state, into, slot) -> {
          activation.count(body.operations());
          for (int i = 0; i < sources.length; i++) {
            sources[i].sample(time, state, activation.frame(), inputs.get(i).slot());
          }
          if (body.code() instanceof Code.Real real) {
            into[slot] = real.in(activation);
          } else if (body.code() instanceof Code.Vector vector) {
            Value.Vector value = vector.in(activation);
            into[slot] = value.x();
            into[slot + 1] = value.y();
            into[slot + 2] = value.z();
          } else {
            into[slot] = ((Code.Truth) body.code()).in(activation) ? 1 : 0;
          }
        });
  }
}
