package whorl.jupyter;

import com.google.gson.JsonArray;
import com.google.gson.JsonElement;
import com.google.gson.JsonObject;
import com.google.gson.JsonParseException;
import com.google.gson.JsonParser;
import com.google.gson.JsonPrimitive;
import com.google.gson.Strictness;
import com.google.gson.stream.JsonReader;
import com.google.gson.stream.JsonToken;
import com.google.gson.stream.JsonWriter;
import java.io.IOException;
import java.io.StringReader;
import java.io.StringWriter;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.Collection;
import java.util.Map;

/** JSON as its standard has it; left alone, Gson reads and writes more than that. */
final class Json {
  private Json() {}

  /**
   * Reads an object.
   *
   * @throws JsonParseException if the bytes hold anything else
   */
  static JsonObject parse(byte[] bytes) {
    var reader = new JsonReader(new StringReader(new String(bytes, StandardCharsets.UTF_8)));
    reader.setStrictness(Strictness.STRICT);
    JsonElement value = JsonParser.parseReader(reader);
    if (value instanceof JsonObject object && isAtEnd(reader)) {
      return object;
    }
    throw new JsonParseException("it is not a JSON object");
  }

  private static boolean isAtEnd(JsonReader reader) {
    try {
      return reader.peek() == JsonToken.END_DOCUMENT;
    } catch (IOException e) {
      throw new JsonParseException(e);
    }
  }

  /** Writes an object. What is no number becomes null, as in JavaScript. */
  static byte[] bytes(JsonObject object) {
    var text = new StringWriter();
    try {
      write(object, new JsonWriter(text));
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
    return text.toString().getBytes(StandardCharsets.UTF_8);
  }

  private static void write(JsonElement value, JsonWriter writer) throws IOException {
    if (value instanceof JsonObject object) {
      writer.beginObject();
      for (Map.Entry<String, JsonElement> member : object.entrySet()) {
        write(member.getValue(), writer.name(member.getKey()));
      }
      writer.endObject();
    } else if (value instanceof JsonArray array) {
      writer.beginArray();
      for (JsonElement element : array) {
        write(element, writer);
      }
      writer.endArray();
    } else if (value instanceof JsonPrimitive primitive) {
      write(primitive, writer);
    } else {
      writer.nullValue();
    }
  }

  private static void write(JsonPrimitive value, JsonWriter writer) throws IOException {
    if (value.isString()) {
      writer.value(value.getAsString());
    } else if (value.isBoolean()) {
      writer.value(value.getAsBoolean());
    } else if (isFinite(value.getAsNumber())) {
      writer.value(value.getAsNumber());
    } else {
      writer.nullValue();
    }
  }

  private static boolean isFinite(Number number) {
    boolean computed = number instanceof Double || number instanceof Float;
    return !computed || Double.isFinite(number.doubleValue());
  }

  /** The texts as an array. */
  static JsonArray array(Collection<String> texts) {
    var array = new JsonArray(texts.size());
    texts.forEach(array::add);
    return array;
  }
}
