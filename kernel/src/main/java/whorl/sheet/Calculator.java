package whorl.sheet;

import java.util.List;
import whorl.check.Checked;
import whorl.check.Checker;
import whorl.check.Routine;
import whorl.check.Vocabulary;
import whorl.syntax.Statement;

/** Checks a statement and works it out with the values that its names have. */
final class Calculator {
  private final Results results;
  private long evaluations;

  Calculator(Results results) {
    this.results = results;
  }

  Result result(Node node) {
    List<String> open =
        node.uses().stream()
            .filter(name -> results.of(name).isEmpty() && !isAtHand(name))
            .sorted()
            .toList();
    if (!open.isEmpty()) {
      return new Result.Waiting(open);
    }
    Checker.Result result = checked(node);
    if (result instanceof Checker.Result.Refused refused) {
      return new Result.Broken(refused.diagnostic(), null);
    }
    Checked checked = ((Checker.Result.Passed) result).checked();
    evaluations++;
    return new Evaluation(node, checked, results).result();
  }

  private Checker.Result checked(Node node) {
    var checker = new Checker(results);
    Routine routine = node.routine();
    return node.statement() instanceof Statement.Published head && routine != null
        ? checker.check(head, routine)
        : checker.check(node.statement());
  }

  /**
   * The result of a statement that says what it said before, in another place of its cell. A value
   * is kept; what points into the text is made anew.
   */
  Result moved(Node node, Result was) {
    if (was instanceof Result.Waiting) {
      return was;
    }
    if (was instanceof Result.Ran ran
        && new Checker(results).check(node.statement()) instanceof Checker.Result.Passed passed
        && passed.checked() instanceof Checked.Motion motion) {
      return new Result.Ran(motion, ran.run(), ran.lapses());
    }
    if (was instanceof Result.Valued valued
        && new Checker(results).check(node.statement()) instanceof Checker.Result.Passed passed
        && passed.checked() instanceof Checked.Value value) {
      return new Result.Valued(value, valued.value(), valued.seen(), valued.lapses());
    }
    return result(node);
  }

  /** How many statements were worked out. */
  long evaluations() {
    return evaluations;
  }

  /** Whether a name means a function of the language because the sheet has none of that name. */
  private boolean isAtHand(String name) {
    return Vocabulary.isFunction(name) && results.definingNode(name).isEmpty();
  }
}
