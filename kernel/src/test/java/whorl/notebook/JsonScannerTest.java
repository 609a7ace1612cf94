package whorl.notebook;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.google.gson.JsonArray;
import com.google.gson.JsonElement;
import com.google.gson.JsonObject;
import com.google.gson.JsonParser;
import com.google.gson.JsonPrimitive;
import java.util.SplittableRandom;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

/** The grammar is that of RFC 8259. */
class JsonScannerTest {

  @ParameterizedTest
  @ValueSource(
      strings = {
        "{}",
        "[]",
        " \t\r\n[ ] \n",
        "\uFEFF{}",
        "true",
        "null",
        "\"\"",
        "\"\\\"\\\\\\/\\b\\f\\n\\r\\t\\u00e9\\uD834\\udd1e\"",
        "\"\\ud800 alone\"",
        "\"\u007f\u2028 𝜔\"",
        "0",
        "-0",
        "-0.0e-0",
        "1E+5",
        "123456789012345678901234567890.10",
        "[1,[2,{\"a\":[3]}],\"]\",{\"}\":\"{\"}]",
        "{ \"a\" : 1 , \"a\" : 2 }"
      })
  void jsonIsAccepted(String text) throws JsonFault {
    Json json = JsonScanner.scan(text);
    assertEquals(text.replace("\uFEFF", "").strip(), json.written());
  }

  @ParameterizedTest
  @CsvSource(
      quoteCharacter = '`',
      delimiter = '~',
      value = {
        "``            ~ 0 ~ the file ends here, in the middle of the note",
        "{             ~ 1 ~ the file ends here, in the middle of the note",
        "[1            ~ 2 ~ the file ends here, in the middle of the note",
        "{\"a\"        ~ 4 ~ the file ends here, in the middle of the note",
        "[1,           ~ 3 ~ the file ends here, in the middle of the note",
        "[1,]          ~ 3 ~ a value must stand here",
        "[,1]          ~ 1 ~ a value must stand here",
        "{\"a\":}      ~ 5 ~ a value must stand here",
        "nul           ~ 0 ~ a value must stand here",
        "NaN           ~ 0 ~ a value must stand here",
        "'a'           ~ 0 ~ a value must stand here",
        "+1            ~ 0 ~ a value must stand here",
        ".5            ~ 0 ~ a value must stand here",
        "{1:2}         ~ 1 ~ a key in double quotes must stand here",
        "{\"a\":1,}    ~ 7 ~ a key in double quotes must stand here",
        "{\"a\" 1}     ~ 5 ~ a colon must stand between a key and its value",
        "[1 2]         ~ 3 ~ a comma or ] must stand here",
        "{\"a\":1]     ~ 6 ~ a comma or } must stand here",
        "[nullx]       ~ 5 ~ a comma or ] must stand here",
        "[] []         ~ 3 ~ more text stands behind the end of the note",
        "1 // one      ~ 2 ~ more text stands behind the end of the note",
        "\"a           ~ 0 ~ a text begins here and never ends",
        "\"a\\\"       ~ 0 ~ a text begins here and never ends",
        "\"\\x41\"     ~ 1 ~ a backslash stands in a text before something it cannot escape",
        "\"\\u00g0\"   ~ 1 ~ a backslash stands in a text before something it cannot escape",
        "\"\\u00\"     ~ 1 ~ a backslash stands in a text before something it cannot escape",
        "`\"a\tb\"`    ~ 2 ~ a line break, tab or control character stands in a text",
        "01            ~ 0 ~ a number begins with a needless zero",
        "-             ~ 0 ~ a number lacks digits",
        "[1.]          ~ 1 ~ a number lacks digits",
        "[1e+]         ~ 1 ~ a number lacks digits",
      })
  void anythingElseIsRefusedWhereItGoesWrong(String text, int index, String problem) {
    var fault = assertThrows(JsonFault.class, () -> JsonScanner.scan(text));
    assertEquals(problem, fault.getMessage());
    assertEquals(index, fault.index());
  }

  @Test
  void nestingIsBounded() throws JsonFault {
    String deepest = "[".repeat(JsonScanner.DEEPEST) + "]".repeat(JsonScanner.DEEPEST);
    assertEquals(deepest, JsonScanner.scan(deepest).written());
    for (String open : new String[] {"[", "{\"a\":"}) {
      var fault = assertThrows(JsonFault.class, () -> JsonScanner.scan(open.repeat(5_000_000)));
      assertEquals("values are nested deeper than 1000 levels", fault.getMessage());
      assertEquals(open.length() * JsonScanner.DEEPEST, fault.index());
    }
  }

  @Test
  void longTextsAreScannedToTheirEnd() throws JsonFault {
    String text = "[" + "\"\\\\\\\"[{\", -1.5e-7, ".repeat(1_000_000) + "0]";
    assertEquals(text.length(), JsonScanner.scan(text).end());
  }

  static IntStream seeds() {
    return IntStream.range(0, 300);
  }

  /**
   * A text with some characters changed is refused, or means to the JSON library what it means to
   * us.
   */
  @ParameterizedTest
  @MethodSource("seeds")
  void damagedTextsAreReadOrRefusedButNeverBreakTheScanner(int seed) {
    var random = new SplittableRandom(seed);
    var text =
        new StringBuilder("{\"a\": [1, -2.5e3, \"x\\n\\u00e9\"], \"b\": {\"c\": null, \"d\": {}}}");
    for (int i = random.nextInt(1, 4); i > 0; i--) {
      String pool = "{}[]\",:\\ue0-.tfn \n";
      char c = pool.charAt(random.nextInt(pool.length()));
      int at = random.nextInt(text.length());
      switch (random.nextInt(3)) {
        case 0 -> text.setCharAt(at, c);
        case 1 -> text.insert(at, c);
        default -> text.deleteCharAt(at);
      }
    }
    try {
      Json json = JsonScanner.scan(text.toString());
      assertEquals(JsonParser.parseString(text.toString()), rebuilt(json));
    } catch (JsonFault fault) {
      assertTrue(fault.index() >= 0 && fault.index() <= text.length(), () -> "place of " + fault);
    }
  }

  /** A value put together from the parts that {@link Json} finds. */
  private static JsonElement rebuilt(Json json) {
    if (json.isObject()) {
      var object = new JsonObject();
      json.members().forEach(member -> object.add(member.name(), rebuilt(member.value())));
      return object;
    }
    if (json.isArray()) {
      var array = new JsonArray();
      json.elements().forEach(element -> array.add(rebuilt(element)));
      return array;
    }
    return json.isString()
        ? new JsonPrimitive(json.string())
        : JsonParser.parseString(json.written());
  }
}
