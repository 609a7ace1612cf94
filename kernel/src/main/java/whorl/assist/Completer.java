package whorl.assist;

import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import whorl.assist.Completion.Candidate;
import whorl.check.Checked;
import whorl.check.PartOfThing;
import whorl.check.Type;
import whorl.laws.ThingSort;
import whorl.sheet.Sheet;
import whorl.syntax.Token;
import whorl.syntax.Token.Kind;
import whorl.units.UnitCatalogue;
import whorl.units.UnitReader;
import whorl.units.UnitSyntaxException;
import whorl.units.UnitText;
import whorl.units.UnknownUnitException;

/** Says what could be typed at one cursor. */
final class Completer {
  private final Sheet sheet;
  private final AtCursor at;
  private final DraftSheet draft;

  Completer(Sheet sheet, AtCursor at) {
    this.sheet = sheet;
    this.at = at;
    this.draft = new DraftSheet(sheet.scope(), at.source(), at.otherLines());
  }

  /** The names that the sheet has, of which a command may follow. */
  Completion definitions(int cursor) {
    return new Completion(at.start(), cursor, new NameCandidates(sheet, draft, at).ofSheet());
  }

  /** What could be typed in a line of the sheet. */
  Completion completion(int cursor) {
    Place place = Place.of(at.tokens(), at.index());
    if (place instanceof Place.KindWord kindWord) {
      return kinds(kindWord, cursor);
    }
    return new Completion(at.start(), cursor, candidates(place));
  }

  private List<Candidate> candidates(Place place) {
    if (place instanceof Place.InBrackets brackets) {
      return UnitCandidates.inBrackets(at, brackets.open(), draft);
    } else if (place instanceof Place.BehindNumber number) {
      return behindNumber(number.holder());
    } else if (place instanceof Place.Part part) {
      return parts(part.dot());
    } else if (place instanceof Place.BehindOperand) {
      return goingOn();
    }
    return place instanceof Place.Operand ? operands() : List.of();
  }

  /** Units; a word that goes on with the line; behind {@code *} or {@code /} also a name. */
  private List<Candidate> behindNumber(int holder) {
    var candidates = new ArrayList<>(UnitCandidates.behindNumber(at, holder, draft));
    Token before = at.tokens().get(at.index() - 1);
    if (at.index() - 1 == holder) {
      candidates.addAll(goingOn());
    } else if (before.is(Kind.TIMES) || before.is(Kind.OVER)) {
      Set<String> units = candidates.stream().map(Candidate::text).collect(Collectors.toSet());
      new NameCandidates(sheet, draft, at)
          .all().stream().filter(name -> !units.contains(name.text())).forEach(candidates::add);
    }
    return candidates;
  }

  private List<Candidate> operands() {
    boolean first = at.index() == 0;
    var candidates = new ArrayList<>(new NameCandidates(sheet, draft, at).all());
    if (first) {
      candidates.addAll(keywords(Keyword.At.LINE));
    } else {
      boolean check = at.index() == 1 && at.tokens().get(0).isWord("check");
      candidates.addAll(keywords(Keyword.At.VALUE));
      candidates.addAll(check ? keywords(Keyword.At.CHECK) : List.of());
    }
    return candidates;
  }

  /** The words that can follow a complete operand, by what stands in front of it. */
  private List<Candidate> goingOn() {
    List<Token> before = at.tokens().subList(0, at.index());
    long ifs = count(before, "if");
    long thens = count(before, "then");
    long elses = count(before, "else");
    Token first = before.get(0);
    boolean condition = first.isWord("check") || first.isWord("assume") || ifs > 0;
    boolean stated =
        first.isWord("check")
            && before.stream().anyMatch(token -> token.is(Kind.EQUALS))
            && count(before, "within") == 0;
    var candidates = new ArrayList<Candidate>();
    candidates.addAll(ifs > thens ? keywords(Keyword.At.IF) : List.of());
    candidates.addAll(thens > elses ? keywords(Keyword.At.THEN) : List.of());
    candidates.addAll(stated ? keywords(Keyword.At.STATED) : List.of());
    candidates.addAll(condition && !stated ? keywords(Keyword.At.CONDITION) : List.of());
    return candidates;
  }

  private static long count(List<Token> tokens, String word) {
    return tokens.stream().filter(token -> token.isWord(word)).count();
  }

  private List<Candidate> keywords(Keyword.At place) {
    return Keyword.all().stream()
        .filter(keyword -> keyword.place() == place && keyword.word().startsWith(at.typed()))
        .map(keyword -> new Candidate(keyword.word(), "keyword", keyword.gist()))
        .toList();
  }

  /** The parts of a vector. */
  private List<Candidate> parts(int dot) {
    List<Token> tokens = at.tokens();
    int last = dot - 1;
    int first = beginning(tokens, last);
    while (first > 1 && tokens.get(first - 1).is(Kind.DOT)) {
      first = beginning(tokens, first - 2);
    }
    if (first < 0) {
      return List.of();
    }
    String whole = at.between(tokens.get(first).span().start(), tokens.get(last).span().end());
    return partsOf(whole).stream().filter(part -> part.text().startsWith(at.typed())).toList();
  }

  /** Where the name, call or group begins that ends with a token; negative where there is none. */
  private static int beginning(List<Token> tokens, int last) {
    int first = tokens.get(last).is(Kind.CLOSE) ? Place.opening(tokens, last) : last;
    boolean call =
        first > 0
            && tokens.get(first).is(Kind.OPEN)
            && tokens.get(first - 1).isFreeName()
            && tokens.get(first - 1).touches(tokens.get(first));
    return call ? first - 1 : first;
  }

  private List<Candidate> partsOf(String whole) {
    if (!(draft.sound(whole).orElse(null) instanceof Checked.Value value)) {
      return List.of();
    }
    Type type = value.formula().type();
    if (type instanceof Type.Vector) {
      return Stream.of("x", "y", "z")
          .map(part -> new Candidate(part, "property", part + " part of " + whole))
          .toList();
    } else if (type instanceof Type.Thing thing) {
      return partsOf(thing.sort());
    }
    return type instanceof Type.Tensor ? partsOf(ThingSort.INERTIA) : List.of();
  }

  private static List<Candidate> partsOf(ThingSort sort) {
    return PartOfThing.of(sort).stream()
        .map(part -> new Candidate(part.name(), "property", part.meaning()))
        .toList();
  }

  /** The kinds that a unit in brackets may stand for, by the words typed behind the comma. */
  private Completion kinds(Place.KindWord place, int cursor) {
    List<Token> tokens = at.tokens();
    int first = tokens.get(place.comma() + 1).span().start();
    int start = at.start() - at.between(first, at.word().span().start()).length();
    String typed = at.between(first, at.word().span().start()) + at.typed();
    String unit = at.inside(tokens.get(place.open()), tokens.get(place.comma()));
    return new Completion(
        start,
        cursor,
        whorl.units.kind.Kind.all().stream()
            .filter(kind -> !kind.isInternal() && measures(unit, kind))
            .filter(kind -> Closeness.of(List.of(typed), List.of(kind.words())) != Closeness.NONE)
            .map(kind -> new Candidate(kind.words(), "class", "kind of quantity"))
            .toList());
  }

  private static boolean measures(String unit, whorl.units.kind.Kind kind) {
    try {
      UnitText text = UnitReader.read(unit);
      return UnitCatalogue.standard().resolve(text, kind).isPresent();
    } catch (UnitSyntaxException | UnknownUnitException noUnit) {
      return false;
    }
  }
}
