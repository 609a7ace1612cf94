package whorl.sheet;

import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.jspecify.annotations.Nullable;
import whorl.check.Mentions;
import whorl.diagnostic.Diagnostic;
import whorl.diagnostic.Span;
import whorl.syntax.Statement;

/** What a statement left in the note: the material of one row of the ruled table. */
public sealed interface Step {
  /** Where its statement stands. */
  Place place();

  /** The statement as written. */
  Statement statement();

  /** What the argument of this step rests on and does not hold. */
  Standing standing();

  /** The assumptions and laws that fail now and on which this step depends. */
  default List<String> doubts() {
    return standing().doubts();
  }

  /** Answers one question for every form of step. */
  <R> R match(Cases<R> cases);

  /**
   * The forms of step, one method each.
   *
   * @param <R> type of the answer
   */
  interface Cases<R> {
    R defined(Defined defined);

    R function(Function function);

    R published(Published published);

    R shown(Shown shown);

    R checked(Checked checked);

    R reproduced(Reproduced reproduced);

    R assumed(Assumed assumed);

    R followed(Ran ran);

    R sketched(Sketched sketched);

    R waiting(Waiting waiting);

    R broken(Broken broken);
  }

  /**
   * A definition with its result.
   *
   * @param input whether the right side is a bare number or vector
   * @param with what went in, in the order of first mention; empty for an input
   * @param gives the result in the declared unit
   */
  record Defined(
      Place place,
      Statement.Definition statement,
      boolean input,
      List<Given> with,
      Quantity gives,
      Standing standing)
      implements Step {
    /** Copies the lists. */
    public Defined {
      with = List.copyOf(with);
    }

    @Override
    public <R> R match(Cases<R> cases) {
      return cases.defined(this);
    }
  }

  /**
   * A function definition.
   *
   * @param resultKind the kind of its result in words, or empty
   */
  record Function(
      Place place,
      Statement.Function statement,
      List<Given> with,
      String resultKind,
      Standing standing)
      implements Step {
    /** Copies the lists. */
    public Function {
      with = List.copyOf(with);
    }

    @Override
    public <R> R match(Cases<R> cases) {
      return cases.function(this);
    }
  }

  /**
   * A function published from a Java cell.
   *
   * @param label how messages call its cell
   * @param resultKind the kind of its result in words, or empty
   */
  record Published(Place place, String label, Statement.Published statement, String resultKind)
      implements Step {
    @Override
    public Standing standing() {
      return Standing.FIRM;
    }

    @Override
    public <R> R match(Cases<R> cases) {
      return cases.published(this);
    }
  }

  /** A shown expression. A name shown alone has nothing in {@code with}. */
  record Shown(
      Place place, Statement.Show statement, List<Given> with, Quantity gives, Standing standing)
      implements Step {
    /** Copies the lists. */
    public Shown {
      with = List.copyOf(with);
    }

    @Override
    public <R> R match(Cases<R> cases) {
      return cases.shown(this);
    }
  }

  /** A check of a condition. */
  record Checked(
      Place place, Statement.Check statement, List<Given> with, Verdict verdict, Standing standing)
      implements Step {
    /** Copies the lists. */
    public Checked {
      with = List.copyOf(with);
    }

    @Override
    public <R> R match(Cases<R> cases) {
      return cases.checked(this);
    }
  }

  /**
   * A hand-worked value reproduced.
   *
   * @param computed the value worked out here
   * @param stated the value worked by hand
   * @param deviation (computed − stated)/stated, a fraction
   * @param within the largest deviation allowed, a fraction
   */
  record Reproduced(
      Place place,
      Statement.Reproduction statement,
      List<Given> with,
      Quantity computed,
      Quantity stated,
      double deviation,
      double within,
      boolean holds,
      Standing standing)
      implements Step {
    /** Copies the lists. */
    public Reproduced {
      with = List.copyOf(with);
    }

    @Override
    public <R> R match(Cases<R> cases) {
      return cases.reproduced(this);
    }
  }

  /** A condition the argument rests on. */
  record Assumed(
      Place place,
      Statement.Assumption statement,
      List<Given> with,
      Verdict verdict,
      Standing standing)
      implements Step {
    /** Copies the lists. */
    public Assumed {
      with = List.copyOf(with);
    }

    @Override
    public <R> R match(Cases<R> cases) {
      return cases.assumed(this);
    }
  }

  /** A motion that was followed. */
  record Ran(
      Place place,
      Statement.Motion statement,
      List<Given> with,
      Followed followed,
      Standing standing)
      implements Step {
    /** Copies the list. */
    public Ran {
      with = List.copyOf(with);
    }

    @Override
    public <R> R match(Cases<R> cases) {
      return cases.followed(this);
    }
  }

  /**
   * A drawing of things in space.
   *
   * @param things in the order in which they are named
   */
  record Sketched(Place place, Statement.Sketch statement, List<Depicted> things, Standing standing)
      implements Step {
    /** Copies the list. */
    public Sketched {
      things = List.copyOf(things);
    }

    @Override
    public <R> R match(Cases<R> cases) {
      return cases.sketched(this);
    }
  }

  /**
   * A statement that waits for names which have no definition, or none that stands.
   *
   * @param names what it waits for
   * @param near for each name up to four defined names that are spelled alike
   */
  record Waiting(Place place, Statement statement, List<String> names, List<List<String>> near)
      implements Step {
    /** Copies the lists. */
    public Waiting {
      names = List.copyOf(names);
      near = List.copyOf(near);
    }

    /**
     * What is wrong with the statement once nothing more is to come; empty if all it waits for is
     * defined somewhere, so that the fault lies there.
     *
     * @param defined the names that the sheet defines or tries to define
     */
    public Optional<Diagnostic> undefined(Set<String> defined) {
      List<String> missing = names.stream().filter(name -> !defined.contains(name)).toList();
      if (missing.isEmpty()) {
        return Optional.empty();
      }
      List<String> alike =
          missing.stream()
              .flatMap(name -> near.get(names.indexOf(name)).stream())
              .distinct()
              .toList();
      Span first = Mentions.ofName(missing.get(0), statement).orElse(statement.span());
      return Optional.of(SheetMessages.undefined(first, missing, alike));
    }

    @Override
    public Standing standing() {
      return Standing.FIRM;
    }

    @Override
    public <R> R match(Cases<R> cases) {
      return cases.waiting(this);
    }
  }

  /**
   * A statement that a change elsewhere broke; its text stays.
   *
   * @param diagnostic what is wrong, in the text of its cell
   * @param last its last good result, now stale, or null
   */
  record Broken(Place place, Statement statement, Diagnostic diagnostic, @Nullable Quantity last)
      implements Step {
    @Override
    public Standing standing() {
      return Standing.FIRM;
    }

    @Override
    public <R> R match(Cases<R> cases) {
      return cases.broken(this);
    }
  }
}
