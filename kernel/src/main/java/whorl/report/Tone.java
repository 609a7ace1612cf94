package whorl.report;

/** How a row stands, for the rail beside it; the words say it too. */
enum Tone {
  /** A value. */
  PLAIN,
  /** A condition that holds. */
  GOOD,
  /** A condition that fails, or a statement that no longer stands. */
  BAD,
  /** A value that rests on an assumption that fails. */
  DOUBTFUL,
  /** A statement that waits. */
  OPEN
}
