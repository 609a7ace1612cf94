package whorl.jupyter;

import com.google.gson.JsonArray;
import com.google.gson.JsonObject;
import java.util.Map;
import java.util.Optional;
import java.util.function.Supplier;
import whorl.assist.Completeness;
import whorl.assist.Completion;
import whorl.assist.Completion.Candidate;
import whorl.page.Bundle;
import whorl.page.Page;

/** What a front end asks about a text that is being written. */
final class CodeQuestions {
  private final Supplier<Page> page;

  CodeQuestions(Supplier<Page> page) {
    this.page = page;
  }

  Map<String, Handler> handlers() {
    return Map.of(
        "complete_request", this::complete,
        "inspect_request", this::inspect,
        "is_complete_request", this::isComplete);
  }

  private void complete(Request request) throws BadContentException {
    var text = CursorText.of(request.content());
    Completion completion = page.get().complete(text.code(), text.cursor());
    int start = text.codePoints(completion.start());
    int end = text.codePoints(completion.end());
    var matches = new JsonArray();
    var types = new JsonArray();
    for (Candidate candidate : completion.candidates()) {
      matches.add(candidate.text());
      var type = new JsonObject();
      type.addProperty("text", candidate.text());
      type.addProperty("type", candidate.type());
      type.addProperty("start", start);
      type.addProperty("end", end);
      type.addProperty("signature", candidate.detail());
      types.add(type);
    }
    var metadata = new JsonObject();
    metadata.add("_jupyter_types_experimental", types);
    var content = new JsonObject();
    content.add("matches", matches);
    content.addProperty("cursor_start", start);
    content.addProperty("cursor_end", end);
    content.add("metadata", metadata);
    request.succeed(content);
  }

  private void inspect(Request request) throws BadContentException {
    var text = CursorText.of(request.content());
    int detail = request.content().number("detail_level", 0);
    Optional<Bundle> found = page.get().inspect(text.code(), text.cursor(), detail);
    Bundle bundle = found.orElseGet(() -> Bundle.of(new JsonObject()));
    var content = new JsonObject();
    content.addProperty("found", found.isPresent());
    content.add("data", bundle.data());
    content.add("metadata", bundle.metadata());
    request.succeed(content);
  }

  private void isComplete(Request request) throws BadContentException {
    Completeness completeness = page.get().completeness(request.content().text("code"));
    var content = new JsonObject();
    content.addProperty("status", status(completeness));
    if (completeness instanceof Completeness.Incomplete incomplete) {
      content.addProperty("indent", incomplete.indent());
    }
    request.succeed(content);
  }

  private static String status(Completeness completeness) {
    if (completeness instanceof Completeness.Complete) {
      return "complete";
    }
    if (completeness instanceof Completeness.Incomplete) {
      return "incomplete";
    }
    return completeness instanceof Completeness.Invalid ? "invalid" : "unknown";
  }
}
