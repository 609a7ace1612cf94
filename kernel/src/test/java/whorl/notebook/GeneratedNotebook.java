package whorl.notebook;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.SplittableRandom;

/**
 * A notebook made at random, as awkward as the format allows: any layout, any escapes, keys in any
 * order, keys and cell types nobody knows.
 *
 * <p>The text is kept in pieces, so that tests know, without reading JSON, which characters may
 * change when a cell is run.
 */
final class GeneratedNotebook {
  /** What a piece of the text is. */
  enum Role {
    FIXED,
    COUNT,
    OUTPUTS
  }

  /**
   * A piece of the text.
   *
   * @param cell position of its cell, from 1, for a value that running the cell replaces
   */
  record Piece(Role role, int cell, String text) {}

  private static final String[] STRANGE = {
    "",
    "é",
    "𝜔",
    "\u2028",
    "\u007f",
    "a\nb",
    "\r\n",
    "\t",
    "\"",
    "\\",
    "/",
    "</script>",
    "ω = 3 rad/s",
    "{\"cells\": [",
    "]}",
    "\u0000",
    "\uFEFF",
    "%%java",
    "\uD800",
    "x".repeat(300)
  };
  private static final String[] NUMBERS = {
    "1.0", "1e5", "-0", "0.10", "1E-07", "123456789012345678901234567890", "6.02214076e+23"
  };

  private final SplittableRandom random;
  private final String newline;
  private final String indent;
  private final String colon;
  private final List<Piece> pieces = new ArrayList<>();
  private final StringBuilder fixed = new StringBuilder();

  final List<String> sources = new ArrayList<>();
  final List<Integer> codeCells = new ArrayList<>();

  GeneratedNotebook(long seed) {
    random = new SplittableRandom(seed);
    newline = pick("\n", "\r\n", "\r", "");
    indent = newline.isEmpty() ? "" : pick("", " ", "  ", "\t", "    ");
    colon = pick(":", ": ", " : ");
    fixed.append(pick("", "", "\uFEFF"));
    notebook();
    fixed.append(pick("", newline, newline + newline));
    flush();
  }

  String text() {
    return String.join("", pieces.stream().map(Piece::text).toList());
  }

  List<Piece> pieces() {
    return pieces;
  }

  private void notebook() {
    var members = new ArrayList<Runnable>();
    members.add(() -> member("nbformat", () -> fixed.append("4")));
    members.add(() -> member("nbformat_minor", () -> fixed.append(pick("0", "4", "5", "17"))));
    members.add(() -> member("metadata", () -> object(1, unknownMembers(1))));
    members.add(() -> member("cells", this::cells));
    members.addAll(unknownMembers(0));
    shuffle(members);
    object(0, members);
  }

  private void cells() {
    var cells = new ArrayList<Runnable>();
    for (int i = random.nextInt(5); i > 0; i--) {
      int position = cells.size() + 1;
      cells.add(() -> cell(position));
    }
    list('[', ']', 1, cells);
  }

  private void cell(int position) {
    String type = pick("code", "code", "markdown", "raw", "slide");
    var members = new ArrayList<Runnable>();
    members.add(() -> member("cell_type", () -> string(type)));
    members.add(() -> member("source", this::source));
    members.add(() -> member("metadata", () -> object(3, unknownMembers(3))));
    if (random.nextBoolean()) {
      members.add(() -> member("id", () -> string("cell-" + position)));
    }
    if (type.equals("code")) {
      codeCells.add(position);
      members.add(
          () -> member("execution_count", () -> replaceable(Role.COUNT, position, this::number)));
      members.add(
          () ->
              member(
                  "outputs",
                  () ->
                      replaceable(
                          Role.OUTPUTS, position, () -> list('[', ']', 3, unknownValues(4)))));
    }
    members.addAll(unknownMembers(2));
    shuffle(members);
    object(2, members);
  }

  private void source() {
    var lines = new ArrayList<String>();
    for (int i = random.nextInt(4); i > 0; i--) {
      lines.add(pick(STRANGE) + pick("\n", ""));
    }
    sources.add(String.join("", lines));
    if (random.nextBoolean()) {
      string(String.join("", lines));
    } else {
      list('[', ']', 3, lines.stream().<Runnable>map(line -> () -> string(line)).toList());
    }
  }

  private void replaceable(Role role, int cell, Runnable value) {
    flush();
    value.run();
    pieces.add(new Piece(role, cell, fixed.toString()));
    fixed.setLength(0);
  }

  private void flush() {
    pieces.add(new Piece(Role.FIXED, 0, fixed.toString()));
    fixed.setLength(0);
  }

  private List<Runnable> unknownMembers(int depth) {
    var members = new ArrayList<Runnable>();
    for (int i = random.nextInt(3); i > 0; i--) {
      String name = "unknown " + i + pick(STRANGE);
      members.add(() -> member(name, () -> unknown(depth + 1)));
    }
    return members;
  }

  private List<Runnable> unknownValues(int depth) {
    var values = new ArrayList<Runnable>();
    for (int i = random.nextInt(3); i > 0; i--) {
      values.add(() -> unknown(depth));
    }
    return values;
  }

  private void unknown(int depth) {
    switch (random.nextInt(depth > 6 ? 3 : 5)) {
      case 0 -> number();
      case 1 -> fixed.append(pick("true", "false", "null"));
      case 2 -> string(pick(STRANGE));
      case 3 -> list('[', ']', depth, unknownValues(depth + 1));
      default -> object(depth, unknownMembers(depth));
    }
  }

  private void number() {
    fixed.append(pick(NUMBERS));
  }

  private void member(String name, Runnable value) {
    string(name);
    fixed.append(colon);
    value.run();
  }

  private void object(int depth, List<Runnable> members) {
    list('{', '}', depth, members);
  }

  private void list(char open, char close, int depth, List<Runnable> parts) {
    fixed.append(open);
    boolean lines = random.nextInt(8) > 0;
    String joint = "";
    for (Runnable part : parts) {
      fixed.append(joint).append(lines ? newline + indent.repeat(depth + 1) : "");
      part.run();
      joint = lines ? "," : pick(",", " , ");
    }
    fixed.append(!lines || parts.isEmpty() ? pick("", " ") : newline + indent.repeat(depth));
    fixed.append(close);
  }

  /** A string, each of its characters in one of the ways JSON can write it. */
  private void string(String text) {
    fixed.append('"');
    text.codePoints().forEach(this::character);
    fixed.append('"');
  }

  private void character(int c) {
    boolean mustEscape = c < ' ' || c == '"' || c == '\\' || c == 0xD800;
    int shorthand = "\n\t\r\"\\/".indexOf(c);
    if (shorthand >= 0 && random.nextBoolean()) {
      fixed.append('\\').append("ntr\"\\/".charAt(shorthand));
    } else if (mustEscape || random.nextInt(10) == 0) {
      String style = pick("\\u%04x", "\\u%04X");
      for (char unit : Character.toChars(c)) {
        fixed.append(String.format(style, (int) unit));
      }
    } else {
      fixed.appendCodePoint(c);
    }
  }

  private void shuffle(List<Runnable> members) {
    for (int i = members.size() - 1; i > 0; i--) {
      Collections.swap(members, i, random.nextInt(i + 1));
    }
  }

  private String pick(String... choices) {
    return choices[random.nextInt(choices.length)];
  }
}
