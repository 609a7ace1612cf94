package whorl.units;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import whorl.units.kind.Kind;

/**
 * Finds the coherent unit that measures the same as a given one.
 *
 * <p>Member by member wherever that gives a unit of the catalogue, so that what was a force times a
 * length stays one; otherwise that of the kind, since {@code W·s} for {@code kW·h} or {@code
 * N·m·s²} for {@code lbf·ft·s²} is no help to the reader; otherwise member by member all the same.
 */
final class CoherentUnits {

  private final UnitCatalogue catalogue;
  private final KindUnits kindUnits;

  /** Rows that are coherent, by their members in any order. */
  private final Map<String, UnitText> rows = new HashMap<>();

  CoherentUnits(UnitCatalogue catalogue, KindUnits kindUnits) {
    this.catalogue = catalogue;
    this.kindUnits = kindUnits;
    for (UnitText text : catalogue.texts()) {
      Composition composition = catalogue.composition(text);
      if (composition.factor().isOne()) {
        rows.putIfAbsent(composition.keyInAnyOrder(), text);
      }
    }
  }

  Unit of(Unit unit) {
    UnitText members = memberByMember(unit);
    @Nullable UnitText row = rows.get(catalogue.composition(members).keyInAnyOrder());
    Unit candidate = serving(row == null ? members : row, unit.kinds());
    if (row != null && measuresTheSame(candidate, unit)) {
      return candidate;
    }
    Optional<Unit> ofKind =
        unit.kinds().size() == 1 ? kindUnits.coherent(unit.kinds().get(0)) : Optional.empty();
    return ofKind.orElse(candidate);
  }

  private static boolean measuresTheSame(Unit candidate, Unit unit) {
    return candidate.factor().isOne()
        && candidate.dimension().equals(unit.dimension())
        && unit.kinds().stream().allMatch(candidate.readings()::canBe);
  }

  private UnitText memberByMember(Unit unit) {
    var exponents = new Exponents();
    for (Member member : catalogue.composition(unit.text()).members()) {
      for (UnitText.Power power : coherent(member).members()) {
        exponents.add(power.symbol(), Math.multiplyExact(power.exponent(), member.exponent()));
      }
    }
    return UnitText.product(exponents.powers());
  }

  private UnitText coherent(Member member) {
    Kind kind = member.row().kind();
    return kindUnits
        .coherent(kind)
        .map(Unit::text)
        .orElseThrow(() -> new IllegalStateException("no coherent unit of " + kind));
  }

  private Unit serving(UnitText text, List<Kind> kinds) {
    Unit unit = catalogue.resolve(text);
    return kinds.size() == 1 ? catalogue.resolve(text, kinds.get(0)).orElse(unit) : unit;
  }
}
