package whorl.laws;

import java.util.List;

/**
 * What turns values into a value: a law of the catalogue, or something plainer, as the reading of a
 * part.
 */
public interface Rule {
  /** What messages call it. */
  String name();

  /** The words of its parameters, in the order of {@link Given}. */
  List<String> parameterWords();

  /** What it works out. */
  Work work();

  /** Where it holds; empty for what always does. */
  List<Validity> validity();
}
