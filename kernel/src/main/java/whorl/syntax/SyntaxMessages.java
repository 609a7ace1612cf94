package whorl.syntax;

import java.util.List;
import java.util.Locale;
import java.util.TreeSet;
import java.util.stream.Collectors;
import org.jspecify.annotations.Nullable;
import whorl.diagnostic.Diagnostic;
import whorl.diagnostic.Source;
import whorl.diagnostic.Span;
import whorl.units.UnitText;
import whorl.units.UnitText.Power;

/**
 * The messages about texts that cannot be read, all in one place so that their wording can be read
 * through. A method is named for the mistake; the code in it is the label in tables and tests.
 */
final class SyntaxMessages {
  private static final int LONGEST_QUOTE = 60;
  private static final int LONGEST_CODE = 150;

  private final Source source;

  SyntaxMessages(Source source) {
    this.source = source;
  }

  // ---- Pieces of text ----

  /** What is written at a place, unchanged. */
  String written(Span span) {
    return source.slice(span);
  }

  /** The words of a kind, joined by single blanks. */
  String kindWords(Span span) {
    return written(span).strip().replaceAll("\\s+", " ");
  }

  /** What is written at a place, on one line and cut where it is long. */
  private String text(Span span) {
    boolean cut = span.length() > LONGEST_QUOTE;
    Span shown = cut ? new Span(span.start(), span.start() + LONGEST_QUOTE) : span;
    String line = written(shown).replaceAll("[\\s\\p{Cntrl}]+", " ").strip();
    return cut ? line + "…" : line;
  }

  private String text(int start, int end) {
    return start < end ? text(new Span(start, end)) : "";
  }

  private String code(Span span) {
    return code(text(span));
  }

  private static String code(String text) {
    int length = text.codePointCount(0, text.length());
    boolean cut = length > LONGEST_CODE;
    return "`"
        + (cut ? text.substring(0, text.offsetByCodePoints(0, LONGEST_CODE)) + "…" : text)
        + "`";
  }

  /** A number or group with a unit behind it. */
  String behind(Span holder, UnitText unit) {
    return code(text(holder) + " " + unit.plain());
  }

  /** A unit in brackets. */
  String inBrackets(UnitText unit) {
    return code("[" + unit.plain() + "]");
  }

  private static Diagnostic message(
      String code, Span span, String problem, String reason, String fix) {
    return Diagnostic.of(code, problem, span, reason, fix);
  }

  // ---- Characters ----

  Diagnostic character(Span span, int c) {
    if (Characters.isDirectionMark(c)) {
      return message(
          "char-invisible",
          span,
          "An invisible mark that turns the direction of writing ("
              + codePoint(c)
              + ") stands here.",
          "With it a line can look different from what is calculated.",
          "Delete it, or type the line again");
    }
    Characters.Refused refused = Characters.refused(c);
    String shown = code(Character.toString(c));
    String instead = refused.instead();
    return switch (refused.flaw()) {
      case FULL_WIDTH ->
          message(
              "char-fullwidth",
              span,
              (instead.isBlank() ? "The blank here" : shown) + " is a full-width character.",
              "",
              instead.isBlank() ? "Type an ordinary blank" : "Type " + code(instead));
      case INVISIBLE ->
          message(
              "char-invisible",
              span,
              "An invisible character (" + codePoint(c) + ") stands here.",
              "",
              "Delete it, or type the words around it again");
      case FOREIGN_LETTER ->
          message(
              "char-letter",
              span,
              shown + " (" + name(c) + ") is no Latin or Greek letter.",
              "Names are written in Latin and Greek letters, digits and _.",
              instead.isEmpty() ? "" : "Type the Latin " + code(instead));
      case LOOK_ALIKE ->
          message(
              "char-lookalike",
              span,
              shown + " (" + name(c) + ") is not used here.",
              "",
              "Type " + code(instead));
      case LOWERED ->
          message(
              "char-subscript",
              span,
              "A lowered character cannot stand in a name.",
              "",
              "Type " + code(instead) + ": what follows the first _ is set as a subscript");
      case STRANGE -> strange(span, c, shown);
    };
  }

  private static Diagnostic strange(Span span, int c, String shown) {
    String fix =
        switch (c) {
          case ';' -> "Write one statement a line";
          case '\\' ->
              "Behind \\ the name of a letter and the Tab key give the letter: \\omega, Tab";
          case '!' -> "The opposite of a < b is written `a >= b`";
          case '$', '€', '£' -> "A price is a plain number here; say the currency in a remark";
          case '{', '}' -> "Group with ( and )";
          case '&' -> "Two conditions are joined by `and`";
          default -> "";
        };
    boolean printable = Character.isDefined(c) && Character.getType(c) != Character.SURROGATE;
    return message(
        "char", span, (printable ? shown : codePoint(c)) + " has no meaning in a sheet.", "", fix);
  }

  private static String codePoint(int c) {
    return String.format("U+%04X", c);
  }

  private static String name(int c) {
    String name = Character.getName(c);
    return name == null ? codePoint(c) : name.toLowerCase(Locale.ROOT);
  }

  Diagnostic accent(Span span) {
    return message(
        "char",
        span,
        "This letter with its accent is no single letter, so it cannot stand in a name.",
        "",
        "Write the accent as a word: `q_dot`; in a motion the rate of q is `q'`");
  }

  Diagnostic textOpen(Span span, boolean inches) {
    return message(
        "text-open",
        span,
        "The quotes are not closed on this line.",
        "",
        inches ? "Inches are written `in`; a text ends with \"" : "A text ends with \"");
  }

  Diagnostic textPlace(Span span) {
    return message(
        "text-place",
        span,
        "A text in quotes cannot stand here.",
        "It stands only as an argument of a call, as the name of a case, or as the name of a file.",
        "");
  }

  Diagnostic textTooLong(int longest) {
    return message(
        "size",
        new Span(longest, longest + 1),
        String.format(Locale.ROOT, "The text is longer than %,d characters.", longest),
        "",
        "Put long tables in a file: `data log from \"log.csv\": t [s], n [rpm]`");
  }

  Diagnostic tooManyStatements(Span span, int most) {
    return message(
        "size",
        span,
        String.format(Locale.ROOT, "The text has more than %,d statements.", most),
        "",
        "Put them into several cells");
  }

  // ---- Numbers ----

  Diagnostic numberPoint(Span span) {
    return message(
        "number-point",
        span,
        "A digit is missing behind the point.",
        "",
        "Write " + code(text(span) + "0"));
  }

  Diagnostic numberComma(Span span) {
    String written = text(span);
    return message(
        "number-comma",
        span,
        code(written) + " is no number: decimals stand behind a point.",
        "A comma separates values.",
        "Write "
            + code(written.replace(',', '.'))
            + ", or "
            + code(written.replace(",", ", "))
            + " for two values");
  }

  Diagnostic numberForm(Span span) {
    boolean points = text(span).indexOf('.') != text(span).lastIndexOf('.');
    return message(
        "number-form",
        span,
        code(span) + " is no number.",
        points ? "A number has one point." : "An underscore stands between two digits.",
        points ? "" : "Thousands may be set apart: `1_000_000`");
  }

  Diagnostic numberRange(Span span, double value) {
    return message(
        "number-range",
        span,
        code(span)
            + (value == 0
                ? " is too small to calculate with."
                : " is too large to calculate with."),
        "Numbers reach from about 1e-308 to 1e308.",
        "");
  }

  Diagnostic numberAfterNumber(Span whole, Span first, Span second) {
    String left = text(first);
    String right = text(second);
    String fix;
    if (left.endsWith("°")) {
      fix = "Degrees and minutes of arc are added, `30° + 15′`";
    } else if (right.equals("1")) {
      fix =
          "A unit per something is written with a negative power, "
              + code(left + " s^-1")
              + "; a product "
              + code(left + " * 1");
    } else {
      fix = "Write " + code(left + " * " + right) + " or " + code(left + " + " + right);
    }
    return message("number-number", whole, "Two numbers stand side by side.", "", fix);
  }

  Diagnostic raisedForm(Span span) {
    return message(
        "power-form",
        span,
        "A raised exponent is a sign and digits.",
        "",
        "Write `a²`, `a⁻¹`, or with a caret `a^2`, `a^-1`");
  }

  // ---- Units ----

  Diagnostic unknownUnit(
      Span span, String word, String usual, List<String> near, @Nullable Span holder) {
    String fix;
    if (!usual.isEmpty()) {
      fix = code(word) + " is written " + code(usual);
    } else if (!near.isEmpty()) {
      fix = "Near it: " + near.stream().map(SyntaxMessages::code).collect(Collectors.joining(", "));
    } else {
      fix = "";
    }
    if (holder != null && usual.isEmpty()) {
      String product = "to multiply by a name write " + code(text(holder) + " * " + word);
      fix = fix.isEmpty() ? capitalized(product) : fix + "; " + product;
    }
    return message("unit-unknown", span, code(word) + " is no unit.", "", fix);
  }

  private static String capitalized(String sentence) {
    return Character.toUpperCase(sentence.charAt(0)) + sentence.substring(1);
  }

  Diagnostic unitBlanks(Span gap, Span holder, Span unit) {
    return message(
        "unit-blanks",
        gap,
        "One blank at most stands between a number and its unit.",
        "",
        "Write " + code(text(holder) + " " + text(unit)));
  }

  Diagnostic unitOrName(
      Span whole, Span holder, Span word, Span factor, UnitText unit, String name) {
    // The operator is the sign in front of the factor.
    String product =
        text(holder.start(), factor.start() - 1)
            + " "
            + written(new Span(factor.start() - 1, factor.start()))
            + " "
            + text(factor);
    String joined = behind(holder, new UnitText(unit.members(), List.of()));
    return message(
            "unit-or-name",
            whole,
            code(whole)
                + " can be read in two ways: "
                + code(name)
                + " is also a name of this sheet.",
            "",
            "With the unit "
                + code(unit.plain())
                + " it is written "
                + joined
                + ", with the value of "
                + code(name)
                + " "
                + code(product))
        .with(word, "unit or name?");
  }

  Diagnostic secondWord(Span whole, Span left, Span word, boolean symbol) {
    String first = text(left);
    String second = text(word);
    if (isWordOfProduct(second)) {
      return message(
          "unit-second-word", whole, code(second) + " is no operator.", "", call(second));
    }
    String product =
        "a product with the value of " + code(second) + " " + code(first + " * " + second);
    return message(
        "unit-second-word",
        whole,
        code(second) + " follows a unit without a sign between.",
        "Behind a number a unit has no blanks inside.",
        symbol
            ? "The unit is written " + code(first + "·" + second) + ", " + product
            : capitalized(product.replaceFirst("` `", "` is written `")));
  }

  private static boolean isWordOfProduct(String word) {
    return word.equals("dot") || word.equals("cross");
  }

  private static String call(String product) {
    return "Write `" + product + "(a, b)`, or `a " + (product.equals("dot") ? "·" : "×") + " b`";
  }

  Diagnostic unitTwoSlashes(Span whole, String fixed) {
    return message("unit-two-slashes", whole, "A unit has one slash.", "", "Write " + fixed);
  }

  Diagnostic unitAfterSlash(Span whole, String fixed) {
    return message(
        "unit-after-slash",
        whole,
        "What is multiplied behind the slash of a unit needs parentheses.",
        "",
        "Write " + fixed + "; as a product, put blanks around the sign");
  }

  Diagnostic unitAfterSlashInBrackets(Span whole, String fixed) {
    return message(
        "unit-after-slash",
        whole,
        "What is multiplied behind the slash of a unit needs parentheses.",
        "",
        "Write " + fixed);
  }

  Diagnostic unitHyphen(Span whole, String fixed, Span left, Span word) {
    return message(
        "unit-hyphen",
        whole,
        "A hyphen does not join units.",
        "",
        "The unit is written " + fixed + ", a difference " + code(text(left) + " - " + text(word)));
  }

  Diagnostic unitHyphenInBrackets(Span whole, String fixed) {
    return message("unit-hyphen", whole, "A hyphen does not join units.", "", "Write " + fixed);
  }

  Diagnostic unitPowerForm(Span exponent) {
    return message(
        "unit-power",
        exponent,
        "The exponent of a unit is a whole number.",
        "",
        "Write `m^2` or `m^-1`; to raise the quantity, put it in parentheses: `(5 m)^x`");
  }

  Diagnostic unitPowerTwice(Span exponent) {
    return message(
        "unit-power",
        exponent,
        "A unit has one exponent.",
        "",
        "To raise the quantity, put it in parentheses: `(5 m^2)^3`");
  }

  Diagnostic unitPowerRange(Span exponent, int given, int highest) {
    return message(
        "unit-power",
        exponent,
        given == 0
            ? "An exponent of 0 leaves nothing of a unit."
            : "The exponent of a unit goes up to " + highest + ".",
        "",
        given == 0 ? "Leave the unit out" : "");
  }

  Diagnostic unitTooLong(Span unit, int longest) {
    return message(
        "unit-long",
        unit,
        "A unit is a product of at most " + longest + " symbols.",
        "",
        "Leave out the symbols that cancel");
  }

  Diagnostic unitPowerBlank(Span whole, Span number, Expr.UnitAt unit, Span exponent) {
    String value = text(number);
    String symbol = text(unit.span());
    String power = text(exponent).replace(" ", "");
    return message(
        "unit-power",
        whole,
        "A blank stands between the unit and its exponent, so it is open what is raised.",
        "",
        "Write "
            + code(value + " " + symbol + power)
            + " to raise the unit, "
            + code("(" + value + " " + symbol + ")" + power)
            + " to raise the quantity");
  }

  Diagnostic unitFraction(Span whole, Span left, Span number, Expr.UnitAt unit) {
    String over = text(left);
    String under = text(number);
    String symbol = text(unit.span());
    return message(
        "unit-fraction",
        whole,
        code(whole) + " can be read in two ways.",
        "A unit belongs to the number in front of it, here to " + code(under) + ".",
        "Write "
            + code("(" + over + "/" + under + ") " + symbol)
            + " or "
            + code(over + "/(" + under + " " + symbol + ")"));
  }

  Diagnostic unitExponent(Span whole, Span power, Span base, Span unit) {
    String written = text(power);
    String symbol = text(unit);
    boolean ten = text(base).equals("10") && written.matches("10\\^[+-]?[0-9]+");
    return message(
        "unit-exponent",
        whole,
        "An exponent has no unit.",
        "",
        "Write "
            + (ten ? code("1e" + written.substring(3) + " " + symbol) + " or " : "")
            + code("(" + written + ") " + symbol));
  }

  Diagnostic unitPlace(Span span) {
    String sign = text(span);
    return message(
        "unit-place",
        span,
        code(sign) + " stands behind no number.",
        sign.equals("%") ? "There is no remainder sign." : "",
        sign.equals("′")
            ? "A unit stands right behind a number; a rate is written `ω'`"
            : "A unit stands right behind a number, `5 " + sign + "`");
  }

  // ---- Brackets ----

  Diagnostic bracketPlace(Span span) {
    return message(
        "bracket-place",
        span,
        "A unit in brackets cannot stand here.",
        "Brackets stand behind the name that is defined, and at the end of a line that shows.",
        "Write " + code("x " + text(span) + " = …") + " to define a value in this unit");
  }

  Diagnostic bracketBehindNumber(Span span, Span number) {
    String bracket = text(span);
    String unit = bracket.replaceAll("[\\[\\]]", "").strip();
    String tight = unit.startsWith("1") ? "" : code(text(number) + " " + unit) + ", or ";
    return message(
        "bracket-place",
        span,
        "Behind a number a unit stands without brackets.",
        "",
        "Write " + tight + code("x " + bracket + " = …") + " to define a value in this unit");
  }

  Diagnostic bracketForm(Span span) {
    return message(
        "bracket-form",
        span,
        text(span).equals("]")
            ? "In front of `]` a unit is missing."
            : code(span) + " cannot stand here in a unit.",
        "",
        "Write `[N·m]`, `[W/(m²·K)]`, `[1/s]`, or `[1]` for a plain number");
  }

  Diagnostic bracketNumber(Span span) {
    return message(
        "bracket-form",
        span,
        "A unit in brackets has no number but a single 1.",
        "",
        "Write `[1/s]`, or `[1]` for a plain number");
  }

  Diagnostic bracketKind(Span span) {
    return message(
        "bracket-form",
        span,
        "Behind the comma the kind of quantity is missing.",
        "",
        "Name it, `[N·m, energy]`, or leave the comma out");
  }

  Diagnostic bracketOfNumber(Span whole, Span shown, Expr value, UnitText unit) {
    String number = text(shown);
    boolean single = value instanceof Expr.Numeral || value instanceof Expr.Vector;
    String behind = single ? number : "(" + number + ")";
    return message(
        "bracket-number",
        whole,
        code(number) + " has no unit that could be shown in another.",
        "",
        "To give it the unit write "
            + code(behind + " " + shownUnit(unit))
            + ", or define a name: "
            + code("x [" + unit.plain() + "] = " + number));
  }

  /** A unit as it stands behind a number, where nothing can be in front of a slash but a symbol. */
  private static String shownUnit(UnitText unit) {
    if (!unit.over().isEmpty()) {
      return unit.plain();
    }
    var powers = unit.under().stream().map(p -> new Power(p.symbol(), -p.exponent())).toList();
    return powers.isEmpty() ? "%" : new UnitText(powers, List.of()).plain();
  }

  Diagnostic bracketOfTable(Span span) {
    return message(
        "bracket-place",
        span,
        "A table has no unit of its own.",
        "",
        "Give each column its unit: `sweep = vary n from 0 rpm to 900 rpm by 90 rpm: E [J]`");
  }

  Diagnostic bracketOfAttitude(Span span) {
    return message(
        "bracket-place",
        span,
        "How a body starts has no single unit.",
        "",
        "Write the units behind the numbers: `wheel starts spin (0, 0, 120) rad/s`");
  }

  // ---- Parentheses and bars ----

  Diagnostic open(Span span, String opener, String closer) {
    return message(
        "paren-open",
        span,
        "This " + code(opener) + " is not closed.",
        "",
        "Close it with " + code(closer) + " where the group ends");
  }

  Diagnostic closeWithoutOpen(Span span, String closer) {
    String opener = closer.equals(")") ? "(" : "[";
    return message(
        "paren-close",
        span,
        "This " + code(closer) + " closes nothing.",
        "",
        "Delete it, or put the missing " + code(opener) + " in front");
  }

  Diagnostic emptyGroup(Span span) {
    return message(
        "operand", span, "Nothing stands between the parentheses.", "", "Put a value between them");
  }

  Diagnostic vectorSize(Span span, int parts) {
    return message(
        "vector-size",
        span,
        "A vector has three parts, but here are " + parts + ".",
        "",
        parts == 2
            ? "Write `(x, y, 0)` in a plane; decimals stand behind a point, `1.5`"
            : "Write `(x, y, z)`; decimals stand behind a point, `1.5`");
  }

  Diagnostic barOpen(Span span) {
    return message(
        "bars-open", span, "This bar is not closed.", "", "Write `|v|` for the magnitude of v");
  }

  Diagnostic barsNest(Span span, Span outer) {
    return message(
            "bars-nest",
            span,
            "Bars do not stand inside bars: it could not be told which close.",
            "",
            "Write `abs(x)` for one of them, or define the inner part with a name")
        .with(outer, "opened here");
  }

  Diagnostic barsTouch(Span span) {
    return message(
        "implied-product",
        span,
        "Between two magnitudes a sign is missing.",
        "",
        "Write `|a| * |b|`");
  }

  // ---- Operands and operators ----

  Diagnostic operand(Span span) {
    return message(
        "operand",
        span,
        "In front of " + code(span) + " a value is missing.",
        "",
        text(span).equals("+-") || text(span).equals("±")
            ? code(span)
                + " is the sign of a tolerance, `412 ± 2`; for a product with a negative"
                + " number write `5 * (-3)`"
            : "");
  }

  Diagnostic unfinished(Span span) {
    return message(
        "unfinished",
        span,
        "The line ends behind " + code(span) + ", where a value is missing.",
        "",
        "Go on here or on the next line");
  }

  Diagnostic impliedProduct(Span span, Span left, Span right) {
    String a = text(left);
    String b = text(right);
    String words = "Multiplication is always written out.";
    if (b.equals("x") || b.equals("X")) {
      return message(
          "implied-product",
          span,
          "Between " + code(a) + " and " + code(b) + " a sign is missing.",
          words,
          "Write "
              + code(a + " * " + b)
              + "; the sign of a product is `*`, that of two vectors `×`");
    }
    if (isWordOfProduct(b)) {
      return message("implied-product", span, code(b) + " is no operator.", "", call(b));
    }
    return message(
        "implied-product",
        span,
        "Between " + code(a) + " and " + code(b) + " a sign is missing.",
        words,
        "Write " + code(a + " * " + b + restOf(right)));
  }

  /** What an operand goes on with that begins with a parenthesis, a bar or a call. */
  private String restOf(Span begin) {
    if (text(begin).equals("|")) {
      return "…|";
    }
    if (text(begin).equals("(")) {
      return "…)";
    }
    boolean call = written(new Span(begin.end(), begin.end() + 1)).equals("(");
    return call ? "(…)" : "";
  }

  Diagnostic callBlank(Span span, Span name) {
    String word = text(name);
    return message(
        "call-blank",
        span,
        "A blank stands between " + code(word) + " and the parenthesis.",
        "",
        "A call is written " + code(word + "(…)") + ", a product " + code(word + " * (…)"));
  }

  Diagnostic operatorForeign(Span span, String operator) {
    String fix =
        switch (operator) {
          case "**" -> "A power is written `a^2`";
          case "==" ->
              "Write `check a = b within 1 %` to compare with a worked value, `a <= b` for a"
                  + " limit, `a = b` behind `so that`";
          case "!=", "≠", "<>" -> "There is no unequal: say what must hold, `a < b` or `a > b`";
          case "=<" -> "At most is written `<=`";
          case "=>" -> "At least is written `>=`";
          case "||" ->
              "One of two conditions is written `a or b`; a product of magnitudes" + " `|a| * |b|`";
          case "&&" -> "Two conditions are joined by `and`";
          case ":=" -> "A definition is written with `=`";
          default -> "A division is written `a / b`; a remark begins with #";
        };
    return message(
        "operator-foreign", span, code(operator) + " is no sign of this language.", "", fix);
  }

  Diagnostic not(Span span) {
    return message(
        "operator-foreign",
        span,
        "There is no `not`.",
        "",
        "Turn the comparison round: not a < b is written `a >= b`");
  }

  Diagnostic compareChain(Span span, Span left, Span middle) {
    String between = text(middle);
    String again = text(middle.end(), span.end());
    return message(
        "compare-chain",
        span,
        "A comparison has two sides.",
        "",
        "Write " + code(text(left.start(), middle.end()) + " and " + between + " " + again + " …"));
  }

  Diagnostic powerChain(Span span) {
    return message(
        "power-chain",
        span,
        "Raised digits and a caret stand together, so it is open what is raised.",
        "",
        "Use one of them, and parentheses: `(a^2)^3` or `a^(2^3)`");
  }

  Diagnostic toleranceChain(Span span) {
    return message(
        "tolerance-chain",
        span,
        "A value has one tolerance.",
        "",
        "Add the parts to one, `412 ± (2 + 1)`, or write `(412 ± 2) + (0 ± 1)` for two that are"
            + " independent");
  }

  Diagnostic toleranceSum(Span span, Span value, Span half, Span sign) {
    String a = text(value);
    String b = text(half);
    String more = " " + text(sign) + " …";
    return message(
        "tolerance-sum",
        span,
        "It is open what is added to the tolerance and what to the value.",
        "",
        "Write "
            + code(a + " ± (" + b + more + ")")
            + " or "
            + code("(" + a + " ± " + b + ")" + more));
  }

  Diagnostic tolerancePercent(Span span, Expr.Numeral value, Expr.Numeral half) {
    double fraction = value.value() / 100;
    return message(
        "tolerance-percent",
        span,
        "It is open whether the tolerance is in percentage points or relative.",
        "",
        "Write "
            + code("(" + value.digits() + " ± " + half.digits() + ") %")
            + " for points, "
            + code(
                String.format(Locale.ROOT, "%.6g", fraction).replaceAll("0+$", "")
                    + " ± "
                    + half.digits()
                    + " %")
            + " for a share of the value");
  }

  Diagnostic coverageCall(Span span) {
    return message(
        "coverage",
        span,
        code(span) + " can be a call or a tolerance with its coverage factor.",
        "",
        "Put a blank in front of the factor, `± u (k = 2)`; a call goes in parentheses, "
            + code("± (" + text(span) + ")"));
  }

  Diagnostic coverageForm(Span span) {
    return message(
        "coverage", span, "The coverage factor is a number above 0.", "", "Write `(k = 2)`");
  }

  // ---- Names, parts and calls ----

  Diagnostic reserved(Span span, String word) {
    var words = new TreeSet<>(Words.STATEMENTS);
    words.addAll(Words.INNER);
    return message(
        "reserved",
        span,
        code(word) + " is a word of the language and cannot be a name.",
        "Taken are: " + String.join(", ", words) + ".",
        "Choose another name, " + code(word + "_1") + " for example");
  }

  Diagnostic constant(Span span) {
    return message(
        "constant",
        span,
        code(span) + " is a constant and keeps its value.",
        "",
        "Choose another name, " + code(text(span) + "_1") + " for example");
  }

  Diagnostic partOfNumber(Span span, Span owner) {
    return message(
        "number-part",
        span,
        code(owner) + " has no parts.",
        "",
        "Units are joined by ·, `N·m`, and decimals stand right behind the point");
  }

  Diagnostic partForm(Span dot, Span owner, Token word) {
    String part = word.is(Token.Kind.NAME) ? text(word.span()) : "mass";
    return message(
        "part",
        dot,
        "A part stands right behind its point, and the point right behind the name.",
        "",
        "Write " + code(text(owner) + "." + part) + " without blanks");
  }

  Diagnostic callOfPart(Span span, Span owner, Span name) {
    return message(
        "call-part",
        span,
        "A call does not stand behind a point.",
        "",
        "Write " + code(text(name) + "(" + text(owner) + ", …)"));
  }

  Diagnostic prime(Span span, boolean twice, boolean number) {
    String fix;
    if (number) {
      fix = "Feet are written `ft`, minutes of arc `arcmin`";
    } else if (twice) {
      fix = "Give the rate a name of its own: `x' = v`, then `v' = …`";
    } else {
      fix = "A rate is written in a motion, `ω' = T / I`, and read from its course, `run.ω'`";
    }
    return message(
        "prime",
        span,
        twice ? "A prime stands once." : "A prime cannot stand here.",
        twice ? "" : "It marks the rate of a quantity that changes in a motion.",
        fix);
  }

  Diagnostic argumentTwice(Span span, String name) {
    return message(
        "call-twice",
        span,
        "The argument " + code(name) + " is given twice.",
        "",
        "Leave one of them out");
  }

  Diagnostic argumentOrder(Span span) {
    return message(
        "call-order",
        span,
        "An argument without a name stands behind one with a name.",
        "",
        "Put it in front of the named ones, or give it its name too");
  }

  Diagnostic depth(Span span, int deepest) {
    return message(
        "depth",
        span,
        "The formula is nested more than " + deepest + " deep here.",
        "",
        "Define its inner parts with names of their own");
  }

  Diagnostic choiceInside(Span span) {
    return message(
        "operand",
        span,
        "A choice inside a formula needs parentheses.",
        "",
        "Write `(if a < b then 1 else 2)`");
  }

  Diagnostic choiceWithoutThen(Span span) {
    return message(
        "if-then",
        span,
        "Behind the condition `then` is missing.",
        "",
        "Write `if a < b then 1 else 2`");
  }

  Diagnostic choiceWithoutElse(Span span) {
    return message(
        "if-else",
        span,
        "The choice says nothing for the other case: `else` is missing.",
        "",
        "Write `if a < b then 1 else 2`");
  }

  // ---- Statements ----

  Diagnostic expected(Span span, String wanted, boolean atEnd) {
    String problem =
        atEnd
            ? "Behind " + code(span) + " something is missing: " + wanted + "."
            : "In the place of " + code(span) + " this is needed: " + wanted + ".";
    return message("expected", span, problem, "", "");
  }

  Diagnostic trailing(Span span) {
    return message(
        "trailing",
        span,
        code(span) + " cannot follow here.",
        "",
        text(span).equals("with") ? "`with` stands in a definition: `x = E with n = 1.2*n`" : "");
  }

  Diagnostic assignmentPlace(Span span) {
    return message(
        "assign",
        span,
        "`=` cannot stand here.",
        "It stands behind the one name, or function with its parameters, that a line defines.",
        "To compare write `check a = b within 1 %`, or `a <= b`");
  }

  Diagnostic nothingDone(Span line, Span head) {
    String name = text(head);
    String value = text(head.end(), line.end());
    return message(
        "nothing-done",
        line,
        "Nothing is done here.",
        "",
        code(name + " = " + value) + " defines, " + code(name) + " alone shows");
  }

  Diagnostic lineOperator(Span span, @Nullable Span line) {
    return message(
        "line-operator",
        span,
        "A line does not begin with " + code(span) + ".",
        "",
        "To go on with the line above, move "
            + code(span)
            + " to its end"
            + (line == null ? "" : "; to show a value, write " + code("(" + text(line) + ")")));
  }

  Diagnostic parameterForm(Span span) {
    return message(
        "function-parameter",
        span,
        "Between the parentheses of a definition stand names, with their units in brackets.",
        "",
        "Write `f(x [m], k) [N] = …`");
  }

  Diagnostic parameterTwice(Span span, String name) {
    return message(
        "function-parameter",
        span,
        "The parameter " + code(name) + " stands twice.",
        "",
        "Give one of them another name");
  }

  Diagnostic headEmpty(Span span) {
    return message(
        "head-empty",
        span,
        "The head of a function published from Java is empty.",
        "",
        "Write its name, its parameters and the unit of its result: `f(x [m], k) [N]`");
  }

  Diagnostic headWithoutParameters(Span name) {
    return message(
        "head-form",
        name,
        "A function published from Java has parentheses behind its name.",
        "",
        "Write "
            + code(text(name) + "(x [m], k) [N]")
            + ", or "
            + code(text(name) + "() [N]")
            + " if it takes nothing");
  }

  Diagnostic headWithFormula(Span equals, Span head) {
    return message(
        "head-form",
        equals,
        "No formula follows the head of a function published from Java.",
        "It is worked out by the Java code that is published with the head.",
        "Write " + code(head));
  }

  Diagnostic headWithoutUnit(Span head) {
    return message(
        "head-form",
        head.behind(),
        "The unit of the result is missing.",
        "A number from Java says nothing of its unit.",
        "Write it in brackets behind the head: "
            + code(text(head) + " [N]")
            + ", or `[1]` for a plain number");
  }

  Diagnostic checkWithin(Span span, Span line) {
    return message(
        "check-within",
        span,
        "A check of a worked value says how near it must be.",
        "",
        "Write " + code(text(line) + " within 1 %") + ", or compare with <= or >=");
  }

  Diagnostic rangeForm(Span name) {
    String input = text(name);
    return message(
        "expected",
        name,
        "Behind " + code(input) + " its values are missing.",
        "",
        "Write " + code(input + " from 0 to 10 by 1") + " or " + code(input + " over 1, 2, 5"));
  }

  Diagnostic reviewOfSomething(Span span) {
    return message(
        "implied-product",
        span,
        "`review` stands alone: it goes through the whole sheet.",
        "",
        "Delete " + code(span));
  }

  Diagnostic rowWithoutLabel(Span span) {
    return message(
        "cases-row",
        span,
        "A case begins with its name.",
        "",
        "Write `rough 6.0, 7.0`, or a name in quotes, `\"sea state 4\" 6.0, 7.0`");
  }

  Diagnostic rowLabelLikeCall(Span span, Span label) {
    return message(
        "cases-row",
        span,
        "The name of the case and its first value look like a call.",
        "",
        "Put a blank between: " + code(text(label) + " (…)"));
  }

  Diagnostic rowSize(Span row, int values, int columns) {
    return message(
        "cases-row",
        row,
        "The row has " + count(values, "value") + " for " + count(columns, "column") + ".",
        "",
        values < columns ? "Add what is missing, with commas between" : "");
  }

  private static String count(int number, String noun) {
    return number + " " + noun + (number == 1 ? "" : "s");
  }

  Diagnostic motionLine(Span span) {
    return message(
        "motion-line",
        span,
        "This is no line of a motion.",
        "",
        "Write `ω starts 0 rpm`, `ω' = T / I`, `I * ω' = T`, `(I*ω)' = T`, `x = …`,"
            + " `stop when …`, `within 2 min`, `body … about …` or `load …`");
  }

  Diagnostic blockEmpty(Span head, String wanted) {
    return message(
        "block-empty",
        head,
        "Below this line something is missing: " + wanted + ".",
        "",
        "Indent the lines that belong to it");
  }

  Diagnostic blockUneven(Span indent, Span first) {
    return message(
            "block-uneven",
            indent,
            "This line is indented differently from the first of its block.",
            "",
            "Indent all lines of a block alike")
        .with(first, "the first");
  }

  Diagnostic indent(Span indent) {
    return message(
        "indent",
        indent,
        "This line is indented but belongs to no block.",
        "",
        "Begin it at the margin; to go on with the line above, end that line in an operator or a"
            + " comma");
  }

  Diagnostic indentMixed(Span indent) {
    return message(
        "indent-mixed",
        indent,
        "Tabs and blanks are mixed in front of this line.",
        "",
        "Use one of them");
  }
}
