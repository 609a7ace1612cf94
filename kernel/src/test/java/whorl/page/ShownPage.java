package whorl.page;

import java.io.IOException;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.jspecify.annotations.Nullable;

/** Keeps what a front end would show: cells in the order of the page, each with its outputs. */
final class ShownPage {
  private final Page page;
  private final Map<String, List<Output>> cells = new LinkedHashMap<>();
  private final List<String> deleted = new ArrayList<>();
  private String client = "client 1";
  private int count;

  ShownPage(Page page) {
    this.page = page;
  }

  /** An output as it stands; printed text and values have no id. */
  record Output(String sort, @Nullable String id, Bundle bundle) {
    String text() {
      return bundle.data().get("text/plain").getAsString();
    }

    String html() {
      return bundle.data().get("text/html").getAsString();
    }
  }

  /** Runs a cell with an id. */
  CellAnswer run(String cell, String code) {
    var outputs = new ArrayList<Output>();
    cells.put(cell, outputs);
    var request =
        new CellRequest(
            Optional.of(cell), List.copyOf(deleted), client, ++count, code, /* mayAsk= */ false);
    deleted.clear();
    return page.run(request, new CellFront(outputs));
  }

  /** Runs an input of a console, and returns what it shows. */
  List<Output> type(String code) {
    var outputs = new ArrayList<Output>();
    CellAnswer answer =
        page.run(
            new CellRequest(Optional.empty(), List.of(), client, ++count, code, false),
            new CellFront(outputs));
    if (answer instanceof CellAnswer.Failed failed) {
      throw new AssertionError(String.join("\n", failed.lines()));
    }
    return outputs;
  }

  void delete(String cell) {
    cells.remove(cell);
    deleted.add(cell);
  }

  /** The page is loaded anew: saved outputs are no longer shown anew in place. */
  void reload() {
    client = client + "'";
  }

  List<Output> outputs(String cell) {
    return cells.getOrDefault(cell, List.of());
  }

  /** The text of all that a cell shows. */
  String text(String cell) {
    return String.join("\n", outputs(cell).stream().map(Output::text).toList());
  }

  private final class CellFront implements Front {
    private final List<Output> outputs;

    CellFront(List<Output> outputs) {
      this.outputs = outputs;
    }

    @Override
    public void print(Stream stream, String text) {
      var data = new com.google.gson.JsonObject();
      data.addProperty("text/plain", text);
      outputs.add(new Output(stream.name(), null, Bundle.of(data)));
    }

    @Override
    public void display(Bundle bundle, @Nullable String id) {
      outputs.add(new Output("display", id, bundle));
    }

    @Override
    public void update(Bundle bundle, String id) {
      for (List<Output> all : cells.values()) {
        all.replaceAll(
            output -> id.equals(output.id()) ? new Output("display", id, bundle) : output);
      }
    }

    @Override
    public void result(Bundle bundle) {
      outputs.add(new Output("result", null, bundle));
    }

    @Override
    public void clear(boolean wait) {
      outputs.clear();
    }

    @Override
    public String ask(String prompt, boolean secret) throws IOException {
      throw new IOException("nobody is there to answer");
    }
  }
}
