package whorl.mechanics.body;

import whorl.mechanics.Given;
import whorl.mechanics.Refusal;

/** What the lengths of a shape have to be. */
final class Lengths {
  private Lengths() {}

  static double positive(String subject, double value) {
    return Given.positive(subject, value, "m");
  }

  /** Refuses a bore that leaves no wall. */
  static void demandWall(double bore, double diameter) {
    positive("diameter", diameter);
    if (positive("bore", bore) < diameter) {
      return;
    }
    throw new Refusal(
        "bore",
        "The bore, "
            + Given.text(bore, "m")
            + ", is not smaller than the diameter, "
            + Given.text(diameter, "m")
            + "; no material is left.",
        "Check which is which, and whether one of them is a radius.");
  }

  /** Refuses a cap that is higher than its sphere. */
  static void demandWithin(double height, double diameter) {
    positive("diameter", diameter);
    if (positive("height", height) <= diameter) {
      return;
    }
    throw new Refusal(
        "height",
        "The height of the cap, "
            + Given.text(height, "m")
            + ", is more than the diameter of its sphere, "
            + Given.text(diameter, "m")
            + ".",
        "The diameter is that of the sphere, not of the base of the cap.");
  }

  /** Refuses a torus that runs into itself. */
  static void demandHole(double section, double diameter) {
    positive("diameter", diameter);
    if (positive("section", section) <= diameter) {
      return;
    }
    throw new Refusal(
        "section",
        "The diameter of the section, "
            + Given.text(section, "m")
            + ", is more than the diameter of the circle through the middle of the section, "
            + Given.text(diameter, "m")
            + ", so the torus runs into itself.",
        "The diameter of a torus is measured between the middles of its sections.");
  }
}
