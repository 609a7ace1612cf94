package whorl.check;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import whorl.diagnostic.Diagnostic;
import whorl.diagnostic.Span;
import whorl.laws.ThingSort;
import whorl.syntax.Expr;
import whorl.syntax.MotionLine;
import whorl.syntax.Printer;
import whorl.syntax.Statement;
import whorl.units.Unit;
import whorl.units.UnitCatalogue;
import whorl.units.UnitReader;

/** The messages about motions and their courses. */
final class MotionMessages {
  /** The unit of time in messages. */
  static final Unit SECOND = UnitCatalogue.standard().resolve(UnitReader.read("s"));

  private MotionMessages() {}

  private static CheckFailure failure(
      String code, String problem, Span span, String reason, String fix) {
    return new CheckFailure(Diagnostic.of(code, problem, span, reason, fix));
  }

  private static String text(Expr expr) {
    return Printer.expression(expr);
  }

  // Courses.

  static CheckFailure noColumn(Expr.Part part, Meaning.Motion motion) {
    return failure(
        "no-course",
        motion.name() + " has no course ." + part.name().name() + ".",
        part.name().span(),
        "",
        courses(motion));
  }

  static CheckFailure motionForNumber(Expr.Name name, Meaning.Motion motion) {
    return failure(
        "motion-for-number",
        "`" + name.name() + "` is a motion, not a quantity.",
        name.span(),
        "",
        courses(motion));
  }

  private static String courses(Meaning.Motion motion) {
    var names = new ArrayList<>(motion.columns().keySet());
    names.add(Courses.DURATION);
    return "It has "
        + names.stream()
            .limit(8)
            .map(column -> motion.name() + "." + column)
            .collect(Collectors.joining(", "))
        + ".";
  }

  static CheckFailure twoMotions(Span span, String one, String other) {
    return failure(
        "two-motions",
        "Courses of two motions, " + one + " and " + other + ", meet in one formula.",
        span,
        "They run over different times, so a value of the one belongs to no value of the other.",
        "Take one value of each, such as last(…), peak(…) or at(…, 3 s).");
  }

  static CheckFailure courseNeeded(Expr.Call call, CourseFunction function, Expr course) {
    return failure(
        "course-needed",
        function.word() + " takes a course of a motion, but `" + text(course) + "` has one value.",
        course.span(),
        "A course has a value for every instant, as run_up.ω has for a motion run_up.",
        "");
  }

  static CheckFailure courseOfNumbers(
      Expr.Call call, CourseFunction function, Expr course, Type found) {
    boolean vector = found instanceof Type.Vector;
    return failure(
        "course-of-numbers",
        function.word()
            + " takes a course of numbers, but `"
            + text(course)
            + "` is one of "
            + (vector ? "vectors." : "conditions or things."),
        course.span(),
        "",
        vector ? "Take its magnitude |" + text(course) + "|, or a part such as .z." : "");
  }

  static CheckFailure namedArgument(Expr.Argument argument, CourseFunction function) {
    return failure(
        "named-argument",
        function.word() + " takes its arguments in order, without names.",
        argument.value().span(),
        "",
        "Write " + call(function) + ".");
  }

  static CheckFailure argumentCount(Expr.Call call, CourseFunction function) {
    return failure(
        "argument-count",
        function.word()
            + " takes "
            + (function.parameters().size() == 1 ? "one argument" : "two arguments")
            + ", but "
            + call.arguments().size()
            + (call.arguments().size() == 1 ? " is" : " are")
            + " given.",
        call.span(),
        "",
        "Write " + call(function) + ".");
  }

  private static String call(CourseFunction function) {
    return function.word() + "(" + String.join(", ", function.parameters()) + ")";
  }

  static CheckFailure timeNeeded(String where, Expr expr, Typed found) {
    return failure(
        "time-needed",
        "A time is needed "
            + (where.equals("at") ? "behind the course" : "behind " + where)
            + ", but `"
            + text(expr)
            + "` is "
            + found.operand().readings().withArticle()
            + ".",
        expr.span(),
        "",
        "Write it with its unit, such as 3 s.");
  }

  static CheckFailure courseInFunction(Expr.Name function, Expr body, String over) {
    return failure(
        "course-in-function",
        function.name() + " would have a value for every instant of " + over + ".",
        body.span(),
        "A function has one value for its arguments.",
        "Hand the value over as an argument, or take one value of the course, such as last(…).");
  }

  static CheckFailure courseInCondition(Expr condition, String over) {
    return failure(
        "course-in-condition",
        "A condition is judged once, but this one has an answer for every instant of " + over + ".",
        condition.span(),
        "",
        "Say which value is meant: peak(…), least(…), last(…), at(…, 3 s).");
  }

  static CheckFailure courseInSketch(Expr thing, String over) {
    return failure(
        "course-in-sketch",
        "A sketch shows one instant, but this has a value for every instant of " + over + ".",
        thing.span(),
        "",
        "Say which one is meant: first(…), last(…), at(…, 3 s).");
  }

  static CheckFailure courseInMotion(Expr.Name motion, String over) {
    return failure(
        "course-in-motion",
        motion.name() + " reads a course of " + over + ", which runs over a time of its own.",
        motion.span(),
        "",
        "Take one value of it, such as last(…) or at(…, 3 s).");
  }

  // The block of a motion.

  static CheckFailure twice(Span span, String name, String what) {
    return failure("twice-in-motion", name + " has two " + what + " in this motion.", span, "", "");
  }

  static CheckFailure noStart(MotionLine.Equation equation, String state) {
    return failure(
        "no-start",
        state + " has a rate, but nothing says where it starts.",
        equation.span(),
        "",
        "Add a line such as: " + state + " [unit] starts 0");
  }

  static CheckFailure noRate(MotionLine.Start start) {
    String state = start.state().name();
    return failure(
        "no-rate",
        state + " starts, but nothing says at what rate it changes.",
        start.span(),
        "",
        "Add its equation: " + state + "' = …");
  }

  static CheckFailure noLimit(Statement.Motion motion) {
    return failure(
        "no-limit",
        "Nothing says how long " + motion.name().name() + " is to be followed at most.",
        motion.name().span(),
        "A motion whose condition to stop is never met would go on for ever.",
        "Add a line such as: within 10 min");
  }

  static CheckFailure notPositiveLimit(Expr limit) {
    return failure("no-limit", "The time limit has to be above zero.", limit.span(), "", "");
  }

  static CheckFailure empty(Statement.Motion motion) {
    return failure(
        "empty-motion",
        motion.name().name() + " has nothing that moves.",
        motion.name().span(),
        "",
        "A state starts somewhere and has a rate: ω [rpm] starts 0, and ω' = T / I.");
  }

  static CheckFailure stateInStart(Expr.Name name) {
    return failure(
        "state-in-start",
        "A start is worked out from the sheet, but `"
            + name.name()
            + "` is known in the motion only.",
        name.span(),
        "It hides what the sheet calls by that name.",
        "Give one of the two another name.");
  }

  static CheckFailure notAState(Expr expr) {
    return failure(
        "not-a-state",
        "`" + text(expr) + "` is no state of this motion, so it has no rate here.",
        expr.span(),
        "A state is a name with a start: ω [rpm] starts 0.",
        "");
  }

  static CheckFailure rateOf(Expr.Rate rate, Typed found) {
    return failure(
        "rate-of",
        "Only a number or a vector has a rate; `" + text(rate.of()) + "` is neither.",
        rate.span(),
        "",
        "");
  }

  static CheckFailure rateOnRight(Expr.Rate rate) {
    return failure(
        "rate-on-right",
        "A rate stands on the left side of its equation only.",
        rate.span(),
        "",
        "Put in what it is equal to, or give that a name of its own in the motion.");
  }

  static CheckFailure noStateInProduct(MotionLine.Equation equation) {
    return failure(
        "no-state-in-product",
        "This product has no single state whose equation it could be.",
        equation.rate().span(),
        "One factor must be a state that has no other equation; the others are its inertia.",
        "Write it as (I*ω)' = T.");
  }

  static CheckFailure inertiaOfOwnState(MotionLine.Equation equation, String state) {
    return failure(
        "inertia-of-own-state",
        "What " + state + " is multiplied by depends on " + state + " itself.",
        equation.rate().span(),
        "The state cannot be found from the product then.",
        "Make the product a state of its own, with its start and its rate.");
  }

  static CheckFailure whichMatter(MotionLine.Equation equation, String state, Expr inertia) {
    String of = text(inertia);
    boolean isOutside =
        inertia.span().start() < equation.span().start()
            || inertia.span().end() > equation.span().end();
    return new CheckFailure(
        new Diagnostic(
            "which-matter",
            "The inertia `"
                + of
                + "` changes with the motion, and an equation for "
                + state
                + "' alone does not say what becomes of the matter.",
            inertia.span(),
            "changes with a state",
            isOutside
                ? List.of(new Diagnostic.Label(equation.span(), "goes into this"))
                : List.of(),
            "The moment is the rate of the angular momentum of the same matter.",
            "If nothing leaves, as when arms are drawn in: ("
                + of
                + "*"
                + state
                + ")' = T. If matter leaves or comes with the speed it has, as from a spool: "
                + of
                + " * "
                + state
                + "' = T."));
  }

  static CheckFailure circle(Expr.Name name) {
    return failure(
        "circle-in-motion",
        name.name() + " depends on itself.",
        name.span(),
        "At an instant of a motion everything follows from the states.",
        "Make one of the names a state, with a start and a rate.");
  }

  static CheckFailure mixed(MotionLine.Equation equation, boolean leftIsVector) {
    return failure(
        "mixed-characters",
        leftIsVector
            ? "The left side is a vector, the right side is none."
            : "The left side is a number, the right side is none.",
        equation.span(),
        "",
        "");
  }

  static CheckFailure stateOfNumbers(MotionLine.Start start) {
    return failure(
        "state-of-numbers",
        start.state().name() + " starts as something that is no number and no vector.",
        start.value().span(),
        "",
        "");
  }

  // Rigid bodies.

  static CheckFailure notABody(Expr.Name name) {
    return failure(
        "not-a-body",
        "`" + name.name() + "` is no body.",
        name.span(),
        "A motion follows a body by its mass, its centre of mass and its inertia.",
        "Make one, such as "
            + name.name()
            + " = solid_cylinder(diameter = …, length = …, mass = …)");
  }

  static CheckFailure notAPoint(Expr about, Typed found) {
    boolean isAxis =
        found.operation() instanceof Operation.Thing thing && thing.sort() == ThingSort.AXIS;
    return failure(
        "not-a-point",
        isAxis
            ? "A body is followed about a point, but `" + text(about) + "` is an axis."
            : "A body is followed about a point, but `" + text(about) + "` is none.",
        about.span(),
        "",
        isAxis
            ? "About a fixed axis the motion has one angle: make it a state, with I * ω' = T and"
                + " I = inertia(…, about = "
                + text(about)
                + ")."
            : "Give the pivot, or the centre of mass of the body where it is free: wheel.centre.");
  }

  static CheckFailure noBody(MotionLine.Attitude attitude) {
    String body = attitude.body().name();
    return failure(
        "no-body",
        body + " starts with a spin or a turn, but this motion does not follow it as a body.",
        attitude.span(),
        "",
        "Add a line such as: body " + body + " about " + body + ".centre");
  }

  static CheckFailure loadOnNothing(MotionLine.Load load) {
    return failure(
        "load-on-nothing",
        "A load acts on a body, but this motion follows none.",
        load.span(),
        "",
        "Add a line such as: body wheel about A");
  }

  static CheckFailure angleNeeded(Expr expr, Typed found) {
    return failure(
        "angle-needed",
        "A body is turned by an angle, but `"
            + text(expr)
            + "` is "
            + found.operand().readings().withArticle()
            + ".",
        expr.span(),
        "",
        "Write it with its unit, such as 60 deg.");
  }

  static CheckFailure axisNeeded(Expr expr) {
    return failure(
        "axis-needed",
        "A body is turned about an axis or a direction, but `" + text(expr) + "` is neither.",
        expr.span(),
        "",
        "Write a direction, such as (1, 0, 0).");
  }

  static CheckFailure spinNeeded(Expr expr, Typed found) {
    boolean isNumber = found.type() instanceof Type.Real;
    return failure(
        "spin-needed",
        "A body starts with the vector of its angular velocity, but `"
            + text(expr)
            + "` is "
            + (isNumber ? "a number." : "none."),
        expr.span(),
        "",
        isNumber
            ? "Give its direction too, such as (0, 0, " + text(expr) + ") @ wheel."
            : "Write it with its unit, such as (0, 0, 120) rad/s @ wheel.");
  }

  static CheckFailure forceWithoutPoint(Expr value) {
    return failure(
        "force-without-point",
        "Nothing says where the force `" + text(value) + "` acts.",
        value.span(),
        "Its moment depends on that.",
        "Write force(" + text(value) + ", at = …).");
  }

  static CheckFailure notALoad(Expr value) {
    return failure(
        "not-a-load",
        "A load is a force with the point where it acts, or a moment; `"
            + text(value)
            + "` is neither.",
        value.span(),
        "",
        "Such as weight(wheel), force(F, at = A), or the vector of a moment in N·m.");
  }

  static CheckFailure reservedColumn(Expr.Name name) {
    return failure(
        "reserved-course",
        "`duration` tells how long a motion lasted, so no state can have that name.",
        name.span(),
        "",
        "Choose another name.");
  }
}
