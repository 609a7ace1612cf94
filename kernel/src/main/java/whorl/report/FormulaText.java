package whorl.report;

import java.util.List;
import java.util.stream.Collectors;

/** Sets a formula in one line of plain text, as {@code 1/2·m·(D/2)²}. */
final class FormulaText implements Layout.Cases<String> {
  private static final char NO_BREAK = '\u00A0';

  private FormulaText() {}

  static String of(Layout layout) {
    return TextWrap.plain(breakable(layout));
  }

  /** The same with marks where a line may break, and no-break spaces where it may not. */
  static String breakable(Layout layout) {
    return layout.match(new FormulaText());
  }

  @Override
  public String symbol(Layout.Symbol symbol) {
    return symbol.subscript().isEmpty()
        ? symbol.base()
        : symbol.base() + "_" + symbol.subscript().replace(", ", "_");
  }

  @Override
  public String upright(Layout.Upright upright) {
    return upright.text();
  }

  @Override
  public String measure(Layout.Measure measure) {
    return breakable(measure.value()) + Amount.gap(measure.unit()) + measure.unit();
  }

  @Override
  public String side(Layout.SideBySide side) {
    return side.pieces().stream().map(FormulaText::breakable).collect(Collectors.joining());
  }

  @Override
  public String terms(Layout.Terms terms) {
    var text = new StringBuilder();
    for (Layout.Term term : terms.terms()) {
      if (text.length() > 0) {
        text.append(' ').append(term.sign()).append(NO_BREAK);
      } else {
        text.append(term.sign());
      }
      text.append(breakable(term.value()));
    }
    return text.toString();
  }

  @Override
  public String product(Layout.Product product) {
    var text = new StringBuilder();
    for (Layout.Factor factor : product.factors()) {
      if (text.length() > 0) {
        text.append(sign(factor.joint()));
      }
      text.append(breakable(factor.value()));
    }
    return text.toString();
  }

  private static String sign(Layout.Joint joint) {
    return switch (joint) {
      case TIMES -> TextWrap.MAY_BREAK + "·";
      case CROSS -> " ×" + NO_BREAK;
      case DOT -> " ·" + NO_BREAK;
    };
  }

  @Override
  public String fraction(Layout.Fraction fraction) {
    String over = over(fraction);
    String under = under(fraction);
    // A solidus between short parts is not worth a line end.
    boolean grouped = over.endsWith(")") || under.startsWith("(");
    return over + (grouped ? TextWrap.MAY_BREAK : "") + "/" + under;
  }

  private static String over(Layout.Fraction fraction) {
    return in(fraction.over(), Layout.Binding.PRODUCT);
  }

  private static String under(Layout.Fraction fraction) {
    return in(fraction.under(), Layout.Binding.SIGN);
  }

  private static String in(Layout layout, Layout.Binding needed) {
    return layout.binding().compareTo(needed) < 0
        ? "(" + breakable(layout) + ")"
        : breakable(layout);
  }

  @Override
  public String raised(Layout.Raised raised) {
    String exponent = breakable(raised.exponent());
    String base = breakable(raised.base());
    if (Superscript.covers(exponent)) {
      return base + Superscript.of(exponent);
    }
    return base + "^" + in(raised.exponent(), Layout.Binding.ATOM);
  }

  @Override
  public String root(Layout.Root root) {
    return (root.cube() ? "∛" : "√") + in(root.radicand(), Layout.Binding.ATOM);
  }

  @Override
  public String bars(Layout.Bars bars) {
    return "|" + breakable(bars.body()) + "|";
  }

  @Override
  public String group(Layout.Group group) {
    String members =
        group.members().stream().map(FormulaText::breakable).collect(Collectors.joining(", "));
    // Named arguments hold together, so they may need a line of their own.
    String open = members.contains(FormulaLayout.NAMED) ? "(" + TextWrap.MAY_BREAK : "(";
    return open + members + ")";
  }

  @Override
  public String branches(Layout.Branches branches) {
    List<String> parts =
        branches.branches().stream()
            .map(
                branch ->
                    "if " + breakable(branch.condition()) + " then " + breakable(branch.value()))
            .toList();
    return String.join(" else ", parts) + " else " + breakable(branches.otherwise());
  }
}
