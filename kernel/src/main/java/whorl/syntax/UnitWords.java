package whorl.syntax;

import java.util.List;
import whorl.units.UnitText;

/** What the parser must know about units to tell where one ends. */
public interface UnitWords {
  /** Whether a word or sign is the symbol of a unit, with a prefix or without. */
  boolean knows(String symbol);

  /** Whether a compound as a whole stands in the catalogue, prefixes aside. */
  boolean isRow(UnitText text);

  /** Symbols near an unknown one, nearest first, at most four. */
  List<String> near(String symbol);

  /** The usual spelling of what a trade writes in another way, {@code N·m} for Nm, or empty. */
  String usualSpelling(String word);
}
