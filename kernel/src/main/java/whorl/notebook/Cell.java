package whorl.notebook;

import com.google.gson.JsonElement;
import java.util.List;
import java.util.Optional;

/** A cell of a note. */
public final class Cell {
  private final int position;
  private final CellKind kind;
  private final String source;
  private final Json json;

  Cell(int position, CellKind kind, String source, Json json) {
    this.position = position;
    this.kind = kind;
    this.source = source;
    this.json = json;
  }

  /** Position among all cells of the note, from 1. */
  public int position() {
    return position;
  }

  /** What the cell is. */
  public CellKind kind() {
    return kind;
  }

  /** Its text. */
  public String source() {
    return source;
  }

  /** Its id; notes before format 4.5 have none. */
  public Optional<String> id() {
    return json.member("id").filter(Json::isString).map(Json::string);
  }

  /** What its stored outputs hold under a MIME type, in order. */
  public List<JsonElement> stored(String mimeType) {
    return json.member("outputs").stream()
        .flatMap(outputs -> outputs.elements().stream())
        .flatMap(output -> output.member("data").stream())
        .flatMap(data -> data.member(mimeType).stream())
        .map(Json::element)
        .toList();
  }

  Json json() {
    return json;
  }
}
