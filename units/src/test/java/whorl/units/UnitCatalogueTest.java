package whorl.units;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;
import whorl.units.kind.Kind;

class UnitCatalogueTest {

  private static final UnitCatalogue CATALOGUE = UnitCatalogue.standard();

  private static Unit unit(String text) {
    return CATALOGUE.resolve(UnitReader.read(text));
  }

  private static String kinds(Unit unit) {
    return String.join(" ", unit.kinds().stream().map(Kind::name).toList());
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "m", "km", "μm", "µm", "um", "kg", "mg", "dag", "min", "cd", "ft", "MPa", "Nm", "RPM", "°",
        "°C", "℃", "Δ°C", "%", "‰", "′", "kΩ", "kohm", "ml", "msec", "turn", "kWh", "MWh", "QN",
            "qg"
      })
  void symbolsAliasesAndPrefixesAreKnown(String symbol) {
    assertTrue(CATALOGUE.knows(symbol));
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "",
        "k",
        "kkg",
        "mkg",
        "kmm",
        "KG",
        "mft",
        "kmin",
        "mmetre",
        "N-m",
        "\"",
        "'",
        "g's",
        "#m",
        "kg·m^2",
        "GD2",
        "kg·m^2_GD2",
        "N·m.e",
        "x"
      })
  void otherTextsAreNoSymbols(String symbol) {
    assertFalse(CATALOGUE.knows(symbol));
  }

  @ParameterizedTest
  @CsvSource({
    "min, time",
    "cd, luminous_intensity",
    "Pa, stress",
    "ft, length",
    "ha, area",
    "kn, velocity",
    "mil, length",
    "gr, mass",
    "dyn, force",
    "pdl, force",
    "cP, dynamic_viscosity",
    "Gal, acceleration",
    "mol, amount_of_substance"
  })
  void theLongestExactSymbolWinsBeforeAPrefix(String symbol, String kind) {
    assertEquals(kind, kinds(unit(symbol)));
  }

  @ParameterizedTest
  @CsvSource({
    "kg·m^2, true",
    "kJ/(kg·K), true",
    "km/h, true",
    "mN·m, true",
    "rev/min, true",
    "tr/min, true",
    "lbf/in², true",
    "m/s^2, true",
    "W/(m²·K), false",
    "kg·g, false",
    "kN/A, false",
    "m·N, false",
    "qx, false",
    "kg·qx, false"
  })
  void aRowIsKnownAsAWhole(String text, boolean row) {
    assertEquals(row, CATALOGUE.isRow(UnitReader.read(text)));
  }

  @ParameterizedTest
  @CsvSource({
    // written alike
    "N·m, torque energy",
    "J, energy",
    "ft·lbf, energy torque",
    "lbf·ft, torque energy",
    "kg·m², rotational_inertia flywheel_effect couple_unbalance",
    "g·mm², rotational_inertia couple_unbalance flywheel_effect",
    "mm³, volume section_modulus",
    "K, temperature_difference temperature",
    "mK, temperature_difference temperature",
    "ddegC, temperature_difference",
    "degC, temperature",
    "lb·in, unbalance",
    // built alike
    "kN·mm, torque energy",
    "km/min, velocity",
    "rad/min, angular_velocity",
    "deg/d, angular_velocity",
    "kg·mm, unbalance",
    "MW·h, energy",
    "kW·s, energy",
    "lbf·s, momentum",
    "1/min, rate",
    "min⁻¹, rate",
    "1/h, rate",
    "cycle/s, frequency",
    "cycle/min, frequency",
    "cycles/h, frequency",
    "kHz, frequency",
    "lbf/ft, force_per_length stiffness",
    "N/m, stiffness force_per_length",
    "L/rev, displacement_per_angle",
    "mV/rpm, torque_constant",
    "m/deg, lead",
    "µm/m, strain",
    "rev/(min·s), angular_acceleration",
    "oz·in/lb, length",
    // by the rules for the members
    "kg/L, density",
    "N·rad, ",
    // temperature in a product is an interval
    "1/°C, thermal_expansion",
    "J/(kg·°C), specific_heat",
    // only the dimension is known
    "W/(m²·K), ",
    "N²·m²·s², ",
  })
  void kindsFollowFromTheRowsAndTheRules(String text, String kinds) {
    assertEquals(kinds == null ? "" : kinds, kinds(unit(text)));
  }

  @ParameterizedTest
  @CsvSource({
    "rad²/s², T^-2, 1",
    "N²·m²·s², M^2 L^4 T^-2, 1",
    "lb·ft²/s, M L^2 T^-1, 0.45359237*0.3048*0.3048",
    "W/(m²·K), M T^-3 Th^-1, 1",
    "lbf·s²/in⁴, M L^-3, 4.4482216152605/0.0254/0.0254/0.0254/0.0254",
    "rev²/min², T^-2, 1/900*pi^2",
    "%/K, Th^-1, 1/100",
    "km·mm, L^2, 1",
    "QN/qN, 1, 1e60"
  })
  void anyCompoundHasAnExactSizeAndDimension(String text, String dimension, String factor) {
    assertEquals(Factor.parse(factor), unit(text).factor());
    assertEquals(dimension, unit(text).dimension().toString());
  }

  @ParameterizedTest
  @CsvSource({
    "20, degC, 293.15",
    "-40, °C, 233.15",
    "-40, °F, 233.15",
    "32, degF, 273.15",
    "20, K, 20",
    "20, ddegF, 11.11111111111111",
    "491.67, degR, 273.15",
    "900, mm, 0.9",
    "1, rpm, 0.10471975511965977"
  })
  void valuesGoToSiAndBack(double value, String text, double si) {
    assertEquals(si, unit(text).toSi(value), Math.abs(si) * 1e-15);
    assertEquals(value, unit(text).fromSi(si), Math.abs(value) * 1e-14);
  }

  @Test
  void onlyAScaleWithItsOwnZeroIsAReading() {
    assertTrue(unit("degC").isReading());
    assertTrue(unit("°F").isReading());
    assertFalse(unit("K").isReading());
    assertFalse(unit("ddegC").isReading());
    assertFalse(unit("W/(m²·°C)").isReading());
    assertEquals(unit("J/(kg·K)").factor(), unit("J/(kg·degC)").factor());
    assertEquals(Factor.parse("9/5"), unit("1/degF").factor());
  }

  @ParameterizedTest
  @CsvSource({
    "rpm, rad/s",
    "krpm, rad/s",
    "deg, rad",
    "rev, rad",
    "in, m",
    "mil, m",
    "kWh, J",
    "kW·h, J",
    "MW·h, J",
    "hp·h, J",
    "lbf·ft, N·m",
    "ft·lbf, N·m",
    "kN·mm, N·m",
    "lb·ft², kg·m^2",
    "lbf·in·s², kg·m^2",
    "lbf·ft·s, N·m·s",
    "mm/rev, m/rad",
    "cm³/rev, m^3/rad",
    "degC, K",
    "degF, K",
    "ddegF, K",
    "kgf/cm², Pa",
    "lbf/in², Pa",
    "hp, W",
    "L/min, m^3/s",
    "km/h, m/s",
    "g0, m/s^2",
    "kn, m/s",
    "CPM, Hz",
    "cycle/h, Hz",
    "N·m/rpm, N·m·s/rad",
    "V/krpm, V·s/rad",
    "lb/in³, kg/m^3",
    "%, 1",
    "%/K, 1/K",
    "W/(m²·°C), W/(m^2·K)",
    "Btu/(h·ft²·°F), J/(s·m^2·K)",
    "Wh/kg, J/kg",
    "rev²/min², rad^2/s^2",
    "kg·m²/s, kg·m^2/s",
    "N·m, N·m"
  })
  void theCoherentUnitMeasuresTheSame(String text, String coherent) {
    Unit unit = unit(text);
    assertEquals(coherent, unit.coherent().toString());
    assertTrue(unit.coherent().factor().isOne());
    assertEquals(unit.dimension(), unit.coherent().dimension());
    assertEquals(unit.coherent(), unit.coherent().coherent());
  }

  @Test
  void aStatedKindDecidesTheCoherentUnit() {
    UnitText text = UnitReader.read("ft·lbf");
    assertEquals("N·m", serving(text, "torque").coherent().toString());
    assertEquals("torque", kinds(serving(text, "torque").coherent()));
    assertEquals("energy", kinds(serving(text, "energy").coherent()));
  }

  private static Unit serving(UnitText text, String kind) {
    return CATALOGUE.resolve(text, Kind.named(kind)).orElseThrow();
  }

  @ParameterizedTest
  @CsvSource({
    "N·m, energy, true",
    "J, torque, false",
    "mm, radius, true",
    "lb·in, torque, false",
    "Hz, angular_velocity, false",
    "1/s, frequency, false",
    "rpm, frequency, false",
    "W/(m²·K), torque, false",
    "kg·m², flywheel_effect, true",
    "K, temperature, true"
  })
  void aUnitServesSomeKindsOnly(String text, String kind, boolean serves) {
    Optional<Unit> unit = CATALOGUE.resolve(UnitReader.read(text), Kind.named(kind));
    assertEquals(serves, unit.isPresent());
    unit.ifPresent(serving -> assertEquals(List.of(Kind.named(kind)), serving.kinds()));
  }

  @ParameterizedTest
  @CsvSource({
    // GD² stated with the weight: the number in kgf·m² is the number in kg·m² (trade practice)
    "kgf·m², 1",
    "kgf·cm², 1/10000",
    "kg·m², 1",
    "lbf·ft², 6584392202157/156250000000000",
    // newtons of weight over standard gravity
    "N·m², 20000/196133"
  })
  void aFlywheelEffectMayBeStatedWithTheWeight(String text, String factor) {
    Unit unit = serving(UnitReader.read(text), "flywheel_effect");
    assertEquals(factor, unit.factor().toString());
    assertEquals(Kind.named("flywheel_effect").dimension(), unit.dimension());
    assertEquals("kg·m^2", unit.coherent().toString());
  }

  @ParameterizedTest
  @MethodSource("kindsOfQuantity")
  void everyKindHasAUsualUnitThatServesIt(Kind kind) {
    Unit usual = CATALOGUE.usual(kind);
    assertEquals(List.of(kind), usual.kinds());
    assertEquals(kind.dimension(), usual.dimension());
    for (Unit unit : CATALOGUE.unitsOf(kind)) {
      assertEquals(kind.dimension(), unit.dimension());
    }
  }

  @ParameterizedTest
  @MethodSource("kindsOfQuantity")
  void multiplesOfAUsualUnitKeepTheKind(Kind kind) {
    Unit usual = CATALOGUE.usual(kind);
    for (double si = 1e-12; si < 1e12; si *= 10) {
      assertEquals(List.of(kind), CATALOGUE.readable(usual, si).kinds());
    }
  }

  static Stream<Kind> kindsOfQuantity() {
    return Kind.all().stream();
  }

  @ParameterizedTest
  @CsvSource({
    "torque, 3500, kN·m",
    "torque, 350, N·m",
    "torque, -3500, kN·m",
    "torque, 0.35, mN·m",
    "torque, 0, N·m",
    "energy, 10291530, MJ",
    "length, 0.35, mm",
    "length, 1, m",
    "length, 999.9, m",
    "length, 1000, km",
    "radius, 0.05, mm",
    "stress, 187032100, MPa",
    "area, 0.0002, mm^2",
    "area, 2, m^2",
    "volume, 0.0028, L",
    "angular_momentum, 36398, kN·m·s",
    "angular_momentum, 36, kg·m^2/s",
    "frequency, 25, Hz",
    "frequency, 25000, kHz",
    "time, 0.02, ms",
    "time, 72000, s",
    "mass, 0.012, g",
    "mass, 5200, kg",
    // these stay as they are
    "rotational_inertia, 0.00003, kg·m^2",
    "angular_velocity, 62831, rad/s",
    "angle, 0.0032, rad",
    "density, 7850, kg/m^3",
    "temperature, 293, degC"
  })
  void resultsAreShownAtAReadableSize(String kind, double si, String shown) {
    Unit usual = CATALOGUE.usual(Kind.named(kind));
    assertEquals(shown, CATALOGUE.readable(usual, si).toString());
  }

  @ParameterizedTest
  @CsvSource({"kN·mm, 3500000", "lbf·ft, 3500000", "W/(m²·K), 5000000", "J/kg, 1e9"})
  void aUnitThatTheAuthorChoseIsNotExchanged(String text, double si) {
    assertEquals(unit(text), CATALOGUE.readable(unit(text), si));
  }

  @ParameterizedTest
  @CsvSource(
      quoteCharacter = '~',
      value = {
        "N-m, N·m",
        "ft-lbf, ft·lbf",
        "in-lbf, lbf·in",
        "\", in",
        "', ft",
        "oz-in/A, ozf·in/A",
        "#m, lb",
        "g's, g0",
        "/s, 1/s",
        "kg·m², kg·m^2",
        "~ rpm ~, rpm"
      })
  void looseSpellingsAreReadInHeadings(String heading, String unit) {
    assertEquals(unit, CATALOGUE.resolveHeading(heading).toString());
  }

  @Test
  void rowsHaveNamesInWords() {
    assertEquals(Optional.of("pound-force foot"), CATALOGUE.name(UnitReader.read("lbf·ft")));
    assertEquals(Optional.of("newton metre"), CATALOGUE.name(UnitReader.read("Nm")));
    assertEquals(Optional.empty(), CATALOGUE.name(UnitReader.read("W/(m²·K)")));
  }

  @Test
  void anUnknownSymbolIsNamed() {
    var unknown = assertThrows(UnknownUnitException.class, () -> unit("kg·qx"));
    assertEquals("qx", unknown.symbol());
    assertEquals(List.of(), unknown.near());
  }
}
