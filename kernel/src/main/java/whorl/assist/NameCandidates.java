package whorl.assist;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.function.Supplier;
import java.util.stream.Collectors;
import whorl.assist.Completion.Candidate;
import whorl.check.ConstantAtHand;
import whorl.check.Meaning;
import whorl.laws.Law;
import whorl.laws.Laws;
import whorl.report.QuantityText;
import whorl.sheet.Quantity;
import whorl.sheet.Sheet;
import whorl.syntax.GreekNames;
import whorl.syntax.LogicalLine;
import whorl.syntax.Token;
import whorl.syntax.Token.Kind;
import whorl.units.Unit;
import whorl.units.UnitText;

/** The names that may be meant in a place: of the sheet, of the cell, at hand. */
final class NameCandidates {
  private static final int LONGEST_LINE = 72;

  private final Sheet sheet;
  private final DraftSheet draft;
  private final AtCursor at;
  private final List<String> typed;

  NameCandidates(Sheet sheet, DraftSheet draft, AtCursor at) {
    this.sheet = sheet;
    this.draft = draft;
    this.at = at;
    this.typed = List.of(at.typed(), GreekNames.fold(at.typed()));
  }

  /** A name with what is said of it, which is worked out only for those that are offered. */
  private record Name(String name, boolean atHand, Supplier<Candidate> candidate) {}

  private record Found(Name name, Closeness closeness) {}

  /** The names that begin as typed, the closest first; functions at hand behind the others. */
  List<Candidate> all() {
    var names = new ArrayList<Name>(argumentNames());
    names.addAll(parameters());
    names.addAll(ofSheetNames());
    names.addAll(ofCellNames());
    names.addAll(atHand());
    return ranked(names);
  }

  /** The names of the sheet alone that begin as typed. */
  List<Candidate> ofSheet() {
    return ranked(ofSheetNames());
  }

  private List<Candidate> ranked(List<Name> names) {
    var taken = new HashSet<String>();
    return names.stream()
        .filter(name -> taken.add(name.name()))
        .map(name -> new Found(name, closeness(name.name())))
        .filter(found -> found.closeness() != Closeness.NONE)
        .sorted(
            Comparator.comparing((Found found) -> found.name().atHand())
                .thenComparing(Found::closeness)
                .thenComparing(found -> found.name().name(), String.CASE_INSENSITIVE_ORDER)
                .thenComparing(found -> found.name().name()))
        .map(found -> found.name().candidate().get())
        .toList();
  }

  private Closeness closeness(String name) {
    return Closeness.of(typed, List.of(name, GreekNames.spelled(name)));
  }

  /** What an argument of the call around the place could be named, those that are not given yet. */
  private List<Name> argumentNames() {
    Token before = at.index() == 0 ? at.word() : at.tokens().get(at.index() - 1);
    if (!before.is(Kind.OPEN) && !before.is(Kind.COMMA)) {
      return List.of();
    }
    return new WordAt(at.source(), at.lines(), at.line(), at.index())
        .calls().stream()
            .findFirst()
            .map(function -> function.name().name())
            .map(this::argumentNames)
            .orElse(List.of());
  }

  private List<Name> argumentNames(String function) {
    if (draft.defines(function)) {
      return draft.meaning(function).orElse(null) instanceof Meaning.Function known
          ? known.parameters().stream()
              .map(parameter -> argument(parameter.name(), NameCards.words(parameter)))
              .toList()
          : List.of();
    }
    return Laws.named(function).stream()
        .flatMap(law -> law.parameters().stream())
        .map(parameter -> argument(parameter.word(), LawCards.words(parameter)))
        .toList();
  }

  private static Name argument(String word, String about) {
    return new Name(word, false, () -> new Candidate(word + " = ", "param", about));
  }

  /** The parameters of the function that the line defines, once its head is complete. */
  private List<Name> parameters() {
    return HeadParameter.of(at.line(), at::inside).stream()
        .filter(parameter -> at.index() > at.line().closing(1))
        .map(parameter -> new Name(parameter.name(), false, () -> candidate(parameter)))
        .toList();
  }

  private static Candidate candidate(HeadParameter parameter) {
    return new Candidate(parameter.name(), "param", "parameter " + parameter.text());
  }

  private List<Name> ofSheetNames() {
    return sheet.scope().names().stream()
        .map(name -> new Name(name, false, () -> ofSheet(name)))
        .toList();
  }

  private List<Name> ofCellNames() {
    return draft.own().entrySet().stream()
        .map(line -> new Name(line.getKey(), false, () -> ofCell(line.getKey(), line.getValue())))
        .toList();
  }

  private Candidate ofSheet(String name) {
    Optional<Quantity> quantity = sheet.quantity(name);
    if (quantity.isPresent()) {
      return new Candidate(name, "instance", detail(quantity.get()));
    }
    Optional<Meaning> meaning = sheet.scope().meaning(name);
    if (meaning.orElse(null) instanceof Meaning.Function function) {
      return new Candidate(name, "function", head(function));
    }
    return new Candidate(name, "instance", "has no value yet");
  }

  private static String detail(Quantity quantity) {
    String value = QuantityText.value(quantity);
    return quantity.kind().isEmpty() ? value : quantity.kind() + ", " + value;
  }

  private Candidate ofCell(String name, LogicalLine line) {
    String text = draft.text(line).replaceAll("\\s+", " ");
    String shown =
        text.codePointCount(0, text.length()) > LONGEST_LINE
            ? text.substring(0, text.offsetByCodePoints(0, LONGEST_LINE)) + "…"
            : text;
    return new Candidate(name, line.definesFunction() ? "function" : "instance", shown);
  }

  /** A function as its head would be written. */
  private static String head(Meaning.Function function) {
    return function.name()
        + function.parameters().stream()
            .map(parameter -> parameter.name() + bracket(parameter.unit()))
            .collect(Collectors.joining(", ", "(", ")"))
        + (function.chosen() ? bracket(function.unit()) : "");
  }

  private static String bracket(Unit unit) {
    return unit.text().equals(UnitText.ONE) ? "" : " [" + unit.symbol() + "]";
  }

  private List<Name> atHand() {
    var names = new ArrayList<Name>();
    for (ConstantAtHand constant : ConstantAtHand.all()) {
      names.add(new Name(constant.symbol(), true, () -> candidate(constant)));
    }
    for (FunctionFacts function : FunctionFacts.all()) {
      names.add(
          new Name(
              function.name(),
              true,
              () -> new Candidate(function.name(), "function", function.head())));
    }
    for (String law : Laws.names()) {
      Law first = Laws.named(law).get(0);
      names.add(
          new Name(
              law,
              true,
              () -> new Candidate(law, "function", first.head() + ", " + first.title())));
    }
    return names;
  }

  private static Candidate candidate(ConstantAtHand constant) {
    String unit = constant.unit().text().equals(UnitText.ONE) ? "" : " " + constant.unit().symbol();
    return new Candidate(constant.symbol(), "constant", constant.value() + unit);
  }
}
