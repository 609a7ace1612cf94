package whorl.laws;

import java.util.LinkedHashSet;
import java.util.List;
import java.util.stream.Collectors;

/**
 * A formula with its papers. Several laws may share a name and differ in what they take, as the
 * inertia about an axis and about a point do.
 *
 * @param name by which the language calls it
 * @param title what it is, in a few words
 * @param room where it stands in the catalogue
 * @param parameters in the order in which a call gives them
 * @param result what it gives
 * @param formula what it works out, in the symbols of its parameters
 * @param validity where it holds; empty for what always does
 * @param source where it comes from
 * @param example a worked example
 * @param work works it out
 */
public record Law(
    String name,
    String title,
    Room room,
    List<Parameter> parameters,
    Result result,
    String formula,
    List<Validity> validity,
    String source,
    Example example,
    Work work)
    implements Rule {
  /** Copies the lists. */
  public Law {
    parameters = List.copyOf(parameters);
    validity = List.copyOf(validity);
  }

  /**
   * What a law gives.
   *
   * @param sort of the result
   * @param about the parameter that it is taken about; empty for a plain quantity
   * @param of the parameter whose body or force it is of, or that is of the same; empty where that
   *     is of no use
   */
  public record Result(Sort sort, String about, String of) {}

  @Override
  public List<String> parameterWords() {
    return parameters.stream().map(Parameter::word).toList();
  }

  /**
   * How it is called, as {@code ring(diameter or radius, mass)}; what may be left out has a mark.
   */
  public String head() {
    var parts = new LinkedHashSet<String>();
    for (Parameter parameter : parameters) {
      parts.add(part(parameter));
    }
    return name + "(" + String.join(", ", parts) + ")";
  }

  private String part(Parameter parameter) {
    if (parameter.need() instanceof Need.OneOf one) {
      return group(one.group()).stream().map(Parameter::word).collect(Collectors.joining(" or "));
    } else if (parameter.sort() instanceof Sort.Several) {
      return parameter.word() + ", …";
    }
    return parameter.isRequired() ? parameter.word() : parameter.word() + "?";
  }

  /** The parameters of which exactly one is to be given. */
  public List<Parameter> group(String group) {
    return parameters.stream()
        .filter(parameter -> parameter.need().equals(new Need.OneOf(group)))
        .toList();
  }
}
