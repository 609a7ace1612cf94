package whorl.check;

import java.util.List;
import whorl.diagnostic.Diagnostic;

/**
 * What a checked statement is worked out from.
 *
 * @param inputs the names that go into its frame, in order of first mention
 * @param courses the courses that it reads, where it is itself a course
 * @param frameSize the room that its frame takes
 * @param remarks what looks odd in it, though it is sound
 */
public record Basis(
    List<Meaning.Input> inputs,
    List<CourseInput> courses,
    FrameSize frameSize,
    List<Diagnostic> remarks) {
  /** Copies the lists. */
  public Basis {
    inputs = List.copyOf(inputs);
    courses = List.copyOf(courses);
    remarks = List.copyOf(remarks);
  }
}
