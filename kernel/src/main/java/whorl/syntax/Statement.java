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

    R show(Show show);

    R check(Check check);

    R reproduction(Reproduction reproduction);

    R assumption(Assumption assumption);
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
}
