package whorl.check;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;

/** The names that a formula may use, with what is known of them. */
public interface Scope {
  /** What a name stands for, or empty where the sheet has no definition of it that stands. */
  Optional<Meaning> meaning(String name);

  /** The folder of the note, below which files are read. */
  Path folder();

  /** The names of the sheet in a settled order, for suggestions. */
  List<String> names();
}
