package whorl.syntax;

import java.util.List;
import org.jspecify.annotations.Nullable;
import whorl.diagnostic.Span;
import whorl.units.UnitText;

/** A statement of a sheet as written. */
public sealed interface Statement {
  /** Where it stands, without its remark. */
  Span span();

  /** The remark behind it, or empty. */
  String remark();

  /** Answers one question for every form of statement. */
  <R> R match(Cases<R> cases);

  /**
   * The forms of statement, one method each.
   *
   * @param <R> type of the answer
   */
  interface Cases<R> {
    R definition(Definition definition);

    R function(Function function);

    R published(Published published);

    R show(Show show);

    R check(Check check);

    R reproduction(Reproduction reproduction);

    R assumption(Assumption assumption);

    R caseSet(CaseSet caseSet);

    R data(Data data);

    R motion(Motion motion);

    R solve(Solve solve);

    R vary(Vary vary);

    R plot(Plot plot);

    R sketch(Sketch sketch);

    R spread(Spread spread);

    R review(Review review);
  }

  /**
   * A unit in brackets, with the kind named behind it if any.
   *
   * @param unit the unit; an empty product is {@code [1]}
   * @param kind the words of the kind, joined by single blanks, or null
   */
  record Bracket(Span span, UnitText unit, @Nullable String kind, @Nullable Span kindSpan) {}

  /** {@code name = expression} behind {@code with}. */
  record Change(Span span, Expr.Name name, Expr value) {}

  /** {@code name [unit] = expression with …}. */
  record Definition(
      Span span,
      Expr.Name name,
      @Nullable Bracket bracket,
      Expr value,
      List<Change> changes,
      String remark)
      implements Statement {
    /** Copies the changes. */
    public Definition {
      changes = List.copyOf(changes);
    }

    @Override
    public <R> R match(Cases<R> cases) {
      return cases.definition(this);
    }
  }

  /** A parameter of a function, a plain number where no unit is given. */
  record Parameter(Span span, Expr.Name name, @Nullable Bracket bracket) {}

  /** {@code f(x [unit], …) [unit] = expression}. */
  record Function(
      Span span,
      Expr.Name name,
      List<Parameter> parameters,
      @Nullable Bracket bracket,
      Expr body,
      String remark)
      implements Statement {
    /** Copies the parameters. */
    public Function {
      parameters = List.copyOf(parameters);
    }

    @Override
    public <R> R match(Cases<R> cases) {
      return cases.function(this);
    }
  }

  /**
   * {@code f(x [unit], …) [unit]}: the head of a function that is worked out outside the sheet. It
   * may have no parameters.
   */
  record Published(
      Span span, Expr.Name name, List<Parameter> parameters, Bracket bracket, String remark)
      implements Statement {
    /** Copies the parameters. */
    public Published {
      parameters = List.copyOf(parameters);
    }

    @Override
    public <R> R match(Cases<R> cases) {
      return cases.published(this);
    }
  }

  /** {@code expression [unit]}. */
  record Show(Span span, Expr value, @Nullable Bracket bracket, String remark)
      implements Statement {
    @Override
    public <R> R match(Cases<R> cases) {
      return cases.show(this);
    }
  }

  /** {@code check condition}. */
  record Check(Span span, boolean nominal, Expr condition, String remark) implements Statement {
    @Override
    public <R> R match(Cases<R> cases) {
      return cases.check(this);
    }
  }

  /** {@code check value = stated within deviation}. */
  record Reproduction(
      Span span, boolean nominal, Expr value, Expr stated, Expr within, String remark)
      implements Statement {
    @Override
    public <R> R match(Cases<R> cases) {
      return cases.reproduction(this);
    }
  }

  /** {@code assume condition}. */
  record Assumption(Span span, Expr condition, String remark) implements Statement {
    @Override
    public <R> R match(Cases<R> cases) {
      return cases.assumption(this);
    }
  }

  /** A column of a case set or of data. */
  record Column(Span span, Expr.Name name, @Nullable Bracket bracket) {}

  /**
   * A case with its values, one for each column.
   *
   * @param label the name of the case, or a text where it is no name
   */
  record CaseRow(Span span, Expr label, List<Expr> values, String remark) {
    /** Copies the values. */
    public CaseRow {
      values = List.copyOf(values);
    }
  }

  /**
   * {@code cases name: columns} with rows, or {@code cases name from "file": columns}.
   *
   * @param file the file that holds the rows, or null where they stand below
   * @param rows empty where a file holds them
   */
  record CaseSet(
      Span span,
      Expr.Name name,
      Expr.@Nullable Text file,
      List<Column> columns,
      List<CaseRow> rows,
      String remark)
      implements Statement {
    /** Copies the columns and the rows. */
    public CaseSet {
      columns = List.copyOf(columns);
      rows = List.copyOf(rows);
    }

    @Override
    public <R> R match(Cases<R> cases) {
      return cases.caseSet(this);
    }
  }

  /** A point of data, one value for each column. */
  record DataRow(Span span, List<Expr> values, String remark) {
    /** Copies the values. */
    public DataRow {
      values = List.copyOf(values);
    }
  }

  /**
   * {@code data name: columns} with rows, or {@code data name from "file": columns}.
   *
   * @param file the file that holds the rows, or null where they stand below
   * @param rows empty where a file holds them
   */
  record Data(
      Span span,
      Expr.Name name,
      Expr.@Nullable Text file,
      List<Column> columns,
      List<DataRow> rows,
      String remark)
      implements Statement {
    /** Copies the columns and the rows. */
    public Data {
      columns = List.copyOf(columns);
      rows = List.copyOf(rows);
    }

    @Override
    public <R> R match(Cases<R> cases) {
      return cases.data(this);
    }
  }

  /** {@code motion name} with its lines. */
  record Motion(Span span, Expr.Name name, List<MotionLine> lines, String remark)
      implements Statement {
    /** Copies the lines. */
    public Motion {
      lines = List.copyOf(lines);
    }

    @Override
    public <R> R match(Cases<R> cases) {
      return cases.motion(this);
    }
  }

  /** The name that takes what {@code solve} finds. */
  record Target(Span span, Expr.Name name, @Nullable Bracket bracket) {}

  /** {@code name between from and to}. */
  record Unknown(Span span, Expr.Name name, Expr from, Expr to) {}

  /**
   * A condition that the unknowns must meet.
   *
   * @param relation how the sides must stand, or null where they must be equal
   */
  record Condition(Span span, Expr left, Expr.@Nullable Relation relation, Expr right) {}

  /** Which end of a value is looked for. */
  enum Aim {
    LEAST,
    MOST
  }

  /** {@code for least value} or {@code for most value}. */
  record Goal(Span span, Aim aim, Expr value) {}

  /**
   * {@code solve unknowns so that conditions for least value}.
   *
   * @param target the name it defines, or null where it stands alone
   * @param conditions empty where there is only a goal
   * @param goal null where there are only conditions
   */
  record Solve(
      Span span,
      @Nullable Target target,
      List<Unknown> unknowns,
      List<Condition> conditions,
      @Nullable Goal goal,
      String remark)
      implements Statement {
    /** Copies the unknowns and the conditions. */
    public Solve {
      unknowns = List.copyOf(unknowns);
      conditions = List.copyOf(conditions);
    }

    @Override
    public <R> R match(Cases<R> cases) {
      return cases.solve(this);
    }
  }

  /** How far a range goes from one value to the next. */
  sealed interface Stride {
    /** {@code by step}. */
    record Equal(Expr step) implements Stride {}

    /** {@code in steps steps}, equal ones or, with {@code by ratio}, in equal ratios. */
    record Counted(int steps, boolean byRatio) implements Stride {}
  }

  /** The values that an input runs through. */
  sealed interface Range {
    /** Where it stands. */
    Span span();

    /** The input. */
    Expr.Name name();

    /**
     * {@code name from from to to}.
     *
     * @param stride null in a plot that leaves it open
     */
    record Stretch(Span span, Expr.Name name, Expr from, Expr to, @Nullable Stride stride)
        implements Range {}

    /** {@code name over values}. */
    record Listed(Span span, Expr.Name name, List<Expr> values) implements Range {
      /** Copies the values. */
      public Listed {
        values = List.copyOf(values);
      }
    }
  }

  /** A column of what a study shows. */
  sealed interface Output {
    /** Where it stands. */
    Span span();

    /** {@code expression [unit]}. */
    record Shown(Span span, Expr value, @Nullable Bracket bracket) implements Output {}

    /** {@code checks}. */
    record Checks(Span span) implements Output {}
  }

  /**
   * {@code vary ranges: outputs}.
   *
   * @param name the name of the table, or null where it stands alone
   */
  record Vary(
      Span span, Expr.@Nullable Name name, List<Range> ranges, List<Output> outputs, String remark)
      implements Statement {
    /** Copies the ranges and the outputs. */
    public Vary {
      ranges = List.copyOf(ranges);
      outputs = List.copyOf(outputs);
    }

    @Override
    public <R> R match(Cases<R> cases) {
      return cases.vary(this);
    }
  }

  /** What a plot is drawn against. */
  sealed interface Abscissa {
    /** An input that runs through a range. */
    record OverRange(Range range) implements Abscissa {}

    /** A course, a column or a value. */
    record Along(Expr course) implements Abscissa {}
  }

  /**
   * {@code plot outputs against abscissa}.
   *
   * @param against null where the outputs say it themselves
   */
  record Plot(Span span, List<Output> outputs, @Nullable Abscissa against, String remark)
      implements Statement {
    /** Copies the outputs. */
    public Plot {
      outputs = List.copyOf(outputs);
    }

    @Override
    public <R> R match(Cases<R> cases) {
      return cases.plot(this);
    }
  }

  /** {@code sketch things}. */
  record Sketch(Span span, List<Expr> things, String remark) implements Statement {
    /** Copies the things. */
    public Sketch {
      things = List.copyOf(things);
    }

    @Override
    public <R> R match(Cases<R> cases) {
      return cases.sketch(this);
    }
  }

  /** {@code spread name}. */
  record Spread(Span span, Expr.Name name, String remark) implements Statement {
    @Override
    public <R> R match(Cases<R> cases) {
      return cases.spread(this);
    }
  }

  /** {@code review}. */
  record Review(Span span, String remark) implements Statement {
    @Override
    public <R> R match(Cases<R> cases) {
      return cases.review(this);
    }
  }
}
