package whorl.install;

import com.google.gson.GsonBuilder;
import com.google.gson.JsonArray;
import com.google.gson.JsonObject;
import java.util.List;

/**
 * What Jupyter is told of a kernel.
 *
 * @param name by which notebooks ask for it
 * @param title by which people choose it
 * @param language of its cells; a notebook whose kernel is missing is opened with one of its
 *     language
 * @param arguments that start it
 * @param logos the folder of its logos among the resources
 */
record Kernelspec(
    String name, String title, String language, List<String> arguments, String logos) {

  /** Jupyter puts the path of the connection file in its place. */
  private static final String CONNECTION = "{connection_file}";

  Kernelspec {
    arguments = List.copyOf(arguments);
  }

  /** The two kernels of the program: one for the sheet language, one that begins in Java. */
  static List<Kernelspec> both(String name) {
    return List.of(
        new Kernelspec(name, "Whorl", "whorl", List.of("kernel", CONNECTION), "sheet"),
        new Kernelspec(
            name + "-java",
            "Java (Whorl)",
            "java",
            List.of("kernel", "--java", CONNECTION),
            "java"));
  }

  /** The text of {@code kernel.json}. */
  String json(List<String> command) {
    var words = new JsonArray();
    command.forEach(words::add);
    var metadata = new JsonObject();
    metadata.addProperty("debugger", false);
    var spec = new JsonObject();
    spec.add("argv", words);
    spec.addProperty("display_name", title);
    spec.addProperty("language", language);
    // A signal would end the JVM.
    spec.addProperty("interrupt_mode", "message");
    spec.add("metadata", metadata);
    return new GsonBuilder().setPrettyPrinting().disableHtmlEscaping().create().toJson(spec) + "\n";
  }
}
