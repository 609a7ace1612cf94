package whorl.report;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import whorl.eval.Value;
import whorl.sheet.Comparison;
import whorl.sheet.Depicted;
import whorl.sheet.Given;
import whorl.sheet.Lapse;
import whorl.sheet.Quantity;
import whorl.sheet.Step;
import whorl.sheet.Verdict;
import whorl.syntax.Expr;
import whorl.syntax.Statement;
import whorl.units.UnitText;

/** Says what each step puts into each column; the one place for the words of the table. */
final class StepRows implements Step.Cases<Row> {
  private static final int PERCENT_DIGITS = 3;

  /** The doubts that the last row with any said. */
  private List<String> lastDoubts = List.of();

  private StepRows() {}

  /** The rows of one table. */
  static List<Row> of(List<Step> steps) {
    var rows = new StepRows();
    return steps.stream().map(step -> step.match(rows)).toList();
  }

  @Override
  public Row defined(Step.Defined defined) {
    Statement.Definition statement = defined.statement();
    List<Line> rule = new ArrayList<>();
    if (defined.input()) {
      rule.add(Line.of(Piece.quiet("input")));
    } else {
      Set<String> vectors = vectors(defined.with());
      rule.add(formula(statement.value(), vectors));
      for (Statement.Change change : statement.changes()) {
        rule.add(
            Line.of(
                Piece.quiet("with "),
                new Piece.Formula(FormulaLayout.of(change.name(), vectors)),
                Piece.words(" = "),
                new Piece.Formula(FormulaLayout.of(change.value(), vectors))));
      }
    }
    boolean vector = defined.gives().value() instanceof Value.Vector;
    return valued(
        symbol(statement.name().name(), vector),
        rule,
        defined.with(),
        defined.gives(),
        defined.input(),
        defined);
  }

  @Override
  public Row shown(Step.Shown shown) {
    Expr value = shown.statement().value();
    boolean vector = shown.gives().value() instanceof Value.Vector;
    boolean alone = value instanceof Expr.Name && shown.with().isEmpty();
    return valued(
        alone ? symbol(((Expr.Name) value).name(), vector) : Line.of(Piece.quiet("show")),
        List.of(alone ? Line.of(Piece.quiet("restated")) : formula(value, vectors(shown.with()))),
        shown.with(),
        shown.gives(),
        false,
        shown);
  }

  private Row valued(
      Line quantity, List<Line> rule, List<Given> with, Quantity gives, boolean input, Step step) {
    Amount amount = Amounts.of(gives);
    var further = new ArrayList<Line>();
    var columns = new ArrayList<Amount>();
    if (amount.details().isEmpty()) {
      columns.add(amount);
      Amounts.about(gives.setting()).ifPresent(about -> further.add(Line.of(Piece.quiet(about))));
    } else {
      further.add(Line.of(new Piece.Value(amount.signed())));
      amount.details().forEach(detail -> further.add(Line.of(Piece.quiet(detail))));
    }
    if (!input) {
      Amounts.coherent(gives).ifPresent(columns::add);
    }
    return new Row(
        tone(step),
        quantity,
        gives.kind(),
        rule,
        givens(with.stream()),
        columns,
        further,
        why(step),
        null);
  }

  @Override
  public Row function(Step.Function function) {
    Statement.Function statement = function.statement();
    List<Line> with = parameters(statement.parameters());
    with.addAll(givens(function.with().stream()));
    return ofFunction(
        function,
        head(statement.name(), statement.parameters()),
        function.resultKind(),
        formula(statement.body(), vectors(function.with())),
        with,
        statement.bracket());
  }

  @Override
  public Row published(Step.Published published) {
    Statement.Published statement = published.statement();
    return ofFunction(
        published,
        head(statement.name(), statement.parameters()),
        published.resultKind(),
        Line.of(Piece.quiet("Java, " + published.label())),
        parameters(statement.parameters()),
        statement.bracket());
  }

  private Row ofFunction(
      Step step,
      Line head,
      String kind,
      Line rule,
      List<Line> with,
      Statement.@Nullable Bracket result) {
    var gives = new ArrayList<Line>();
    if (!kind.isEmpty()) {
      gives.add(Line.of(Piece.words(kind)));
    }
    if (result != null && !result.unit().equals(UnitText.ONE)) {
      gives.add(Line.of(Piece.quiet("in "), new Piece.Value(UnitSigns.of(result.unit()))));
    }
    return new Row(tone(step), head, kind, List.of(rule), with, List.of(), gives, why(step), null);
  }

  private static Line head(Expr.Name name, List<Statement.Parameter> parameters) {
    List<Layout> symbols =
        parameters.stream()
            .map(parameter -> (Layout) FormulaLayout.symbol(parameter.name().name(), false))
            .toList();
    return Line.of(
        new Piece.Formula(
            new Layout.SideBySide(
                Layout.Binding.ATOM,
                List.of(FormulaLayout.symbol(name.name(), false), new Layout.Group(symbols)))));
  }

  private static List<Line> parameters(List<Statement.Parameter> parameters) {
    var lines = new ArrayList<Line>();
    for (Statement.Parameter parameter : parameters) {
      Piece symbol = new Piece.Formula(FormulaLayout.symbol(parameter.name().name(), false));
      Statement.Bracket bracket = parameter.bracket();
      lines.add(
          bracket == null || bracket.unit().equals(UnitText.ONE)
              ? Line.of(symbol, Piece.quiet(" is a plain number"))
              : Line.of(
                  symbol, Piece.quiet(" in "), new Piece.Value(UnitSigns.of(bracket.unit()))));
    }
    return lines;
  }

  @Override
  public Row checked(Step.Checked checked) {
    Statement.Check statement = checked.statement();
    String word = statement.nominal() ? "check nominal" : "check";
    return judged(word, statement.condition(), checked.verdict(), checked.with(), checked);
  }

  @Override
  public Row assumed(Step.Assumed assumed) {
    Expr condition = assumed.statement().condition();
    return judged("assume", condition, assumed.verdict(), assumed.with(), assumed);
  }

  private Row judged(String word, Expr condition, Verdict verdict, List<Given> with, Step step) {
    var gives = new ArrayList<Line>();
    gives.add(state(verdict.holds()));
    boolean several = verdict.comparisons().size() > 1;
    for (Comparison comparison : verdict.comparisons()) {
      gives.addAll(compared(comparison, several));
    }
    Set<String> compared = new HashSet<>();
    for (Comparison comparison : verdict.comparisons()) {
      nameOf(comparison.text().left()).ifPresent(compared::add);
      nameOf(comparison.text().right()).ifPresent(compared::add);
    }
    return new Row(
        tone(verdict.holds(), step),
        Line.of(Piece.quiet(word)),
        "",
        List.of(formula(condition, vectors(with))),
        // A name that is a whole side of a comparison stands beside the verdict with its value.
        givens(with.stream().filter(given -> !compared.contains(given.name()))),
        List.of(),
        gives,
        why(step),
        null);
  }

  private static Optional<String> nameOf(Expr side) {
    return side instanceof Expr.Name name ? Optional.of(name.name()) : Optional.empty();
  }

  private static Line state(boolean holds) {
    return Line.of(
        holds ? new Piece.State("holds", Tone.GOOD) : new Piece.State("FAILS", Tone.BAD));
  }

  private static Tone tone(boolean holds, Step step) {
    if (!holds) {
      return Tone.BAD;
    }
    return step.standing().isFirm() ? Tone.GOOD : Tone.DOUBTFUL;
  }

  private static Tone tone(Step step) {
    if (!step.standing().lapses().isEmpty()) {
      return Tone.BAD;
    }
    return step.doubts().isEmpty() ? Tone.PLAIN : Tone.DOUBTFUL;
  }

  private static List<Line> compared(Comparison comparison, boolean several) {
    List<Amount> sides = Amounts.compared(comparison.left(), comparison.right());
    boolean exact = sides.get(0).exact() && sides.get(1).exact();
    String sign = relation(comparison);
    var lines = new ArrayList<Line>();
    String rounded = exact ? "" : "≈\u00A0";
    Piece values =
        new Piece.Value(
            rounded + sides.get(0).text() + " " + sign + "\u00A0" + sides.get(1).text());
    lines.add(
        several && !comparison.holds() ? Line.of(values, Piece.words(", fails")) : Line.of(values));
    var use = new ArrayList<Piece>();
    comparison
        .share()
        .ifPresent(
            share -> {
              use.add(new Piece.Value(percent(share, 1, "")));
              use.add(Piece.quiet(" of the limit, "));
            });
    use.add(Piece.quiet("margin "));
    use.add(new Piece.Value(rounded(Amounts.of(comparison.margin()))));
    lines.add(new Line(use));
    return lines;
  }

  /** The relation in which the two values really stand. */
  private static String relation(Comparison comparison) {
    if (comparison.holds()) {
      return comparison.text().relation().sign();
    }
    return switch (comparison.text().relation()) {
      case LESS -> "≥";
      case AT_MOST -> ">";
      case MORE -> "≤";
      case AT_LEAST -> "<";
    };
  }

  /**
   * A fraction in per cent, with the digits it takes to tell it from a fraction of note.
   *
   * @param plus the sign in front of what is positive, or nothing
   */
  private static String percent(double fraction, double limit, String plus) {
    Figure figure = Figures.apart(100 * fraction, 100 * limit, PERCENT_DIGITS);
    String rounded = figure.exact() ? "" : "≈\u00A0";
    return rounded + (fraction > 0 ? plus : "") + figure.text() + "\u00A0%";
  }

  private static String rounded(Amount amount) {
    return amount.exact() ? amount.text() : amount.signed();
  }

  @Override
  public Row reproduced(Step.Reproduced reproduced) {
    Statement.Reproduction statement = reproduced.statement();
    Set<String> vectors = vectors(reproduced.with());
    Layout equation =
        new Layout.Terms(
            Layout.Binding.COMPARISON,
            List.of(
                new Layout.Term("", FormulaLayout.of(statement.value(), vectors)),
                new Layout.Term("=", FormulaLayout.of(statement.stated(), vectors))));
    Line rule =
        Line.of(
            new Piece.Formula(equation),
            Piece.words(" within "),
            new Piece.Formula(FormulaLayout.of(statement.within(), vectors)));
    Amount computed = Amounts.of(reproduced.computed());
    double deviation = reproduced.deviation();
    double allowed = Math.copySign(reproduced.within(), deviation);
    String off = percent(deviation, allowed, "+");
    var gives = new ArrayList<Line>();
    gives.add(state(reproduced.holds()));
    gives.add(Line.of(new Piece.Value(computed.signed()), Piece.quiet(" computed")));
    gives.add(
        Line.of(new Piece.Value(Amounts.of(reproduced.stated()).signed()), Piece.quiet(" stated")));
    gives.add(
        Line.of(
            new Piece.Value(off),
            Piece.quiet(" deviation, "),
            new Piece.Value("±" + Figures.of(100 * reproduced.within()).text() + "\u00A0%"),
            Piece.quiet(" allowed")));
    Optional<String> name = nameOf(statement.value());
    return new Row(
        tone(reproduced.holds(), reproduced),
        Line.of(Piece.quiet(statement.nominal() ? "check nominal" : "check")),
        "",
        List.of(rule),
        givens(reproduced.with().stream().filter(given -> !name.equals(Optional.of(given.name())))),
        List.of(),
        gives,
        why(reproduced),
        null);
  }

  @Override
  public Row sketched(Step.Sketched sketched) {
    var gives = new ArrayList<Line>();
    for (Depicted thing : sketched.things()) {
      Quantity quantity = thing.quantity();
      boolean vector = quantity.value() instanceof Value.Vector;
      Piece name =
          thing.name().chars().allMatch(c -> Character.isLetterOrDigit(c) || c == '_')
              ? new Piece.Formula(FormulaLayout.symbol(thing.name(), vector))
              : Piece.words(thing.name());
      String size = Depictions.size(quantity);
      gives.add(
          size.isEmpty()
              ? Line.of(name, Piece.quiet(" " + quantity.kind()))
              : Line.of(name, new Piece.Value(" " + size), Piece.quiet(" " + quantity.kind())));
    }
    return new Row(
        sketched.standing().isFirm() ? Tone.PLAIN : Tone.DOUBTFUL,
        Line.of(Piece.quiet("sketch")),
        "",
        List.of(
            Line.of(
                Piece.words(
                    sketched.things().stream()
                        .map(Depicted::name)
                        .collect(Collectors.joining(", "))))),
        List.of(),
        List.of(),
        gives,
        why(sketched),
        null,
        null,
        Html.drawing(Depictions.of(sketched.things())));
  }

  @Override
  public Row followed(Step.Ran ran) {
    var row = new MotionRow(ran);
    var why = new ArrayList<>(why(ran));
    why.addAll(row.why());
    return new Row(
        tone(ran),
        symbol(ran.statement().name().name(), false),
        "motion",
        row.rule(),
        givens(ran.with().stream()),
        List.of(Amounts.of(ran.followed().duration())),
        row.gives(),
        why,
        null,
        row.grid(),
        null);
  }

  @Override
  public Row waiting(Step.Waiting waiting) {
    var gives = new ArrayList<Line>();
    gives.add(
        Line.of(
            new Piece.State("waits", Tone.OPEN),
            Piece.words(" for " + String.join(", ", waiting.names()))));
    for (int i = 0; i < waiting.names().size(); i++) {
      List<String> near = waiting.near().get(i);
      if (!near.isEmpty()) {
        String which = waiting.names().size() > 1 ? " to " + waiting.names().get(i) : "";
        gives.add(Line.of(Piece.quiet("near" + which + ": " + String.join(", ", near))));
      }
    }
    return ofStatement(waiting, Tone.OPEN, gives);
  }

  @Override
  public Row broken(Step.Broken broken) {
    var gives = new ArrayList<Line>();
    gives.add(Line.of(new Piece.State("does not stand", Tone.BAD)));
    Quantity last = broken.last();
    if (last != null) {
      gives.add(
          Line.of(
              Piece.quiet("was "),
              new Piece.Value(rounded(Amounts.of(last))),
              Piece.quiet(", now stale")));
    }
    Row row = ofStatement(broken, Tone.BAD, gives);
    return new Row(
        row.tone(),
        row.quantity(),
        row.kind(),
        row.rule(),
        row.with(),
        List.of(),
        row.further(),
        row.why(),
        broken.diagnostic());
  }

  /**
   * A row for a statement that has no result: what it says stands, with words in place of a value.
   */
  private Row ofStatement(Step step, Tone tone, List<Line> gives) {
    StatementHead head = StatementHead.of(step.statement());
    return new Row(
        tone,
        head.quantity(),
        "",
        List.of(head.rule()),
        List.of(),
        List.of(),
        gives,
        why(step),
        null);
  }

  private static List<Line> givens(Stream<Given> givens) {
    return givens.map(StepRows::given).toList();
  }

  private static Line given(Given given) {
    Quantity quantity = given.quantity();
    boolean vector = quantity.value() instanceof Value.Vector;
    Amount amount = Amounts.of(quantity);
    var pieces = new ArrayList<Piece>();
    pieces.add(new Piece.Formula(FormulaLayout.symbol(given.name(), vector)));
    pieces.add(new Piece.Value("\u00A0" + amount.signed()));
    Amounts.coherent(quantity)
        .ifPresent(coherent -> pieces.add(new Piece.Value(" " + coherent.signed())));
    return new Line(pieces);
  }

  private List<Line> why(Step step) {
    var lines = new ArrayList<Line>();
    for (Lapse lapse : step.standing().lapses()) {
      lines.add(
          Line.of(
              new Piece.State("outside its validity:", Tone.BAD),
              Piece.words(" " + lapse.text() + " does not hold")));
    }
    if (!step.doubts().isEmpty()) {
      lines.add(doubts(step.doubts()));
    }
    if (!step.statement().remark().isEmpty()) {
      lines.add(Line.of(Piece.words(step.statement().remark())));
    }
    return lines;
  }

  /** The doubts in full, but for those that the row above has just said. */
  private Line doubts(List<String> doubts) {
    boolean again = doubts.equals(lastDoubts);
    lastDoubts = doubts;
    if (again) {
      String what = doubts.size() == 1 ? "that assumption" : "those assumptions";
      return Line.of(new Piece.State("rests on " + what + " too", Tone.DOUBTFUL));
    }
    return Line.of(
        new Piece.State("rests on an assumption that fails:", Tone.DOUBTFUL),
        Piece.words(" " + String.join("; ", doubts)));
  }

  static Line symbol(String name, boolean vector) {
    return Line.of(new Piece.Formula(FormulaLayout.symbol(name, vector)));
  }

  private static Line formula(Expr expression, Set<String> vectors) {
    return Line.of(new Piece.Formula(FormulaLayout.of(expression, vectors)));
  }

  private static Set<String> vectors(List<Given> givens) {
    var names = new HashSet<String>();
    for (Given given : givens) {
      if (given.quantity().value() instanceof Value.Vector) {
        names.add(given.name());
      }
    }
    return names;
  }
}
