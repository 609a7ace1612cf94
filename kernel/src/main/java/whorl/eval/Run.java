package whorl.eval;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Objects;
import whorl.mechanics.motion.MotionRun;

/** A motion that was followed, with its courses by name. */
public final class Run {
  /** The course of the time that the run lasted, the same at every instant. */
  static final String DURATION = "duration";

  private final MotionRun run;
  private final Map<String, Course> columns;

  Run(MotionRun run, Map<String, Course> columns) {
    this.run = run;
    this.columns = Collections.unmodifiableMap(new LinkedHashMap<>(columns));
  }

  /** The run itself. */
  public MotionRun motion() {
    return run;
  }

  /** Its courses by name, in the order in which they are shown. */
  public Map<String, Course> columns() {
    return columns;
  }

  /** One of its courses. */
  Course column(String name) {
    return name.equals(DURATION)
        ? new Course(run, 1, (time, state, into, slot) -> into[slot] = run.duration())
        : Objects.requireNonNull(columns.get(name), name);
  }
}
