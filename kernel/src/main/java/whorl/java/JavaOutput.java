package whorl.java;

import com.google.gson.JsonObject;
import java.io.IOException;
import org.jspecify.annotations.Nullable;

/**
 * Where a cell in Java prints and shows. Safe for several threads; what a cell started may still
 * print when the cell has ended.
 */
public interface JavaOutput {
  /** Where text goes. */
  enum Stream {
    OUT,
    ERR
  }

  /** Adds text. */
  void print(Stream stream, String text);

  /**
   * Shows an output.
   *
   * @param data by media type
   * @param metadata by media type
   * @param id by which it can be shown anew in place, or null
   */
  void display(JsonObject data, JsonObject metadata, @Nullable String id);

  /** Shows an output anew wherever it stands. */
  void update(JsonObject data, JsonObject metadata, String id);

  /** Shows the value of the cell. */
  void result(JsonObject data, JsonObject metadata);

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
   * @throws IOException if nobody can be asked, or the cell was interrupted meanwhile
   */
  String ask(String prompt, boolean secret) throws IOException;
}
