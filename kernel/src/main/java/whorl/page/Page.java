package whorl.page;

import java.util.Optional;
import whorl.assist.Completeness;
import whorl.assist.Completion;

/**
 * Runs cells and answers what a front end asks about their text. One thread at a time calls it,
 * save {@link #interrupt}. Places in a text are counted in UTF-16 units, as Java does.
 */
public interface Page extends AutoCloseable {
  /** What the page's plain cells are written in. */
  PlainLanguage language();

  /**
   * Runs a cell. What it shows goes to the front while it runs; an error is the answer, and is not
   * shown by the page.
   */
  CellAnswer run(CellRequest request, Front front);

  /** Works out an expression for a client, leaving nothing behind. */
  ExpressionAnswer evaluate(String expression);

  /** What could be typed at the cursor. */
  Completion complete(String code, int cursor);

  /**
   * What is known of the word at the cursor.
   *
   * @param detail 0 for the usual, 1 for all
   */
  Optional<Bundle> inspect(String code, int cursor, int detail);

  /** Whether a console may send the text as it is. */
  Completeness completeness(String code);

  /** Ends the cell that runs, if one does; from any thread. */
  void interrupt();

  /** Ends what the page started. */
  @Override
  void close();
}
