package whorl.check;

import java.util.List;
import whorl.diagnostic.Diagnostic;

/**
 * What a checked statement is worked out from.
 *
 * @param inputs the names that go into its frame, in order of first mention
 * @param frameSize the room that its frame takes
 * @param remarks what looks odd in it, though it is sound
 */
public record Basis(List<Meaning.Input> inputs, FrameSize frameSize, List<Diagnostic> remarks) {
  /** Copies the lists. */
  public Basis {
    inputs = List.copyOf(inputs);
    remarks = List.copyOf(remarks);
  }
}
