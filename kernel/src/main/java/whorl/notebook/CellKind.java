package whorl.notebook;

import java.util.regex.Pattern;

/** What a cell of a note is to us. */
public enum CellKind {
  /** Code in the sheet language. */
  SHEET,
  /** Code in Java. */
  JAVA,
  /** Code that begins with another {@code %%word}, which belongs to some other kernel. */
  FOREIGN,
  /** Prose. */
  MARKDOWN,
  /** Raw text, or a cell type that we do not know. */
  OTHER;

  private static final Pattern JAVA_HEAD = Pattern.compile("\\s*%%java(\\s|$)");
  private static final Pattern SHEET_HEAD = Pattern.compile("\\s*%%sheet[ \\t]*(?=\\R|$)");
  private static final Pattern FOREIGN_HEAD = Pattern.compile("\\s*%%\\w");

  /** Whether a program is to be run for the cell, so that it has outputs. */
  public boolean isCode() {
    return this == SHEET || this == JAVA || this == FOREIGN;
  }

  /**
   * The kind of a cell by its type in the file and by how its text begins.
   *
   * @param plain what code without such a beginning is
   */
  static CellKind of(String cellType, String source, CellKind plain) {
    return switch (cellType) {
      case "code" -> ofCode(source, plain);
      case "markdown" -> MARKDOWN;
      default -> OTHER;
    };
  }

  private static CellKind ofCode(String source, CellKind plain) {
    if (JAVA_HEAD.matcher(source).lookingAt()) {
      return JAVA;
    } else if (SHEET_HEAD.matcher(source).lookingAt()) {
      return SHEET;
    }
    // Notes in Java may use magics of their extensions.
    return plain == SHEET && FOREIGN_HEAD.matcher(source).lookingAt() ? FOREIGN : plain;
  }

  /** The statements of a cell of the sheet; each keeps the number of its line. */
  static String statements(String source) {
    var head = SHEET_HEAD.matcher(source);
    return head.lookingAt() ? source.substring(head.end()) : source;
  }
}
