package whorl.sheet;

import java.util.List;
import java.util.Optional;

/**
 * All that the sheet knows of a name.
 *
 * @param definition its definition
 * @param uses the names of the sheet that its definition uses itself, in order of first mention,
 *     also such as have no definition
 * @param usedBy the names whose definitions use it themselves, in alphabetical order
 * @param checks the checks and assumptions that rest on it, also through other definitions, in
 *     alphabetical order
 * @param doubts the assumptions, as written, that fail now and on whose names it depends
 */
public record NameCard(
    Definition definition,
    List<String> uses,
    List<String> usedBy,
    List<Judged> checks,
    List<String> doubts) {

  /**
   * A check or an assumption.
   *
   * @param text as written
   * @param holds whether it holds; empty where it cannot be judged
   */
  public record Judged(String text, Optional<Boolean> holds) {}

  /** Copies the lists. */
  public NameCard {
    uses = List.copyOf(uses);
    usedBy = List.copyOf(usedBy);
    checks = List.copyOf(checks);
    doubts = List.copyOf(doubts);
  }
}
