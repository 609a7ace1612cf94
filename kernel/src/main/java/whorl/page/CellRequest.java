package whorl.page;

import java.util.List;
import java.util.Optional;

/**
 * A cell to be run.
 *
 * @param cell the client's id of it, opaque; empty from a console
 * @param deleted ids of cells that were deleted since the last request
 * @param client the client's session, another after a page was loaded anew
 * @param count the number that the cell bears when it ran, as in {@code [2]}
 * @param code its text
 * @param mayAsk whether the client can answer a question
 */
public record CellRequest(
    Optional<String> cell,
    List<String> deleted,
    String client,
    int count,
    String code,
    boolean mayAsk) {
  /** Copies the list. */
  public CellRequest {
    deleted = List.copyOf(deleted);
  }
}
