package whorl.assist;

import java.util.List;

/**
 * What could stand in a part of a text.
 *
 * @param start where the part begins
 * @param end where it ends
 * @param candidates best first
 */
public record Completion(int start, int end, List<Candidate> candidates) {
  /** Copies the list. */
  public Completion {
    candidates = List.copyOf(candidates);
  }

  /**
   * Something that could stand there.
   *
   * @param text what would be written
   * @param type what it is, in a word that front ends have a sign for, as {@code function}
   * @param detail what a user wants to know to choose, such as kind and value
   */
  public record Candidate(String text, String type, String detail) {}

  /** The same for a text before which others stand. */
  public Completion movedBy(int offset) {
    return new Completion(start + offset, end + offset, candidates);
  }

  /** Nothing fits. */
  public static Completion none(int cursor) {
    return new Completion(cursor, cursor, List.of());
  }
}
