package whorl.eval;

import java.util.List;
import whorl.check.CourseInput;
import whorl.check.Operation;
import whorl.laws.ThingSort;
import whorl.mechanics.motion.MotionRun;

/** Works out a formula that reads courses, and so is a course itself. */
public final class CourseEvaluator {
  private CourseEvaluator() {}

  /**
   * The course, or the first instant at which it has no value.
   *
   * @param formula what is worked out for every instant
   * @param courses what has a value for every instant
   * @param frame the numbers that it reads, by slot
   * @param things the motions and courses among what it reads, by slot
   */
  public static Outcome evaluate(
      Operation formula, List<CourseInput> courses, double[] frame, Object... things) {
    var site = new Site(formula.span(), "");
    Procedure[] procedures = new CodeWriter().write(formula);
    var meter = new Meter(site, ScalarEvaluator.MOST_OPERATIONS);
    try {
      Course tried = course(procedures, courses, frame, things, meter);
      MotionRun run = tried.run();
      double[] value = new double[tried.width()];
      run.visit((time, state) -> tried.sample(time, state, value, 0));
      // One course serves many threads and any number of later questions.
      var course =
          new Course(
              run,
              tried.width(),
              (time, state, into, slot) ->
                  course(
                          procedures,
                          courses,
                          frame,
                          things,
                          new Meter(site, ScalarEvaluator.MOST_OPERATIONS))
                      .sample(time, state, into, slot));
      return new Outcome.Done(new Value.Thing(ThingSort.COURSE, course), meter.breaches());
    } catch (NoValue none) {
      return new Outcome.Failed(none.failure());
    }
  }

  private static Course course(
      Procedure[] procedures,
      List<CourseInput> courses,
      double[] frame,
      Object[] things,
      Meter meter) {
    Activation activation = Activation.of(procedures, frame.clone(), things, meter);
    return SampledCode.sampled(procedures[0], activation, courses);
  }
}
