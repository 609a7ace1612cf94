package whorl.mechanics;

import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;

/** What an argument has to be, and how it is refused otherwise. */
public final class Given {
  private Given() {}

  /** A number as a message shows it. */
  public static String text(double value, String unit) {
    String number = Double.toString(Double.parseDouble(String.format("%.6g", value)));
    String plain = number.endsWith(".0") ? number.substring(0, number.length() - 2) : number;
    return unit.isEmpty() ? plain : plain + " " + unit;
  }

  /** A vector as a message shows it. */
  public static String text(Vector3D v, String unit) {
    return "("
        + String.join(", ", text(v.getX(), ""), text(v.getY(), ""), text(v.getZ(), ""))
        + ")"
        + (unit.isEmpty() ? "" : " " + unit);
  }

  /** The value, refused unless it is a number. */
  public static double finite(String subject, double value, String unit) {
    if (Double.isFinite(value)) {
      return value;
    }
    throw new Refusal(
        subject,
        "The " + subject + " is " + (unit.isEmpty() ? "" : "in " + unit + " and ") + "no number.",
        "");
  }

  /** The value, refused unless it is above zero. */
  public static double positive(String subject, double value, String unit) {
    if (finite(subject, value, unit) > 0) {
      return value;
    }
    throw new Refusal(
        subject, "The " + subject + " has to be positive, but is " + text(value, unit) + ".", "");
  }

  /** The value, refused where it is below zero. */
  public static double notNegative(String subject, double value, String unit) {
    if (finite(subject, value, unit) >= 0) {
      return value;
    }
    throw new Refusal(
        subject, "The " + subject + " must not be negative, but is " + text(value, unit) + ".", "");
  }

  /** The vector, refused unless its parts are numbers. */
  public static Vector3D finite(String subject, Vector3D v) {
    if (v.isNaN() || v.isInfinite()) {
      throw new Refusal(subject, "A part of the " + subject + " is no number.", "");
    }
    return v;
  }

  /** The unit vector along a vector, refused where it has no length. */
  public static Vector3D direction(String subject, Vector3D v) {
    // Division by the largest part first: the square of a very small or large one leaves the range.
    double largest = finite(subject, v).getNormInf();
    if (largest == 0) {
      throw new Refusal(
          subject,
          "The " + subject + " has length zero, so it points nowhere.",
          "Give a vector that is not zero, such as (0, 0, 1).");
    }
    Vector3D scaled = new Vector3D(v.getX() / largest, v.getY() / largest, v.getZ() / largest);
    return scaled.normalize();
  }
}
