package whorl.page;

import java.io.IOException;
import org.jspecify.annotations.Nullable;

/**
 * What a cell can show while it runs. Safe for several threads: a cell in Java may start its own.
 */
public interface Front {
  /** Where text goes. */
  enum Stream {
    OUT,
    ERR
  }

  /** Adds text; it may be held back for a moment, and never overtakes other output. */
  void print(Stream stream, String text);

  /**
   * Shows an output.
   *
   * @param id by which it can be shown anew in place, or null
   */
  void display(Bundle bundle, @Nullable String id);

  /** Shows an output anew wherever it stands on the page. */
  void update(Bundle bundle, String id);

  /** Shows the value of the cell. */
  void result(Bundle bundle);

  /**
   * Removes what the cell showed.
   *
   * @param wait whether only when the next output comes
   */
  void clear(boolean wait);

  /**
   * Asks the user for a line.
   *
   * @param secret whether what is typed must not be seen
   * @throws IOException if the client cannot be asked, or the cell was interrupted meanwhile
   */
  String ask(String prompt, boolean secret) throws IOException;
}
