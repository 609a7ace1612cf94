package whorl.report;

/** A piece of a line, which each medium sets in its own way. */
sealed interface Piece {
  /** Answers one question for every form. */
  <R> R match(Cases<R> cases);

  /**
   * The forms, one method each.
   *
   * @param <R> type of the answer
   */
  interface Cases<R> {
    R formula(Formula formula);

    R value(Value value);

    R words(Words words);

    R state(State state);
  }

  /** A formula. */
  record Formula(Layout layout) implements Piece {
    @Override
    public <R> R match(Cases<R> cases) {
      return cases.formula(this);
    }
  }

  /** Digits and units. */
  record Value(String text) implements Piece {
    @Override
    public <R> R match(Cases<R> cases) {
      return cases.value(this);
    }
  }

  /**
   * Words.
   *
   * @param quiet whether they stand back behind what they explain
   */
  record Words(String text, boolean quiet) implements Piece {
    @Override
    public <R> R match(Cases<R> cases) {
      return cases.words(this);
    }
  }

  /** A word that says how the row stands. */
  record State(String text, Tone tone) implements Piece {
    @Override
    public <R> R match(Cases<R> cases) {
      return cases.state(this);
    }
  }

  /** Words to be read. */
  static Piece words(String text) {
    return new Words(text, false);
  }

  /** Words that stand back. */
  static Piece quiet(String text) {
    return new Words(text, true);
  }
}
