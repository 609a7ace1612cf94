package whorl.notebook;

import com.google.gson.JsonArray;
import com.google.gson.JsonElement;
import com.google.gson.JsonNull;
import com.google.gson.JsonPrimitive;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalInt;

/**
 * What running a cell left in the note.
 *
 * @param count the number in front of the cell; none for a cell that was not run
 * @param outputs its outputs in order
 */
public record Execution(OptionalInt count, List<Output> outputs) {
  /** A cell that was not run. */
  public static final Execution NONE = new Execution(OptionalInt.empty(), List.of());

  /** Copies the list. */
  public Execution {
    outputs = List.copyOf(outputs);
  }

  /** The members of a code cell that hold it. */
  Map<String, JsonElement> members() {
    var all = new JsonArray();
    outputs.forEach(output -> all.add(output.json(count.orElse(0))));
    JsonElement number =
        count.isPresent() ? new JsonPrimitive(count.getAsInt()) : JsonNull.INSTANCE;
    var members = new LinkedHashMap<String, JsonElement>();
    members.put("execution_count", number);
    members.put("outputs", all);
    return members;
  }
}
