package whorl.report;

import java.util.ArrayList;
import java.util.List;
import whorl.sheet.Step;
import whorl.syntax.Statement;

/** Says in a line what a change did elsewhere in the note. */
final class Recalculated implements Step.Cases<String> {
  private Recalculated() {}

  /** {@code Recalculated elsewhere: L ≈ 26.21 kN·m·s; check E ≤ 10 MJ holds}. */
  static String words(List<Step> changed) {
    var reader = new Recalculated();
    var parts = new ArrayList<String>();
    for (Step step : changed) {
      parts.add(step.match(reader));
    }
    return TextWrap.plain("Recalculated elsewhere: " + String.join("; ", parts));
  }

  @Override
  public String defined(Step.Defined defined) {
    return defined.statement().name().name() + " " + Amounts.of(defined.gives()).signed();
  }

  @Override
  public String function(Step.Function function) {
    return function.statement().name().name();
  }

  @Override
  public String shown(Step.Shown shown) {
    return formula(shown) + " " + Amounts.of(shown.gives()).signed();
  }

  @Override
  public String checked(Step.Checked checked) {
    return "check " + formula(checked) + " " + state(checked.verdict().holds());
  }

  @Override
  public String reproduced(Step.Reproduced reproduced) {
    return "check of " + formula(reproduced) + " " + state(reproduced.holds());
  }

  @Override
  public String assumed(Step.Assumed assumed) {
    return "assumption " + formula(assumed) + " " + state(assumed.verdict().holds());
  }

  @Override
  public String waiting(Step.Waiting waiting) {
    return subject(waiting.statement()) + " waits for " + String.join(", ", waiting.names());
  }

  @Override
  public String broken(Step.Broken broken) {
    return subject(broken.statement()) + " does not stand";
  }

  private static String state(boolean holds) {
    return holds ? "holds" : "FAILS";
  }

  private static String formula(Step step) {
    return formula(step.statement());
  }

  private static String formula(Statement statement) {
    return TextTable.plain(StatementHead.of(statement).rule());
  }

  private static String subject(Statement statement) {
    if (statement instanceof Statement.Definition definition) {
      return definition.name().name();
    }
    if (statement instanceof Statement.Function function) {
      return function.name().name();
    }
    return formula(statement);
  }
}
