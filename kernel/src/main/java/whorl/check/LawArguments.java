package whorl.check;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import whorl.laws.Law;
import whorl.laws.Need;
import whorl.laws.Parameter;
import whorl.laws.Sort;
import whorl.syntax.Expr;

/**
 * The arguments of a call by the parameters of a law.
 *
 * @param law the law
 * @param values for each parameter what the call gives for it, none where it is left out
 */
record LawArguments(Law law, List<List<Expr>> values) {
  /**
   * Puts the arguments of a call in the order of the parameters of a law.
   *
   * @throws CheckFailure where the law has no parameter for one of them
   */
  static LawArguments of(Expr.Call call, Law law) {
    List<Parameter> parameters = law.parameters();
    var values = new ArrayList<List<Expr>>();
    parameters.forEach(parameter -> values.add(new ArrayList<>()));
    List<Integer> positions = positions(law);
    int position = 0;
    for (Expr.Argument argument : call.arguments()) {
      int index;
      if (argument.name() != null) {
        index = law.parameterWords().indexOf(argument.name().name());
        if (index < 0) {
          throw LawMessages.noSuchParameter(argument, law);
        }
      } else {
        if (position >= positions.size()) {
          throw LawMessages.tooMany(argument, law);
        }
        index = positions.get(position);
        boolean list = parameters.get(index).sort() instanceof Sort.Several;
        position += list ? 0 : 1;
      }
      boolean list = parameters.get(index).sort() instanceof Sort.Several;
      if (!list && !values.get(index).isEmpty()) {
        throw LawMessages.twice(argument, parameters.get(index), law);
      }
      values.get(index).add(argument.value());
    }
    return new LawArguments(law, values);
  }

  /** The parameters that values in order go to: of those of which one is given, the first. */
  private static List<Integer> positions(Law law) {
    var positions = new ArrayList<Integer>();
    for (int i = 0; i < law.parameters().size(); i++) {
      Parameter parameter = law.parameters().get(i);
      boolean later =
          parameter.need() instanceof Need.OneOf one
              && !law.group(one.group()).get(0).equals(parameter);
      if (!later) {
        positions.add(i);
      }
    }
    return positions;
  }

  /** What is wrong where something that must be given is left out, or too much is given. */
  Optional<CheckFailure> incomplete(Expr.Call call) {
    for (int i = 0; i < values.size(); i++) {
      Parameter parameter = law.parameters().get(i);
      if (parameter.isRequired() && values.get(i).isEmpty()) {
        return Optional.of(LawMessages.missing(call, parameter, law));
      } else if (parameter.need() instanceof Need.OneOf one) {
        Optional<CheckFailure> failure = notOne(call, law.group(one.group()));
        if (failure.isPresent()) {
          return failure;
        }
      }
    }
    return Optional.empty();
  }

  private Optional<CheckFailure> notOne(Expr.Call call, List<Parameter> group) {
    List<Parameter> given =
        group.stream().filter(parameter -> value(parameter.word()) != null).toList();
    if (given.isEmpty()) {
      return Optional.of(LawMessages.noneOf(call, group, law));
    }
    return given.size() > 1
        ? Optional.of(LawMessages.severalOf(call, given, law))
        : Optional.empty();
  }

  /** What is given for a parameter by its number; none where it is left out. */
  List<Expr> values(int index) {
    return values.get(index);
  }

  /**
   * What is given for a parameter, or null where it is left out or the law has none of the word.
   */
  @Nullable Expr value(String word) {
    int index = law.parameterWords().indexOf(word);
    return index < 0 || values.get(index).isEmpty() ? null : values.get(index).get(0);
  }
}
