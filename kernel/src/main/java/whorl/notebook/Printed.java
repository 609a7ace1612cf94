package whorl.notebook;

import com.google.gson.JsonObject;
import java.io.IOException;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.jspecify.annotations.Nullable;
import whorl.java.JavaOutput;

/** Keeps what the Java cells of a note print and show, cell by cell. For any thread. */
final class Printed {
  private final Map<Cell, List<Entry>> entries = new HashMap<>();

  /** Cells of which all goes when the next output comes. */
  private final Set<Cell> outdated = new HashSet<>();

  /** An output, which may still change. */
  private sealed interface Entry {
    /** The output as it stands. */
    Output output();
  }

  /** A text that grows while a program prints. */
  private record Text(String stream, StringBuilder text) implements Entry {
    @Override
    public Output output() {
      return new Output.Stream(stream, text.toString());
    }
  }

  /** An output with the id by which a later cell may show it anew. */
  private static final class Shown implements Entry {
    private final @Nullable String id;
    private Output output;

    Shown(@Nullable String id, Output output) {
      this.id = id;
      this.output = output;
    }

    @Override
    public Output output() {
      return output;
    }
  }

  /** What a cell left, in order. */
  synchronized List<Output> of(Cell cell) {
    return entries.getOrDefault(cell, List.of()).stream().map(Entry::output).toList();
  }

  private List<Entry> open(Cell cell) {
    List<Entry> open = entries.computeIfAbsent(cell, any -> new ArrayList<>());
    if (outdated.remove(cell)) {
      open.clear();
    }
    return open;
  }

  private synchronized void add(Cell cell, @Nullable String id, Output output) {
    open(cell).add(new Shown(id, output));
  }

  private synchronized void print(Cell cell, String stream, String printed) {
    List<Entry> open = open(cell);
    boolean goesOn =
        !open.isEmpty()
            && open.get(open.size() - 1) instanceof Text last
            && last.stream().equals(stream);
    if (!goesOn) {
      open.add(new Text(stream, new StringBuilder()));
    }
    ((Text) open.get(open.size() - 1)).text().append(printed);
  }

  private synchronized void update(String id, Output output) {
    for (List<Entry> all : entries.values()) {
      for (Entry entry : all) {
        if (entry instanceof Shown shown && id.equals(shown.id)) {
          shown.output = output;
        }
      }
    }
  }

  private synchronized void clear(Cell cell, boolean wait) {
    outdated.add(cell);
    if (!wait) {
      open(cell);
    }
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
        Printed.this.clear(cell, wait);
      }

      @Override
      public String ask(String prompt, boolean secret) throws IOException {
        throw new IOException("nobody can be asked while a note runs without a page");
      }
    };
  }
}
