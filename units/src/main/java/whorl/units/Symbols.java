package whorl.units;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.jspecify.annotations.Nullable;

/**
 * What single symbols mean. The longest exact symbol wins before a prefix with a symbol: {@code
 * min} is a minute and no milli-inch, {@code cd} a candela and no centiday.
 */
final class Symbols {

  /** Words take no prefix symbols: {@code ml} and {@code msec} are written, {@code mmetre} not. */
  private static final int LONGEST_PREFIXABLE_ALIAS = 3;

  private final Map<String, CatalogueRow> rows = new HashMap<>();

  Symbols(List<CatalogueRow> catalogue) {
    for (CatalogueRow row : catalogue) {
      if (row.isSymbol()) {
        add(row.symbol(), row);
      }
      for (UnitText alias : row.aliases()) {
        if (alias.isSymbol()) {
          add(alias.over().get(0).symbol(), row);
        }
      }
    }
  }

  /** The first row with a symbol is its usual meaning; two units may not share one. */
  private void add(String symbol, CatalogueRow row) {
    CatalogueRow earlier = rows.putIfAbsent(symbol, row);
    if (earlier != null && !earlier.text().plain().equals(row.text().plain())) {
      throw new IllegalStateException(
          "the symbol " + symbol + " stands for " + earlier.text() + " and for " + row.text());
    }
  }

  /** All symbols and aliases, without prefixes. */
  Set<String> all() {
    return rows.keySet();
  }

  /** Whether a symbol is known, alone or behind a prefix. */
  boolean knows(String symbol) {
    return !members(symbol).isEmpty();
  }

  /**
   * The members that a symbol stands for: itself, or those of the product of which it is an alias.
   * Empty if it is unknown.
   */
  List<Member> members(String written) {
    String symbol = written.replace('µ', 'μ');
    @Nullable CatalogueRow row = rows.get(symbol);
    if (row != null) {
      return row.isSymbol() ? List.of(new Member(row, Prefix.NONE, 1)) : members(row.text());
    }
    for (int length = 1; length <= Math.min(Prefix.LONGEST, symbol.length() - 1); length++) {
      @Nullable Prefix prefix = Prefix.of(symbol.substring(0, length));
      @Nullable CatalogueRow unit = prefix == null ? null : prefixable(symbol.substring(length));
      if (prefix != null && unit != null) {
        return List.of(new Member(unit, prefix, 1));
      }
    }
    return List.of();
  }

  private @Nullable CatalogueRow prefixable(String symbol) {
    @Nullable CatalogueRow row = rows.get(symbol);
    boolean fits =
        row != null
            && row.prefixable()
            && (row.symbol().equals(symbol) || symbol.length() <= LONGEST_PREFIXABLE_ALIAS);
    return fits ? row : null;
  }

  /** The members of a text of known symbols; empty if one is unknown. */
  private List<Member> members(UnitText text) {
    List<Member> all = new ArrayList<>();
    for (UnitText.Power power : text.members()) {
      List<Member> members = members(power.symbol());
      if (members.isEmpty()) {
        return List.of();
      }
      members.forEach(member -> all.add(member.power(power.exponent())));
    }
    return all;
  }
}
