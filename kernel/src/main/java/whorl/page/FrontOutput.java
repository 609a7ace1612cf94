package whorl.page;

import com.google.gson.JsonObject;
import java.io.IOException;
import org.jspecify.annotations.Nullable;
import whorl.java.JavaOutput;

/** Shows on a page what a cell in Java shows. */
record FrontOutput(Front front) implements JavaOutput {
  @Override
  public void print(JavaOutput.Stream stream, String text) {
    front.print(stream == JavaOutput.Stream.OUT ? Front.Stream.OUT : Front.Stream.ERR, text);
  }

  @Override
  public void display(JsonObject data, JsonObject metadata, @Nullable String id) {
    front.display(new Bundle(data, metadata), id);
  }

  @Override
  public void update(JsonObject data, JsonObject metadata, String id) {
    front.update(new Bundle(data, metadata), id);
  }

  @Override
  public void result(JsonObject data, JsonObject metadata) {
    front.result(new Bundle(data, metadata));
  }

  @Override
  public void clear(boolean wait) {
    front.clear(wait);
  }

  @Override
  public String ask(String prompt, boolean secret) throws IOException {
    return front.ask(prompt, secret);
  }
}
