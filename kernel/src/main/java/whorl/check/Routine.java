package whorl.check;

/**
 * A function worked out outside the sheet. It must be pure: the same arguments always give the same
 * number.
 */
@FunctionalInterface
public interface Routine {
  /**
   * Works out the function.
   *
   * @param arguments in the units of its head, in the order of its parameters
   * @return the result in the unit of its head
   * @throws RoutineFailure if it has no value, or was interrupted
   */
  double apply(double[] arguments) throws RoutineFailure;
}
