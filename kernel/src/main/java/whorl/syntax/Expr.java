package whorl.syntax;

import java.util.List;
import org.jspecify.annotations.Nullable;
import whorl.diagnostic.Span;
import whorl.units.UnitText;

/**
 * An expression as written. Names are folded ({@code omega} is {@code ω}); parentheses are not
 * kept, since the tree says what they said. A chain of equal operators is one node with a list, so
 * that only nesting costs depth.
 */
public sealed interface Expr {
  /** Where it stands. */
  Span span();

  /** Answers one question for every form of expression. */
  <R> R match(Cases<R> cases);

  /**
   * The forms of expression, one method each.
   *
   * @param <R> type of the answer
   */
  interface Cases<R> {
    R numeral(Numeral numeral);

    R inUnit(InUnit inUnit);

    R name(Name name);

    R part(Part part);

    R rate(Rate rate);

    R inFrame(InFrame inFrame);

    R vector(Vector vector);

    R negation(Negation negation);

    R sum(Sum sum);

    R product(Product product);

    R power(Power power);

    R magnitude(Magnitude magnitude);

    R tolerance(Tolerance tolerance);

    R comparison(Comparison comparison);

    R allOf(AllOf allOf);

    R anyOf(AnyOf anyOf);

    R choice(Choice choice);

    R call(Call call);

    R text(Text text);

    R truth(Truth truth);
  }

  /** A unit and where it stands. */
  record UnitAt(Span span, UnitText text) {}

  /**
   * A number with the unit that stands tight behind it, if any.
   *
   * @param digits canonical digits, as {@code 0.5e-3}; negative only for a reading such as {@code
   *     -20 degC}, where the sign belongs to the number
   * @param value the number
   */
  record Numeral(Span span, String digits, double value, @Nullable UnitAt unit) implements Expr {
    @Override
    public <R> R match(Cases<R> cases) {
      return cases.numeral(this);
    }
  }

  /** A group or vector with a unit behind its closing parenthesis, {@code (1/2) in}. */
  record InUnit(Span span, Expr group, UnitAt unit) implements Expr {
    @Override
    public <R> R match(Cases<R> cases) {
      return cases.inUnit(this);
    }
  }

  /** A name, folded. */
  record Name(Span span, String name) implements Expr {
    @Override
    public <R> R match(Cases<R> cases) {
      return cases.name(this);
    }
  }

  /** A part read with a dot, {@code rotor.mass}. */
  record Part(Span span, Expr of, Name name) implements Expr {
    @Override
    public <R> R match(Cases<R> cases) {
      return cases.part(this);
    }
  }

  /** A rate, {@code ω'}. */
  record Rate(Span span, Expr of) implements Expr {
    @Override
    public <R> R match(Cases<R> cases) {
      return cases.rate(this);
    }
  }

  /** A vector stated in a frame, {@code v @ ship}. */
  record InFrame(Span span, Expr vector, Expr frame) implements Expr {
    @Override
    public <R> R match(Cases<R> cases) {
      return cases.inFrame(this);
    }
  }

  /** A vector of three parts. */
  record Vector(Span span, Expr x, Expr y, Expr z) implements Expr {
    @Override
    public <R> R match(Cases<R> cases) {
      return cases.vector(this);
    }
  }

  /** A minus sign. */
  record Negation(Span span, Expr operand) implements Expr {
    @Override
    public <R> R match(Cases<R> cases) {
      return cases.negation(this);
    }
  }

  /** A term of a sum: subtracted or added; the first term is added. */
  record Term(boolean subtracted, Expr value) {}

  /** A sum of two terms or more. */
  record Sum(Span span, List<Term> terms) implements Expr {
    /** Copies the terms. */
    public Sum {
      terms = List.copyOf(terms);
    }

    @Override
    public <R> R match(Cases<R> cases) {
      return cases.sum(this);
    }
  }

  /** What joins a factor to those before it; the first factor has {@link #TIMES}. */
  enum Joint {
    TIMES,
    OVER,
    CROSS,
    DOT
  }

  /** A factor of a product. */
  record Factor(Joint joint, Expr value) {}

  /** A product of two factors or more, read from left to right. */
  record Product(Span span, List<Factor> factors) implements Expr {
    /** Copies the factors. */
    public Product {
      factors = List.copyOf(factors);
    }

    @Override
    public <R> R match(Cases<R> cases) {
      return cases.product(this);
    }
  }

  /** A power. */
  record Power(Span span, Expr base, Expr exponent) implements Expr {
    @Override
    public <R> R match(Cases<R> cases) {
      return cases.power(this);
    }
  }

  /** A magnitude, {@code |v|}. */
  record Magnitude(Span span, Expr operand) implements Expr {
    @Override
    public <R> R match(Cases<R> cases) {
      return cases.magnitude(this);
    }
  }

  /** A value with its limits or its expanded uncertainty, {@code 412 ± 2 (k = 2)}. */
  record Tolerance(Span span, Expr value, Expr half, @Nullable Numeral coverage) implements Expr {
    @Override
    public <R> R match(Cases<R> cases) {
      return cases.tolerance(this);
    }
  }

  /** How two sides of a comparison stand. */
  enum Relation {
    LESS("<"),
    AT_MOST("≤"),
    MORE(">"),
    AT_LEAST("≥");

    private final String sign;

    Relation(String sign) {
      this.sign = sign;
    }

    /** The sign as written in canonical text. */
    public String sign() {
      return sign;
    }
  }

  /** A comparison of two sides. */
  record Comparison(Span span, Expr left, Relation relation, Expr right) implements Expr {
    @Override
    public <R> R match(Cases<R> cases) {
      return cases.comparison(this);
    }
  }

  /** Conditions joined by {@code and}. */
  record AllOf(Span span, List<Expr> conditions) implements Expr {
    /** Copies the conditions. */
    public AllOf {
      conditions = List.copyOf(conditions);
    }

    @Override
    public <R> R match(Cases<R> cases) {
      return cases.allOf(this);
    }
  }

  /** Conditions joined by {@code or}. */
  record AnyOf(Span span, List<Expr> conditions) implements Expr {
    /** Copies the conditions. */
    public AnyOf {
      conditions = List.copyOf(conditions);
    }

    @Override
    public <R> R match(Cases<R> cases) {
      return cases.anyOf(this);
    }
  }

  /** {@code if … then … else …}. */
  record Choice(Span span, Expr condition, Expr then, Expr otherwise) implements Expr {
    @Override
    public <R> R match(Cases<R> cases) {
      return cases.choice(this);
    }
  }

  /** An argument of a call, by position or by name. */
  record Argument(Span span, @Nullable Name name, Expr value) {}

  /** A call, with the case set it runs over where one is given. */
  record Call(Span span, Name function, List<Argument> arguments, @Nullable Name over)
      implements Expr {
    /** Copies the arguments. */
    public Call {
      arguments = List.copyOf(arguments);
    }

    @Override
    public <R> R match(Cases<R> cases) {
      return cases.call(this);
    }
  }

  /** A text literal. */
  record Text(Span span, String value) implements Expr {
    @Override
    public <R> R match(Cases<R> cases) {
      return cases.text(this);
    }
  }

  /** {@code true} or {@code false}. */
  record Truth(Span span, boolean value) implements Expr {
    @Override
    public <R> R match(Cases<R> cases) {
      return cases.truth(this);
    }
  }
}
