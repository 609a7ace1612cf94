package whorl.notebook;

import com.google.gson.JsonArray;
import com.google.gson.JsonElement;
import com.google.gson.JsonNull;
import com.google.gson.JsonObject;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Collectors;

/**
 * A note: a notebook of format 4 as it stands in its file, and the cells in it. Whatever is not
 * ours to change, known to us or not, keeps every character.
 */
public final class Note {
  private static final String LANGUAGE = "whorl";
  private static final String JAVA = "java";
  private static final String CELLS = "cells";
  private static final int FORMAT = 4;

  private final String name;
  private final Json root;
  private final List<Cell> cells;

  private Note(String name, Json root, List<Cell> cells) {
    this.name = name;
    this.root = root;
    this.cells = List.copyOf(cells);
  }

  /**
   * Reads a notebook.
   *
   * @param name what to call the file in messages
   * @param text the text of the file
   */
  public static Note parse(String name, String text) throws NoteFileException {
    try {
      Json root = JsonScanner.scan(text);
      requireOurs(name, root);
      return new Note(name, root, cellsOf(name, root));
    } catch (JsonFault fault) {
      throw new NoteFileException(
          name
              + " is not a notebook, for it is not JSON: "
              + TextPlace.of(text, fault.index())
              + ": "
              + fault.getMessage(),
          fault);
    }
  }

  /** A notebook with one cell that holds a whole sheet. */
  static Note ofSheet(String name, String sheet) throws NoteFileException {
    var cell = new JsonObject();
    cell.addProperty("cell_type", "code");
    cell.add("execution_count", JsonNull.INSTANCE);
    cell.addProperty("id", "sheet");
    cell.add("metadata", new JsonObject());
    cell.add("outputs", new JsonArray());
    cell.add("source", CanonicalJson.lines(sheet));
    var cells = new JsonArray();
    cells.add(cell);
    var kernel = new JsonObject();
    kernel.addProperty("display_name", "Whorl");
    kernel.addProperty("language", LANGUAGE);
    kernel.addProperty("name", LANGUAGE);
    var language = new JsonObject();
    language.addProperty("name", LANGUAGE);
    var metadata = new JsonObject();
    metadata.add("kernelspec", kernel);
    metadata.add("language_info", language);
    var note = new JsonObject();
    note.add("cells", cells);
    note.add("metadata", metadata);
    note.addProperty("nbformat", FORMAT);
    note.addProperty("nbformat_minor", 5);
    return parse(name, JsonLayout.JUPYTER.write(note) + "\n");
  }

  private static void requireOurs(String name, Json root) throws NoteFileException {
    Optional<Json> format = root.member("nbformat");
    if (format.isEmpty()) {
      throw new NoteFileException(
          name + " is JSON, but not a notebook: it does not say its nbformat");
    }
    requireFour(name, format.get().written());
    if (root.member(CELLS).filter(Json::isArray).isEmpty()) {
      throw new NoteFileException(name + " is JSON, but not a notebook: it has no list of cells");
    }
    String language = language(root);
    if (!language.toLowerCase(Locale.ROOT).equals(LANGUAGE) && !isJava(language)) {
      throw new NoteFileException(
          name
              + " is a note in "
              + language
              + ", not in Whorl; to make it one, choose the kernel Whorl in JupyterLab and save it");
    }
  }

  private static void requireFour(String name, String version) throws NoteFileException {
    double format;
    try {
      format = Double.parseDouble(version);
    } catch (NumberFormatException e) {
      throw new NoteFileException(
          name + " is JSON, but not a notebook: its nbformat is no number", e);
    }
    if (format < FORMAT) {
      throw new NoteFileException(
          name
              + ": this notebook is format "
              + version
              + "; open it in JupyterLab and save it, which makes it format 4");
    }
    if (format > FORMAT) {
      throw new NoteFileException(
          name
              + ": this notebook is format "
              + version
              + ", which is newer than this program; it reads format 4");
    }
  }

  /**
   * The language a notebook says it is in: that of its kernel, which a change of kernel sets first.
   */
  private static String language(Json root) {
    Optional<Json> metadata = root.member("metadata");
    return metadata
        .flatMap(about -> about.member("kernelspec"))
        .flatMap(kernel -> kernel.member("language"))
        .or(
            () ->
                metadata
                    .flatMap(about -> about.member("language_info"))
                    .flatMap(language -> language.member("name")))
        .filter(Json::isString)
        .map(Json::string)
        .orElse(LANGUAGE);
  }

  private static boolean isJava(String language) {
    return language.toLowerCase(Locale.ROOT).equals(JAVA);
  }

  private static List<Cell> cellsOf(String name, Json root) throws NoteFileException {
    CellKind plain = isJava(language(root)) ? CellKind.JAVA : CellKind.SHEET;
    var cells = new ArrayList<Cell>();
    for (Json json : root.member(CELLS).orElseThrow().elements()) {
      int position = cells.size() + 1;
      if (!json.isObject()) {
        throw new NoteFileException(name + ": cell " + position + " is not an object");
      }
      String source = source(name, position, json);
      String type =
          json.member("cell_type").filter(Json::isString).map(Json::string).orElse("unknown");
      cells.add(new Cell(position, CellKind.of(type, source, plain), source, json));
    }
    return cells;
  }

  private static String source(String name, int position, Json cell) throws NoteFileException {
    Optional<Json> source = cell.member("source");
    if (source.isEmpty()) {
      return "";
    }
    if (source.get().isString()) {
      return source.get().string();
    }
    List<Json> lines = source.get().elements();
    if (!source.get().isArray() || !lines.stream().allMatch(Json::isString)) {
      throw new NoteFileException(
          name + ": the source of cell " + position + " is neither a text nor a list of texts");
    }
    return lines.stream().map(Json::string).collect(Collectors.joining());
  }

  /** The cells in order. */
  public List<Cell> cells() {
    return cells;
  }

  /** The text of the file as it was read. */
  public String text() {
    return root.text();
  }

  /** What is odd about the file though it can be read, one sentence each. */
  public List<String> oddities() {
    var first = new HashMap<String, Integer>();
    var oddities = new ArrayList<String>();
    for (Cell cell : cells) {
      cell.id()
          .map(id -> first.putIfAbsent(id, cell.position()))
          .ifPresent(
              earlier ->
                  oddities.add(
                      "cells "
                          + earlier
                          + " and "
                          + cell.position()
                          + " have the same id "
                          + cell.id().orElseThrow()
                          + ", so that in a live page one takes the place of the other;"
                          + " opening and saving the note in JupyterLab mends it"));
    }
    return oddities;
  }

  /**
   * The text of the file with new outputs in some of its code cells.
   *
   * @param executions by position of the cell, from 1
   */
  public String executed(Map<Integer, Execution> executions) {
    var values = new HashMap<Integer, Map<String, JsonElement>>();
    executions.forEach((position, execution) -> values.put(position, execution.members()));
    return edited(values);
  }

  /**
   * The same note with other texts in some of its cells.
   *
   * @param sources by position of the cell, from 1
   */
  public Note withSources(Map<Integer, String> sources) throws NoteFileException {
    var values = new HashMap<Integer, Map<String, JsonElement>>();
    sources.forEach(
        (position, source) -> values.put(position, Map.of("source", CanonicalJson.lines(source))));
    return parse(name, edited(values));
  }

  private String edited(Map<Integer, Map<String, JsonElement>> values) {
    var layout = JsonLayout.of(root);
    var text = new StringBuilder();
    int copied = 0;
    for (Cell cell : cells) {
      Map<String, JsonElement> members = values.get(cell.position());
      if (members != null) {
        Json json = cell.json();
        text.append(root.text(), copied, json.start()).append(layout.set(json, members));
        copied = json.end();
      }
    }
    return text.append(root.text(), copied, root.text().length()).toString();
  }
}
