package whorl.notebook;

import com.google.gson.Gson;
import com.google.gson.JsonElement;
import com.google.gson.JsonNull;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import org.jspecify.annotations.Nullable;

/**
 * The part of a record of results that a recheck compares.
 *
 * @param definitions by name
 * @param verdicts whether each check and assumption holds, by what it is called
 */
record Recorded(Map<String, Definition> definitions, Map<String, Boolean> verdicts) {

  /**
   * A definition.
   *
   * @param value a number, an array of numbers or a truth value, in {@code unit}
   * @param si the same in coherent units
   */
  record Definition(String kind, String unit, JsonElement value, JsonElement si) {
    String words() {
      return unit.equals("1") ? value.toString() : value + " " + unit;
    }
  }

  /** A record as read; a file may hold anything in its place, so that any part may be missing. */
  private record Read(
      @Nullable Map<String, ReadDefinition> definitions,
      @Nullable List<ReadVerdict> checks,
      @Nullable List<ReadVerdict> assumptions) {}

  private record ReadDefinition(
      @Nullable String kind,
      @Nullable String unit,
      @Nullable JsonElement value,
      @Nullable JsonElement si) {
    Definition definition() {
      return new Definition(
          Objects.requireNonNullElse(kind, ""),
          Objects.requireNonNullElse(unit, ""),
          Objects.requireNonNullElse(value, JsonNull.INSTANCE),
          Objects.requireNonNullElse(si, JsonNull.INSTANCE));
    }
  }

  private record ReadVerdict(@Nullable String text, boolean holds) {}

  /**
   * Puts records together; a live page may have stored one for each statement of a cell.
   *
   * @throws com.google.gson.JsonParseException if one is no record
   */
  static Recorded of(List<? extends JsonElement> records) {
    var definitions = new LinkedHashMap<String, Definition>();
    var verdicts = new LinkedHashMap<String, Boolean>();
    for (JsonElement record : records) {
      Read read = new Gson().fromJson(record, Read.class);
      if (read.definitions() != null) {
        read.definitions().forEach((name, found) -> definitions.put(name, found.definition()));
      }
      put(verdicts, "check ", read.checks());
      put(verdicts, "assumption ", read.assumptions());
    }
    return new Recorded(definitions, verdicts);
  }

  private static void put(
      Map<String, Boolean> verdicts, String noun, @Nullable List<ReadVerdict> read) {
    if (read != null) {
      read.forEach(verdict -> verdicts.put(noun + verdict.text(), verdict.holds()));
    }
  }

  boolean isEmpty() {
    return definitions.isEmpty() && verdicts.isEmpty();
  }
}
