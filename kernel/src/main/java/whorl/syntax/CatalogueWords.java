package whorl.syntax;

import java.util.List;
import whorl.units.UnitCatalogue;
import whorl.units.UnitText;
import whorl.units.UnknownUnitException;

/** The unit catalogue as the parser asks it. */
public final class CatalogueWords implements UnitWords {
  /** The words of the standard catalogue. */
  public static final UnitWords STANDARD = new CatalogueWords(UnitCatalogue.standard());

  private final UnitCatalogue catalogue;

  private CatalogueWords(UnitCatalogue catalogue) {
    this.catalogue = catalogue;
  }

  @Override
  public boolean knows(String symbol) {
    return catalogue.knows(symbol);
  }

  @Override
  public boolean isRow(UnitText text) {
    return catalogue.isRow(text);
  }

  @Override
  public List<String> near(String symbol) {
    return catalogue.near(symbol);
  }

  @Override
  public String usualSpelling(String word) {
    try {
      catalogue.resolve(new UnitText(List.of(new UnitText.Power(word, 1)), List.of()));
      return "";
    } catch (UnknownUnitException unknown) {
      return unknown.usualSpelling().orElse("");
    }
  }
}
