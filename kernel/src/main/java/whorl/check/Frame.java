package whorl.check;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** Gives the names that a formula reads their slots, in order of first mention. */
final class Frame {
  private final Map<String, Meaning.Input> inputs = new LinkedHashMap<>();
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

  List<Meaning.Input> inputs() {
    return new ArrayList<>(inputs.values());
  }

  FrameSize size() {
    return size;
  }
}
