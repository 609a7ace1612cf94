package whorl.units.kind;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import whorl.units.Rational;

/**
 * A factor of a product that may be of another kind than its author stated, with which the product
 * is of a kind wanted: a length that is a radius, or a plain number that lacks its unit.
 *
 * @param factor its text
 * @param kind that it may be of
 */
record CloserKind(String factor, Kind kind) {

  /** A factor whose kind the author may name closer, as a radius is a length. */
  static Optional<CloserKind> narrower(List<Powered> factors, List<Kind> wanted) {
    return first(factors, CloserKind::narrower, wanted);
  }

  private static Stream<Kind> narrower(Operand operand) {
    Readings readings = operand.readings();
    return isFixed(operand)
        ? Stream.empty()
        : Kind.all().stream()
            .filter(kind -> !kind.isInternal() && !kind.has(Kind.Mark.ASIDE))
            .filter(kind -> kind.parent().map(Readings::of).filter(readings::equals).isPresent());
  }

  /** A plain number that may lack its unit, as 9.81 does. */
  static Optional<CloserKind> lackingUnit(List<Powered> factors, List<Kind> wanted) {
    return first(factors, CloserKind::withUnit, wanted);
  }

  private static Stream<Kind> withUnit(Operand operand) {
    boolean number = operand.readings().all(Reading::isPlainNumber) && !isFixed(operand);
    return number
        ? Kind.all().stream().filter(kind -> kind.has(Kind.Mark.PLAIN) && !kind.dimension().isOne())
        : Stream.empty();
  }

  /** Whole numbers and fractions of one count or divide; π is a number. */
  private static boolean isFixed(Operand operand) {
    return operand.readings().equals(Readings.PI)
        || operand
            .value()
            .filter(value -> value.isInteger() || value.compareTo(Rational.ONE) < 0)
            .isPresent();
  }

  private interface Candidates {
    Stream<Kind> of(Operand operand);
  }

  private static Optional<CloserKind> first(
      List<Powered> factors, Candidates candidates, List<Kind> wanted) {
    for (int i = 0; i < factors.size(); i++) {
      Powered factor = factors.get(i);
      int place = i;
      Optional<Kind> kind =
          candidates
              .of(factor.operand())
              .filter(other -> makes(factors, place, other, wanted))
              .findFirst();
      if (kind.isPresent()) {
        return kind.map(other -> new CloserKind(factor.key().toString(), other));
      }
    }
    return Optional.empty();
  }

  private static boolean makes(List<Powered> factors, int place, Kind kind, List<Kind> wanted) {
    List<Powered> replaced = new ArrayList<>(factors);
    Powered factor = factors.get(place);
    replaced.set(place, new Powered(factor.key(), Operand.of(kind), factor.exponent()));
    return Repair.isOf(KindAlgebra.product(replaced), wanted);
  }

  /** What to write into the bracket behind the name, as {@code [m, radius]}. */
  String bracket() {
    return "[" + Readings.of(kind).unit() + ", " + kind.words() + "]";
  }
}
