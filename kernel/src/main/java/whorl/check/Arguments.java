package whorl.check;

import java.util.ArrayList;
import java.util.List;
import whorl.syntax.Expr;

/** Puts the arguments of a call in the order of the parameters. */
final class Arguments {
  private Arguments() {}

  /** The value for each parameter, whether given by position or by name. */
  static List<Expr> inOrder(Expr.Call call, Meaning.Function function) {
    List<String> names = function.parameters().stream().map(Meaning.Parameter::name).toList();
    var values = new ArrayList<Expr>();
    for (int i = 0; i < names.size(); i++) {
      values.add(null);
    }
    int position = 0;
    for (Expr.Argument argument : call.arguments()) {
      int index = argument.name() == null ? position++ : names.indexOf(argument.name().name());
      if (index < 0) {
        throw CheckMessages.noSuchParameter(argument, function);
      }
      if (index >= names.size()) {
        throw CheckMessages.tooManyArguments(argument, function);
      }
      if (values.get(index) != null) {
        throw CheckMessages.argumentTwice(argument, names.get(index), function);
      }
      values.set(index, argument.value());
    }
    int missing = values.indexOf(null);
    if (missing >= 0) {
      throw CheckMessages.argumentMissing(call, names.get(missing), function);
    }
    return values;
  }
}
