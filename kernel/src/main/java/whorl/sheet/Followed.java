package whorl.sheet;

import java.util.List;
import whorl.eval.Course;
import whorl.mechanics.motion.Ending;
import whorl.mechanics.motion.Kept;
import whorl.syntax.MotionLine;
import whorl.units.Unit;

/**
 * A motion that was followed, as the sheet shows it.
 *
 * @param duration how long it lasted
 * @param ending why it ended
 * @param steps number of steps that it took
 * @param columns its courses
 * @param hidden names of the sheet that names of the motion hide
 * @param balances equations that say what becomes of matter while an inertia changes
 * @param kept what should not have changed, and how well it was kept
 */
public record Followed(
    Quantity duration,
    Ending ending,
    int steps,
    List<Column> columns,
    List<String> hidden,
    List<Balance> balances,
    List<Kept> kept) {
  /** Copies the lists. */
  public Followed {
    columns = List.copyOf(columns);
    hidden = List.copyOf(hidden);
    balances = List.copyOf(balances);
    kept = List.copyOf(kept);
  }

  /**
   * A course.
   *
   * @param unit the unit it is shown in
   * @param chosen whether the author chose the unit
   * @param kind the kind of quantity in words, or empty
   */
  public record Column(String name, Course course, Unit unit, boolean chosen, String kind) {}

  /**
   * What an equation says of an inertia that changes with the motion.
   *
   * @param sameMatter whether it is the rate of the angular momentum of the same matter; otherwise
   *     matter leaves or comes with the speed it has
   */
  public record Balance(MotionLine.Equation equation, boolean sameMatter) {}
}
