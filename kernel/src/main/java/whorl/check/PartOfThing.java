package whorl.check;

import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.function.Function;
import java.util.function.ToDoubleFunction;
import java.util.stream.Collectors;
import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;
import whorl.laws.Given;
import whorl.laws.Rule;
import whorl.laws.Sort;
import whorl.laws.ThingSort;
import whorl.laws.Validity;
import whorl.laws.Work;
import whorl.mechanics.Refusal;
import whorl.mechanics.body.Body;
import whorl.mechanics.reference.Axis;
import whorl.mechanics.reference.BoundForce;
import whorl.mechanics.reference.Frame;
import whorl.mechanics.reference.InertiaTensor;
import whorl.mechanics.reference.Point;

/**
 * A part that is read from a thing in space with a dot.
 *
 * @param of what it is read from
 * @param name behind the dot
 * @param gives what it is
 * @param meaning in a few words
 * @param work reads it; its one parameter is the thing
 */
public record PartOfThing(ThingSort of, String name, Sort gives, String meaning, Work work)
    implements Rule {
  private static final Map<ThingSort, Map<String, PartOfThing>> ALL =
      Arrays.stream(ThingSort.values())
          .collect(Collectors.toMap(Function.identity(), PartOfThing::partsOf));

  /** The parts of things of a sort, by name. */
  static Map<String, PartOfThing> named(ThingSort of) {
    return ALL.getOrDefault(of, Map.of());
  }

  /** The parts of things of a sort, in the order in which they are named to people. */
  public static List<PartOfThing> of(ThingSort of) {
    return List.copyOf(named(of).values());
  }

  @Override
  public List<String> parameterWords() {
    return List.of(of.words());
  }

  @Override
  public List<Validity> validity() {
    return List.of();
  }

  private static Map<String, PartOfThing> partsOf(ThingSort sort) {
    List<PartOfThing> parts =
        switch (sort) {
          case POINT -> ofPoint();
          case AXIS -> ofAxis();
          case FRAME -> ofFrame();
          case BODY -> ofBody();
          case FORCE -> ofForce();
          case INERTIA -> ofTensor();
          // Which parts a motion has, its own block says.
          case MOTION, COURSE -> List.of();
        };
    var named = new LinkedHashMap<String, PartOfThing>();
    parts.forEach(part -> named.put(part.name(), part));
    return named;
  }

  private static PartOfThing number(
      ThingSort of, String name, String kind, String meaning, Work.Real work) {
    return new PartOfThing(of, name, Sort.number(kind), meaning, work);
  }

  private static PartOfThing vector(
      ThingSort of, String name, String kind, String meaning, Work.Vector work) {
    return new PartOfThing(of, name, Sort.vector(kind), meaning, work);
  }

  private static PartOfThing thing(
      ThingSort of, String name, ThingSort gives, String meaning, Work.Thing work) {
    return new PartOfThing(of, name, new Sort.Thing(gives), meaning, work);
  }

  private static List<PartOfThing> ofPoint() {
    ThingSort of = ThingSort.POINT;
    Function<Given, Point> point = g -> g.thing(0, Point.class);
    return List.of(
        number(
            of, "x", "length", "world coordinate along x", g -> point.apply(g).position().getX()),
        number(
            of, "y", "length", "world coordinate along y", g -> point.apply(g).position().getY()),
        number(
            of, "z", "length", "world coordinate along z", g -> point.apply(g).position().getZ()),
        vector(
            of,
            "position",
            "length",
            "from the origin of the world",
            g -> point.apply(g).position()),
        vector(
            of, "velocity", "velocity", "as seen from the world", g -> point.apply(g).velocity()));
  }

  private static List<PartOfThing> ofAxis() {
    ThingSort of = ThingSort.AXIS;
    return List.of(
        vector(of, "along", "number", "unit vector along it", g -> g.thing(0, Axis.class).along()),
        thing(
            of,
            "through",
            ThingSort.POINT,
            "a point on it",
            g -> g.thing(0, Axis.class).through()));
  }

  private static List<PartOfThing> ofFrame() {
    ThingSort of = ThingSort.FRAME;
    Function<Given, Frame> frame = g -> g.thing(0, Frame.class);
    return List.of(
        thing(of, "origin", ThingSort.POINT, "its origin", g -> frame.apply(g).origin()),
        vector(
            of,
            "x",
            "number",
            "unit vector along its x axis",
            g -> frame.apply(g).toWorld(Vector3D.PLUS_I)),
        vector(
            of,
            "y",
            "number",
            "unit vector along its y axis",
            g -> frame.apply(g).toWorld(Vector3D.PLUS_J)),
        vector(
            of,
            "z",
            "number",
            "unit vector along its z axis",
            g -> frame.apply(g).toWorld(Vector3D.PLUS_K)),
        vector(
            of,
            "turning",
            "angular_velocity",
            "its angular velocity, seen from the world",
            g -> frame.apply(g).angularVelocity()));
  }

  private static List<PartOfThing> ofBody() {
    ThingSort of = ThingSort.BODY;
    Function<Given, Body> body = g -> g.thing(0, Body.class);
    return List.of(
        number(of, "mass", "mass", "its mass", g -> body.apply(g).mass()),
        number(of, "volume", "volume", "its volume", g -> volume(body.apply(g))),
        thing(of, "centre", ThingSort.POINT, "its centre of mass", g -> body.apply(g).centre()),
        thing(
            of,
            "datum",
            ThingSort.POINT,
            "origin of the coordinates that its shape is given in",
            g -> body.apply(g).datum()),
        thing(
            of,
            "inertia",
            ThingSort.INERTIA,
            "its inertia tensor about its centre of mass",
            g -> body.apply(g).massProperties().atCentre()),
        thing(of, "frame", ThingSort.FRAME, "its own frame", g -> body.apply(g).frame()));
  }

  private static double volume(Body body) {
    OptionalDouble volume = body.volume();
    return volume.orElseThrow(
        () ->
            new Refusal(
                ThingSort.BODY.words(),
                "The body has no volume: it is thin, or given by its mass and inertia.",
                "Take a shape that has a thickness."));
  }

  private static List<PartOfThing> ofForce() {
    ThingSort of = ThingSort.FORCE;
    return List.of(
        vector(of, "force", "force", "the force", g -> g.thing(0, BoundForce.class).force()),
        thing(of, "at", ThingSort.POINT, "where it acts", g -> g.thing(0, BoundForce.class).at()));
  }

  private static List<PartOfThing> ofTensor() {
    return List.of(
        element("xx", "∫ (y² + z²) dm", InertiaTensor::xx),
        element("yy", "∫ (z² + x²) dm", InertiaTensor::yy),
        element("zz", "∫ (x² + y²) dm", InertiaTensor::zz),
        element("xy", "−∫ x y dm", InertiaTensor::xy),
        element("yz", "−∫ y z dm", InertiaTensor::yz),
        element("zx", "−∫ z x dm", InertiaTensor::zx),
        element("least", "its least principal moment", t -> t.principalMoments()[0]),
        element("middle", "its middle principal moment", t -> t.principalMoments()[1]),
        element("greatest", "its greatest principal moment", t -> t.principalMoments()[2]),
        principalAxis("least_axis", "the axis of its least principal moment", 0),
        principalAxis("middle_axis", "the axis of its middle principal moment", 1),
        principalAxis("greatest_axis", "the axis of its greatest principal moment", 2));
  }

  private static PartOfThing element(
      String name, String meaning, ToDoubleFunction<InertiaTensor> element) {
    return number(
        ThingSort.INERTIA,
        name,
        "rotational_inertia",
        meaning,
        g -> element.applyAsDouble(g.thing(0, InertiaTensor.class)));
  }

  private static PartOfThing principalAxis(String name, String meaning, int index) {
    return vector(
        ThingSort.INERTIA,
        name,
        "number",
        meaning,
        g -> g.thing(0, InertiaTensor.class).principalAxes().get(index));
  }
}
