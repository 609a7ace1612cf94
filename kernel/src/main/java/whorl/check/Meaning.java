package whorl.check;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import whorl.units.Unit;
import whorl.units.kind.Readings;

/** What a name of the sheet stands for. */
public sealed interface Meaning {
  /**
   * A value.
   *
   * @param unit the unit that it is shown in
   * @param chosen whether the author chose that unit
   */
  record Quantity(Type type, Unit unit, boolean chosen) implements Meaning {}

  /**
   * A function, checked once.
   *
   * @param parameters in order
   * @param result type of its result
   * @param unit the unit that its result is shown in
   * @param chosen whether the author chose that unit
   * @param body what it works out; its frame holds the parameters, then the captures
   * @param captures what it reads from the sheet, in the order of their slots
   */
  record Function(
      String name,
      List<Parameter> parameters,
      Type result,
      Unit unit,
      boolean chosen,
      Operation.Body body,
      List<Input> captures)
      implements Meaning {
    /** Copies the lists. */
    public Function {
      parameters = List.copyOf(parameters);
      captures = List.copyOf(captures);
    }
  }

  /**
   * A motion.
   *
   * @param columns its courses by name, each with what one value of it is, in the order in which
   *     they are shown
   */
  record Motion(String name, Map<String, Quantity> columns) implements Meaning {
    /** Copies the columns. */
    public Motion {
      columns = Collections.unmodifiableMap(new LinkedHashMap<>(columns));
    }
  }

  /** A parameter of a function, always a number. */
  record Parameter(String name, Unit unit, Readings readings) {}

  /**
   * A name of the sheet that a formula reads.
   *
   * @param slot first slot of its value in the formula's frame; for a thing in space among the
   *     slots for things
   * @param direct whether the formula itself names it; otherwise a function that it calls does
   */
  record Input(String name, Type type, int slot, boolean direct) {}
}
