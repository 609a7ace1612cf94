package whorl.sheet;

/**
 * What a quantity is about and where it is seen from.
 *
 * @param about the point or axis that it is taken about, as the sheet calls it; empty for none
 * @param frame the frame along whose axes its parts are, as the sheet calls it; empty for the world
 */
public record Setting(String about, String frame) {
  /** About nothing, seen from the world. */
  public static final Setting NONE = new Setting("", "");
}
