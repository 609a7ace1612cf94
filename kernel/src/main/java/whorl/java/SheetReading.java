package whorl.java;

import java.util.List;
import java.util.Optional;
import whorl.sheet.Quantity;
import whorl.sheet.Sheet;

/** The sheet as a cell in Java can read it. */
@FunctionalInterface
public interface SheetReading {
  /** Reads a sheet. */
  static SheetReading of(Sheet sheet) {
    return new SheetReading() {
      @Override
      public Optional<Quantity> quantity(String name) {
        return sheet.quantity(name);
      }

      @Override
      public List<String> near(String name) {
        return sheet.near(name);
      }
    };
  }

  /** What a name stands for, or empty if it has no value. */
  Optional<Quantity> quantity(String name);

  /** Names that are spelled like one that has no value; none if that is not known. */
  default List<String> near(String name) {
    return List.of();
  }
}
