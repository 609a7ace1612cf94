package whorl.units;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import whorl.units.kind.Kind;

/** The units chosen for each kind of quantity; {@code kind-units.csv} explains them. */
final class KindUnits {

  private static final int COLUMNS = 4;

  /** A value from here on is written without a zero in front. */
  private static final double SMALLEST_READABLE = 1;

  private static final double LARGEST_READABLE = 999;

  private static final double BEYOND_READABLE = 1000;

  private record Line(UnitText coherent, UnitText usual, List<UnitText> multiples) {}

  private final UnitCatalogue catalogue;
  private final Map<Kind, Line> lines = new HashMap<>();

  KindUnits(UnitCatalogue catalogue) {
    this.catalogue = catalogue;
    for (List<String> cells : CommaSeparated.lines("kind-units.csv", COLUMNS)) {
      lines.put(
          Kind.named(cells.get(0)),
          new Line(
              UnitReader.read(cells.get(1)),
              UnitReader.read(cells.get(2)),
              CommaSeparated.units(cells.get(3))));
    }
  }

  private Optional<Line> line(Kind kind) {
    @Nullable Line line = lines.get(kind);
    return line == null ? kind.parent().flatMap(this::line) : Optional.of(line);
  }

  /** The unit in which a quantity of a kind is shown. */
  Unit usual(Kind kind) {
    return line(kind)
        .map(line -> unit(line.usual(), kind))
        .orElseGet(
            () -> catalogue.resolve(ofBaseUnits(kind.dimension()).orElseThrow()).serving(kind));
  }

  /** The units among which a quantity of a kind is shown; at least its usual one. */
  List<Unit> choices(Kind kind) {
    Unit usual = usual(kind);
    List<Unit> choices = multiples(usual, kind).stream().map(text -> unit(text, kind)).toList();
    return choices.isEmpty() ? List.of(usual) : choices;
  }

  /** The coherent unit of a kind, as the trade writes it; empty for kinds that have no name. */
  Optional<Unit> coherent(Kind kind) {
    return line(kind).map(line -> unit(line.coherent(), kind));
  }

  private Unit unit(UnitText text, Kind kind) {
    return catalogue
        .resolve(text, kind)
        .orElseThrow(() -> new IllegalStateException(text + " is no unit of " + kind));
  }

  /** The base units of a dimension; empty where a root of one would be needed. */
  static Optional<UnitText> ofBaseUnits(Dimension dimension) {
    List<UnitText.Power> members = new ArrayList<>();
    for (Dimension.Base base : Dimension.Base.values()) {
      Rational exponent = dimension.exponent(base);
      if (!exponent.isInteger()) {
        return Optional.empty();
      }
      if (!exponent.isZero()) {
        members.add(new UnitText.Power(base.unit(), exponent.numerator().intValueExact()));
      }
    }
    return Optional.of(UnitText.product(members));
  }

  /** The multiple of the usual unit of a kind that suits a value best. */
  Unit readable(Unit usual, double si) {
    if (usual.kinds().isEmpty() || si == 0 || !Double.isFinite(si)) {
      return usual;
    }
    Kind kind = usual.kinds().get(0);
    Unit best = usual;
    for (UnitText text : multiples(usual, kind)) {
      Unit multiple = unit(text, kind);
      if (decadesOff(multiple.fromSi(si)) < decadesOff(best.fromSi(si))) {
        best = multiple;
      }
    }
    return best;
  }

  private List<UnitText> multiples(Unit usual, Kind kind) {
    return line(kind)
        .filter(line -> line.usual().equals(usual.text()))
        .map(Line::multiples)
        .orElse(List.of());
  }

  /** How many powers of ten a value is away from a readable size; more than zero from 1000 on. */
  private static double decadesOff(double value) {
    double size = Math.abs(value);
    if (size < SMALLEST_READABLE) {
      return Math.log10(SMALLEST_READABLE / size);
    }
    return size < BEYOND_READABLE ? 0 : Math.log10(size / LARGEST_READABLE);
  }
}
