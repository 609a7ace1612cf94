package whorl.notebook;

/** A text is not JSON: what is wrong, and at which UTF-16 index. */
final class JsonFault extends Exception {
  private final int index;

  JsonFault(int index, String problem) {
    super(problem);
    this.index = index;
  }

  int index() {
    return index;
  }
}
