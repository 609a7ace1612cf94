package whorl.notebook;

import com.google.gson.JsonArray;
import com.google.gson.JsonElement;
import com.google.gson.JsonObject;
import java.util.List;
import java.util.Map;

/** An output of a cell. */
public sealed interface Output {
  /** The output as the notebook format has it. */
  JsonObject json();

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
    public JsonObject json() {
      var json = new JsonObject();
      json.add("data", CanonicalJson.bundle(data));
      json.add("metadata", CanonicalJson.sorted(metadata));
      json.addProperty("output_type", "display_data");
      return json;
    }
  }

  /**
   * What a program printed.
   *
   * @param name {@code stdout} or {@code stderr}
   */
  record Stream(String name, String text) implements Output {
    @Override
    public JsonObject json() {
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
    public JsonObject json() {
      var json = new JsonObject();
      json.addProperty("ename", name);
      json.addProperty("evalue", value);
      json.addProperty("output_type", "error");
      var lines = new JsonArray();
      traceback.forEach(lines::add);
      json.add("traceback", lines);
      return json;
    }
  }
}
