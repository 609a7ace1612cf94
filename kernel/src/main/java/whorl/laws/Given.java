package whorl.laws;

import java.util.List;
import java.util.Objects;
import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;
import org.jspecify.annotations.Nullable;

/**
 * What a rule is given at one use: for each of its parameters a number, a vector, a thing or a list
 * of these, in coherent SI units and world axes. Filled once, from the first parameter on, and read
 * through the rule's own parameters; numbers are never boxed.
 */
public final class Given {
  private static final int PARTS = 3;

  private final double[] numbers;
  private final @Nullable Object[] things;
  private final boolean[] present;

  /** Room for so many parameters, none of them given yet. */
  public Given(int parameters) {
    this.numbers = new double[PARTS * parameters];
    this.things = new Object[parameters];
    this.present = new boolean[parameters];
  }

  /** Gives a number. */
  public void put(int parameter, double number) {
    numbers[PARTS * parameter] = number;
    present[parameter] = true;
  }

  /** Gives a vector by its parts in the world. */
  public void put(int parameter, double x, double y, double z) {
    numbers[PARTS * parameter] = x;
    numbers[PARTS * parameter + 1] = y;
    numbers[PARTS * parameter + 2] = z;
    present[parameter] = true;
  }

  /** Gives a thing, or a list of vectors or things. */
  public void put(int parameter, Object thing) {
    things[parameter] = thing;
    present[parameter] = true;
  }

  /** Whether a parameter was given. */
  public boolean has(int parameter) {
    return present[parameter];
  }

  /** A number that was given. */
  public double number(int parameter) {
    return numbers[PARTS * parameter];
  }

  /** A vector that was given. */
  public Vector3D vector(int parameter) {
    int first = PARTS * parameter;
    return new Vector3D(numbers[first], numbers[first + 1], numbers[first + 2]);
  }

  /** A thing that was given. */
  public <T> T thing(int parameter, Class<T> type) {
    return type.cast(Objects.requireNonNull(things[parameter]));
  }

  /** A list that was given. */
  public <T> List<T> list(int parameter, Class<T> type) {
    List<?> members = thing(parameter, List.class);
    return members.stream().<T>map(type::cast).toList();
  }
}
