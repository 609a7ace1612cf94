package whorl.units;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.regex.Pattern;
import org.jspecify.annotations.Nullable;

/**
 * Codes of the Unified Code for Units of Measure (UCUM, case-sensitive form) for the units of the
 * catalogue, both ways.
 *
 * <p>A row that has a code of its own is exchanged for it as a whole; other products go member by
 * member. A numeric factor has no place in a unit: it is taken up by a prefix where it can be.
 */
final class UcumCodes implements UcumReader.Atoms {

  /** A number that is no power: at the start or behind an operator, with a member to go with. */
  private static final Pattern NUMBER = Pattern.compile("(^|[./(])[0-9]+[*./]|[./][0-9]+$");

  private final UnitCatalogue catalogue;
  private final Map<String, CatalogueRow> byCode = new HashMap<>();

  /** Codes that no other notation could express, since a unit has no numeric factors. */
  private final List<String> numericCodes = new ArrayList<>();

  UcumCodes(UnitCatalogue catalogue, List<CatalogueRow> rows) {
    this.catalogue = catalogue;
    for (CatalogueRow row : rows) {
      for (String code : row.ucum()) {
        byCode.putIfAbsent(code, row);
        if (NUMBER.matcher(code).find()) {
          numericCodes.add(code);
        }
      }
    }
  }

  /**
   * The unit of a code.
   *
   * @throws UnitSyntaxException if there is none
   */
  UnitText read(String code) {
    @Nullable CatalogueRow row = byCode.get(code);
    return row == null ? new UcumReader(code, this).unit() : row.text();
  }

  @Override
  public @Nullable UnitText unit(String code) {
    @Nullable CatalogueRow row = byCode.get(code);
    if (row != null) {
      return row.text();
    }
    for (int length = 1; length <= Math.min(Prefix.LONGEST, code.length() - 1); length++) {
      @Nullable Prefix prefix = Prefix.of(code.substring(0, length));
      @Nullable CatalogueRow unit = byCode.get(code.substring(length));
      if (prefix != null && unit != null && unit.prefixable()) {
        return UnitText.of(prefix.symbol() + unit.symbol());
      }
    }
    return null;
  }

  @Override
  public String numericCode(String code, int start) {
    String longest = "";
    for (String candidate : numericCodes) {
      int end = start + candidate.length();
      boolean whole =
          end == code.length() || (end < code.length() && "./)".indexOf(code.charAt(end)) >= 0);
      if (whole && candidate.length() > longest.length() && code.startsWith(candidate, start)) {
        longest = candidate;
      }
    }
    return longest;
  }

  @Override
  public boolean takesPrefix(String symbol) {
    Composition composition = catalogue.composition(UnitText.of(symbol));
    return composition.isSymbol()
        && composition.first().prefix() == Prefix.NONE
        && composition.first().row().prefixable();
  }

  /** The code of a unit; empty if a member has none. */
  Optional<String> write(UnitText text) {
    Optional<String> ofRow =
        catalogue.rowWrittenAs(text).map(CatalogueRow::ucum).flatMap(UcumCodes::first);
    return ofRow.or(() -> memberByMember(catalogue.composition(text)));
  }

  private static Optional<String> first(List<String> codes) {
    return codes.stream().findFirst();
  }

  private static Optional<String> memberByMember(Composition composition) {
    var over = new StringBuilder();
    var under = new StringBuilder();
    for (Member member : composition.members()) {
      Optional<String> code = power(member);
      if (code.isEmpty()) {
        return Optional.empty();
      }
      if (member.exponent() > 0) {
        over.append(over.length() == 0 ? "" : ".").append(code.get());
      } else {
        under.append('/').append(code.get());
      }
    }
    return Optional.of(over.append(under).toString());
  }

  /** A member with the size of its exponent. */
  private static Optional<String> power(Member member) {
    Optional<String> known = first(member.row().ucum());
    if (known.isEmpty()) {
      return known;
    }
    String prefix = member.prefix() == Prefix.MICRO ? "u" : member.prefix().symbol();
    String code = prefix + known.get();
    int exponent = Math.abs(member.exponent());
    boolean atom = UcumReader.isAtom(code);
    if (exponent == 1) {
      return Optional.of(atom || member.exponent() > 0 ? code : "(" + code + ")");
    }
    return atom ? Optional.of(code + exponent) : Optional.empty(); // UCUM raises atoms only
  }
}
