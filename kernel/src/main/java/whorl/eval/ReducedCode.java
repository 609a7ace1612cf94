package whorl.eval;

import java.util.OptionalDouble;
import org.jspecify.annotations.Nullable;
import whorl.check.Operation.Reducer;
import whorl.mechanics.Given;
import whorl.mechanics.motion.MotionRun;
import whorl.mechanics.motion.StateFunction;
import whorl.units.Unit;

/**
 * What a course comes to.
 *
 * @param argument a time or a value; null where none is needed
 * @param unit in which a message shows values of the course
 */
record ReducedCode(
    Site site, Reducer reducer, SampledCode course, Code.@Nullable Real argument, Unit unit) {

  /** A course of numbers. */
  double real(Activation caller) {
    Course sampled = course.in(caller);
    MotionRun run = sampled.run();
    double[] value = new double[1];
    StateFunction function =
        (time, state) -> {
          sampled.sample(time, state, value, 0);
          return value[0];
        };
    return switch (reducer) {
      case FIRST -> run.first(function);
      case LAST -> run.last(function);
      case PEAK -> run.peak(function).value();
      case LEAST -> run.least(function).value();
      case MEAN -> run.mean(function);
      case RMS -> run.rms(function);
      case AT -> run.value(function, time(caller, run));
      case WHEN -> when(caller, run, function);
    };
  }

  /** A course of vectors. */
  Value.Vector vector(Activation caller) {
    Course sampled = course.in(caller);
    MotionRun run = sampled.run();
    double time =
        switch (reducer) {
          case FIRST -> 0;
          case AT -> time(caller, run);
          default -> run.duration();
        };
    double[] value = new double[3];
    sampled.sample(time, run.state(time), value, 0);
    return new Value.Vector(value[0], value[1], value[2]);
  }

  private double argument(Activation caller) {
    if (argument == null) {
      throw new IllegalStateException(reducer + " needs an argument");
    }
    return argument.in(caller);
  }

  private double time(Activation caller, MotionRun run) {
    double time = argument(caller);
    if (time >= 0 && time <= run.duration()) {
      return time;
    }
    throw refused(
        "at",
        "The motion lasts from 0 s to "
            + Given.text(run.duration(), "s")
            + ", so it has no value at "
            + Given.text(time, "s")
            + ".",
        "");
  }

  private double when(Activation caller, MotionRun run, StateFunction function) {
    double value = argument(caller);
    OptionalDouble time = run.firstTime(function, value);
    if (time.isPresent()) {
      return time.getAsDouble();
    }
    throw refused(
        "when",
        "The value "
            + shown(value)
            + " is never reached; during the motion it lies between "
            + shown(run.least(function).value())
            + " and "
            + shown(run.peak(function).value())
            + ".",
        "");
  }

  private String shown(double si) {
    return Given.text(unit.fromSi(si), unit.symbol().equals("1") ? "" : unit.symbol());
  }

  private NoValue refused(String function, String reason, String fix) {
    return site.noValue(new NumericFailure.Refused(function, reason, fix));
  }
}
