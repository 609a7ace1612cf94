package whorl.notebook;

/** What becomes of the cells in Java. */
public enum JavaCells {
  /** They run. */
  RUN,
  /** They are an error, for they could do anything. */
  REFUSED
}
