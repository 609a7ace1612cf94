package whorl.assist;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.util.List;
import java.util.stream.Collectors;
import whorl.report.Figure;
import whorl.report.Figures;
import whorl.report.InfoCard;
import whorl.report.InfoCard.Fact;
import whorl.units.Factor;
import whorl.units.Rational;
import whorl.units.Unit;
import whorl.units.UnitCatalogue;
import whorl.units.UnitText;
import whorl.units.kind.Kind;

/** What there is to say of a unit. */
final class UnitCard {
  private static final UnitCatalogue UNITS = UnitCatalogue.standard();
  private static final int DIGITS = 6;
  private static final int LONGEST_EXACT = 40;
  private static final int LONGEST_AT_A_GLANCE = 12;

  private UnitCard() {}

  static InfoCard of(UnitText text) {
    Unit unit = UNITS.resolve(text);
    return new InfoCard(
        text.typeset(),
        UNITS.guide().words(text),
        List.of(
            measures(unit),
            new Fact("size", size(unit)),
            Fact.of("source", String.join("; ", UNITS.guide().sources(text)))));
  }

  private static Fact measures(Unit unit) {
    return unit.kinds().isEmpty()
        ? Fact.of("in base units", unit.readings().unit())
        : Fact.of(
            "measures",
            unit.kinds().stream().map(Kind::words).distinct().collect(Collectors.joining(", ")));
  }

  private static List<String> size(Unit unit) {
    Unit coherent = unit.coherent();
    String symbol = unit.symbol();
    if (unit.isReading()) {
      String zero = Figures.of(unit.toSi(0), DIGITS).text();
      return List.of(
          "0 " + symbol + " is " + zero + " K", "one degree is " + exact(unit.factor()) + " K");
    }
    if (unit.factor().isOne()) {
      return List.of("coherent SI unit");
    }
    String exact = exact(unit.factor());
    Figure rounded = Figures.of(unit.factor().doubleValue(), DIGITS);
    if (rounded.exact() || exact.length() > LONGEST_EXACT) {
      return List.of(line(symbol, rounded.sign(), rounded.text(), coherent));
    }
    String whole = line(symbol, "=", exact, coherent);
    return exact.length() <= LONGEST_AT_A_GLANCE && isDecimal(unit.factor())
        ? List.of(whole)
        : List.of(whole, line(symbol, rounded.sign(), rounded.text(), coherent));
  }

  private static String line(String symbol, String sign, String number, Unit coherent) {
    String unit = coherent.text().equals(UnitText.ONE) ? "" : " " + coherent.symbol();
    return "1 " + symbol + " " + sign + " " + number + unit;
  }

  private static boolean isDecimal(Factor factor) {
    return factor.piExponent() == 0 && isDecimal(factor.coefficient());
  }

  /** A factor without rounding, as a decimal where it has an end. */
  private static String exact(Factor factor) {
    Rational size = factor.coefficient();
    if (isDecimal(size)) {
      String digits = decimal(size).stripTrailingZeros().toPlainString();
      return switch (factor.piExponent()) {
        case 0 -> digits;
        case 1 -> digits.equals("1") ? "π" : digits + "·π";
        case -1 -> digits + "/π";
        default -> digits + "·π^" + factor.piExponent();
      };
    }
    String over = size.numerator().toString();
    String under = size.denominator().toString();
    return switch (factor.piExponent()) {
      case 0 -> over + "/" + under;
      case 1 -> (over.equals("1") ? "π" : over + "·π") + "/" + under;
      case -1 -> over + "/(" + under + "·π)";
      default -> over + "/" + under + "·π^" + factor.piExponent();
    };
  }

  private static boolean isDecimal(Rational number) {
    BigInteger left = number.denominator();
    for (int prime : new int[] {2, 5}) {
      BigInteger divisor = BigInteger.valueOf(prime);
      while (left.mod(divisor).signum() == 0) {
        left = left.divide(divisor);
      }
    }
    return left.equals(BigInteger.ONE);
  }

  private static BigDecimal decimal(Rational number) {
    return new BigDecimal(number.numerator()).divide(new BigDecimal(number.denominator()));
  }
}
