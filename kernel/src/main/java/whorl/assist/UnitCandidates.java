package whorl.assist;

import java.util.HashSet;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import whorl.assist.Completion.Candidate;
import whorl.assist.RankedUnits.Use;
import whorl.check.Meaning;
import whorl.syntax.Token;
import whorl.syntax.Token.Kind;
import whorl.units.Unit;
import whorl.units.UnitCatalogue;
import whorl.units.UnitGuide;
import whorl.units.UnitReader;
import whorl.units.UnitText;

/** The units that may be meant in a place. */
final class UnitCandidates {
  private static final UnitCatalogue UNITS = UnitCatalogue.standard();

  /** What a note on rotating machinery is mostly written in. */
  private static final List<UnitText> COMMON =
      List.of(
              "mm", "m", "kg", "s", "min", "h", "rpm", "rad/s", "Hz", "deg", "rad", "N", "kN",
              "N·m", "kN·m", "kg·m²", "m/s", "MPa", "J", "kJ", "W", "kW", "K", "%")
          .stream()
          .map(UnitReader::read)
          .toList();

  /** The highest power of a symbol that is looked for where only a power may fit. */
  private static final int HIGHEST_POWER = 4;

  private final AtCursor at;
  private final boolean brackets;
  private final DraftSheet draft;
  private final FittingUnits fitting;
  private final RankedUnits found;
  private final List<String> typed;
  private final boolean asked;

  private UnitCandidates(AtCursor at, boolean brackets, DraftSheet draft, FittingUnits fitting) {
    this.at = at;
    this.brackets = brackets;
    this.draft = draft;
    this.fitting = fitting;
    this.found = new RankedUnits(fitting);
    this.typed = spellings(at.typed());
    this.asked = !at.typed().isEmpty();
  }

  /** The units in brackets that open with a token. */
  static List<Candidate> inBrackets(AtCursor at, int open, DraftSheet draft) {
    var fitting = FittingUnits.by(Trial.inBrackets(at, open, draft), draft);
    return new UnitCandidates(at, true, draft, fitting).from(open + 1);
  }

  /** The units behind a number or group. */
  static List<Candidate> behindNumber(AtCursor at, int holder, DraftSheet draft) {
    var fitting = FittingUnits.by(Trial.behindNumber(at, holder, draft), draft);
    return new UnitCandidates(at, false, draft, fitting).from(holder + 1);
  }

  /** Micro is typed as u, or as one of two characters. */
  private static List<String> spellings(String typed) {
    String plain = typed.replace('µ', 'μ');
    return plain.startsWith("u") ? List.of(plain, "μ" + plain.substring(1)) : List.of(plain);
  }

  private List<Candidate> from(int first) {
    return first == at.index()
        ? whole()
        : following(UnitBeginning.of(at.tokens().subList(first, at.index())));
  }

  /** Units by their beginning, one letter or more; without, a short choice. */
  private List<Candidate> whole() {
    var taken = new HashSet<String>();
    for (UnitText unit : usual()) {
      UnitGuide.Entry entry = UNITS.guide().entry(unit);
      taken.add(entry.symbol());
      addWhole(entry, Use.USUAL);
    }
    if (asked || fitting.areKnown()) {
      for (UnitGuide.Entry entry : UNITS.guide().entries()) {
        if ((asked || !entry.prefixed()) && taken.add(entry.symbol())) {
          addWhole(entry, entry.prefixed() ? Use.PREFIXED : Use.LISTED);
        }
      }
    }
    return found.offered(asked, /* complete= */ true);
  }

  /** The units of the line and of its names, then those usual for the kinds that fit. */
  private Set<UnitText> usual() {
    var units = new LinkedHashSet<UnitText>();
    List<Token> tokens = at.tokens();
    for (int i = 0; i < tokens.size(); i++) {
      Token token = tokens.get(i);
      if (i != at.index() && token.isFreeName()) {
        draft.meaning(token.name().name()).ifPresent(meaning -> addUnits(meaning, units));
      } else if (token.is(Kind.OPEN_BRACKET) && at.line().closing(i) > 0) {
        Token close = tokens.get(at.line().closing(i));
        UnitSpan.read(at.inside(token, close).replaceFirst(",.*", "")).ifPresent(units::add);
      }
    }
    fitting.kinds().stream()
        .flatMap(kind -> UNITS.usualUnits(kind).stream())
        .map(Unit::text)
        .forEach(units::add);
    units.addAll(COMMON);
    return units;
  }

  private static void addUnits(Meaning meaning, Set<UnitText> units) {
    if (meaning instanceof Meaning.Quantity quantity) {
      units.add(quantity.unit().text());
    } else if (meaning instanceof Meaning.Function function) {
      function.parameters().forEach(parameter -> units.add(parameter.unit().text()));
    }
  }

  private void addWhole(UnitGuide.Entry entry, Use use) {
    UnitText unit = entry.text();
    boolean writable = brackets || !unit.equals(UnitText.ONE);
    String text = brackets || !unit.over().isEmpty() ? entry.symbol() : Trial.tight(unit).typeset();
    Closeness closeness = closeness(text, entry.alsoRead());
    if (writable && closeness != Closeness.NONE) {
      found.add(text, unit, closeness, use);
    }
  }

  private Closeness closeness(String text, Set<String> alsoRead) {
    Closeness closeness = Closeness.of(typed, List.of(text));
    if (closeness.compareTo(Closeness.ASIDE) < 0) {
      return closeness;
    }
    return Closeness.of(typed, alsoRead).compareTo(Closeness.ASIDE) < 0
        ? Closeness.ASIDE
        : closeness;
  }

  /** What may follow the members that already stand there, as {@code m²/s} behind {@code kg·}. */
  private List<Candidate> following(String beginning) {
    var taken = new HashSet<String>();
    for (UnitGuide.Entry entry : UNITS.guide().entries()) {
      String whole = entry.symbol();
      if (whole.length() > beginning.length() && whole.startsWith(beginning)) {
        String rest = whole.substring(beginning.length());
        // The parenthesis that closes a divisor is left to its author or the editor.
        String open = rest.contains("(") ? rest : rest.replace(")", "");
        addMember(taken, beginning, open, Use.USUAL);
      }
    }
    if (asked) {
      for (UnitGuide.Entry entry : UNITS.guide().entries()) {
        addPowers(taken, beginning, entry.text(), entry.prefixed() ? Use.PREFIXED : Use.LISTED);
      }
    } else {
      COMMON.forEach(unit -> addPowers(taken, beginning, unit, Use.LISTED));
    }
    return found.offered(asked, /* complete= */ false);
  }

  private void addPowers(Set<String> taken, String beginning, UnitText unit, Use use) {
    if (!unit.isSymbol()) {
      return;
    }
    String symbol = unit.over().get(0).symbol();
    int highest = fitting.areKnown() ? HIGHEST_POWER : 1;
    for (int power = 1; power <= highest; power++) {
      var member = UnitText.product(List.of(new UnitText.Power(symbol, power)));
      addMember(taken, beginning, member.typeset(), power == 1 ? use : Use.RARE);
    }
  }

  private void addMember(Set<String> taken, String beginning, String member, Use use) {
    var closeness = Closeness.of(typed, List.of(member));
    if (closeness.compareTo(Closeness.ASIDE) >= 0 || !taken.add(member)) {
      return;
    }
    String whole = beginning + member;
    boolean open = whole.contains("(") && !whole.contains(")");
    UnitSpan.read(open ? whole + ")" : whole)
        .ifPresent(unit -> found.add(member, unit, closeness, use));
  }
}
