package whorl.report;

import java.util.List;

/**
 * How a formula stands on the page, apart from the medium: what is a fraction, what is raised, what
 * needs parentheses. HTML and plain text both set this one tree.
 */
sealed interface Layout {
  /** How tightly it holds together next to an operator. */
  Binding binding();

  /** Answers one question for every form. */
  <R> R match(Cases<R> cases);

  /**
   * The forms, one method each.
   *
   * @param <R> type of the answer
   */
  interface Cases<R> {
    R symbol(Symbol symbol);

    R upright(Upright upright);

    R measure(Measure measure);

    R side(SideBySide side);

    R terms(Terms terms);

    R product(Product product);

    R fraction(Fraction fraction);

    R raised(Raised raised);

    R root(Root root);

    R bars(Bars bars);

    R group(Group group);

    R branches(Branches branches);
  }

  /** From the loosest to the tightest. */
  enum Binding {
    CHOICE,
    ANY_OF,
    ALL_OF,
    COMPARISON,
    TOLERANCE,
    SUM,
    PRODUCT,
    MEASURE,
    SIGN,
    POWER,
    ATOM
  }

  /**
   * A name: its letter or word and its subscript.
   *
   * @param subscript upright; empty for none
   */
  record Symbol(String base, Face face, String subscript) implements Layout {
    @Override
    public Binding binding() {
      return Binding.ATOM;
    }

    @Override
    public <R> R match(Cases<R> cases) {
      return cases.symbol(this);
    }
  }

  /** The slope and weight of a symbol: quantities italic, vectors bold too, words upright. */
  enum Face {
    ITALIC,
    BOLD_ITALIC,
    UPRIGHT
  }

  /** Digits, words and the names of functions. */
  record Upright(String text) implements Layout {
    @Override
    public Binding binding() {
      return text.startsWith("−") ? Binding.SIGN : Binding.ATOM;
    }

    @Override
    public <R> R match(Cases<R> cases) {
      return cases.upright(this);
    }
  }

  /** A value with a unit behind it. */
  record Measure(Layout value, String unit) implements Layout {
    @Override
    public Binding binding() {
      return Binding.MEASURE;
    }

    @Override
    public <R> R match(Cases<R> cases) {
      return cases.measure(this);
    }
  }

  /** Pieces that stand side by side and are never parted. */
  record SideBySide(Binding binding, List<Layout> pieces) implements Layout {
    /** Copies the pieces. */
    public SideBySide {
      pieces = List.copyOf(pieces);
    }

    @Override
    public <R> R match(Cases<R> cases) {
      return cases.side(this);
    }
  }

  /** What stands behind a sign; the sign in front of the first is empty. */
  record Term(String sign, Layout value) {}

  /** Values with signs or words between them; a long one breaks in front of a sign. */
  record Terms(Binding binding, List<Term> terms) implements Layout {
    /** Copies the terms. */
    public Terms {
      terms = List.copyOf(terms);
    }

    @Override
    public <R> R match(Cases<R> cases) {
      return cases.terms(this);
    }
  }

  /** How a factor is joined to those in front of it. */
  enum Joint {
    TIMES,
    CROSS,
    DOT
  }

  /** A factor. */
  record Factor(Joint joint, Layout value) {}

  /** A product of two factors or more. */
  record Product(List<Factor> factors) implements Layout {
    /** Copies the factors. */
    public Product {
      factors = List.copyOf(factors);
    }

    @Override
    public Binding binding() {
      return Binding.PRODUCT;
    }

    @Override
    public <R> R match(Cases<R> cases) {
      return cases.product(this);
    }
  }

  /**
   * A fraction.
   *
   * @param stacked whether it may be set with a bar; inside parentheses, exponents and fractions it
   *     is set with a solidus, so that no line grows higher than two
   */
  record Fraction(Layout over, Layout under, boolean stacked) implements Layout {
    @Override
    public Binding binding() {
      return stacked ? Binding.MEASURE : Binding.PRODUCT;
    }

    @Override
    public <R> R match(Cases<R> cases) {
      return cases.fraction(this);
    }
  }

  /** A power. */
  record Raised(Layout base, Layout exponent) implements Layout {
    @Override
    public Binding binding() {
      return Binding.POWER;
    }

    @Override
    public <R> R match(Cases<R> cases) {
      return cases.raised(this);
    }
  }

  /** A square root, or a cube root. */
  record Root(boolean cube, Layout radicand) implements Layout {
    @Override
    public Binding binding() {
      return Binding.POWER;
    }

    @Override
    public <R> R match(Cases<R> cases) {
      return cases.root(this);
    }
  }

  /** A magnitude. */
  record Bars(Layout body) implements Layout {
    @Override
    public Binding binding() {
      return Binding.ATOM;
    }

    @Override
    public <R> R match(Cases<R> cases) {
      return cases.bars(this);
    }
  }

  /** Something in parentheses: a group, a vector, the arguments of a function. */
  record Group(List<Layout> members) implements Layout {
    /** Copies the members. */
    public Group {
      members = List.copyOf(members);
    }

    @Override
    public Binding binding() {
      return Binding.ATOM;
    }

    @Override
    public <R> R match(Cases<R> cases) {
      return cases.group(this);
    }
  }

  /** A value and when it applies. */
  record Branch(Layout value, Layout condition) {}

  /** Values by case. */
  record Branches(List<Branch> branches, Layout otherwise) implements Layout {
    /** Copies the branches. */
    public Branches {
      branches = List.copyOf(branches);
    }

    @Override
    public Binding binding() {
      return Binding.CHOICE;
    }

    @Override
    public <R> R match(Cases<R> cases) {
      return cases.branches(this);
    }
  }
}
