package whorl.java;

/** What cells call to deal with their own output, beside what the display library has for them. */
public final class CellOutput {
  private CellOutput() {}

  /**
   * Removes what the cell has shown so far. Without a cell that runs, nothing happens.
   *
   * @param wait whether only when the next output comes, so that a picture drawn again and again
   *     does not flicker
   */
  public static void clearOutput(boolean wait) {
    CellRun.current().ifPresent(run -> run.output().clear(wait));
  }
}
