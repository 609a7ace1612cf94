package whorl.mechanics.body;

import java.util.List;
import java.util.OptionalDouble;
import java.util.function.Supplier;
import org.apache.commons.math3.geometry.euclidean.threed.Rotation;
import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;
import org.jspecify.annotations.Nullable;
import whorl.mechanics.Given;
import whorl.mechanics.Refusal;
import whorl.mechanics.reference.AngularMomentum;
import whorl.mechanics.reference.AxialInertia;
import whorl.mechanics.reference.Axis;
import whorl.mechanics.reference.Frame;
import whorl.mechanics.reference.InertiaTensor;
import whorl.mechanics.reference.Point;
import whorl.mechanics.reference.Turn;

/**
 * A rigid body at a place: its mass and inertia tensor in a frame of its own, whose origin is its
 * centre of mass, and where that frame is.
 */
public final class Body {
  private static final double ROUNDING = 1e-9;

  private final Shape shape;
  private final double mass;
  private final Frame frame;
  private final MassProperties inWorld;

  /** A body of a shape and mass at the origin of the world. */
  Body(Shape shape, double mass) {
    this(shape, mass, Frame.WORLD);
  }

  private Body(Shape shape, double mass, Frame frame) {
    this.shape = shape;
    this.mass = mass;
    this.frame = frame;
    inWorld =
        new MassProperties(
            mass, frame.origin().position(), shape.perMass().times(mass).turned(frame.attitude()));
  }

  /**
   * A measured or catalogue body. Its frame has its origin at the centre of mass and the axes of
   * the world.
   *
   * @param properties along the axes of the world
   */
  public static Body of(MassProperties properties) {
    double mass = properties.mass();
    Shape shape =
        new Shape(
            "rigid body",
            properties.atCentre().times(1 / mass),
            OptionalDouble.empty(),
            properties.centre().negate(),
            () -> Outline.NONE);
    return new Body(shape, mass, at(properties.centre()));
  }

  /**
   * Bodies joined rigidly. The frame of the whole has its origin at the common centre of mass, and
   * turns and stands as that of the first part.
   *
   * @param parts at least one; those with frames that move have to move as one
   * @throws Refusal where there is no part, or where the parts move differently
   */
  public static Body assembly(List<Body> parts) {
    if (parts.isEmpty()) {
      throw new Refusal("assembly", "The assembly has no parts.", "Name at least one body.");
    }
    Body first = parts.get(0);
    MassProperties sum = first.inWorld;
    double volume = first.volumeOrNaN();
    for (Body part : parts.subList(1, parts.size())) {
      first.demandMovesWith(part);
      sum = sum.plus(part.inWorld);
      volume += part.volumeOrNaN();
    }
    List<Body> all = List.copyOf(parts);
    return first.joined("assembly", sum, volume, () -> outline(all));
  }

  /**
   * What is left of this body when others are taken out of it, such as a bore or a keyway.
   *
   * @param removed bodies of the material that is taken out, each within this body and apart from
   *     the others; they may touch
   * @throws Refusal where a removed body moves differently or takes what is not there, or where
   *     nothing sound is left
   */
  public Body without(Body... removed) {
    MassProperties rest = inWorld;
    double volume = volumeOrNaN();
    Outline left = outline();
    for (Body part : removed) {
      demandMovesWith(part);
      rest = rest.minus(part.inWorld);
      volume -= part.volumeOrNaN();
      Outline out = part.outline();
      Enclosure.demandWithin(left, out);
      left = left.without(out);
    }
    Outline rough = left;
    return joined(shape.name(), rest, volume, () -> rough);
  }

  private double volumeOrNaN() {
    return shape.volume().orElse(Double.NaN);
  }

  /** The whole that replaces this body and goes with its frame; its outline is in the world. */
  private Body joined(String name, MassProperties whole, double volume, Supplier<Outline> outline) {
    double mass = whole.mass();
    Vector3D inFrame = frame.fromWorld(whole.centre().subtract(frame.origin().position()));
    Rotation back = frame.attitude().revert();
    Frame place = Frame.in(frame, inFrame, Rotation.IDENTITY);
    Shape joint =
        new Shape(
            name,
            whole.atCentre().times(1 / mass).turned(back),
            Double.isNaN(volume) ? OptionalDouble.empty() : OptionalDouble.of(volume),
            shape.datum().subtract(inFrame),
            () -> outline.get().mapped(v -> place.coordinates(Point.fixed(v)), false));
    return new Body(joint, mass, place);
  }

  private static Outline outline(List<Body> bodies) {
    return bodies.stream().map(Body::outline).reduce(Outline.NONE, Outline::plus);
  }

  private void demandMovesWith(Body part) {
    Vector3D arm = part.frame.origin().minus(frame.origin());
    Vector3D carried = frame.origin().velocity().add(frame.angularVelocity().crossProduct(arm));
    double speed = Math.max(carried.getNorm(), frame.angularVelocity().getNorm() * arm.getNorm());
    boolean turnAsOne =
        part.frame.angularVelocity().distance(frame.angularVelocity())
            <= ROUNDING * frame.angularVelocity().getNorm();
    boolean moveAsOne = part.frame.origin().velocity().distance(carried) <= ROUNDING * speed;
    if (!turnAsOne || !moveAsOne) {
      throw new Refusal(
          "assembly",
          "The parts are placed in frames that move differently, so they are not one rigid body.",
          "Place all parts in one frame.");
    }
  }

  /** Mass, centre of mass and inertia tensor along the axes of the world. */
  public MassProperties massProperties() {
    return inWorld;
  }

  /** The mass, in kg. */
  public double mass() {
    return mass;
  }

  /** The volume of material, in m³; none for what is thin or given by its inertia. */
  public OptionalDouble volume() {
    return shape.volume();
  }

  /** The body's own frame: origin at the centre of mass, axis of the shape along z. */
  public Frame frame() {
    return frame;
  }

  /** The centre of mass. */
  public Point centre() {
    return frame.origin();
  }

  /** The origin of the coordinates that the shape is described in; see {@link Shape#datum}. */
  public Point datum() {
    return frame.point(shape.datum());
  }

  /** What the body looks like, in the world. */
  public Outline outline() {
    return shape.drawn().get().mapped(v -> frame.point(v).position(), false);
  }

  /** The inertia tensor about the centre of mass along the axes of the body's own frame. */
  public InertiaTensor ownInertia() {
    return shape.perMass().times(mass);
  }

  /** This body with its own frame elsewhere. */
  public Body placed(Frame place) {
    return new Body(shape, mass, place);
  }

  /**
   * This body with its centre of mass at a point of a frame and its own z axis along a direction
   * there.
   *
   * @param in the frame
   * @param at the centre of mass, in the frame, in m
   * @param along the direction, in the frame
   */
  public Body placed(Frame in, Vector3D at, Vector3D along) {
    return placed(Frame.in(in, at, Turn.zTo(along)));
  }

  /**
   * This body turned about an axis by an angle in rad. It is then at rest there.
   *
   * @throws Refusal where the body's frame moves, since a turned place says nothing of the motion
   */
  public Body turned(Axis about, double angle) {
    demandRest("turned");
    Rotation turn = Turn.about(about.along(), angle);
    Vector3D pivot = about.through().position();
    Vector3D centre = turn.applyTo(centre().position().subtract(pivot)).add(pivot);
    return placed(Frame.in(Frame.WORLD, centre, Turn.after(frame.attitude(), turn)));
  }

  /**
   * This body mirrored in a plane. Its frame stays right-handed: y and z are mirrored with the
   * body, x against it.
   *
   * @param through a point of the plane
   * @param normal of the plane
   * @throws Refusal where the body's frame moves, or where the normal has length zero
   */
  public Body mirrored(Point through, Vector3D normal) {
    demandRest("mirrored");
    Vector3D n = Given.direction("normal", normal);
    double ahead = centre().minus(through).dotProduct(n);
    Vector3D centre = centre().position().subtract(2 * ahead, n);
    Vector3D y = frame.toWorld(Vector3D.PLUS_J);
    Vector3D z = frame.toWorld(Vector3D.PLUS_K);
    Vector3D mirroredY = y.subtract(2 * y.dotProduct(n), n);
    Vector3D mirroredZ = z.subtract(2 * z.dotProduct(n), n);
    Rotation attitude = Frame.axes(mirroredY.crossProduct(mirroredZ), mirroredY, mirroredZ);
    return new Body(shape.mirrored(), mass, Frame.in(Frame.WORLD, centre, attitude));
  }

  /**
   * This body with all lengths times a factor, of the same material: the mass grows with the cube,
   * moments of inertia with the fifth power of the factor. The centre of mass stays where it is.
   *
   * @throws Refusal where the factor is not positive, or where the body has no volume, so that
   *     nothing tells how its mass grows
   */
  public Body scaled(double factor) {
    Given.positive("factor", factor, "");
    if (shape.volume().isEmpty()) {
      throw new Refusal(
          "body",
          "The " + shape.name() + " has no volume, so nothing tells how its mass grows with size.",
          "Make the body again with the lengths and the mass that it is to have.");
    }
    return new Body(shape.scaled(factor), mass * factor * factor * factor, frame);
  }

  private void demandRest(String what) {
    if (!frame.isFixed()) {
      throw new Refusal(
          "body",
          "The body moves with its frame, so it cannot be " + what + " in the world.",
          "Do that first, and place the body in the moving frame afterwards.");
    }
  }

  /** The inertia tensor about a point, along the axes of the world. */
  public InertiaTensor inertia(Point about) {
    return inWorld.about(about.position());
  }

  /** The moment of inertia about an axis. */
  public AxialInertia inertia(Axis about) {
    return new AxialInertia(inWorld.about(about), about);
  }

  /** The radius of gyration about an axis, {@code k = √(I/m)}, in m. */
  public double radiusOfGyration(Axis about) {
    return Math.sqrt(inWorld.about(about) / mass);
  }

  /**
   * The flywheel effect about an axis, {@code GD² = 4 I} with G as a mass and D twice the radius of
   * gyration, in kg·m². The American WR² or WK² is the moment of inertia itself.
   */
  public double flywheelEffect(Axis about) {
    return 4 * inWorld.about(about);
  }

  /**
   * The part of the angular momentum that turning about the centre of mass gives: {@code I_C ω}.
   */
  public Vector3D spinAngularMomentum(Vector3D spin) {
    return inWorld.atCentre().times(Given.finite("spin", spin));
  }

  /** The part that the motion of the centre of mass gives about a point: {@code (C − A) × m v}. */
  public Vector3D orbitalAngularMomentum(Vector3D velocity, Point about) {
    return centre()
        .minus(about)
        .crossProduct(Given.finite("velocity", velocity).scalarMultiply(mass));
  }

  /**
   * The angular momentum about a point, spin and orbital part together.
   *
   * @param spin angular velocity of the body as seen from the world, in rad/s
   * @param velocity of the centre of mass, in m/s
   * @param about the point
   */
  public AngularMomentum angularMomentum(Vector3D spin, Vector3D velocity, Point about) {
    return new AngularMomentum(
        spinAngularMomentum(spin).add(orbitalAngularMomentum(velocity, about)), about);
  }

  /**
   * The kinetic energy, {@code m v²/2 + ω · I_C ω/2}, in J.
   *
   * @param spin angular velocity of the body as seen from the world, in rad/s
   * @param velocity of the centre of mass, in m/s
   */
  public double kineticEnergy(Vector3D spin, Vector3D velocity) {
    return (mass * Given.finite("velocity", velocity).getNormSq()
            + spin.dotProduct(spinAngularMomentum(spin)))
        / 2;
  }

  /** Whether another body has the same mass, inertia, volume and place. */
  @Override
  public boolean equals(@Nullable Object other) {
    return other instanceof Body body
        && shape.name().equals(body.shape.name())
        && shape.volume().equals(body.shape.volume())
        && ownInertia().equals(body.ownInertia())
        && mass == body.mass
        && frame.equals(body.frame);
  }

  @Override
  public int hashCode() {
    return inWorld.hashCode();
  }

  private static Frame at(Vector3D origin) {
    return Frame.in(Frame.WORLD, origin, Rotation.IDENTITY);
  }
}
