package whorl.report;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Set;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import whorl.eval.Value;
import whorl.mechanics.motion.Ending;
import whorl.mechanics.motion.Extreme;
import whorl.mechanics.motion.Kept;
import whorl.sheet.Followed;
import whorl.sheet.Quantity;
import whorl.sheet.Step;
import whorl.syntax.Expr;
import whorl.syntax.MotionLine;
import whorl.units.Unit;
import whorl.units.UnitCatalogue;

/** Says what a motion that was followed puts into its row, and the table of the run under it. */
final class MotionRow {
  private static final UnitCatalogue UNITS = UnitCatalogue.standard();

  /** Intervals of the table of a run. */
  private static final int INTERVALS = 10;

  private final Step.Ran step;
  private final Followed followed;

  MotionRow(Step.Ran step) {
    this.step = step;
    this.followed = step.followed();
  }

  /** The equations, line by line as written. */
  List<Line> rule() {
    return step.statement().lines().stream().map(line -> line.match(new Lines())).toList();
  }

  /** What it came to besides its duration. */
  List<Line> gives() {
    var lines = new ArrayList<Line>();
    lines.add(Line.of(Piece.words(ending())));
    for (Kept kept : followed.kept()) {
      lines.add(
          Line.of(
              Piece.quiet(
                  kept.name()
                      + " kept to "
                      + (kept.relative() == 0 ? "all digits" : kept(kept.relative())))));
    }
    return lines;
  }

  /** A small fraction to one digit: {@code 4×10⁻¹⁴}. */
  private static String kept(double relative) {
    int order = (int) Math.floor(Math.log10(relative));
    long digit = Math.round(relative / Math.pow(10, order));
    return (digit == 10 ? 1 : digit)
        + "×10"
        + Superscript.of(digit == 10 ? order + 1 : order)
        + " of its size";
  }

  private String ending() {
    boolean mayStop = step.statement().lines().stream().anyMatch(MotionLine.Stop.class::isInstance);
    if (followed.ending() == Ending.STOPPED) {
      return "stopped: the condition is met";
    }
    return mayStop ? "time over: the condition to stop was not met" : "followed to the time limit";
  }

  /** Remarks of its lines, and what the reader should know of names and matter. */
  List<Line> why() {
    var lines = new ArrayList<Line>();
    for (Followed.Balance balance : followed.balances()) {
      lines.add(
          Line.of(
              new Piece.Formula(FormulaLayout.of(balance.equation().rate(), Set.of())),
              Piece.words(
                  balance.sameMatter()
                      ? ": the same matter throughout"
                      : ": matter leaves or comes with the speed it has")));
    }
    for (MotionLine line : step.statement().lines()) {
      if (!line.remark().isEmpty()) {
        lines.add(Line.of(Piece.words(line.remark())));
      }
    }
    if (!followed.hidden().isEmpty()) {
      lines.add(
          Line.of(
              Piece.quiet(
                  "within it "
                      + String.join(", ", followed.hidden())
                      + (followed.hidden().size() == 1
                          ? " is its own and hides that of the sheet"
                          : " are its own and hide those of the sheet"))));
    }
    return lines;
  }

  /** The run at equal steps of time. */
  Grid grid() {
    double duration = ((Value.Real) followed.duration().value()).value();
    List<Double> times =
        duration == 0
            ? List.of(0.0)
            : Stream.iterate(0, k -> k + 1)
                .limit(INTERVALS + 1)
                .map(k -> k == INTERVALS ? duration : duration * k / INTERVALS)
                .toList();
    var heads = new ArrayList<Grid.Head>();
    var columns = new ArrayList<List<String>>();
    Unit second = shownIn(followed.duration().unit(), false, duration);
    heads.add(new Grid.Head(FormulaLayout.symbol("t", false), UnitSigns.of(second)));
    columns.add(digits(second, times));
    for (Followed.Column column : followed.columns()) {
      add(column, times, heads, columns);
    }
    var rows = new ArrayList<List<String>>();
    for (int k = 0; k < times.size(); k++) {
      int row = k;
      rows.add(columns.stream().map(values -> values.get(row)).toList());
    }
    return new Grid(heads, rows);
  }

  private static void add(
      Followed.Column column,
      List<Double> times,
      List<Grid.Head> heads,
      List<List<String>> columns) {
    boolean vector = column.course().width() > 1;
    List<double[]> values = times.stream().map(time -> column.course().at(time)).toList();
    double size = values.stream().flatMapToDouble(Arrays::stream).map(Math::abs).max().orElse(0);
    Unit unit = shownIn(column.unit(), column.chosen(), size);
    heads.add(new Grid.Head(FormulaLayout.symbol(column.name(), vector), UnitSigns.of(unit)));
    List<List<String>> parts = new ArrayList<>();
    for (int k = 0; k < column.course().width(); k++) {
      int part = k;
      parts.add(digits(unit, values.stream().map(value -> value[part]).toList()));
    }
    var cells = new ArrayList<String>();
    for (int k = 0; k < times.size(); k++) {
      int row = k;
      String joined =
          parts.stream().map(digits -> digits.get(row)).collect(Collectors.joining(", "));
      cells.add(vector ? "(" + joined + ")" : joined);
    }
    columns.add(cells);
  }

  private static Unit shownIn(Unit unit, boolean chosen, double size) {
    return chosen ? unit : UNITS.readable(unit, size);
  }

  private static List<String> digits(Unit unit, List<Double> si) {
    return Figures.together(si.stream().map(unit::fromSi).toList()).stream()
        .map(Figure::text)
        .toList();
  }

  /** The least and the largest value of each course of numbers. */
  static String range(Followed.Column column) {
    Extreme least = column.course().least();
    Extreme peak = column.course().peak();
    return Amounts.of(quantity(column, least.value())).text()
        + " to "
        + Amounts.of(quantity(column, peak.value())).text();
  }

  private static Quantity quantity(Followed.Column column, double si) {
    return new Quantity(new Value.Real(si), column.unit(), column.chosen(), column.kind(), null);
  }

  /** The lines of a motion as rules. */
  private static final class Lines implements MotionLine.Cases<Line> {
    private static Piece formula(Expr expr) {
      return new Piece.Formula(FormulaLayout.of(expr, Set.of()));
    }

    private static Piece symbol(Expr.Name name) {
      return new Piece.Formula(FormulaLayout.symbol(name.name(), false));
    }

    private static Line equation(Layout left, Expr right) {
      return Line.of(
          new Piece.Formula(
              new Layout.Terms(
                  Layout.Binding.COMPARISON,
                  List.of(
                      new Layout.Term("", left),
                      new Layout.Term("=", FormulaLayout.of(right, Set.of()))))));
    }

    @Override
    public Line start(MotionLine.Start start) {
      var bracket = start.bracket();
      Piece unit =
          bracket == null
                  || !(start.value() instanceof Expr.Numeral numeral)
                  || numeral.unit() != null
              ? Piece.words("")
              : new Piece.Value("\u00A0" + UnitSigns.of(bracket.unit()));
      return Line.of(symbol(start.state()), Piece.quiet(" starts "), formula(start.value()), unit);
    }

    @Override
    public Line attitude(MotionLine.Attitude attitude) {
      var pieces = new ArrayList<Piece>();
      pieces.add(symbol(attitude.body()));
      pieces.add(Piece.quiet(" starts"));
      Expr spin = attitude.spin();
      if (spin != null) {
        pieces.add(Piece.quiet(" spin "));
        pieces.add(formula(spin));
      }
      MotionLine.Turn turn = attitude.turn();
      if (turn != null) {
        pieces.add(Piece.quiet(spin == null ? " turned " : ", turned "));
        pieces.add(formula(turn.angle()));
        pieces.add(Piece.quiet(" about "));
        pieces.add(formula(turn.about()));
      }
      return new Line(pieces);
    }

    @Override
    public Line equation(MotionLine.Equation equation) {
      return equation(FormulaLayout.of(equation.rate(), Set.of()), equation.value());
    }

    @Override
    public Line local(MotionLine.Local local) {
      return equation(FormulaLayout.symbol(local.name().name(), false), local.value());
    }

    @Override
    public Line stop(MotionLine.Stop stop) {
      return Line.of(Piece.quiet("stop when "), formula(stop.condition()));
    }

    @Override
    public Line limit(MotionLine.Limit limit) {
      return Line.of(Piece.quiet("within "), formula(limit.time()));
    }

    @Override
    public Line body(MotionLine.Body body) {
      return Line.of(
          Piece.quiet("body "), symbol(body.name()), Piece.quiet(" about "), formula(body.about()));
    }

    @Override
    public Line load(MotionLine.Load load) {
      return Line.of(Piece.quiet("load "), formula(load.value()));
    }
  }
}
