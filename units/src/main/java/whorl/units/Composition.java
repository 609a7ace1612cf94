package whorl.units;

import java.util.List;
import java.util.Optional;
import java.util.function.UnaryOperator;

/**
 * The members of a unit, all found in the catalogue.
 *
 * @param members in the order of the text; those behind the solidus with negative exponents
 */
record Composition(List<Member> members) {

  /** Copies the members. */
  Composition {
    members = List.copyOf(members);
  }

  /** Whether this is one symbol, as {@code kN}, and no product, power or quotient. */
  boolean isSymbol() {
    return members.size() == 1 && members.get(0).exponent() == 1;
  }

  /** Whether a member is a scale with a zero of its own. */
  boolean hasReading() {
    for (Member member : members) {
      if (member.row().isReading()) {
        return true;
      }
    }
    return false;
  }

  /** The same with each member exchanged. */
  Composition with(UnaryOperator<Member> exchange) {
    return new Composition(members.stream().map(exchange).toList());
  }

  /** The first member, of a unit that has any. */
  Member first() {
    return members.get(0);
  }

  Factor factor() {
    return members.stream().map(Member::factor).reduce(Factor.ONE, Factor::times);
  }

  Dimension dimension() {
    return members.stream().map(Member::dimension).reduce(Dimension.ONE, Dimension::times);
  }

  /** Equal for the same members in the same order, whatever aliases and slashes were written. */
  String key() {
    var exponents = new Exponents();
    for (Member member : members) {
      exponents.add(member.symbol(), member.exponent());
    }
    return exponents.inOrder();
  }

  /** As {@link #key()} without regard to prefixes. */
  String keyWithoutPrefixes() {
    var exponents = new Exponents();
    for (Member member : members) {
      exponents.add(member.row().symbol(), member.exponent());
    }
    return exponents.inOrder();
  }

  /** As {@link #key()} without regard to the order of the members. */
  String keyInAnyOrder() {
    var exponents = new Exponents();
    for (Member member : members) {
      exponents.add(member.symbol(), member.exponent());
    }
    return exponents.sorted();
  }

  /**
   * Equal for products of the same build, as {@code kN·mm} and {@code lbf·ft}: members exchanged
   * for others of the same kind, in any order. Empty for a single symbol, which says itself what it
   * measures, and where like is divided by like, as in {@code mm/m}, of which the members tell
   * nothing.
   */
  Optional<String> build() {
    var over = new Exponents();
    var under = new Exponents();
    for (Member member : members) {
      (member.exponent() > 0 ? over : under).add(member.exchange(), member.exponent());
    }
    return isSymbol() || members.isEmpty() || over.sharesNameWith(under)
        ? Optional.empty()
        : Optional.of(over.sorted() + "/ " + under.sorted());
  }
}
