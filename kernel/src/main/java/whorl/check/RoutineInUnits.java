package whorl.check;

import java.util.List;
import whorl.units.Unit;

/** A routine with the conversions around it: numbers enter and leave in coherent SI units. */
final class RoutineInUnits implements Routine {
  private final Routine routine;
  private final List<Meaning.Parameter> parameters;
  private final Unit result;

  /**
   * Puts the conversions around a routine.
   *
   * @param parameters with the units that it takes
   * @param result the unit that it gives
   */
  RoutineInUnits(Routine routine, List<Meaning.Parameter> parameters, Unit result) {
    this.routine = routine;
    this.parameters = List.copyOf(parameters);
    this.result = result;
  }

  @Override
  public double apply(double[] arguments) throws RoutineFailure {
    var converted = new double[arguments.length];
    for (int i = 0; i < converted.length; i++) {
      converted[i] = parameters.get(i).unit().fromSi(arguments[i]);
    }
    return result.toSi(routine.apply(converted));
  }
}
