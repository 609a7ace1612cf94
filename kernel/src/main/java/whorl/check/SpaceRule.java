package whorl.check;

import java.util.List;
import whorl.laws.Rule;
import whorl.laws.Validity;
import whorl.laws.Work;
import whorl.mechanics.reference.Frame;
import whorl.mechanics.reference.InertiaTensor;
import whorl.mechanics.reference.Point;

/** What operators do with things in space: the arithmetic of points, tensors and frames. */
record SpaceRule(String name, Work work) implements Rule {
  /** The vector to one point from another. */
  static final SpaceRule DIFFERENCE =
      new SpaceRule(
          "difference", (Work.Vector) g -> g.thing(0, Point.class).minus(g.thing(1, Point.class)));

  /** A point displaced by a vector. */
  static final SpaceRule DISPLACED =
      new SpaceRule("displaced", (Work.Thing) g -> g.thing(0, Point.class).plus(g.vector(1)));

  /** The sum of two tensors. */
  static final SpaceRule TENSOR_SUM =
      new SpaceRule(
          "tensor sum",
          (Work.Thing) g -> g.thing(0, InertiaTensor.class).plus(g.thing(1, InertiaTensor.class)));

  /** The difference of two tensors. */
  static final SpaceRule TENSOR_DIFFERENCE =
      new SpaceRule(
          "tensor difference",
          (Work.Thing) g -> g.thing(0, InertiaTensor.class).minus(g.thing(1, InertiaTensor.class)));

  /** A tensor times a number. */
  static final SpaceRule TENSOR_SCALED =
      new SpaceRule(
          "tensor scaled", (Work.Thing) g -> g.thing(0, InertiaTensor.class).times(g.number(1)));

  /** A tensor times a vector. */
  static final SpaceRule TENSOR_TIMES_VECTOR =
      new SpaceRule(
          "tensor times vector",
          (Work.Vector) g -> g.thing(0, InertiaTensor.class).times(g.vector(1)));

  /** A vector whose parts are stated along the axes of a frame. */
  static final SpaceRule STATED =
      new SpaceRule("stated", (Work.Vector) g -> g.thing(0, Frame.class).toWorld(g.vector(1)));

  /** The parts of a vector along the axes of a frame. */
  static final SpaceRule SEEN =
      new SpaceRule("seen", (Work.Vector) g -> g.thing(0, Frame.class).fromWorld(g.vector(1)));

  /** A tensor along the axes of a frame. */
  static final SpaceRule TENSOR_SEEN =
      new SpaceRule(
          "tensor seen",
          (Work.Thing)
              g ->
                  g.thing(1, InertiaTensor.class)
                      .turned(g.thing(0, Frame.class).attitude().revert()));

  /** The vector to a point from the origin of a frame. */
  static final SpaceRule FROM_ORIGIN =
      new SpaceRule(
          "from origin",
          (Work.Vector) g -> g.thing(1, Point.class).minus(g.thing(0, Frame.class).origin()));

  @Override
  public List<String> parameterWords() {
    return List.of("left", "right");
  }

  @Override
  public List<Validity> validity() {
    return List.of();
  }

  /** The rule at work on its two operands. */
  Operation.Use on(Operation left, Operation right) {
    return new Operation.Use(
        this, List.of(Operation.Argument.of(0, left), Operation.Argument.of(1, right)));
  }
}
