package whorl.notebook;

import com.google.gson.JsonArray;
import com.google.gson.JsonElement;
import com.google.gson.JsonObject;
import com.google.gson.JsonPrimitive;
import java.util.List;
import java.util.Map;

/** An output of a cell. */
public sealed interface Output {
  /**
   * The output as the notebook format has it.
   *
   * @param count the number in front of its cell
   */
  JsonObject json(int count);

  /** What a terminal shows of it; empty where it has no text. */
  String text();

  /**
   * Something to look at, in one or more forms.
   *
   * @param data by MIME type; texts as strings
   * @param metadata by MIME type
   */
  record Display(Map<String, JsonElement> data, JsonObject metadata) implements Output {
    /** Copies the map. */
    public Display {
      data = Map.copyOf(data);
    }

    @Override
    public JsonObject json(int count) {
      var json = new JsonObject();
      json.add("data", CanonicalJson.bundle(data));
      json.add("metadata", CanonicalJson.sorted(metadata));
      json.addProperty("output_type", "display_data");
      return json;
    }

    @Override
    public String text() {
      return plain(data);
    }
  }

  /**
   * The value of a cell, in one or more forms.
   *
   * @param data by MIME type; texts as strings
   * @param metadata by MIME type
   */
  record Value(Map<String, JsonElement> data, JsonObject metadata) implements Output {
    /** Copies the map. */
    public Value {
      data = Map.copyOf(data);
    }

    @Override
    public JsonObject json(int count) {
      var json = new JsonObject();
      json.add("data", CanonicalJson.bundle(data));
      json.addProperty("execution_count", count);
      json.add("metadata", CanonicalJson.sorted(metadata));
      json.addProperty("output_type", "execute_result");
      return json;
    }

    @Override
    public String text() {
      return plain(data);
    }
  }

  private static String plain(Map<String, JsonElement> data) {
    return data.get("text/plain") instanceof JsonPrimitive text ? text.getAsString() : "";
  }

  /**
   * What a program printed.
   *
   * @param name {@code stdout} or {@code stderr}
   */
  record Stream(String name, String text) implements Output {
    @Override
    public JsonObject json(int count) {
      var json = new JsonObject();
      json.addProperty("name", name);
      json.addProperty("output_type", "stream");
      json.add("text", CanonicalJson.lines(text));
      return json;
    }
  }

  /**
   * An error.
   *
   * @param name a short name of the sort of error
   * @param value the message in one line
   * @param traceback the message in full, line by line
   */
  record Failure(String name, String value, List<String> traceback) implements Output {
    /** Copies the list. */
    public Failure {
      traceback = List.copyOf(traceback);
    }

    @Override
    public JsonObject json(int count) {
      var json = new JsonObject();
      json.addProperty("ename", name);
      json.addProperty("evalue", value);
      json.addProperty("output_type", "error");
      var lines = new JsonArray();
      traceback.forEach(lines::add);
      json.add("traceback", lines);
      return json;
    }

    /** An error is told apart from what is printed. */
    @Override
    public String text() {
      return "";
    }
  }
}
