package whorl.laws;

import java.util.List;
import java.util.stream.Collectors;
import whorl.units.kind.Kind;

/** What a parameter of a law takes, or a law gives. */
public sealed interface Sort {
  /** In words with their article, as {@code an angular velocity}. */
  String withArticle();

  /**
   * A number of one of some kinds.
   *
   * @param kinds the usual one first; none for a number of any kind
   */
  record Real(List<Kind> kinds) implements Sort {
    /** Copies the list. */
    public Real {
      kinds = List.copyOf(kinds);
    }

    @Override
    public String withArticle() {
      return kinds.isEmpty() ? "a quantity" : either(kinds);
    }
  }

  /**
   * A vector of one of some kinds.
   *
   * @param kinds the usual one first; none for a vector of any kind, of which the direction counts
   */
  record Vector(List<Kind> kinds) implements Sort {
    /** Copies the list. */
    public Vector {
      kinds = List.copyOf(kinds);
    }

    @Override
    public String withArticle() {
      return kinds.isEmpty() ? "a vector" : either(kinds) + " as a vector";
    }
  }

  /** A thing in space. */
  record Thing(ThingSort sort) implements Sort {
    @Override
    public String withArticle() {
      return sort.withArticle();
    }
  }

  /** The name of a file below the folder of the note. */
  record File() implements Sort {
    @Override
    public String withArticle() {
      return "the name of a file in quotes";
    }
  }

  /** As many values of one sort as the author writes, at least one. */
  record Several(Sort of) implements Sort {
    @Override
    public String withArticle() {
      return of.withArticle() + " or more";
    }
  }

  /** A number of one kind. */
  static Sort number(String kind) {
    return new Real(List.of(Kind.named(kind)));
  }

  /** A vector of one kind. */
  static Sort vector(String kind) {
    return new Vector(List.of(Kind.named(kind)));
  }

  private static String either(List<Kind> kinds) {
    return kinds.stream().map(Kind::withArticle).collect(Collectors.joining(" or "));
  }
}
