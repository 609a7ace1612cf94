package whorl.report;

import java.util.ArrayList;
import java.util.Map;
import java.util.regex.Matcher;

/**
 * Sets a formula in HTML with inline styles. A long sum breaks in front of a sign; only a product
 * that is long by itself breaks too, in front of a dot. Type keeps its size.
 */
final class FormulaHtml implements Layout.Cases<Html> {
  /** Longest product, in characters of its plain text, that is kept on one line. */
  private static final int LONGEST_UNBROKEN = 36;

  private static final String NO_BREAK = "\u00A0";
  private static final String THIN = "\u2009";
  private static final Map<String, String> SMALL_FRACTIONS =
      Map.ofEntries(
          Map.entry("1/2", "½"),
          Map.entry("1/3", "⅓"),
          Map.entry("2/3", "⅔"),
          Map.entry("1/4", "¼"),
          Map.entry("3/4", "¾"),
          Map.entry("1/5", "⅕"),
          Map.entry("2/5", "⅖"),
          Map.entry("3/5", "⅗"),
          Map.entry("4/5", "⅘"),
          Map.entry("1/6", "⅙"),
          Map.entry("5/6", "⅚"),
          Map.entry("1/8", "⅛"),
          Map.entry("3/8", "⅜"),
          Map.entry("5/8", "⅝"),
          Map.entry("7/8", "⅞"));

  private FormulaHtml() {}

  /** A formula in its own face and size. */
  static Html of(Layout layout) {
    return Html.styled("span", Look.FORMULA, set(layout));
  }

  /** Digits and units, whose raised characters become markup, so that all are of one cut. */
  static Html value(String text) {
    var pieces = new ArrayList<Html>();
    int done = 0;
    Matcher run = Superscript.RUN.matcher(text);
    while (run.find()) {
      pieces.add(Html.text(text.substring(done, run.start())));
      String raised = Superscript.lowered(run.group());
      pieces.add(Html.styled("sup", Look.RAISED, Html.text(raised)));
      done = run.end();
    }
    pieces.add(Html.text(text.substring(done)));
    return Html.all(pieces);
  }

  private static Html set(Layout layout) {
    return layout.match(new FormulaHtml());
  }

  private static boolean isLong(Layout layout) {
    return FormulaText.of(layout).length() > LONGEST_UNBROKEN;
  }

  @Override
  public Html symbol(Layout.Symbol symbol) {
    return symbol.subscript().isEmpty()
        ? base(symbol)
        : Html.styled(
            "span",
            Look.UNBROKEN,
            base(symbol),
            Html.styled("sub", Look.LOWERED, Html.text(symbol.subscript())));
  }

  private static Html base(Layout.Symbol symbol) {
    String style =
        switch (symbol.face()) {
          case ITALIC -> Look.ITALIC;
          case BOLD_ITALIC -> Look.BOLD_ITALIC;
          case UPRIGHT -> Look.UPRIGHT;
        };
    if (symbol.face() == Layout.Face.UPRIGHT) {
      return Html.text(symbol.base());
    }
    // Only the letter slopes; digits behind it stay upright.
    int digits = symbol.base().length();
    while (digits > 1 && Character.isDigit(symbol.base().charAt(digits - 1))) {
      digits--;
    }
    return Html.all(
        Html.styled("i", style, Html.text(symbol.base().substring(0, digits))),
        Html.text(symbol.base().substring(digits)));
  }

  @Override
  public Html upright(Layout.Upright upright) {
    return value(upright.text());
  }

  @Override
  public Html measure(Layout.Measure measure) {
    return Html.styled(
        "span",
        Look.UNBROKEN,
        set(measure.value()),
        value(Amount.gap(measure.unit()) + measure.unit()));
  }

  @Override
  public Html side(Layout.SideBySide side) {
    return Html.all(side.pieces().stream().map(FormulaHtml::set).toList());
  }

  @Override
  public Html terms(Layout.Terms terms) {
    var pieces = new ArrayList<Html>();
    for (Layout.Term term : terms.terms()) {
      Html value = set(term.value());
      if (pieces.isEmpty()) {
        pieces.add(Html.styled("span", Look.TERM, Html.text(term.sign()), value));
      } else {
        pieces.add(Html.text(" "));
        pieces.add(Html.styled("span", Look.TERM, Html.text(term.sign() + NO_BREAK), value));
      }
    }
    return Html.all(pieces);
  }

  @Override
  public Html product(Layout.Product product) {
    boolean breaks = isLong(product);
    var pieces = new ArrayList<Html>();
    Layout before = null;
    for (Layout.Factor factor : product.factors()) {
      if (before != null) {
        String sign = sign(before, factor);
        if (breaks) {
          pieces.add(Html.text(" " + (sign.isEmpty() ? "·" : sign) + NO_BREAK));
        } else if (sign.isEmpty()) {
          pieces.add(Html.text(THIN));
        } else {
          pieces.add(Html.text(NO_BREAK + sign + NO_BREAK));
        }
      }
      pieces.add(set(factor.value()));
      before = factor.value();
    }
    Html all = Html.all(pieces);
    return breaks ? all : Html.styled("span", Look.UNBROKEN, all);
  }

  /** The sign between two factors; none where a thin space says it all. */
  private static String sign(Layout before, Layout.Factor factor) {
    return switch (factor.joint()) {
      case CROSS -> "×";
      case DOT -> "·";
      case TIMES -> {
        Edge left = Edge.trailing(before);
        Edge right = Edge.leading(factor.value());
        if (left == Edge.DIGIT && right == Edge.DIGIT) {
          yield "×";
        }
        yield left == Edge.WORD || right == Edge.WORD || right == Edge.DIGIT ? "·" : "";
      }
    };
  }

  @Override
  public Html fraction(Layout.Fraction fraction) {
    String small = SMALL_FRACTIONS.get(FormulaText.of(fraction));
    if (small != null) {
      return Html.styled("span", Look.SMALL_FRACTION, Html.text(small));
    }
    if (!fraction.stacked()) {
      return Html.styled(
          "span",
          Look.UNBROKEN,
          parenthesised(fraction.over(), Layout.Binding.PRODUCT),
          Html.text("/"),
          parenthesised(fraction.under(), Layout.Binding.SIGN));
    }
    boolean groupOver = fraction.over().binding().compareTo(Layout.Binding.PRODUCT) < 0;
    boolean groupUnder = fraction.under().binding().compareTo(Layout.Binding.SIGN) < 0;
    return Html.styled(
        "span",
        Look.FRACTION,
        Html.styled(
            "span",
            Look.OVER,
            unseen(groupOver ? "(" : ""),
            set(fraction.over()),
            unseen((groupOver ? ")" : "") + "/")),
        Html.styled(
            "span",
            Look.UNDER,
            unseen(groupUnder ? "(" : ""),
            set(fraction.under()),
            unseen(groupUnder ? ")" : "")));
  }

  private static Html parenthesised(Layout layout, Layout.Binding needed) {
    return layout.binding().compareTo(needed) < 0
        ? Html.all(Html.text("("), set(layout), Html.text(")"))
        : set(layout);
  }

  private static Html unseen(String text) {
    return text.isEmpty() ? Html.NONE : Html.styled("span", Look.UNSEEN, Html.text(text));
  }

  @Override
  public Html raised(Layout.Raised raised) {
    Html exponent = set(raised.exponent());
    if (raised.base() instanceof Layout.Symbol symbol && !symbol.subscript().isEmpty()) {
      return Html.styled(
          "span",
          Look.UNBROKEN,
          base(symbol),
          Html.styled(
              "span",
              Look.SCRIPTS,
              Html.styled("sup", Look.SCRIPT, exponent),
              Html.styled("sub", Look.SCRIPT, Html.text(symbol.subscript()))));
    }
    return Html.styled(
        "span",
        Look.UNBROKEN,
        parenthesised(raised.base(), Layout.Binding.ATOM),
        Html.styled("sup", Look.RAISED, exponent));
  }

  @Override
  public Html root(Layout.Root root) {
    boolean group = root.radicand().binding() != Layout.Binding.ATOM;
    return Html.styled(
        "span",
        Look.UNBROKEN,
        Html.styled("span", Look.ROOT, Html.text(root.cube() ? "∛" : "√")),
        Html.styled(
            "span",
            Look.RADICAND,
            unseen(group ? "(" : ""),
            set(root.radicand()),
            unseen(group ? ")" : "")));
  }

  @Override
  public Html bars(Layout.Bars bars) {
    return Html.all(unseen("|"), Html.styled("span", Look.BARS, set(bars.body())), unseen("|"));
  }

  @Override
  public Html group(Layout.Group group) {
    var pieces = new ArrayList<Html>();
    pieces.add(Html.text("("));
    String comma = "";
    for (Layout member : group.members()) {
      pieces.add(Html.text(comma));
      pieces.add(set(member));
      comma = ", ";
    }
    pieces.add(Html.text(")"));
    Html all = Html.all(pieces);
    return isLong(group) ? all : Html.styled("span", Look.UNBROKEN, all);
  }

  @Override
  public Html branches(Layout.Branches branches) {
    var lines = new ArrayList<Html>();
    for (Layout.Branch branch : branches.branches()) {
      lines.add(line(set(branch.value()), Html.all(Html.text("if "), set(branch.condition()))));
    }
    lines.add(line(set(branches.otherwise()), Html.text("otherwise")));
    return Html.styled("span", Look.BRANCHES, Html.all(lines));
  }

  private static Html line(Html value, Html condition) {
    return Html.styled(
        "span", Look.LINE, value, Html.text(" "), Html.styled("span", Look.CONDITION, condition));
  }

  /** What a piece shows to its neighbour, which decides the sign between two factors. */
  private enum Edge {
    DIGIT,
    WORD,
    LETTER;

    static Edge leading(Layout layout) {
      return edge(layout, true);
    }

    static Edge trailing(Layout layout) {
      return edge(layout, false);
    }

    private static Edge edge(Layout layout, boolean leading) {
      if (layout instanceof Layout.Upright upright) {
        return Character.isDigit(upright.text().codePointAt(0)) ? DIGIT : WORD;
      }
      if (layout instanceof Layout.Measure measure) {
        return leading ? edge(measure.value(), true) : WORD;
      }
      if (layout instanceof Layout.Symbol symbol) {
        return symbol.face() == Layout.Face.UPRIGHT && symbol.base().length() > 1 ? WORD : LETTER;
      }
      if (layout instanceof Layout.SideBySide side) {
        Layout last = side.pieces().get(side.pieces().size() - 1);
        if (side.binding() == Layout.Binding.SIGN) {
          return edge(last, leading);
        }
        // A call starts with the name of its function and ends with a parenthesis.
        return last instanceof Layout.Group ? LETTER : WORD;
      }
      if (layout instanceof Layout.Raised raised) {
        return edge(raised.base(), leading) == DIGIT ? DIGIT : LETTER;
      }
      return LETTER;
    }
  }
}
