package whorl.sheet;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import whorl.eval.Value;
import whorl.units.Unit;
import whorl.units.UnitCatalogue;
import whorl.units.UnitReader;

/**
 * A value that a name of a sheet must have, as a line of a table: {@code T_m = 154.46 N*m to
 * 4e-05}, the last number the largest relative deviation. Behind {@code or} stands an absolute one,
 * in the same unit, for values that may be zero. A part of a vector is named as in a sheet, {@code
 * M.x}.
 */
record ExpectedValue(
    String name, double value, Unit unit, double relative, double absolute, String line) {
  private static final Pattern LINE =
      Pattern.compile("(\\S+) += (\\S+) (\\S+) to (\\S+)(?: or (\\S+))?");

  static List<ExpectedValue> read(String lines) {
    return lines.lines().map(ExpectedValue::readLine).toList();
  }

  private static ExpectedValue readLine(String line) {
    Matcher found = LINE.matcher(line);
    if (!found.matches()) {
      throw new IllegalArgumentException("no expected value: " + line);
    }
    String absolute = found.group(5);
    return new ExpectedValue(
        found.group(1),
        Double.parseDouble(found.group(2)),
        unit(found.group(3)),
        Double.parseDouble(found.group(4)),
        absolute == null ? 0 : Double.parseDouble(absolute),
        line);
  }

  private static Unit unit(String text) {
    return text.equals("1") ? Unit.ONE : UnitCatalogue.standard().resolve(UnitReader.read(text));
  }

  /** Fails unless the name has the value, to the deviation allowed. */
  void assertIn(Sheet sheet) {
    String[] parts = name.split("\\.", 2);
    Quantity quantity =
        sheet.quantity(parts[0]).orElseThrow(() -> new AssertionError(name + " has no value"));
    assertEquals(unit.dimension(), quantity.unit().dimension(), line);
    double found = unit.fromSi(parts.length == 1 ? real(quantity) : part(quantity, parts[1]));
    assertEquals(value, found, relative * Math.abs(value) + absolute, line);
  }

  private static double real(Quantity quantity) {
    return ((Value.Real) quantity.value()).value();
  }

  private static double part(Quantity quantity, String axis) {
    var vector = (Value.Vector) quantity.value();
    return switch (axis) {
      case "x" -> vector.x();
      case "y" -> vector.y();
      case "z" -> vector.z();
      default -> throw new IllegalArgumentException("no part of a vector: " + axis);
    };
  }
}
