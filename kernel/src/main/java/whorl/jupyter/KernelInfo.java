package whorl.jupyter;

import com.google.gson.JsonArray;
import com.google.gson.JsonObject;
import java.util.Objects;
import whorl.page.PlainLanguage;

/** Tells what this kernel is. */
final class KernelInfo implements Handler {
  private static final String UNKNOWN_VERSION = "0";

  private final PlainLanguage language;

  KernelInfo(PlainLanguage language) {
    this.language = language;
  }

  @Override
  public void handle(Request request) {
    String version =
        Objects.requireNonNullElse(
            KernelInfo.class.getPackage().getImplementationVersion(), UNKNOWN_VERSION);
    var content = new JsonObject();
    content.addProperty("protocol_version", Session.PROTOCOL);
    content.addProperty("implementation", "whorl");
    content.addProperty("implementation_version", version);
    content.add("language_info", language(version));
    content.addProperty("banner", banner(version));
    content.add("help_links", new JsonArray());
    content.add("supported_features", new JsonArray());
    request.succeed(content);
  }

  private String banner(String version) {
    String cells =
        switch (language) {
          case SHEET -> "%%java begins a cell in Java";
          case JAVA -> "cells are in Java; %%sheet begins one in the sheet language";
        };
    return "Whorl " + version + ": calculation notes that check themselves; " + cells;
  }

  private JsonObject language(String version) {
    return switch (language) {
      // Front ends know no mode for the sheet; that of Octave colours it best.
      case SHEET -> language("whorl", version, "text/x-whorl", ".whorl", "octave", "octave");
      case JAVA ->
          language(
              "Java",
              System.getProperty("java.version"),
              "text/x-java-source",
              ".java",
              "text/x-java",
              "java");
    };
  }

  private static JsonObject language(
      String name, String version, String mediaType, String extension, String mode, String lexer) {
    var info = new JsonObject();
    info.addProperty("name", name);
    info.addProperty("version", version);
    info.addProperty("mimetype", mediaType);
    info.addProperty("file_extension", extension);
    info.addProperty("codemirror_mode", mode);
    info.addProperty("pygments_lexer", lexer);
    info.addProperty("nbconvert_exporter", "script");
    return info;
  }
}
