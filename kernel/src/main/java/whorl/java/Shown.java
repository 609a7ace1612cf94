package whorl.java;

import com.google.gson.Gson;
import com.google.gson.GsonBuilder;
import com.google.gson.JsonObject;
import java.util.Optional;
import org.dflib.jjava.jupyter.kernel.display.DisplayData;

/**
 * What the display library made of a value, as JSON.
 *
 * @param data by media type
 * @param metadata by media type
 * @param id by which it can be shown anew
 */
record Shown(JsonObject data, JsonObject metadata, Optional<String> id) {
  private static final Gson GSON =
      new GsonBuilder().serializeNulls().disableHtmlEscaping().create();

  static Shown of(DisplayData display) {
    JsonObject json = GSON.toJsonTree(display, DisplayData.class).getAsJsonObject();
    return new Shown(
        part(json, "data"), part(json, "metadata"), Optional.ofNullable(display.getDisplayId()));
  }

  private static JsonObject part(JsonObject json, String name) {
    return json.get(name) instanceof JsonObject part ? part : new JsonObject();
  }
}
