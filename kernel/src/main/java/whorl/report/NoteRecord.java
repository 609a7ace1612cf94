package whorl.report;

import com.google.gson.GsonBuilder;
import com.google.gson.JsonArray;
import com.google.gson.JsonElement;
import com.google.gson.JsonObject;
import com.google.gson.JsonPrimitive;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import whorl.diagnostic.Diagnostic;
import whorl.diagnostic.Source;
import whorl.eval.Course;
import whorl.eval.Value;
import whorl.laws.ThingSort;
import whorl.mechanics.motion.Ending;
import whorl.report.sketch.Sketch;
import whorl.sheet.Comparison;
import whorl.sheet.Depicted;
import whorl.sheet.Followed;
import whorl.sheet.Lapse;
import whorl.sheet.Quantity;
import whorl.sheet.Setting;
import whorl.sheet.Step;
import whorl.sheet.Verdict;
import whorl.syntax.Printer;
import whorl.syntax.Statement;
import whorl.units.Unit;

/**
 * The results of a note for tools, as {@value #MEDIA_TYPE}: definitions by name, functions
 * published from Java and sketches if there are any, checks, assumptions and errors, in the order
 * of the note, at full double precision.
 */
public final class NoteRecord implements Step.Cases<NoteRecord> {
  /** Media type of the record. */
  public static final String MEDIA_TYPE = "application/x-whorl-steps+json";

  private final JsonObject definitions = new JsonObject();
  private final JsonObject published = new JsonObject();
  private final JsonObject motions = new JsonObject();
  private final JsonArray checks = new JsonArray();
  private final JsonArray assumptions = new JsonArray();
  private final JsonArray sketches = new JsonArray();
  private final JsonArray errors = new JsonArray();

  private NoteRecord() {}

  /**
   * An error and where it is.
   *
   * @param cell position of its cell among all cells of the note, from 1
   * @param source the text of the cell
   */
  public record Fault(int cell, Source source, Diagnostic diagnostic) {}

  /** The record of some steps and errors. */
  public static JsonObject of(List<Step> steps, List<Fault> faults) {
    var record = new NoteRecord();
    for (Step step : steps) {
      step.match(record);
      step.standing().lapses().forEach(record::lapse);
    }
    faults.forEach(record::fault);
    var object = new JsonObject();
    object.add("definitions", record.definitions);
    if (!record.published.isEmpty()) {
      object.add("published", record.published);
    }
    if (!record.motions.isEmpty()) {
      object.add("motions", record.motions);
    }
    object.add("checks", record.checks);
    object.add("assumptions", record.assumptions);
    if (!record.sketches.isEmpty()) {
      object.add("sketches", record.sketches);
    }
    object.add("errors", record.errors);
    return object;
  }

  /** A record as a file holds it: indented, with a line end behind it. */
  public static String text(JsonObject record) {
    return new GsonBuilder().disableHtmlEscaping().setPrettyPrinting().create().toJson(record)
        + "\n";
  }

  @Override
  public NoteRecord defined(Step.Defined defined) {
    Quantity gives = defined.gives();
    var definition = new JsonObject();
    definition.addProperty("kind", gives.kind());
    definition.addProperty("unit", unit(gives));
    definition.add("value", value(gives));
    definition.add("si", inUnit(gives.value(), gives.unit().coherent()));
    reference(gives.setting()).ifPresent(found -> definition.add("reference", found));
    definition.addProperty("formula", Printer.expression(defined.statement().value()));
    definitions.add(defined.statement().name().name(), definition);
    return this;
  }

  /** The unit of the numbers; those of a thing in space are in coherent units. */
  private static String unit(Quantity quantity) {
    return quantity.value() instanceof Value.Thing thing && thing.sort() != ThingSort.COURSE
        ? ThingRecord.unit(thing.sort())
        : quantity.unit().symbol();
  }

  /** What a quantity is taken about and where it is seen from, if that is to be said. */
  private static Optional<JsonObject> reference(Setting setting) {
    if (setting.equals(Setting.NONE)) {
      return Optional.empty();
    }
    var reference = new JsonObject();
    if (!setting.about().isEmpty()) {
      reference.addProperty("about", setting.about());
    }
    if (!setting.frame().isEmpty()) {
      reference.addProperty("frame", setting.frame());
    }
    return Optional.of(reference);
  }

  private static JsonElement value(Quantity quantity) {
    // An input keeps its digits; the way to SI units and back might change the last one.
    return quantity.written() == null
        ? inUnit(quantity.value(), quantity.unit())
        : new JsonPrimitive(Double.valueOf(quantity.written()));
  }

  private static JsonElement inUnit(Value value, Unit unit) {
    if (value instanceof Value.Truth truth) {
      return new JsonPrimitive(truth.holds());
    }
    if (value instanceof Value.Vector vector) {
      var parts = new JsonArray();
      parts.add(unit.fromSi(vector.x()));
      parts.add(unit.fromSi(vector.y()));
      parts.add(unit.fromSi(vector.z()));
      return parts;
    }
    if (value instanceof Value.Thing thing && thing.content() instanceof Course course) {
      return course(course, unit);
    }
    if (value instanceof Value.Thing thing) {
      return ThingRecord.of(thing);
    }
    return new JsonPrimitive(unit.fromSi(((Value.Real) value).value()));
  }

  @Override
  public NoteRecord followed(Step.Ran ran) {
    Followed followed = ran.followed();
    var motion = new JsonObject();
    motion.addProperty("duration", ((Value.Real) followed.duration().value()).value());
    motion.addProperty("stopped", followed.ending() == Ending.STOPPED);
    motion.addProperty("steps", followed.steps());
    var courses = new JsonObject();
    for (Followed.Column column : followed.columns()) {
      var course = new JsonObject();
      course.addProperty("kind", column.kind());
      course.addProperty("unit", column.unit().symbol());
      course.add("value", course(column.course(), column.unit()));
      course.add("si", course(column.course(), column.unit().coherent()));
      courses.add(column.name(), course);
    }
    motion.add("courses", courses);
    var kept = new JsonObject();
    followed.kept().forEach(one -> kept.addProperty(one.name(), one.relative()));
    motion.add("kept", kept);
    motions.add(ran.statement().name().name(), motion);
    return this;
  }

  /** Where a course starts and ends, and for numbers between what it lies. */
  private static JsonObject course(Course course, Unit unit) {
    var object = new JsonObject();
    object.add("first", value(course.at(0), unit));
    object.add("last", value(course.at(course.run().duration()), unit));
    if (course.width() == 1) {
      object.addProperty("least", unit.fromSi(course.least().value()));
      object.addProperty("peak", unit.fromSi(course.peak().value()));
    }
    return object;
  }

  private static JsonElement value(double[] si, Unit unit) {
    if (si.length == 1) {
      return new JsonPrimitive(unit.fromSi(si[0]));
    }
    var parts = new JsonArray();
    for (double part : si) {
      parts.add(unit.fromSi(part));
    }
    return parts;
  }

  @Override
  public NoteRecord checked(Step.Checked checked) {
    checks.add(judged(Printer.expression(checked.statement().condition()), checked.verdict()));
    return this;
  }

  @Override
  public NoteRecord assumed(Step.Assumed assumed) {
    assumptions.add(judged(Printer.expression(assumed.statement().condition()), assumed.verdict()));
    return this;
  }

  /** A law outside its validity is an assumption that fails. */
  private void lapse(Lapse lapse) {
    var assumption = new JsonObject();
    assumption.addProperty("text", lapse.text());
    assumption.addProperty("holds", false);
    assumption.addProperty("law", lapse.law());
    assumptions.add(assumption);
  }

  private static JsonObject judged(String text, Verdict verdict) {
    var check = new JsonObject();
    check.addProperty("text", text);
    check.addProperty("holds", verdict.holds());
    OptionalDouble share =
        verdict.comparisons().stream()
            .map(Comparison::share)
            .flatMapToDouble(OptionalDouble::stream)
            .max();
    if (share.isPresent()) {
      check.addProperty("share", share.getAsDouble());
    }
    return check;
  }

  @Override
  public NoteRecord reproduced(Step.Reproduced reproduced) {
    var check = new JsonObject();
    var statement = reproduced.statement();
    check.addProperty(
        "text",
        Printer.expression(statement.value())
            + " = "
            + Printer.expression(statement.stated())
            + " within "
            + Printer.expression(statement.within()));
    check.addProperty("holds", reproduced.holds());
    check.add("stated", value(reproduced.stated()));
    check.addProperty("deviation", reproduced.deviation());
    checks.add(check);
    return this;
  }

  @Override
  public NoteRecord function(Step.Function function) {
    return this;
  }

  @Override
  public NoteRecord published(Step.Published step) {
    Statement.Published statement = step.statement();
    var function = new JsonObject();
    function.addProperty("kind", step.resultKind());
    function.addProperty("unit", statement.bracket().unit().typeset());
    function.addProperty("head", Printer.unremarked(statement));
    published.add(statement.name().name(), function);
    return this;
  }

  @Override
  public NoteRecord shown(Step.Shown shown) {
    return this;
  }

  @Override
  public NoteRecord sketched(Step.Sketched sketched) {
    var sketch = new JsonObject();
    var things = new JsonArray();
    for (Depicted thing : sketched.things()) {
      var object = new JsonObject();
      object.addProperty("name", thing.name());
      object.addProperty("kind", thing.quantity().kind());
      object.add("si", inUnit(thing.quantity().value(), thing.quantity().unit().coherent()));
      things.add(object);
    }
    sketch.addProperty("text", Printer.unremarked(sketched.statement()));
    sketch.add("things", things);
    sketch.addProperty("svg", Sketch.svg(Depictions.of(sketched.things())));
    sketches.add(sketch);
    return this;
  }

  @Override
  public NoteRecord waiting(Step.Waiting waiting) {
    return this;
  }

  @Override
  public NoteRecord broken(Step.Broken broken) {
    return this;
  }

  private void fault(Fault fault) {
    Source source = fault.source();
    Diagnostic diagnostic = fault.diagnostic();
    int start = Math.min(diagnostic.span().start(), source.length());
    var error = new JsonObject();
    error.addProperty("cell", fault.cell());
    error.addProperty("line", source.line(start));
    error.addProperty("column", source.column(start));
    error.addProperty("length", diagnostic.span().length());
    error.addProperty("message", diagnostic.problem());
    errors.add(error);
  }
}
