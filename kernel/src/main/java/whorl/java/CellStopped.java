package whorl.java;

/**
 * Ends the code of a cell after an interrupt. An error, so that handlers of exceptions let it pass.
 */
public final class CellStopped extends Error {
  private static final long serialVersionUID = 1;

  CellStopped() {
    super("the cell was interrupted", null, false, false);
  }
}
