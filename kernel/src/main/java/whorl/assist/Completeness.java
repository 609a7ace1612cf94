package whorl.assist;

/** Whether a text can be run as it is. */
public sealed interface Completeness {
  /** It can. */
  record Complete() implements Completeness {}

  /**
   * More must follow.
   *
   * @param indent blanks with which the next line begins
   */
  record Incomplete(String indent) implements Completeness {}

  /** More would not mend it. */
  record Invalid() implements Completeness {}

  /** Nobody can tell. */
  record Unknown() implements Completeness {}
}
