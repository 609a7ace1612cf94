package whorl.page;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import whorl.report.Recalculated;
import whorl.sheet.CellId;
import whorl.sheet.CellOutcome;

/** A cell at its turn: what is asked, and what came of it so far. */
final class Turn {
  private final CellRequest request;
  private final CellId cell;
  private final Front front;
  private final List<String> sentences = new ArrayList<>();
  private final List<CellOutcome> outcomes = new ArrayList<>();

  Turn(CellRequest request, CellId cell, Front front) {
    this.request = request;
    this.cell = cell;
    this.front = front;
  }

  CellRequest request() {
    return request;
  }

  CellId cell() {
    return cell;
  }

  Front front() {
    return front;
  }

  /** How messages call the cell. */
  String label() {
    return "cell [" + request.count() + "]";
  }

  /** Whether a cell comes from a client that tells cells apart. */
  boolean isOnPage() {
    return request.cell().isPresent();
  }

  /** What the cell has to say besides its steps. */
  List<String> sentences() {
    return List.copyOf(sentences);
  }

  void say(String sentence) {
    sentences.add(sentence);
  }

  /** What the cell did elsewhere on the sheet. */
  Recalculated elsewhere() {
    return Recalculated.of(outcomes);
  }

  /** Other cells whose steps are no longer what they were. */
  Set<CellId> refreshed() {
    var others = new LinkedHashSet<CellId>();
    outcomes.forEach(outcome -> others.addAll(outcome.refreshed()));
    others.remove(cell);
    return others;
  }

  /** Adds a change to the sheet that the cell made. */
  void made(CellOutcome outcome) {
    outcomes.add(outcome);
  }
}
