package whorl.page;

import com.google.gson.JsonObject;

/**
 * One output in several forms.
 *
 * @param data forms by media type
 * @param metadata of the forms
 */
public record Bundle(JsonObject data, JsonObject metadata) {
  /** An output without metadata. */
  public static Bundle of(JsonObject data) {
    return new Bundle(data, new JsonObject());
  }
}
