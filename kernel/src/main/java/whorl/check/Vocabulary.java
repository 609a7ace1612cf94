package whorl.check;

import java.util.List;
import java.util.Set;
import java.util.stream.Stream;

/** Words of the language that are no names of a sheet. */
public final class Vocabulary {
  /**
   * Bodies, references and their functions: words of the language that this version does not work
   * out.
   */
  private static final Set<String> LATER =
      Set.of(
          "point",
          "axis",
          "frame",
          "force",
          "moment",
          "inertia",
          "angular_momentum",
          "moved",
          "placed",
          "solid_cylinder",
          "hollow_cylinder",
          "disc",
          "ring",
          "rod",
          "solid_sphere",
          "hollow_sphere",
          "cone",
          "frustum",
          "box",
          "plate",
          "ellipsoid",
          "torus",
          "prism",
          "revolved",
          "point_mass",
          "mesh",
          "rigid_body",
          "assembly",
          "without",
          "weight",
          "at",
          "when",
          "peak",
          "least",
          "first",
          "last",
          "mean",
          "rms",
          "sum");

  private Vocabulary() {}

  /** Whether a name is a function at hand, which a definition may hide. */
  public static boolean isFunction(String name) {
    return FunctionAtHand.named(name).isPresent();
  }

  /** Whether a name is a function of the language that this version does not work out. */
  static boolean isLater(String name) {
    return LATER.contains(name);
  }

  /** Every name at hand. */
  public static List<String> atHand() {
    return Stream.concat(
            ConstantAtHand.all().stream().map(ConstantAtHand::symbol),
            Stream.of(FunctionAtHand.values()).map(FunctionAtHand::word))
        .sorted()
        .toList();
  }
}
