package whorl.check;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** Gives the names that a formula reads their slots, in order of first mention. */
final class Frame {
  private final Map<String, Meaning.Input> inputs = new LinkedHashMap<>();
  private int size;

  /** A frame whose first slots are taken by the parameters of a function. */
  Frame(int parameters) {
    this.size = parameters;
  }

  /** The input for a name, with a slot of its own from the first mention on. */
  Meaning.Input input(String name, Type type, boolean direct) {
    Meaning.Input known = inputs.get(name);
    if (known == null) {
      known = new Meaning.Input(name, type, size, direct);
      size += type.slots();
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

  int size() {
    return size;
  }
}
