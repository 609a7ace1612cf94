package whorl.assist;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import whorl.assist.Completion.Candidate;
import whorl.units.Unit;
import whorl.units.UnitCatalogue;
import whorl.units.UnitText;

/** Units found for a place, to be offered with the likeliest in front. */
final class RankedUnits {
  private static final UnitCatalogue UNITS = UnitCatalogue.standard();

  /** More than this nobody reads where not a letter was typed. */
  private static final int MOST_UNASKED = 24;

  /** How much a unit is used, most first. */
  enum Use {
    USUAL,
    LISTED,
    PREFIXED,
    RARE
  }

  private record Found(
      String text, UnitText unit, boolean fits, Closeness closeness, Use use, int order) {}

  private final FittingUnits fitting;
  private final List<Found> found = new ArrayList<>();

  RankedUnits(FittingUnits fitting) {
    this.fitting = fitting;
  }

  /**
   * Takes a unit in.
   *
   * @param text what would be written
   * @param unit the whole unit that it would make
   * @param closeness of what was typed to it
   */
  void add(String text, UnitText unit, Closeness closeness, Use use) {
    boolean fits = fitting.fit(UNITS.resolve(unit));
    found.add(new Found(text, unit, fits, closeness, use, found.size()));
  }

  /**
   * The units to offer: only those that fit where others would be wrong or nothing was typed; where
   * none fits, those that are used by themselves.
   *
   * @param asked whether anything was typed
   * @param complete whether each is meant to be the whole unit, so that nothing more can mend it
   */
  List<Candidate> offered(boolean asked, boolean complete) {
    boolean anyFits = found.stream().anyMatch(Found::fits);
    boolean onlyFitting =
        anyFits ? !asked || fitting.areBinding() : complete && fitting.areBinding();
    return found.stream()
        .filter(one -> one.fits() || (!onlyFitting && one.use() != Use.RARE))
        .filter(one -> one.fits() || !anyFits || one.use() != Use.PREFIXED)
        .sorted(
            Comparator.comparing((Found one) -> !one.fits())
                .thenComparing(Found::closeness)
                .thenComparing(Found::use)
                .thenComparing(one -> one.use() == Use.PREFIXED && !one.unit().isSymbol())
                .thenComparingInt(Found::order))
        .limit(asked ? Integer.MAX_VALUE : MOST_UNASKED)
        .map(one -> new Candidate(one.text(), "unit", detail(one.unit())))
        .toList();
  }

  /** A unit in words with what it measures. */
  private static String detail(UnitText text) {
    String words = UNITS.guide().words(text);
    Unit unit = UNITS.resolve(text);
    return unit.kinds().isEmpty() ? words : words + ", " + unit.readings().words();
  }
}
