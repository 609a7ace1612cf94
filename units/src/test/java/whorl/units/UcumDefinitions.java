package whorl.units;

import java.io.IOException;
import java.io.InputStream;
import java.math.BigDecimal;
import java.util.Map;
import java.util.Objects;
import org.fhir.ucum.BaseUnit;
import org.fhir.ucum.Component;
import org.fhir.ucum.DefinedUnit;
import org.fhir.ucum.ExpressionParser;
import org.fhir.ucum.Operator;
import org.fhir.ucum.Symbol;
import org.fhir.ucum.Term;
import org.fhir.ucum.UcumException;
import org.fhir.ucum.UcumModel;
import org.fhir.ucum.definitions.XmlDefinitionsParser;

/**
 * Exact sizes of UCUM codes, from the definitions of the standard (ucum-essence.xml, version 1.9)
 * as an independent library reads them, and by the library's parser. The arithmetic is ours, since
 * that of the library keeps only as many digits as its operands have.
 */
final class UcumDefinitions {

  /** A size in coherent SI units, with its dimension. */
  record Size(Factor factor, Dimension dimension) {

    static Size of(String factor, String dimension) {
      return new Size(Factor.parse(factor), Dimension.of(dimension));
    }

    Size times(Size other) {
      return new Size(factor.times(other.factor), dimension.times(other.dimension));
    }

    Size power(int exponent) {
      return new Size(factor.power(exponent), dimension.power(Rational.of(exponent)));
    }
  }

  /** UCUM has the gram, the radian and the coulomb for base units. */
  private static final Map<String, Size> BASES =
      Map.of(
          "m", Size.of("1", "L"),
          "s", Size.of("1", "T"),
          "g", Size.of("0.001", "M"),
          "rad", Size.of("1", "1"),
          "K", Size.of("1", "Th"),
          "C", Size.of("1", "I T"),
          "cd", Size.of("1", "J"));

  private final UcumModel model;

  UcumDefinitions() {
    try (InputStream definitions =
        Objects.requireNonNull(UcumModel.class.getResourceAsStream("/ucum-essence.xml"))) {
      model = new XmlDefinitionsParser().parse(definitions);
    } catch (IOException | UcumException e) {
      throw new IllegalStateException("the definitions of UCUM cannot be read", e);
    }
  }

  Size size(String code) throws UcumException {
    return size(new ExpressionParser(model).parse(code));
  }

  private Size size(Component component) throws UcumException {
    if (component instanceof Symbol symbol) {
      return size(symbol);
    }
    if (component instanceof org.fhir.ucum.Factor number) {
      return Size.of(Integer.toString(number.getValue()), "1");
    }
    return size((Term) component);
  }

  /** The library nests what stands on the right of an operator; UCUM works from left to right. */
  private Size size(Term first) throws UcumException {
    Size size = first.hasComp() ? size(first.getComp()) : Size.of("1", "1");
    for (Term term = first; term.hasTerm(); term = term.getTerm()) {
      boolean divided = term.hasOp() && term.getOp() == Operator.DIVISION;
      size = size.times(size(term.getTerm().getComp()).power(divided ? -1 : 1));
    }
    return size;
  }

  private Size size(Symbol symbol) throws UcumException {
    Size size = size(symbol.getUnit());
    if (symbol.hasPrefix()) {
      size = new Size(exact(symbol.getPrefix().getValue().asDecimal()), Dimension.ONE).times(size);
    }
    return size.power(symbol.getExponent());
  }

  private Size size(org.fhir.ucum.Unit unit) throws UcumException {
    if (unit instanceof BaseUnit) {
      return Objects.requireNonNull(BASES.get(unit.getCode()), unit.getCode());
    }
    if (unit.getCode().equals("[pi]")) {
      return Size.of("pi", "1");
    }
    var value = ((DefinedUnit) unit).getValue();
    return new Size(exact(value.getValue().asDecimal()), Dimension.ONE)
        .times(size(value.getUnit()));
  }

  private static Factor exact(String decimal) {
    return Factor.of(Rational.of(new BigDecimal(decimal)));
  }
}
