package whorl.laws;

/**
 * The sorts of thing that a formula can work with besides numbers and vectors: things in space, a
 * motion that was followed, and a course, which has a value for every instant of one.
 */
public enum ThingSort {
  POINT("point", "a point"),
  AXIS("axis", "an axis"),
  FRAME("frame", "a frame"),
  BODY("body", "a body"),
  FORCE("bound force", "a bound force"),
  INERTIA("inertia tensor", "an inertia tensor"),
  MOTION("motion", "a motion"),
  COURSE("course", "a course");

  private final String words;
  private final String withArticle;

  ThingSort(String words, String withArticle) {
    this.words = words;
    this.withArticle = withArticle;
  }

  /** What people call it. */
  public String words() {
    return words;
  }

  /** The same with its article, as {@code an axis}. */
  public String withArticle() {
    return withArticle;
  }
}
