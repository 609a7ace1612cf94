package whorl.units;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.concurrent.ConcurrentHashMap;
import org.jspecify.annotations.Nullable;
import whorl.units.kind.Kind;
import whorl.units.kind.Readings;

/**
 * The units of measurement that are known, with their exact sizes and the kinds of quantity they
 * serve. Symbols are case-sensitive. Any product of powers of known symbols is a unit.
 *
 * <p>What a product measures is found in three steps:
 *
 * <ol>
 *   <li>If rows of the catalogue are built alike, it serves their kinds, first those written alike:
 *       {@code kN·mm} is of force and length as {@code N·m} is, so a torque or an energy.
 *   <li>Otherwise it serves the kinds that the rules give for the product of its members: {@code
 *       kg/L} is a mass over a volume, so a density.
 *   <li>Otherwise only its dimension is known, and it goes with any kind of that dimension.
 * </ol>
 *
 * <p>A scale of temperature is a reading only where it stands alone. In a product, as in {@code
 * W/(m²·°C)}, nobody can mean a reading: there it is the interval.
 *
 * <p>The catalogue is immutable for its users and may be used by several threads.
 */
public final class UnitCatalogue {

  /**
   * Texts come from people, who write a few dozen units; beyond this something else is going on.
   */
  private static final int MOST_REMEMBERED = 4096;

  /** Sum of the sizes of all exponents; a bound on the work for an exact factor. */
  private static final int HIGHEST_DEGREE = 1000;

  private final List<CatalogueRow> rows;
  private final Symbols symbols;
  private final Map<String, List<CatalogueRow>> byKey = new HashMap<>();
  private final Map<String, List<CatalogueRow>> byBuild = new HashMap<>();
  private final Set<String> keysWithoutPrefixes = new HashSet<>();
  private final Map<UnitText, Unit> resolved = new ConcurrentHashMap<>();

  private final Memo<KindUnits> kindUnits = new Memo<>(() -> new KindUnits(this));
  private final Memo<CoherentUnits> coherentUnits =
      new Memo<>(() -> new CoherentUnits(this, kindUnits.get()));
  private final Memo<NearSymbols> nearSymbols;
  private final Memo<UcumCodes> ucum;
  private final Memo<UnitGuide> guide = new Memo<>(this::makeGuide);

  private UnitCatalogue(List<CatalogueRow> rows) {
    this.rows = List.copyOf(rows);
    this.symbols = new Symbols(rows);
    this.nearSymbols = new Memo<>(() -> new NearSymbols(symbols, rows));
    this.ucum = new Memo<>(() -> new UcumCodes(this, rows));
    for (CatalogueRow row : rows) {
      enter(row.text(), row);
      for (UnitText alias : row.aliases()) {
        if (!alias.isSymbol()) { // single symbols are in the other table
          enter(alias, row);
        }
      }
    }
  }

  private void enter(UnitText text, CatalogueRow row) {
    Composition composition = composition(text);
    add(row, composition.key(), byKey);
    keysWithoutPrefixes.add(composition.keyWithoutPrefixes());
    Optional<String> build = composition.build();
    if (build.isPresent()) {
      add(row, build.get(), byBuild);
    }
  }

  private static void add(CatalogueRow row, String key, Map<String, List<CatalogueRow>> table) {
    @Nullable List<CatalogueRow> alike = table.get(key);
    if (alike == null) {
      alike = new ArrayList<>();
      table.put(key, alike);
    }
    alike.add(row);
  }

  /** The catalogue. */
  public static UnitCatalogue standard() {
    return Standard.CATALOGUE;
  }

  /** Loads the catalogue when it is first asked for. */
  private static final class Standard {
    static final UnitCatalogue CATALOGUE = new UnitCatalogue(CatalogueFile.rows());
  }

  /**
   * Whether a symbol is known: a row of one symbol, an alias, or a prefix before one that has it.
   */
  public boolean knows(String symbol) {
    return symbols.knows(symbol);
  }

  /**
   * Whether the whole text is a row of the catalogue or an alias, possibly with other prefixes:
   * {@code kJ/(kg·K)} is, {@code W/(m²·K)} is not.
   */
  public boolean isRow(UnitText text) {
    for (UnitText.Power member : text.members()) {
      if (!knows(member.symbol())) {
        return false;
      }
    }
    return keysWithoutPrefixes.contains(composition(text).keyWithoutPrefixes());
  }

  /**
   * The unit of a text.
   *
   * @throws UnknownUnitException if a symbol is not known
   * @throws UnitSyntaxException if the exponents of all members together are beyond any unit, which
   *     no text that {@link UnitReader} reads with fewer than ten members can be
   */
  public Unit resolve(UnitText text) {
    @Nullable Unit known = resolved.get(text);
    if (known == null) {
      known = unit(text, composition(text));
      if (resolved.size() < MOST_REMEMBERED) {
        resolved.put(text, known);
      }
    }
    return known;
  }

  /**
   * The unit of a text where the kind of the quantity is stated; empty if the unit does not serve
   * that kind. The kind may make a difference to the size: where a flywheel effect is stated with a
   * weight in place of a mass, {@code kgf·m²} means {@code kg·m²}.
   *
   * @throws UnknownUnitException if a symbol is not known
   */
  public Optional<Unit> resolve(UnitText text, Kind kind) {
    Unit unit = resolve(text);
    if (unit.readings().canBe(kind)) {
      return Optional.of(unit.serving(kind));
    }
    return composition(text)
        .build()
        .map(build -> byBuild.getOrDefault(build, List.of()))
        .flatMap(alike -> alike.stream().filter(row -> row.kind() == kind).findFirst())
        .map(row -> inTheForceOf(row, unit, kind));
  }

  /** What a row makes of the product of its members, it makes of a product built alike. */
  private Unit inTheForceOf(CatalogueRow row, Unit unit, Kind kind) {
    Factor meant = row.factor().dividedBy(composition(row.text()).factor());
    return new Unit(
        unit.text(), unit.factor().times(meant), Rational.ZERO, kind.dimension(), List.of(kind));
  }

  private Unit unit(UnitText text, Composition composition) {
    Dimension dimension = composition.dimension();
    Rational zero = composition.isSymbol() ? composition.first().row().zero() : Rational.ZERO;
    List<Kind> kinds = kindsOfRows(composition, dimension);
    if (kinds.isEmpty()) {
      Readings readings = MemberReadings.of(composition);
      List<Kind> named = readings.kinds().stream().filter(kind -> !kind.isInternal()).toList();
      return new Unit(text, composition.factor(), zero, dimension, named, readings);
    }
    return new Unit(text, composition.factor(), zero, dimension, kinds);
  }

  private List<Kind> kindsOfRows(Composition composition, Dimension dimension) {
    List<CatalogueRow> alike = new ArrayList<>(writtenAlike(composition));
    composition.build().ifPresent(b -> alike.addAll(byBuild.getOrDefault(b, List.of())));
    Set<Kind> kinds = new LinkedHashSet<>();
    for (CatalogueRow row : alike) {
      if (row.kind().dimension().equals(dimension)) {
        kinds.add(row.kind());
      }
    }
    return List.copyOf(kinds);
  }

  private List<CatalogueRow> writtenAlike(Composition composition) {
    String key = composition.isSymbol() ? composition.keyWithoutPrefixes() : composition.key();
    return byKey.getOrDefault(key, List.of());
  }

  Composition composition(UnitText text) {
    List<Member> members = new ArrayList<>();
    long degree = 0;
    for (UnitText.Power power : text.members()) {
      degree += Math.abs((long) power.exponent());
      if (degree > HIGHEST_DEGREE) {
        throw UnitSyntaxException.tooLong(text.plain());
      }
      List<Member> found = symbols.members(power.symbol());
      if (found.isEmpty()) {
        throw unknown(power.symbol());
      }
      found.forEach(member -> members.add(member.power(power.exponent())));
    }
    var composition = new Composition(members);
    return composition.isSymbol() || !composition.hasReading()
        ? composition
        : composition.with(this::interval);
  }

  /** The interval of a scale of temperature; any other member as it is. */
  private Member interval(Member member) {
    return member.row().isReading()
        ? symbols.members("d" + member.row().symbol()).get(0).power(member.exponent())
        : member;
  }

  private UnknownUnitException unknown(String symbol) {
    Optional<String> usual = nearSymbols.get().usualSpelling(symbol);
    return new UnknownUnitException(symbol, near(symbol), usual.orElse(null));
  }

  /** Up to four symbols that may be meant by one that is not known, the likeliest first. */
  public List<String> near(String symbol) {
    return nearSymbols.get().near(symbol);
  }

  /**
   * The unit that the heading of a column in a data file means. Beside all that {@link UnitReader}
   * reads, some spellings are known that are too loose for a formula, as {@code ft-lbf} or {@code
   * "} for inches.
   *
   * @throws UnitSyntaxException if the text is no unit
   * @throws UnknownUnitException if a symbol is not known
   */
  public Unit resolveHeading(String heading) {
    String spelling = heading.strip();
    for (CatalogueRow row : rows) {
      if (row.inFiles().contains(spelling)) {
        return resolve(row.text());
      }
    }
    return resolve(UnitReader.read(spelling));
  }

  /** The unit in which a quantity of a kind is usually shown. */
  public Unit usual(Kind kind) {
    return kindUnits.get().usual(kind);
  }

  /** The product of SI base units of a dimension; empty where a root of a unit would be needed. */
  public Optional<Unit> coherent(Dimension dimension) {
    return KindUnits.ofBaseUnits(dimension).map(this::resolve);
  }

  /** The units of a kind, as they stand in the catalogue; those of the parent if it has none. */
  public List<Unit> unitsOf(Kind kind) {
    List<Unit> units = new ArrayList<>();
    for (CatalogueRow row : rows) {
      if (row.kind() == kind) {
        resolve(row.text(), kind).ifPresent(units::add);
      }
    }
    return units.isEmpty() ? kind.parent().map(this::unitsOf).orElse(List.of()) : units;
  }

  /**
   * A unit in which a value has a size that is easy to read, between 1 and 1000 where there is one:
   * {@code kN·m} for 3500 N·m, {@code mm} for 0.35 m. Only the usual unit of a kind is exchanged,
   * and only for such multiples as the trade uses; a unit that an author chose stays.
   *
   * @param usual unit of its first kind; any other is handed back
   * @param si the value in coherent SI units
   */
  public Unit readable(Unit usual, double si) {
    return kindUnits.get().readable(usual, si);
  }

  /** The coherent unit of the same kind; see {@link Unit#coherent()}. */
  Unit coherent(Unit unit) {
    return coherentUnits.get().of(unit);
  }

  /** The texts of all rows, for completion. */
  public List<UnitText> texts() {
    return rows.stream().map(CatalogueRow::text).distinct().toList();
  }

  /** The name of a row or alias in words, as {@code pound-force foot}; empty for other products. */
  public Optional<String> name(UnitText text) {
    return rowWrittenAs(text).map(CatalogueRow::name);
  }

  /** The first row written with the members of a text, in their order. */
  Optional<CatalogueRow> rowWrittenAs(UnitText text) {
    return byKey.getOrDefault(composition(text).key(), List.of()).stream().findFirst();
  }

  /**
   * The code of a unit in the Unified Code for Units of Measure; empty if it has none.
   *
   * @throws UnknownUnitException if a symbol is not known
   */
  public Optional<String> ucumCode(UnitText text) {
    return ucum.get().write(text);
  }

  /** What people look up about the units. */
  public UnitGuide guide() {
    return guide.get();
  }

  private UnitGuide makeGuide() {
    return new UnitGuide(this, rows, symbols);
  }

  /** The units among which a quantity of a kind is usually shown, from small to large. */
  public List<Unit> usualUnits(Kind kind) {
    return kindUnits.get().choices(kind);
  }

  UcumCodes ucum() {
    return ucum.get();
  }
}
