package whorl.check;

import java.util.List;
import java.util.Set;
import java.util.stream.Stream;
import whorl.laws.Laws;

/** Words of the language that are no names of a sheet. */
public final class Vocabulary {
  /** Functions of the language that this version does not work out. */
  private static final Set<String> LATER = Set.of("sum");

  private Vocabulary() {}

  /** Whether a name is a function at hand or a law, which a definition may hide. */
  public static boolean isFunction(String name) {
    return FunctionAtHand.named(name).isPresent()
        || CourseFunction.named(name).isPresent()
        || !Laws.named(name).isEmpty();
  }

  /** Whether a name is a function of the language that this version does not work out. */
  static boolean isLater(String name) {
    return LATER.contains(name);
  }

  /** Every name at hand. */
  public static List<String> atHand() {
    return Stream.concat(
            ConstantAtHand.all().stream().map(ConstantAtHand::symbol),
            Stream.concat(
                Stream.of(FunctionAtHand.values()).map(FunctionAtHand::word),
                Stream.concat(
                    Stream.of(CourseFunction.values()).map(CourseFunction::word),
                    Laws.names().stream())))
        .sorted()
        .toList();
  }
}
