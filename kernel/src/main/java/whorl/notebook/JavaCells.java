package whorl.notebook;

/** What becomes of the cells in Java. */
public enum JavaCells {
  /** Nobody forbids them, but nothing here runs them either. */
  NOT_RUN("This version does not run cells in Java."),
  /** They are forbidden. */
  REFUSED("Cells in Java are refused here.");

  private final String problem;

  JavaCells(String problem) {
    this.problem = problem;
  }

  String problem() {
    return problem;
  }
}
