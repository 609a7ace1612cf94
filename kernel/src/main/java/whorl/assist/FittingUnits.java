package whorl.assist;

import java.util.HashMap;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.jspecify.annotations.Nullable;
import whorl.units.Dimension;
import whorl.units.Unit;
import whorl.units.UnitCatalogue;
import whorl.units.UnitGuide;
import whorl.units.UnitText;
import whorl.units.kind.Kind;
import whorl.units.kind.Readings;

/**
 * Which units fit in a place of an unfinished line: those with which a statement of it is sound.
 */
final class FittingUnits {
  private static final UnitCatalogue UNITS = UnitCatalogue.standard();

  /** Units of one group read alike, so that they fit in the same places. */
  private record Group(List<Kind> kinds, Readings readings, boolean reading) {
    static Group of(Unit unit) {
      return new Group(unit.kinds(), unit.readings(), unit.isReading());
    }
  }

  /** A unit of each group that the catalogue has, loaded with the first question. */
  private static final class Groups {
    static final Map<Group, Unit> FIRST = new LinkedHashMap<>();

    static {
      for (UnitGuide.Entry entry : UNITS.guide().entries()) {
        if (!entry.prefixed()) {
          Unit unit = UNITS.resolve(entry.text());
          FIRST.putIfAbsent(Group.of(unit), unit);
        }
      }
    }
  }

  private final @Nullable Trial trial;
  private final DraftSheet draft;
  private final Map<Group, Boolean> fits = new HashMap<>();
  private final Set<Dimension> dimensions = new HashSet<>();
  private final Set<Kind> kinds = new LinkedHashSet<>();

  private FittingUnits(@Nullable Trial trial, DraftSheet draft) {
    this.trial = trial;
    this.draft = draft;
  }

  /** The units that fit by the first statement that tells some from others. */
  static FittingUnits by(List<Trial> trials, DraftSheet draft) {
    for (Trial trial : new LinkedHashSet<>(trials)) {
      var units = new FittingUnits(trial, draft);
      if (units.tells()) {
        return units;
      }
    }
    return new FittingUnits(null, draft);
  }

  /** Whether some units fit and some do not. */
  private boolean tells() {
    boolean checkable = false;
    for (Map.Entry<Group, Unit> group : Groups.FIRST.entrySet()) {
      Unit unit = group.getValue();
      // A statement that cannot be read with one unit, or uses unknown names, is so with another.
      checkable = checkable || draft.known(trialled(unit.text())).isPresent();
      if (!checkable) {
        return false;
      }
      boolean sound = isSound(unit);
      fits.put(group.getKey(), sound);
      if (sound) {
        dimensions.add(unit.dimension());
        kinds.addAll(unit.kinds());
      }
    }
    return fits.containsValue(true) && fits.containsValue(false);
  }

  private String trialled(UnitText text) {
    return trial == null ? "" : trial.with(text);
  }

  /** Whether it is known which units fit. */
  boolean areKnown() {
    return trial != null;
  }

  /** Whether units that do not fit would be wrong. */
  boolean areBinding() {
    return trial != null && trial.binding();
  }

  /** The kinds that fitting units of the catalogue measure, if they measure others too. */
  List<Kind> kinds() {
    return List.copyOf(kinds);
  }

  /** Whether a unit fits; none is said to where nothing is known. */
  boolean fit(Unit unit) {
    return trial != null
        && dimensions.contains(unit.dimension())
        && fits.computeIfAbsent(Group.of(unit), group -> isSound(unit));
  }

  private boolean isSound(Unit unit) {
    return draft.sound(trialled(unit.text())).isPresent();
  }
}
