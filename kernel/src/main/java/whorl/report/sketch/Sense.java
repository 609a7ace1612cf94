package whorl.report.sketch;

/**
 * What a vector tells. A polar vector points where something acts or goes; an axial one points
 * along the axis of a turning, and is drawn with the sense of that turning.
 */
public enum Sense {
  /** A force. */
  FORCE(false, "#c0562f"),
  /** A moment of force. */
  MOMENT(true, "#8661c1"),
  /** An angular momentum. */
  ANGULAR_MOMENTUM(true, "#2f7fc1"),
  /** An angular velocity or acceleration. */
  TURNING(true, "#2a9065"),
  /** A velocity, a displacement or another vector that does not turn. */
  POLAR(false, "#a3782a");

  private final boolean axial;
  private final String colour;

  Sense(boolean axial, String colour) {
    this.axial = axial;
    this.colour = colour;
  }

  boolean axial() {
    return axial;
  }

  /** Of middling lightness, so that it reads on white and on black. */
  String colour() {
    return colour;
  }
}
