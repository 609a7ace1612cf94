package whorl.units;

import java.util.HashMap;
import java.util.Map;
import org.jspecify.annotations.Nullable;

/** An SI prefix (SI Brochure, 9th edition, table 7), or none. */
enum Prefix {
  NONE("", "", 0),
  QUETTA("quetta", "Q", 30),
  RONNA("ronna", "R", 27),
  YOTTA("yotta", "Y", 24),
  ZETTA("zetta", "Z", 21),
  EXA("exa", "E", 18),
  PETA("peta", "P", 15),
  TERA("tera", "T", 12),
  GIGA("giga", "G", 9),
  MEGA("mega", "M", 6),
  KILO("kilo", "k", 3),
  HECTO("hecto", "h", 2),
  DECA("deca", "da", 1),
  DECI("deci", "d", -1),
  CENTI("centi", "c", -2),
  MILLI("milli", "m", -3),
  /** Written with the Greek letter; the micro sign and {@code u} are read too. */
  MICRO("micro", "μ", -6),
  NANO("nano", "n", -9),
  PICO("pico", "p", -12),
  FEMTO("femto", "f", -15),
  ATTO("atto", "a", -18),
  ZEPTO("zepto", "z", -21),
  YOCTO("yocto", "y", -24),
  RONTO("ronto", "r", -27),
  QUECTO("quecto", "q", -30);

  /** Length of the longest symbol, {@code da}. */
  static final int LONGEST = 2;

  private static final Map<String, Prefix> BY_SYMBOL = bySymbol();

  private final String word;
  private final String symbol;
  private final int powerOfTen;

  Prefix(String word, String symbol, int powerOfTen) {
    this.word = word;
    this.symbol = symbol;
    this.powerOfTen = powerOfTen;
  }

  private static Map<String, Prefix> bySymbol() {
    Map<String, Prefix> prefixes = new HashMap<>();
    for (Prefix prefix : values()) {
      prefixes.put(prefix.symbol, prefix);
    }
    prefixes.put("u", MICRO);
    prefixes.remove("");
    return prefixes;
  }

  /** The prefix with a symbol; null if there is none. */
  static @Nullable Prefix of(String symbol) {
    return BY_SYMBOL.get(symbol);
  }

  String word() {
    return word;
  }

  String symbol() {
    return symbol;
  }

  int powerOfTen() {
    return powerOfTen;
  }

  Factor factor() {
    return Factor.of(Rational.of(10).power(powerOfTen));
  }
}
