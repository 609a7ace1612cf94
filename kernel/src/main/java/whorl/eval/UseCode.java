package whorl.eval;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;
import whorl.check.Operation;
import whorl.eval.NumericFailure.Reason;
import whorl.laws.Given;
import whorl.laws.Rule;
import whorl.laws.Validity;
import whorl.laws.Work;
import whorl.mechanics.Refusal;

/**
 * A rule at work: works out what goes in, from left to right, then the rule, and notes where it was
 * used outside its validity.
 *
 * @param site the use
 * @param rule the rule
 * @param arguments what goes in
 * @param files files that go in
 */
record UseCode(Site site, Rule rule, List<Argument> arguments, List<File> files) {
  /** A file that goes in for one parameter. */
  record File(int parameter, Path path, Site site) {}

  /** What goes in for one parameter; several values for a parameter that takes a list. */
  record Argument(int parameter, List<Code> values, boolean list, Site site) {
    void give(Activation activation, Given given) {
      if (!list) {
        values.get(0).give(activation, given, parameter);
        return;
      }
      var members = new ArrayList<Object>();
      for (Code value : values) {
        members.add(
            value instanceof Code.Vector vector
                ? vector3D(vector.in(activation))
                : ((Code.Thing) value).in(activation));
      }
      given.put(parameter, List.copyOf(members));
    }
  }

  static UseCode of(Site site, Operation.Use use, CodeWriter writer) {
    List<Argument> arguments =
        use.arguments().stream()
            .map(
                argument ->
                    new Argument(
                        argument.parameter(),
                        argument.values().stream().map(writer::any).toList(),
                        argument.list(),
                        writer.site(argument.values().get(0).span())))
            .toList();
    List<File> files =
        use.files().stream()
            .map(file -> new File(file.parameter(), file.file(), writer.site(file.span())))
            .toList();
    return new UseCode(site, use.rule(), arguments, files);
  }

  private static Vector3D vector3D(Value.Vector vector) {
    return new Vector3D(vector.x(), vector.y(), vector.z());
  }

  double real(Activation activation, Work.Real work) {
    Given given = given(activation);
    double value;
    try {
      value = work.of(given);
    } catch (Refusal refusal) {
      throw refused(refusal);
    }
    if (!Double.isFinite(value)) {
      throw site.noValue(Reason.OVERFLOW, value);
    }
    judge(activation, given);
    return value;
  }

  Value.Vector vector(Activation activation, Work.Vector work) {
    Given given = given(activation);
    Vector3D value;
    try {
      value = work.of(given);
    } catch (Refusal refusal) {
      throw refused(refusal);
    }
    judge(activation, given);
    return VectorArithmetic.finite(value.getX(), value.getY(), value.getZ(), site, Double.NaN);
  }

  Object thing(Activation activation, Work.Thing work) {
    Given given = given(activation);
    Object value;
    try {
      value = work.of(given);
    } catch (Refusal refusal) {
      throw refused(refusal);
    }
    judge(activation, given);
    return value;
  }

  private Given given(Activation activation) {
    var given = new Given(rule.parameterWords().size());
    for (Argument argument : arguments) {
      argument.give(activation, given);
    }
    files.forEach(file -> given.put(file.parameter(), file.path()));
    return given;
  }

  private void judge(Activation activation, Given given) {
    for (Validity validity : rule.validity()) {
      if (!validity.holds().test(given)) {
        activation.breach(new Breach(rule.name(), validity.text(), site.span(), site.inFunction()));
      }
    }
  }

  /** The refusal at the argument that it is about, if the author wrote that one. */
  private NoValue refused(Refusal refusal) {
    int parameter = rule.parameterWords().indexOf(refusal.subject());
    Site place =
        Stream.concat(
                arguments.stream()
                    .filter(argument -> argument.parameter() == parameter)
                    .map(Argument::site),
                files.stream().filter(file -> file.parameter() == parameter).map(File::site))
            .findFirst()
            .orElse(site);
    return place.noValue(new NumericFailure.Refused(rule.name(), refusal.reason(), refusal.fix()));
  }
}
