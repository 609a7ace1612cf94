package whorl.page;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.TreeSet;
import whorl.check.DefinedNames;
import whorl.diagnostic.Diagnostic;
import whorl.diagnostic.Source;
import whorl.report.CellReport;
import whorl.report.ErrorText;
import whorl.report.Recalculated;
import whorl.sheet.CellId;
import whorl.sheet.CellOutcome;
import whorl.sheet.Sheet;
import whorl.sheet.Step;

/**
 * The sheet as it stands on a page: what a cell changes elsewhere is shown anew in place, and the
 * cell says what changed.
 */
final class LiveSheet {
  private final Sheet sheet;
  private final JavaReads reads;
  private final Board board = new Board();
  private final Pace pace = new Pace();

  LiveSheet(Sheet sheet, JavaReads reads) {
    this.sheet = sheet;
    this.reads = reads;
  }

  /** Withdraws the cells that were deleted on the page. */
  void withdrawDeleted(Turn turn) {
    for (String id : turn.request().deleted()) {
      var cell = new CellId(id);
      List<String> names = names(cell);
      board.clear(cell);
      reads.forget(cell);
      turn.made(sheet.withdraw(cell));
      if (!names.isEmpty()) {
        turn.say("Withdrawn with a deleted cell: " + Words.list(names) + ".");
      }
    }
  }

  /** Shows what became of the cell and of those that rest on it, and says how the cell ended. */
  CellAnswer settle(Turn turn, CellOutcome outcome) {
    turn.made(outcome);
    if (!outcome.tookEffect()) {
      settle(turn);
      return refused(outcome);
    }
    List<Renewal> renewals = renewals(turn);
    show(turn, outcome);
    renewals.forEach(renewal -> renew(renewal, turn.front()));
    return new CellAnswer.Done();
  }

  /** The same for a cell that shows no steps of its own. */
  void settle(Turn turn) {
    board.clear(turn.cell());
    List<Renewal> renewals = renewals(turn);
    CellReport report = report(turn, new Source(""), List.of(), List.of());
    if (!report.text().isEmpty()) {
      turn.front().display(SheetBundle.of(report), display(turn.cell()));
    }
    renewals.forEach(renewal -> renew(renewal, turn.front()));
  }

  /** Shows the steps of every cell as they stand. */
  void showAll(Front front) {
    for (CellId cell : sheet.cells()) {
      CellReport report =
          CellReport.of(sheet.source(cell).orElseThrow(), sheet.steps(cell), List.of());
      CellReport headed = report.headed(sheet.label(cell).orElseThrow());
      pace.await(headed.html().length());
      front.display(SheetBundle.of(headed), null);
    }
  }

  private void show(Turn turn, CellOutcome outcome) {
    List<String> notices = outcome.notices().stream().map(Diagnostic::problem).toList();
    CellReport report = report(turn, outcome.source(), outcome.steps(), notices);
    if (sheet.source(turn.cell()).isPresent()) {
      CellReport steps = CellReport.of(outcome.source(), outcome.steps(), notices);
      CellRequest request = turn.request();
      board.put(turn.cell(), new Board.Shown(request.client(), request.count(), notices, steps));
    } else {
      board.clear(turn.cell());
    }
    if (!report.text().isEmpty()) {
      pace.await(report.html().length());
      turn.front().display(SheetBundle.of(report), display(turn.cell()));
    }
  }

  private static CellReport report(
      Turn turn, Source source, List<Step> steps, List<String> notices) {
    return CellReport.of(source, steps, notices, turn.elsewhere(), turn.sentences());
  }

  /** The answer of a cell that was not taken over. */
  static CellAnswer refused(CellOutcome outcome) {
    ErrorText error = ErrorText.of(outcome.errors(), outcome.source());
    if (outcome.interrupted()) {
      return new CellAnswer.Failed(CellAnswer.INTERRUPTED, error.summary(), error.lines());
    }
    var lines = new ArrayList<>(error.lines());
    if (!outcome.standing().isEmpty()) {
      lines.add("");
      lines.add(
          "This cell was not taken over: " + Words.list(outcome.standing()) + " stand as before.");
    }
    return new CellAnswer.Failed(ErrorText.NAME, error.summary(), lines);
  }

  /** A cell elsewhere whose steps look different now. */
  private record Renewal(CellId cell, CellReport report) {}

  private List<Renewal> renewals(Turn turn) {
    var renewals = new ArrayList<Renewal>();
    var older = new TreeSet<Integer>();
    for (CellId cell : turn.refreshed()) {
      Optional<Board.Shown> before = board.of(cell);
      Optional<Source> source = sheet.source(cell);
      if (before.isEmpty() || source.isEmpty()) {
        continue;
      }
      Board.Shown shown = before.get();
      List<Step> steps = sheet.steps(cell);
      CellReport report = CellReport.of(source.get(), steps, shown.notices());
      if (!report.html().equals(shown.report().html())) {
        board.put(cell, shown.with(report));
        String caption = "Recalculated in [" + turn.request().count() + "].";
        renewals.add(
            new Renewal(
                cell,
                CellReport.of(
                    source.get(), steps, shown.notices(), Recalculated.NOTHING, List.of(caption))));
        if (!shown.client().equals(turn.request().client())) {
          older.add(shown.count());
        }
      }
    }
    if (!older.isEmpty()) {
      List<String> counts = older.stream().map(count -> "[" + count + "]").toList();
      turn.say(
          "Shown before the page was loaded anew, so run again to be up to date: "
              + Words.list(counts)
              + ".");
    }
    reads.outdated(turn.cell(), sheet::quantity).ifPresent(turn::say);
    return renewals;
  }

  private void renew(Renewal renewal, Front front) {
    pace.await(renewal.report().html().length());
    front.update(SheetBundle.of(renewal.report()), display(renewal.cell()));
  }

  private List<String> names(CellId cell) {
    return sheet.steps(cell).stream()
        .flatMap(step -> DefinedNames.in(step.statement()).stream())
        .toList();
  }

  private static String display(CellId cell) {
    return cell.id() + "/1";
  }
}
