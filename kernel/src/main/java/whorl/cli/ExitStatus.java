package whorl.cli;

/** What the command tells the program that started it; a later one wins over an earlier one. */
enum ExitStatus {
  /** Everything holds. */
  HOLDS(0),
  /** A check or an assumption fails, or a recheck differs. */
  FAILS(1),
  /** The note has an error. */
  ERROR(2),
  /** The command was wrong, or a file cannot be read or written. */
  USAGE(3);

  private final int code;

  ExitStatus(int code) {
    this.code = code;
  }

  int code() {
    return code;
  }
}
