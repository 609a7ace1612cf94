package whorl.notebook;

import com.google.gson.JsonObject;
import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import whorl.java.JavaOutput;

/** Keeps what the Java cells of a note print and show, cell by cell. For any thread. */
final class Printed {
  private final List<Shown> all = new ArrayList<>();

  /** An output with the id by which a later cell may show it anew. */
  private static final class Shown {
    private final Cell cell;
    private final @Nullable String id;
    private Output output;

    Shown(Cell cell, @Nullable String id, Output output) {
      this.cell = cell;
      this.id = id;
      this.output = output;
    }
  }

  /** What a cell left, in order. */
  synchronized List<Output> of(Cell cell) {
    return all.stream().filter(shown -> shown.cell == cell).map(shown -> shown.output).toList();
  }

  private synchronized void add(Cell cell, @Nullable String id, Output output) {
    all.add(new Shown(cell, id, output));
  }

  private synchronized void print(Cell cell, String name, String text) {
    Optional<Shown> last =
        all.stream().filter(shown -> shown.cell == cell).reduce((earlier, later) -> later);
    if (last.isPresent()
        && last.get().output instanceof Output.Stream stream
        && stream.name().equals(name)) {
      last.get().output = new Output.Stream(name, stream.text() + text);
    } else {
      add(cell, null, new Output.Stream(name, text));
    }
  }

  private synchronized void update(String id, Output output) {
    all.stream().filter(shown -> id.equals(shown.id)).forEach(shown -> shown.output = output);
  }

  private synchronized void clear(Cell cell) {
    all.removeIf(shown -> shown.cell == cell);
  }

  /** Where a cell prints and shows. */
  JavaOutput in(Cell cell) {
    return new JavaOutput() {
      @Override
      public void print(Stream stream, String text) {
        Printed.this.print(cell, stream == Stream.OUT ? "stdout" : "stderr", text);
      }

      @Override
      public void display(JsonObject data, JsonObject metadata, @Nullable String id) {
        add(cell, id, new Output.Display(data.asMap(), metadata));
      }

      @Override
      public void update(JsonObject data, JsonObject metadata, String id) {
        Printed.this.update(id, new Output.Display(data.asMap(), metadata));
      }

      @Override
      public void result(JsonObject data, JsonObject metadata) {
        add(cell, null, new Output.Value(data.asMap(), metadata));
      }

      @Override
      public void clear(boolean wait) {
        Printed.this.clear(cell);
      }

      @Override
      public String ask(String prompt, boolean secret) throws IOException {
        throw new IOException("nobody can be asked while a note runs without a page");
      }
    };
  }
}
