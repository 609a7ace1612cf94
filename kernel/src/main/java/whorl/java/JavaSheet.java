package whorl.java;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.List;
import java.util.Optional;
import whorl.eval.Value;
import whorl.sheet.Quantity;
import whorl.units.Unit;
import whorl.units.UnitCatalogue;
import whorl.units.UnitReader;
import whorl.units.UnitSyntaxException;
import whorl.units.UnitText;
import whorl.units.UnknownUnitException;
import whorl.units.kind.Kind;

/**
 * The sheet, as {@code sheet} in cells in Java. Values are read, and functions are published;
 * nothing else leads from Java into the sheet. It can be used only while a cell runs.
 */
public final class JavaSheet {
  /** The sheet of the cell that runs. */
  public static final JavaSheet sheet = new JavaSheet();

  private static final MathContext DIGITS = new MathContext(6);

  private JavaSheet() {}

  /**
   * The value of a name in a unit.
   *
   * @param name as it is defined in the sheet
   * @param unit as it is written in the sheet, such as {@code N·m·s} or {@code N*m*s}
   * @throws IllegalArgumentException if the name has no value, or none that the unit fits
   */
  public double value(String name, String unit) {
    Quantity quantity = quantityOf(name);
    return unit(name, quantity, unit).fromSi(number(name, quantity));
  }

  /**
   * The value of a name in the unit in which the sheet shows it.
   *
   * @throws IllegalArgumentException if the name has no value, or one that is no number
   */
  public SheetQuantity quantity(String name) {
    Quantity quantity = quantityOf(name);
    Unit unit = quantity.unit();
    double value = unit.fromSi(number(name, quantity));
    String digits = quantity.written() == null ? digits(value) : quantity.written();
    boolean plain = unit.equals(Unit.ONE);
    return new SheetQuantity(
        value, unit.symbol(), quantity.kind(), plain ? digits : digits + " " + unit.symbol());
  }

  /**
   * Publishes a function to the sheet, once the cell has ended without error.
   *
   * @param head as in the sheet, such as {@code drag(v [m/s], A [m²]) [N]}; the function takes its
   *     arguments and gives its result in these units
   * @throws IllegalArgumentException if the head has another number of parameters
   */
  public void function(String head, SheetFunction.Of0 function) {
    publish(head, function);
  }

  /**
   * Publishes a function of one parameter, as {@link #function(String, SheetFunction.Of0)} does.
   */
  public void function(String head, SheetFunction.Of1 function) {
    publish(head, function);
  }

  /**
   * Publishes a function of two parameters, as {@link #function(String, SheetFunction.Of0)} does.
   */
  public void function(String head, SheetFunction.Of2 function) {
    publish(head, function);
  }

  /**
   * Publishes a function of three parameters, as {@link #function(String, SheetFunction.Of0)} does.
   */
  public void function(String head, SheetFunction.Of3 function) {
    publish(head, function);
  }

  /**
   * Publishes a function of four parameters, as {@link #function(String, SheetFunction.Of0)} does.
   */
  public void function(String head, SheetFunction.Of4 function) {
    publish(head, function);
  }

  /**
   * Publishes a function of five parameters, as {@link #function(String, SheetFunction.Of0)} does.
   */
  public void function(String head, SheetFunction.Of5 function) {
    publish(head, function);
  }

  /**
   * Publishes a function of six parameters, as {@link #function(String, SheetFunction.Of0)} does.
   */
  public void function(String head, SheetFunction.Of6 function) {
    publish(head, function);
  }

  /** Six digits; a power of ten only where zeros would be many. */
  private static String digits(double value) {
    BigDecimal rounded = new BigDecimal(value).round(DIGITS).stripTrailingZeros();
    int order = rounded.precision() - rounded.scale() - 1;
    return Math.abs(order) <= DIGITS.getPrecision() ? rounded.toPlainString() : rounded.toString();
  }

  private static void publish(String head, SheetFunction function) {
    int parameters = parameters(head);
    if (parameters != function.parameters()) {
      throw new IllegalArgumentException(
          head
              + " has "
              + counted(parameters, "parameter")
              + ", and the function in Java takes "
              + function.parameters());
    }
    run().publish(head.strip(), function);
  }

  private static int parameters(String head) {
    int open = head.indexOf('(');
    int close = open;
    int commas = 0;
    for (int depth = 0; close >= 0 && close < head.length(); close++) {
      char sign = head.charAt(close);
      depth += sign == '(' ? 1 : sign == ')' ? -1 : 0;
      commas += sign == ',' && depth == 1 ? 1 : 0;
      if (depth == 0) {
        break;
      }
    }
    if (open < 0 || close == head.length()) {
      throw new IllegalArgumentException(
          "The head of a function is written as in the sheet, such as drag(v [m/s], A [m²]) [N];"
              + " this is not: "
              + head);
    }
    return head.substring(open + 1, close).isBlank() ? 0 : commas + 1;
  }

  private static String counted(int number, String noun) {
    return number + " " + noun + (number == 1 ? "" : "s");
  }

  private static CellRun run() {
    return CellRun.current().orElseThrow(() -> new IllegalStateException(CellRun.OVER));
  }

  private static Quantity quantityOf(String name) {
    CellRun run = run();
    return run.read(name)
        .orElseThrow(
            () -> {
              List<String> near = run.near(name);
              return new IllegalArgumentException(
                  "The sheet has no value for "
                      + name
                      + (near.isEmpty() ? "" : "; near it are " + String.join(", ", near)));
            });
  }

  private static double number(String name, Quantity quantity) {
    if (quantity.value() instanceof Value.Real real) {
      return real.value();
    }
    if (quantity.value() instanceof Value.Thing thing) {
      throw new IllegalArgumentException(
          name
              + " is "
              + thing.sort().withArticle()
              + "; a cell in Java reads numbers, such as one of its parts under a name of its own");
    }
    throw new IllegalArgumentException(
        quantity.value() instanceof Value.Vector
            ? name
                + " is a vector; a cell in Java reads numbers, such as its part "
                + name
                + ".x"
                + " under a name of its own"
            : name + " is a condition; a cell in Java reads numbers");
  }

  private static Unit unit(String name, Quantity quantity, String written) {
    UnitText text;
    Unit unit;
    try {
      text = UnitReader.read(written);
      unit = UnitCatalogue.standard().resolve(text);
    } catch (UnitSyntaxException | UnknownUnitException e) {
      throw new IllegalArgumentException(e.getMessage());
    }
    Optional<Kind> kind = Kind.find(quantity.kind());
    if (kind.isPresent()) {
      return UnitCatalogue.standard()
          .resolve(text, kind.get())
          .orElseThrow(
              () ->
                  new IllegalArgumentException(
                      name
                          + " is "
                          + kind.get().withArticle()
                          + ", which "
                          + unit.symbol()
                          + " does not measure; the sheet shows it in "
                          + quantity.unit().symbol()));
    }
    if (!unit.dimension().equals(quantity.unit().dimension())) {
      throw new IllegalArgumentException(
          name
              + " is measured in "
              + quantity.unit().symbol()
              + ", which "
              + unit.symbol()
              + " does not fit");
    }
    return unit;
  }
}
