package whorl.sheet;

import java.util.Optional;
import whorl.eval.Value;
import whorl.laws.ThingSort;

/** Tells what a recalculation changed. */
final class Change {
  private Change() {}

  /** A definition that came to another value. */
  static Optional<CellOutcome.Change> between(
      Node node, Optional<Result> before, Optional<Result> now) {
    if (node.defines().isPresent()
        && before.orElse(null) instanceof Result.Valued was
        && now.orElse(null) instanceof Result.Valued is
        && !isCourse(is.value())) {
      Quantity old = Quantities.of(node, was);
      Quantity fresh = Quantities.of(node, is);
      return old.equals(fresh)
          ? Optional.empty()
          : Optional.of(new CellOutcome.Change(node.defines().get(), old, fresh));
    }
    return Optional.empty();
  }

  /** A course is no single value that could be told before and after. */
  private static boolean isCourse(Value value) {
    return value instanceof Value.Thing thing && thing.sort() == ThingSort.COURSE;
  }

  /** A check or assumption that turned. */
  static Optional<CellOutcome.Turn> turn(Node node, Optional<Result> before, Optional<Result> now) {
    Optional<Boolean> was = before.flatMap(Change::holds);
    Optional<Boolean> is = now.flatMap(Change::holds);
    return is.isEmpty() || was.isEmpty() || was.equals(is)
        ? Optional.empty()
        : Optional.of(new CellOutcome.Turn(node.text(), is.get()));
  }

  /** A definition, check or assumption that came to something and now comes to nothing. */
  static Optional<String> stop(Node node, Optional<Result> before, Optional<Result> now) {
    boolean stopped =
        before.orElse(null) instanceof Result.Sound
            && now.isPresent()
            && !(now.get() instanceof Result.Sound);
    if (!stopped) {
      return Optional.empty();
    }
    return node.defines().or(() -> Optional.of(node.text()).filter(text -> node.judges()));
  }

  /** Whether a check or an assumption holds, if it was judged. */
  static Optional<Boolean> holds(Result result) {
    if (result instanceof Result.Judged judged) {
      return Optional.of(judged.verdict().holds());
    }
    return result instanceof Result.Compared compared
        ? Optional.of(compared.holds())
        : Optional.empty();
  }
}
