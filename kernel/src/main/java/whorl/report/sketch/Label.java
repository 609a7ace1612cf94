package whorl.report.sketch;

/**
 * The text beside something.
 *
 * @param base what stands before the first underscore of the name
 * @param subscript what follows it; may be empty
 * @param size a magnitude with its unit; may be empty
 * @param bold whether it names a vector
 */
record Label(String base, String subscript, String size, boolean bold) {
  static Label of(String name, String size, boolean bold) {
    int mark = name.indexOf('_');
    return mark <= 0
        ? new Label(name, "", size, bold)
        : new Label(name.substring(0, mark), name.substring(mark + 1), size, bold);
  }

  /** About how wide it is. */
  double width() {
    double width = 8.2 * length(base) + 6.2 * length(subscript);
    return size.isEmpty() ? width : width + 6 + 6.6 * length(size);
  }

  private static int length(String text) {
    return text.codePointCount(0, text.length());
  }
}
