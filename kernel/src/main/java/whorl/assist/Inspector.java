package whorl.assist;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import whorl.check.ConstantAtHand;
import whorl.check.Meaning;
import whorl.report.InfoCard;
import whorl.report.InfoCard.Fact;
import whorl.sheet.Sheet;
import whorl.syntax.Token;
import whorl.syntax.Token.Kind;
import whorl.units.UnitCatalogue;
import whorl.units.UnitText;

/** Says what the word at one cursor means. */
final class Inspector {
  private static final UnitCatalogue UNITS = UnitCatalogue.standard();

  private final Sheet sheet;
  private final WordAt at;
  private final DraftSheet draft;
  private final NameCards names;

  Inspector(Sheet sheet, WordAt at, boolean all) {
    this.sheet = sheet;
    this.at = at;
    this.draft = new DraftSheet(sheet.scope(), at.source(), at.lines());
    this.names = new NameCards(sheet, all);
  }

  private Inspector(Inspector other, int index) {
    this.sheet = other.sheet;
    this.at = new WordAt(other.at.source(), other.at.lines(), other.at.line(), index);
    this.draft = other.draft;
    this.names = other.names;
  }

  /** The card of the word, or else of the function whose parentheses it stands in. */
  Optional<InfoCard> card() {
    return (at.isWord() ? ofWord() : ofUnitInFront())
        .or(
            () ->
                at.calls().stream()
                    .flatMap(function -> ofFunction(function.name().name()).stream())
                    .findFirst());
  }

  /** The unit whose exponent or closing parenthesis stands at the place. */
  private Optional<InfoCard> ofUnitInFront() {
    int symbol = at.index();
    while (symbol > 0 && UnitSpan.isEndOfUnit(at.tokens().get(symbol))) {
      symbol--;
    }
    Place place = Place.of(at.tokens(), symbol);
    boolean unit = place instanceof Place.InBrackets || place instanceof Place.BehindNumber;
    return symbol < at.index() && unit ? new Inspector(this, symbol).ofWord() : Optional.empty();
  }

  private Optional<InfoCard> ofWord() {
    Token word = at.token();
    Place place = Place.of(at.tokens(), at.index());
    if (place instanceof Place.InBrackets brackets) {
      return UnitSpan.inBrackets(at, brackets.open()).map(UnitCard::of);
    } else if (place instanceof Place.KindWord kindWord) {
      return ofKind(kindWord);
    } else if (place instanceof Place.BehindNumber number && isUnit(word)) {
      return UnitSpan.behindNumber(at, number.holder()).map(UnitCard::of);
    } else if (place instanceof Place.Part part) {
      Token whole = at.tokens().get(part.dot() - 1);
      return whole.is(Kind.NAME) ? ofName(whole.name().name()) : Optional.empty();
    } else if (word.is(Kind.UNIT_SIGN)) {
      return UnitSpan.read(word.text()).map(UnitCard::of);
    }
    return ofName(word.name().name());
  }

  private static boolean isUnit(Token word) {
    return !word.isReservedWord() && UNITS.knows(word.text());
  }

  /** A name by what it means in its line: as a parameter, in the sheet, in the cell, at hand. */
  private Optional<InfoCard> ofName(String name) {
    return ofParameter(name)
        .or(() -> ofArgument(name))
        .or(() -> ofSheetOrCell(name))
        .or(() -> FunctionFacts.named(name).map(FunctionFacts::card))
        .or(() -> LawCards.named(name))
        .or(() -> ConstantAtHand.named(name).map(Inspector::ofConstant))
        .or(() -> Keyword.named(name).map(Keyword::card));
  }

  private Optional<InfoCard> ofSheetOrCell(String name) {
    return sheet
        .card(name)
        .map(card -> names.of(card, draft))
        .or(() -> draft.line(name).map(line -> NameCards.ofCell(name, draft, line.remark())));
  }

  private Optional<InfoCard> ofFunction(String name) {
    boolean function = draft.meaning(name).orElse(null) instanceof Meaning.Function;
    if (function) {
      return ofSheetOrCell(name);
    }
    return draft.defines(name)
        ? Optional.empty()
        : FunctionFacts.named(name).map(FunctionFacts::card).or(() -> LawCards.named(name));
  }

  /** A parameter of the function that the line defines. */
  private Optional<InfoCard> ofParameter(String name) {
    return HeadParameter.of(at.line(), at::inside).stream()
        .filter(parameter -> at.index() > 0 && parameter.name().equals(name))
        .findFirst()
        .map(
            parameter ->
                new InfoCard(
                    parameter.text(),
                    "parameter of " + at.line().first().name().name(),
                    List.of(new Fact("measures", kinds(parameter.unit())))));
  }

  private static List<String> kinds(String unit) {
    return UnitSpan.read(unit.replaceFirst(",.*", "")).stream()
        .map(text -> UNITS.resolve(text).readings().words())
        .toList();
  }

  /** An argument that is given by its name. */
  private Optional<InfoCard> ofArgument(String name) {
    if (!at.tokens().get(at.index() + 1).is(Kind.EQUALS)) {
      return Optional.empty();
    }
    return at.calls().stream()
        .findFirst()
        .map(function -> function.name().name())
        .flatMap(
            function ->
                draft.defines(function)
                    ? draft
                        .meaning(function)
                        .filter(Meaning.Function.class::isInstance)
                        .flatMap(meaning -> ofParameter((Meaning.Function) meaning, name))
                    : LawCards.parameter(function, name));
  }

  private static Optional<InfoCard> ofParameter(Meaning.Function function, String name) {
    return function.parameters().stream()
        .filter(parameter -> parameter.name().equals(name))
        .map(
            parameter ->
                new InfoCard(
                    NameCards.words(parameter), "parameter of " + function.name(), List.of()))
        .findFirst();
  }

  private static InfoCard ofConstant(ConstantAtHand constant) {
    UnitText unit = constant.unit().text();
    String value = constant.value() + (unit.equals(UnitText.ONE) ? "" : " " + unit.typeset());
    return new InfoCard(
        constant.symbol(),
        constant.words(),
        List.of(Fact.of("value", value), new Fact("source", constant.source().lines().toList())));
  }

  private Optional<InfoCard> ofKind(Place.KindWord place) {
    int last = at.index();
    while (at.tokens().get(last + 1).is(Kind.NAME)) {
      last++;
    }
    return whorl.units.kind.Kind.find(at.text(place.comma() + 1, last)).map(Inspector::ofKind);
  }

  private static InfoCard ofKind(whorl.units.kind.Kind kind) {
    var facts = new ArrayList<Fact>();
    kind.parent()
        .filter(parent -> !parent.isInternal())
        .ifPresent(parent -> facts.add(Fact.of("special case of", parent.words())));
    facts.add(
        Fact.of(
            "units",
            UNITS.usualUnits(kind).stream()
                .map(unit -> unit.text().typeset())
                .collect(Collectors.joining(", "))));
    if (!kind.alsoRead().isEmpty()) {
      facts.add(Fact.of("also called", String.join(", ", kind.alsoRead())));
    }
    return new InfoCard(kind.words(), "kind of quantity", facts);
  }
}
