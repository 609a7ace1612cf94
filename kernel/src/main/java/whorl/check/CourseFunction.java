package whorl.check;

import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import whorl.check.Operation.Reducer;

/** The functions that take a course of a motion and make one value of it. */
public enum CourseFunction {
  FIRST(Reducer.FIRST, "the value at the start of the motion"),
  LAST(Reducer.LAST, "the value at its end"),
  PEAK(Reducer.PEAK, "the largest value, between the steps too"),
  LEAST(Reducer.LEAST, "the least value, between the steps too"),
  MEAN(Reducer.MEAN, "the mean over time"),
  RMS(Reducer.RMS, "the root of the mean of the square over time"),
  AT(Reducer.AT, "the value at a time"),
  WHEN(Reducer.WHEN, "the time at which a value is first reached");

  private final Reducer reducer;
  private final String gist;

  CourseFunction(Reducer reducer, String gist) {
    this.reducer = reducer;
    this.gist = gist;
  }

  /** The function that a name calls, unless the sheet hides it. */
  public static Optional<CourseFunction> named(String name) {
    return Arrays.stream(values()).filter(function -> function.word().equals(name)).findFirst();
  }

  /** Its name. */
  public String word() {
    return name().toLowerCase(Locale.ROOT);
  }

  /** What it gives, in a few words. */
  public String gist() {
    return gist;
  }

  /** What it takes, as written in a call. */
  public List<String> parameters() {
    return switch (this) {
      case AT -> List.of("course", "time");
      case WHEN -> List.of("course", "value");
      default -> List.of("course");
    };
  }

  Reducer reducer() {
    return reducer;
  }

  /** Whether it takes a course of vectors. */
  boolean takesVectors() {
    return this == FIRST || this == LAST || this == AT;
  }
}
