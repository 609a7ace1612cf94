package whorl.notebook;

import java.util.regex.Pattern;

/** What a cell of a note is to us. */
public enum CellKind {
  /** Code in the sheet language. */
  SHEET,
  /** Code that begins with {@code %%java}. */
  JAVA,
  /** Code that begins with another {@code %%word}, which belongs to some other kernel. */
  FOREIGN,
  /** Prose. */
  MARKDOWN,
  /** Raw text, or a cell type that we do not know. */
  OTHER;

  private static final Pattern JAVA_HEAD = Pattern.compile("\\s*%%java(\\s|$)");
  private static final Pattern FOREIGN_HEAD = Pattern.compile("\\s*%%\\w");

  /** Whether a program is to be run for the cell, so that it has outputs. */
  public boolean isCode() {
    return this == SHEET || this == JAVA || this == FOREIGN;
  }

  /** The kind of a cell by its type in the file and by how its text begins. */
  static CellKind of(String cellType, String source) {
    return switch (cellType) {
      case "code" -> ofCode(source);
      case "markdown" -> MARKDOWN;
      default -> OTHER;
    };
  }

  private static CellKind ofCode(String source) {
    if (JAVA_HEAD.matcher(source).lookingAt()) {
      return JAVA;
    }
    return FOREIGN_HEAD.matcher(source).lookingAt() ? FOREIGN : SHEET;
  }
}
