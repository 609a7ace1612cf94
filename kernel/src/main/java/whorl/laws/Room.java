package whorl.laws;

/** The rooms of the catalogue, in the order of the reference. */
public enum Room {
  REFERENCE("reference", "Points, axes, frames, and what quantities are about"),
  BODIES("bodies", "Bodies"),
  MOMENTUM("momentum", "Inertia, momentum and energy"),
  GYROSCOPES("gyroscopes", "Gyroscopes");

  private final String word;
  private final String title;

  Room(String word, String title) {
    this.word = word;
    this.title = title;
  }

  /** Its name in file names. */
  public String word() {
    return word;
  }

  /** Its name as a heading. */
  public String title() {
    return title;
  }
}
