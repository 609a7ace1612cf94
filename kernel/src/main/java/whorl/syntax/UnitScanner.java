package whorl.syntax;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.function.Predicate;
import org.jspecify.annotations.Nullable;
import whorl.diagnostic.Diagnostic;
import whorl.diagnostic.Span;
import whorl.syntax.Token.Kind;
import whorl.units.UnitText;
import whorl.units.UnitText.Power;

/**
 * Reads units: tight behind a number or a group, where it tells where the unit ends and the formula
 * goes on, and in brackets.
 */
final class UnitScanner {
  /** A unit has no more symbols than this, each counted as often as its exponent says. */
  private static final int HIGHEST_DEGREE = 200;

  private final Cursor cursor;
  private final SyntaxMessages messages;
  private final Predicate<String> names;
  private final UnitWords units;
  private final List<UnitWord> unitWords;

  /**
   * A reader at a cursor.
   *
   * @param names the names that a word may mean
   * @param unitWords takes the words that are read as units because no such name exists
   */
  UnitScanner(
      Cursor cursor,
      SyntaxMessages messages,
      Predicate<String> names,
      UnitWords units,
      List<UnitWord> unitWords) {
    this.cursor = cursor;
    this.messages = messages;
    this.names = names;
    this.units = units;
    this.unitWords = unitWords;
  }

  /** The unit tight behind a number, if one stands there. */
  Expr.@Nullable UnitAt behindNumber(Span number) {
    Token word = cursor.peek();
    if (!couldBegin(word)) {
      return null;
    }
    if (!units.knows(word.text())) {
      boolean product = word.is(Kind.NAME) && (isName(word) || word.text().equals("x"));
      throw cursor.refusal(
          product
              ? messages.impliedProduct(number.to(word.span()), number, word.span())
              : unknown(word, number));
    }
    return tight(number);
  }

  /** The unit tight behind the closing parenthesis of a group or vector, if one stands there. */
  Expr.@Nullable UnitAt behindGroup(Span group) {
    Token word = cursor.peek();
    if (!couldBegin(word)) {
      return null;
    }
    if (!units.knows(word.text())) {
      throw cursor.refusal(
          word.is(Kind.NAME)
              ? messages.impliedProduct(group.to(word.span()), group, word.span())
              : unknown(word, group));
    }
    return tight(group);
  }

  /** Whether the next word would be read as a unit behind a number. */
  boolean isAhead() {
    return couldBegin(cursor.peek()) && units.knows(cursor.peek().text());
  }

  /** Whether a word is the symbol of a unit. */
  boolean isSymbol(Token word) {
    return units.knows(word.text());
  }

  /** Whether a word is a name of the sheet, or of the function or motion at hand. */
  boolean isName(Token word) {
    return word.is(Kind.NAME) && names.test(word.name().name());
  }

  private Diagnostic unknown(Token word, @Nullable Span holder) {
    return messages.unknownUnit(
        word.span(),
        word.text(),
        units.usualSpelling(word.text()),
        units.near(word.text()),
        holder);
  }

  private boolean couldBegin(Token word) {
    if (word.opensLine()) {
      return false;
    }
    if (word.is(Kind.UNIT_SIGN)) {
      return true;
    }
    return word.isFreeName() && !isCall(0) && !isWordOfStatement(word);
  }

  private boolean isCall(int ahead) {
    Token behind = cursor.peek(ahead + 1);
    return behind.is(Kind.OPEN) && cursor.peek(ahead).touches(behind);
  }

  /** Words with a meaning behind a complete value are no units, but {@code in} mostly is one. */
  private boolean isWordOfStatement(Token word) {
    if (word.isWord("in")) {
      return cursor.peek(1).is(Kind.NUMBER) && cursor.peek(2).isWord("steps");
    }
    return Words.CONTEXTUAL.contains(word.text());
  }

  // bare = product1 [ "/" ( factor | "(" product1 ")" ) ], no blank inside
  private Expr.UnitAt tight(Span holder) {
    Token first = cursor.peek();
    Span gap = holder.gapTo(first.span());
    if (gap.length() > 1) {
      throw cursor.refusal(messages.unitBlanks(gap, holder, first.span()));
    }
    var text = new TightText(holder);
    text.factor(text.over, false);
    text.product(text.over);
    text.solidus();
    text.refuseWhatFollows();
    return text.finish(first.span());
  }

  /** Whether a symbol of a unit stands right behind the token in front of it. */
  private boolean symbolAt(int ahead) {
    Token word = cursor.peek(ahead);
    if (!cursor.peek(ahead - 1).touches(word)) {
      return false;
    }
    if (word.is(Kind.UNIT_SIGN)) {
      return units.knows(word.text());
    }
    return word.isFreeName()
        && (word.isWord("in") || !Words.CONTEXTUAL.contains(word.text()))
        && units.knows(word.text())
        && !isCall(ahead)
        && !hasPart(ahead);
  }

  /** Whether a word goes on as only a name does, with a part or a prime: {@code rotor.mass}. */
  private boolean hasPart(int ahead) {
    Token word = cursor.peek(ahead);
    Token behind = cursor.peek(ahead + 1);
    if (!word.touches(behind)) {
      return false;
    }
    if (behind.is(Kind.PRIME)) {
      return true;
    }
    Token part = cursor.peek(ahead + 2);
    return behind.is(Kind.DOT) && part.is(Kind.NAME) && !units.knows(part.text());
  }

  private static boolean isJoin(Token token) {
    return token.is(Kind.RAISED_DOT) || token.is(Kind.DOT) || token.is(Kind.TIMES);
  }

  /**
   * A word of a unit that a name of the sheet would turn into a factor.
   *
   * @param factor the factor of the formula that it would be or stand in
   */
  private record OpenWord(String name, Span word, Span factor) {}

  /** A unit that stands tight, as far as it was read. */
  private final class TightText {
    private final Span holder;
    private final List<Power> over = new ArrayList<>();
    private final List<Power> under = new ArrayList<>();

    /** The words behind {@code *} or {@code /}. */
    private final List<OpenWord> open = new ArrayList<>();

    TightText(Span holder) {
      this.holder = holder;
    }

    private void factor(List<Power> members, boolean behindOperator) {
      Token symbol = cursor.take();
      members.add(new Power(symbol.text(), tightExponent(symbol)));
      if (behindOperator && symbol.is(Kind.NAME)) {
        Span factor = symbol.span().to(cursor.previous().span());
        open.add(new OpenWord(symbol.name().name(), symbol.span(), factor));
      }
    }

    private int tightExponent(Token symbol) {
      Token sign = cursor.peek();
      if (!symbol.touches(sign) || !(sign.is(Kind.CARET) || sign.is(Kind.RAISED))) {
        return 1;
      }
      int exponent = exponent(true);
      Token again = cursor.peek();
      if (cursor.previous().touches(again) && (again.is(Kind.CARET) || again.is(Kind.RAISED))) {
        throw cursor.refusal(messages.unitPowerTwice(exponentSpan()));
      }
      return exponent;
    }

    // product1 = factor { ("·" | "." | "*") factor }
    private void product(List<Power> members) {
      while (joins()) {
        boolean operator = cursor.take().is(Kind.TIMES);
        factor(members, operator);
      }
    }

    private boolean joins() {
      Token join = cursor.peek();
      return isJoin(join) && cursor.previous().touches(join) && symbolAt(1);
    }

    private boolean divides() {
      Token slash = cursor.peek();
      return slash.is(Kind.OVER) && cursor.previous().touches(slash);
    }

    private void solidus() {
      if (!divides()) {
        return;
      }
      if (symbolAt(1)) {
        cursor.take();
        factor(under, true);
      } else if (isGroupOfSymbols()) {
        cursor.take();
        Span opened = cursor.take().span();
        int first = open.size();
        factor(under, true);
        while (!cursor.at(Kind.CLOSE)) {
          cursor.take();
          factor(under, true);
        }
        Span group = opened.to(cursor.take().span());
        // Taken for a formula, the group would count as a whole.
        open.subList(first, open.size())
            .replaceAll(word -> new OpenWord(word.name(), word.word(), group));
      }
    }

    /** Whether {@code /(} and symbols joined without blanks up to {@code )} stand here. */
    private boolean isGroupOfSymbols() {
      int ahead = 1;
      if (!cursor.peek(ahead).is(Kind.OPEN) || !cursor.peek().touches(cursor.peek(ahead))) {
        return false;
      }
      while (symbolAt(ahead + 1)) {
        ahead = behindExponent(ahead + 2);
        Token next = cursor.peek(ahead);
        if (!cursor.peek(ahead - 1).touches(next)) {
          return false;
        }
        if (next.is(Kind.CLOSE)) {
          return true;
        }
        if (!isJoin(next)) {
          return false;
        }
      }
      return false;
    }

    private int behindExponent(int ahead) {
      if (cursor.peek(ahead).is(Kind.RAISED)) {
        return ahead + 1;
      }
      if (!cursor.peek(ahead).is(Kind.CARET)) {
        return ahead;
      }
      Token sign = cursor.peek(ahead + 1);
      int number = ahead + (sign.is(Kind.MINUS) || sign.is(Kind.PLUS) ? 2 : 1);
      return cursor.peek(number).is(Kind.NUMBER) ? number + 1 : ahead;
    }

    private boolean goesOn() {
      return joins() || (divides() && symbolAt(1));
    }

    /** Refuses what would go on with the unit although a unit has ended. */
    private void refuseWhatFollows() {
      if (!under.isEmpty() && goesOn()) {
        boolean twoSlashes = divides();
        while (goesOn()) {
          cursor.take();
          factor(under, false);
        }
        Span whole = holder.to(cursor.previous().span());
        var fixed = new UnitText(over, merged(under));
        throw cursor.refusal(
            twoSlashes
                ? messages.unitTwoSlashes(whole, messages.behind(holder, fixed))
                : messages.unitAfterSlash(whole, messages.behind(holder, fixed)));
      }
      Token hyphen = cursor.peek();
      if (hyphen.is(Kind.MINUS) && cursor.previous().touches(hyphen) && symbolAt(1)) {
        Token word = cursor.peek(1);
        var joined = new ArrayList<>(over);
        joined.add(new Power(word.text(), 1));
        var fixed = new UnitText(joined, under);
        if (!isName(word) || units.isRow(fixed)) {
          Span left = holder.to(cursor.previous().span());
          throw cursor.refusal(
              messages.unitHyphen(
                  left.to(word.span()), messages.behind(holder, fixed), left, word.span()));
        }
      }
    }

    private Expr.UnitAt finish(Span first) {
      UnitText text = sized(new UnitText(over, under), first.to(cursor.previous().span()));
      if (!open.isEmpty() && !units.isRow(text)) {
        for (OpenWord word : open) {
          if (names.test(word.name())) {
            Span whole = holder.to(word.factor());
            throw cursor.refusal(
                messages.unitOrName(whole, holder, word.word(), word.factor(), text, word.name()));
          }
        }
        open.forEach(word -> unitWords.add(new UnitWord(word.name(), word.word())));
      }
      return new Expr.UnitAt(first.to(cursor.previous().span()), text);
    }
  }

  /** The exponent of a symbol, which begins here with a caret or is raised. */
  private int exponent(boolean tight) {
    Span whole = exponentSpan();
    String digits;
    if (cursor.at(Kind.RAISED)) {
      digits = cursor.take().text();
    } else {
      Token caret = cursor.take();
      Token sign = cursor.peek();
      boolean signed = sign.is(Kind.MINUS) || sign.is(Kind.PLUS);
      Token number = cursor.peek(signed ? 1 : 0);
      boolean touching = caret.touches(sign) && (!signed || sign.touches(number));
      if (!number.is(Kind.NUMBER) || (tight && !touching)) {
        throw cursor.refusal(messages.unitPowerForm(whole));
      }
      cursor.skip(signed ? 2 : 1);
      digits = (sign.is(Kind.MINUS) ? "-" : "") + number.text();
    }
    if (!digits.matches("[-+]?[0-9]{1,6}")) {
      throw cursor.refusal(messages.unitPowerForm(whole));
    }
    int exponent = Integer.parseInt(digits);
    if (exponent == 0 || Math.abs(exponent) > UnitText.LARGEST_EXPONENT) {
      throw cursor.refusal(messages.unitPowerRange(whole, exponent, UnitText.LARGEST_EXPONENT));
    }
    return exponent;
  }

  /** From a caret or a raised exponent here to the end of what is meant as the exponent. */
  Span exponentSpan() {
    Token sign = cursor.peek();
    if (sign.is(Kind.RAISED)) {
      return sign.span();
    }
    int ahead = cursor.peek(1).is(Kind.MINUS) || cursor.peek(1).is(Kind.PLUS) ? 2 : 1;
    Token operand = cursor.peek(ahead);
    return switch (operand.kind()) {
      case NAME, NUMBER, RAISED -> sign.span().to(operand.span());
      case OPEN -> {
        int close = Shapes.closing(cursor.rest().subList(ahead, cursor.rest().size()), 0);
        yield close < 0 ? sign.span() : sign.span().to(cursor.peek(ahead + close).span());
      }
      default -> sign.span();
    };
  }

  /** A unit that is short enough to be one. */
  private UnitText sized(UnitText unit, Span place) {
    long degree = 0;
    for (Power member : unit.members()) {
      degree += Math.abs(member.exponent());
    }
    if (degree > HIGHEST_DEGREE) {
      throw cursor.refusal(messages.unitTooLong(place, HIGHEST_DEGREE));
    }
    return unit;
  }

  /** Members with the exponents of equal symbols added up, where that gives a unit. */
  private static List<Power> merged(List<Power> members) {
    var exponents = new LinkedHashMap<String, Integer>();
    members.forEach(member -> exponents.merge(member.symbol(), member.exponent(), Integer::sum));
    boolean unit =
        exponents.values().stream()
            .allMatch(sum -> sum != 0 && Math.abs(sum) <= UnitText.LARGEST_EXPONENT);
    return unit
        ? exponents.entrySet().stream().map(e -> new Power(e.getKey(), e.getValue())).toList()
        : members;
  }

  // bracket = "[" ( "1" | spaced ) [ "/" ( factor | "(" spaced ")" ) ] [ "," word { word } ] "]"
  Statement.Bracket bracket() {
    int close = cursor.closing();
    Token open = cursor.take();
    if (close < 0) {
      throw cursor.refusal(messages.open(open.span(), "[", "]"));
    }
    Span whole = open.span().to(cursor.peek(close - 1).span());
    var text = new BracketText();
    text.read();
    UnitText unit = sized(new UnitText(text.over, text.under), whole);
    String kind = null;
    Span kindSpan = null;
    if (cursor.at(Kind.COMMA)) {
      Token comma = cursor.take();
      kindSpan = kindWords(comma);
      kind = messages.kindWords(kindSpan);
    }
    if (!cursor.accept(Kind.CLOSE_BRACKET)) {
      throw cursor.refusal(messages.bracketForm(cursor.peek().span()));
    }
    return new Statement.Bracket(whole, unit, kind, kindSpan);
  }

  private Span kindWords(Token comma) {
    if (!cursor.at(Kind.NAME)) {
      throw cursor.refusal(messages.bracketKind(comma.span()));
    }
    Span words = cursor.take().span();
    while (cursor.at(Kind.NAME)) {
      words = words.to(cursor.take().span());
    }
    return words;
  }

  /** A unit in brackets, as far as it was read. */
  private final class BracketText {
    private final List<Power> over = new ArrayList<>();
    private final List<Power> under = new ArrayList<>();

    private void read() {
      Span first = cursor.peek().span();
      one();
      if (cursor.accept(Kind.OVER)) {
        if (cursor.accept(Kind.OPEN)) {
          spaced(under);
          if (!cursor.accept(Kind.CLOSE)) {
            throw cursor.refusal(messages.bracketForm(cursor.peek().span()));
          }
        } else {
          factor(under);
        }
        refuseMore(first);
      }
      if (cursor.at(Kind.MINUS)) {
        throw cursor.refusal(hyphen(first));
      }
    }

    /** What stands in front of the solidus: {@code 1} or a product. */
    private void one() {
      Token number = cursor.peek();
      if (!number.is(Kind.NUMBER)) {
        spaced(over);
        return;
      }
      cursor.take();
      if (!number.text().equals("1")) {
        throw cursor.refusal(messages.bracketNumber(number.span()));
      }
      if (cursor.at(Kind.NAME) || cursor.at(Kind.UNIT_SIGN)) {
        throw cursor.refusal(messages.bracketNumber(number.span().to(cursor.peek().span())));
      }
    }

    // spaced = factor { ("·" | "." | "*" | blank) factor }
    private void spaced(List<Power> members) {
      factor(members);
      while (isJoin(cursor.peek()) || cursor.at(Kind.NAME) || cursor.at(Kind.UNIT_SIGN)) {
        if (isJoin(cursor.peek())) {
          cursor.take();
        }
        factor(members);
      }
    }

    private void factor(List<Power> members) {
      Token symbol = cursor.peek();
      if (!symbol.is(Kind.NAME) && !symbol.is(Kind.UNIT_SIGN)) {
        throw cursor.refusal(messages.bracketForm(symbol.span()));
      }
      if (!units.knows(symbol.text())) {
        throw cursor.refusal(unknown(symbol, null));
      }
      cursor.take();
      int exponent = 1;
      if (cursor.at(Kind.CARET) || cursor.at(Kind.RAISED)) {
        exponent = exponent(false);
        if (cursor.at(Kind.CARET) || cursor.at(Kind.RAISED)) {
          throw cursor.refusal(messages.unitPowerTwice(exponentSpan()));
        }
      }
      members.add(new Power(symbol.text(), exponent));
    }

    private void refuseMore(Span first) {
      if (cursor.at(Kind.OVER)) {
        while (cursor.accept(Kind.OVER)) {
          spaced(under);
        }
        Span whole = first.to(cursor.previous().span());
        throw cursor.refusal(
            messages.unitTwoSlashes(whole, messages.inBrackets(new UnitText(over, merged(under)))));
      }
      if (isJoin(cursor.peek()) || cursor.at(Kind.NAME) || cursor.at(Kind.UNIT_SIGN)) {
        if (isJoin(cursor.peek())) {
          cursor.take();
        }
        spaced(under);
        Span whole = first.to(cursor.previous().span());
        throw cursor.refusal(
            messages.unitAfterSlashInBrackets(
                whole, messages.inBrackets(new UnitText(over, merged(under)))));
      }
    }

    private Diagnostic hyphen(Span first) {
      cursor.take();
      spaced(over);
      Span whole = first.to(cursor.previous().span());
      return messages.unitHyphenInBrackets(whole, messages.inBrackets(new UnitText(over, under)));
    }
  }
}
