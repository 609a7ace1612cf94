package whorl.jupyter;

import com.google.gson.JsonElement;
import com.google.gson.JsonObject;
import com.google.gson.JsonPrimitive;

/**
 * What a request says. A field that is null counts as missing, for some clients write all of them.
 */
record Content(JsonObject fields) {
  private static final int SHOWN = 40;

  boolean has(String name) {
    JsonElement value = fields.get(name);
    return value != null && !value.isJsonNull();
  }

  String text(String name) throws BadContentException {
    if (!has(name)) {
      throw new BadContentException(name + " is missing");
    }
    return primitive(name, "a text", JsonPrimitive::isString).getAsString();
  }

  String text(String name, String absent) throws BadContentException {
    return has(name) ? text(name) : absent;
  }

  boolean flag(String name, boolean absent) throws BadContentException {
    return has(name)
        ? primitive(name, "true or false", JsonPrimitive::isBoolean).getAsBoolean()
        : absent;
  }

  /** A number, without what follows its point and within the range of an int. */
  int number(String name, int absent) throws BadContentException {
    return has(name)
        ? (int) primitive(name, "a number", JsonPrimitive::isNumber).getAsDouble()
        : absent;
  }

  /** An object, or an empty one. */
  JsonObject object(String name) throws BadContentException {
    if (!has(name)) {
      return new JsonObject();
    }
    if (fields.get(name) instanceof JsonObject object) {
      return object;
    }
    throw unlike(name, "an object");
  }

  private JsonPrimitive primitive(String name, String sort, Sort test) throws BadContentException {
    if (fields.get(name) instanceof JsonPrimitive primitive && test.holds(primitive)) {
      return primitive;
    }
    throw unlike(name, sort);
  }

  private BadContentException unlike(String name, String sort) {
    String found = String.valueOf(fields.get(name));
    String shown = found.length() <= SHOWN ? found : found.substring(0, SHOWN) + " …";
    return new BadContentException(name + " must be " + sort + ", but is " + shown);
  }

  private interface Sort {
    boolean holds(JsonPrimitive value);
  }
}
