package whorl.laws;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Predicate;
import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;
import whorl.mechanics.Refusal;
import whorl.mechanics.body.Body;
import whorl.mechanics.reference.Axis;
import whorl.mechanics.reference.BoundForce;
import whorl.mechanics.reference.Frame;
import whorl.mechanics.reference.InertiaTensor;
import whorl.mechanics.reference.Point;

/**
 * Writes a law down: its parameters in order, each handed back as what the formula reads it by, and
 * then what it gives.
 */
final class LawBuilder {
  private final Room room;
  private final String name;
  private final String title;
  private final List<Parameter> parameters = new ArrayList<>();
  private final List<Validity> validity = new ArrayList<>();
  private String about = "";
  private String of = "";
  private String formula = "";
  private String source = "";
  private Example example = new Example(List.of(), "", "", "", "");

  LawBuilder(Room room, String name, String title) {
    this.room = room;
    this.name = name;
    this.title = title;
  }

  /** Reads a number out of what a law is given. */
  @FunctionalInterface
  interface NumberOf {
    double in(Given given);
  }

  /** Reads anything else out of what a law is given. */
  @FunctionalInterface
  interface Of<T> {
    T in(Given given);
  }

  /** How many parameters there are so far, which is the number of the next. */
  int count() {
    return parameters.size();
  }

  private int add(String word, String symbol, Sort sort, String explanation, Need need) {
    parameters.add(new Parameter(word, symbol, sort, explanation, need));
    return parameters.size() - 1;
  }

  NumberOf number(String word, String symbol, String kind, String explanation) {
    return number(word, symbol, kind, explanation, new Need.Required());
  }

  NumberOf number(String word, String symbol, String kind, String explanation, Need need) {
    int index = add(word, symbol, Sort.number(kind), explanation, need);
    return given -> given.number(index);
  }

  /** A number that may be left out. */
  NumberOf number(
      String word, String symbol, String kind, String explanation, double value, String otherwise) {
    int index = add(word, symbol, Sort.number(kind), explanation, new Need.Optional(otherwise));
    return given -> given.has(index) ? given.number(index) : value;
  }

  /** A diameter that may be given by its radius. */
  NumberOf diameter(String word, String radius, String symbol, String explanation) {
    var need = new Need.OneOf(word);
    int whole = add(word, symbol, Sort.number("length"), explanation, need);
    int half = add(radius, symbol + "/2", Sort.number("length"), "half of the " + word, need);
    return given -> given.has(whole) ? given.number(whole) : 2 * given.number(half);
  }

  Of<Vector3D> vector(String word, String symbol, String kind, String explanation) {
    int index = add(word, symbol, Sort.vector(kind), explanation, new Need.Required());
    return given -> given.vector(index);
  }

  /** A vector that may be left out. */
  Of<Optional<Vector3D>> vector(
      String word, String symbol, String kind, String explanation, Need need) {
    int index = add(word, symbol, Sort.vector(kind), explanation, need);
    return given -> given.has(index) ? Optional.of(given.vector(index)) : Optional.empty();
  }

  /** A vector of which only the direction counts. */
  Of<Vector3D> direction(String word, String symbol, String explanation) {
    int index = add(word, symbol, new Sort.Vector(List.of()), explanation, new Need.Required());
    return given -> direction(word, given.vector(index));
  }

  private static Vector3D direction(String word, Vector3D vector) {
    if (vector.getNormInf() == 0) {
      throw new Refusal(
          word,
          "A direction is needed, but this vector has length zero and points nowhere.",
          "Give one that is not zero, such as (0, 0, 1).");
    }
    return vector;
  }

  /** A direction that may be left out. */
  Of<Optional<Vector3D>> direction(String word, String symbol, String explanation, Need need) {
    int index = add(word, symbol, new Sort.Vector(List.of()), explanation, need);
    return given ->
        given.has(index) ? Optional.of(direction(word, given.vector(index))) : Optional.empty();
  }

  private <T> Of<T> thing(
      String word, String symbol, ThingSort sort, Class<T> type, String explanation) {
    int index = add(word, symbol, new Sort.Thing(sort), explanation, new Need.Required());
    return given -> given.thing(index, type);
  }

  private <T> Of<Optional<T>> thing(
      String word, String symbol, ThingSort sort, Class<T> type, String explanation, Need need) {
    int index = add(word, symbol, new Sort.Thing(sort), explanation, need);
    return given -> given.has(index) ? Optional.of(given.thing(index, type)) : Optional.empty();
  }

  Of<Point> point(String word, String symbol, String explanation) {
    return thing(word, symbol, ThingSort.POINT, Point.class, explanation);
  }

  Of<Optional<Point>> point(String word, String symbol, String explanation, Need need) {
    return thing(word, symbol, ThingSort.POINT, Point.class, explanation, need);
  }

  Of<Axis> axis(String word, String symbol, String explanation) {
    return thing(word, symbol, ThingSort.AXIS, Axis.class, explanation);
  }

  Of<Optional<Axis>> axis(String word, String symbol, String explanation, Need need) {
    return thing(word, symbol, ThingSort.AXIS, Axis.class, explanation, need);
  }

  /** The frame that the rest is given in; the world where it is left out. */
  Of<Frame> frame(String explanation) {
    var frame =
        thing(
            "frame", "", ThingSort.FRAME, Frame.class, explanation, new Need.Optional("the world"));
    return given -> frame.in(given).orElse(Frame.WORLD);
  }

  Of<Body> body(String word, String symbol, String explanation) {
    return thing(word, symbol, ThingSort.BODY, Body.class, explanation);
  }

  Of<BoundForce> force(String word, String symbol, String explanation) {
    return thing(word, symbol, ThingSort.FORCE, BoundForce.class, explanation);
  }

  Of<InertiaTensor> tensor(String word, String symbol, String explanation) {
    return thing(word, symbol, ThingSort.INERTIA, InertiaTensor.class, explanation);
  }

  /** A file below the folder of the note. */
  Of<Path> file(String word, String explanation) {
    int index = add(word, "", new Sort.File(), explanation, new Need.Required());
    return given -> given.thing(index, Path.class);
  }

  /** As many bodies as are written. */
  Of<List<Body>> bodies(String word, String explanation) {
    Sort sort = new Sort.Several(new Sort.Thing(ThingSort.BODY));
    int index = add(word, "", sort, explanation, new Need.Required());
    return given -> given.list(index, Body.class);
  }

  /** As many vectors of length as are written. */
  Of<List<Vector3D>> corners(String word, String explanation) {
    Sort sort = new Sort.Several(Sort.vector("length"));
    int index = add(word, "", sort, explanation, new Need.Required());
    return given -> given.list(index, Vector3D.class);
  }

  /** Says where the law holds. */
  LawBuilder valid(String text, Predicate<Given> holds) {
    validity.add(new Validity(text, holds));
    return this;
  }

  /** The parameter that the result is taken about. */
  LawBuilder about(String parameter) {
    about = parameter;
    return this;
  }

  /** The parameter whose body or force the result is of. */
  LawBuilder of(String parameter) {
    of = parameter;
    return this;
  }

  LawBuilder formula(String text) {
    formula = text;
    return this;
  }

  LawBuilder source(String text) {
    source = text;
    return this;
  }

  /** The worked example; its lines stand before its expression. */
  LawBuilder example(
      String expression, String value, String within, String where, String... lines) {
    example = new Example(List.of(lines), expression, value, within, where);
    return this;
  }

  Law gives(String kind, Work.Real work) {
    return law(Sort.number(kind), work);
  }

  Law givesVector(String kind, Work.Vector work) {
    return law(Sort.vector(kind), work);
  }

  Law gives(ThingSort sort, Work.Thing work) {
    return law(new Sort.Thing(sort), work);
  }

  private Law law(Sort sort, Work work) {
    return new Law(
        name,
        title,
        room,
        parameters,
        new Law.Result(sort, about, of),
        formula,
        validity,
        source,
        example,
        work);
  }
}
