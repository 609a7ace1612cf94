package whorl.laws;

/** The sorts of thing in space that a formula can work with besides numbers and vectors. */
public enum ThingSort {
  POINT("point", "a point"),
  AXIS("axis", "an axis"),
  FRAME("frame", "a frame"),
  BODY("body", "a body"),
  FORCE("bound force", "a bound force"),
  INERTIA("inertia tensor", "an inertia tensor");

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
