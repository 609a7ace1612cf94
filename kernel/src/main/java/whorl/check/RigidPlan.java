package whorl.check;

import java.util.List;
import org.jspecify.annotations.Nullable;

/**
 * A rigid body that a motion follows.
 *
 * @param name of the body
 * @param source the body as it stands in the sheet
 * @param slot where the body as it moves stands among the slots for things
 * @param about the point that stays in place; null where the body is free
 * @param angle by which it is turned at the start; null for 0
 * @param turnedAbout the axis, or the direction of one, about which it is turned; null for none
 * @param spin angular velocity at the start, read with the body turned; null for 0
 * @param loads what acts on it
 * @param columns first slot of what is read of it, in the order of {@link Column}
 * @param isRead whether a formula reads the body as it moves, besides what the columns say
 */
public record RigidPlan(
    String name,
    Operation.Thing source,
    int slot,
    Operation.@Nullable Thing about,
    Operation.@Nullable Real angle,
    @Nullable Operation turnedAbout,
    Operation.@Nullable Vector spin,
    List<Load> loads,
    int columns,
    boolean isRead) {
  /** Copies the list. */
  public RigidPlan {
    loads = List.copyOf(loads);
  }

  /**
   * A load.
   *
   * @param value a bound force, or the vector of a moment
   * @param isWeight whether it is the weight of the body, the same wherever the body is
   */
  public record Load(Operation value, boolean isWeight) {}

  /** What can be read of a moving body. */
  public enum Column {
    /** Unit vector along its own z axis. */
    AXIS("axis", "number", 0, 3),
    /** The part of the angular velocity along that axis. */
    SPIN("spin", "angular_velocity", 3, 1),
    /** Angular velocity. */
    RATE("rate", "angular_velocity", 4, 3),
    /** Angular momentum about the point of the motion. */
    MOMENTUM("L", "angular_momentum", 7, 3),
    /** Position of the centre of mass from the origin of the world. */
    AT("at", "length", 10, 3);

    private final String word;
    private final String kind;
    private final int offset;
    private final int width;

    Column(String word, String kind, int offset, int width) {
      this.word = word;
      this.kind = kind;
      this.offset = offset;
      this.width = width;
    }

    /** As written behind the name of the body. */
    public String word() {
      return word;
    }

    String kind() {
      return kind;
    }

    /** Numbers that it takes. */
    public int width() {
      return width;
    }

    /** Where it stands behind the first of the columns. */
    public int offset() {
      return offset;
    }
  }
}
