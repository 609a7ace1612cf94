package whorl.check;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.jspecify.annotations.Nullable;

/** Gives the names that a formula reads their slots, in order of first mention. */
final class Frame {
  private final Map<String, Meaning.Input> inputs = new LinkedHashMap<>();
  private final Map<String, CourseInput> courses = new LinkedHashMap<>();
  private @Nullable String over;
  private FrameSize size;

  /** A frame whose first slots are taken by the parameters of a function. */
  Frame(int parameters) {
    this.size = new FrameSize(parameters, 0);
  }

  /** The input for a name, with a slot of its own from the first mention on. */
  Meaning.Input input(String name, Type type, boolean direct) {
    Meaning.Input known = inputs.get(name);
    if (known == null) {
      int slot = type.slots().things() > 0 ? size.things() : size.numbers();
      known = new Meaning.Input(name, type, slot, direct);
      size = size.plus(type.slots());
      inputs.put(name, known);
    } else if (direct && !known.direct()) {
      known = new Meaning.Input(name, type, known.slot(), true);
      inputs.put(name, known);
    }
    return known;
  }

  /** Room for a value that is no name of the sheet: a state or a local of a motion. */
  int reserve(Type type) {
    int slot = type.slots().things() > 0 ? size.things() : size.numbers();
    size = size.plus(type.slots());
    return slot;
  }

  /**
   * One value of a course at a time, with slots of its own from the first mention on.
   *
   * @param source the motion or the course
   * @param column of the motion; empty for a course with a name of its own
   */
  CourseInput course(Meaning.Input source, String column, Type.Course type) {
    over = type.over();
    return courses.computeIfAbsent(
        source.name() + "." + column,
        key -> new CourseInput(column, type.sample(), reserve(type.sample()), source.slot()));
  }

  /** The motion whose courses are read, or null where none is. */
  @Nullable String over() {
    return over;
  }

  List<CourseInput> courses() {
    return List.copyOf(courses.values());
  }

  List<Meaning.Input> inputs() {
    return new ArrayList<>(inputs.values());
  }

  FrameSize size() {
    return size;
  }
}
