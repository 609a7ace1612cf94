package whorl.java;

import java.nio.file.Path;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.concurrent.Callable;
import java.util.function.Supplier;
import jdk.jshell.JShell;
import jdk.jshell.SourceCodeAnalysis;
import jdk.jshell.spi.ExecutionControl;
import jdk.jshell.spi.ExecutionControlProvider;
import jdk.jshell.spi.ExecutionEnv;
import org.dflib.jjava.jupyter.kernel.BaseNotebookStatics;
import org.dflib.jjava.jupyter.kernel.display.DisplayData;
import org.dflib.jjava.jupyter.kernel.magic.MagicsRegistry;
import org.jspecify.annotations.Nullable;

/**
 * JShell with all that the Java cells of a page have declared, and what shows their values. It is
 * begun anew when the code of a cell cannot be ended.
 */
final class JavaSession implements AutoCloseable {
  /** What a JShell user finds imported, and what notebooks call without a class in front. */
  private static final List<String> IMPORTS =
      List.of(
          "java.io.*",
          "java.math.*",
          "java.net.*",
          "java.nio.file.*",
          "java.util.*",
          "java.util.concurrent.*",
          "java.util.function.*",
          "java.util.prefs.*",
          "java.util.regex.*",
          "java.util.stream.*",
          "static " + BaseNotebookStatics.class.getName() + ".*",
          "static " + CellOutput.class.getName() + ".*",
          "static " + JavaSheet.class.getName() + ".*");

  static {
    // The display library logs, and SLF4J would tell the user that nobody reads it. A binding on
    // the class path is used all the same.
    System.getProperties().putIfAbsent("slf4j.internal.verbosity", "ERROR");
  }

  private final CellLoader loader = new CellLoader();
  private final NotebookKernel kernel = new NotebookKernel(this);
  private final Set<Path> added = new HashSet<>();
  private final Supplier<CellThread> thread;
  private final JShell shell;
  private final SourceCodeAnalysis analysis;
  private final Frames frames;
  private final CellCalls calls;
  private final Snippets snippets;
  private final JavaServices services;
  private boolean begun;

  /**
   * A session without declarations.
   *
   * @param thread where code of cells runs; now and then another
   */
  JavaSession(Supplier<CellThread> thread) {
    this.thread = thread;
    var control = new CellControl(loader, thread);
    shell = JShell.builder().executionEngine(new Engine(control), Map.of()).build();
    analysis = shell.sourceCodeAnalysis();
    var origins = new Origins(analysis);
    frames = new Frames(origins);
    calls = new CellCalls(thread, new JavaErrors(frames));
    snippets = new Snippets(shell, control, origins, calls, thread);
    services = new JavaServices(shell, kernel.getMagicsRegistry());
    new Magics(this).register(kernel.getMagicsRegistry());
    IMPORTS.forEach(name -> shell.eval("import " + name + ";"));
  }

  private record Engine(CellControl control) implements ExecutionControlProvider {
    @Override
    public String name() {
      return "whorl";
    }

    @Override
    public ExecutionControl generate(ExecutionEnv environment, Map<String, String> parameters) {
      return control;
    }
  }

  ClassLoader loader() {
    return loader;
  }

  /** What answers questions about texts. */
  JavaServices services() {
    return services;
  }

  /** What tells where in cells an exception came from. */
  Frames frames() {
    return frames;
  }

  /** Runs a text and shows its value. */
  void run(JavaText text, CellRun run) throws Failure, Stop {
    thread.get().use(loader);
    kernel.install();
    installFirstExtensions(text, run);
    Optional<Value> value = evaluate(text);
    if (value.isPresent() && !run.isShown(value.get().object())) {
      Shown shown = call(() -> Shown.of(rendered(value.get().object())), text);
      run.output().result(shown.data(), shown.metadata());
    }
  }

  /** Extensions beside the kernel itself; one that fails keeps no cell from running. */
  private void installFirstExtensions(JavaText text, CellRun run) throws Stop {
    if (!begun) {
      begun = true;
      try {
        call(kernel::installExtensions, text);
      } catch (Failure failure) {
        String notice = "An extension cannot be installed: " + failure.getMessage() + "\n";
        run.output().print(JavaOutput.Stream.ERR, notice);
      }
    }
  }

  private <T> T call(Callable<T> task, JavaText text) throws Failure, Stop {
    return calls.call(task, text, text.lastLine());
  }

  private DisplayData rendered(@Nullable Object value) {
    if (value == null) {
      return new DisplayData("null");
    }
    return value instanceof DisplayData display ? display : kernel.getRenderer().render(value);
  }

  /** Runs a text; what comes out is the value of its last piece, if that has one to be shown. */
  private Optional<Value> evaluate(JavaText text) throws Failure, Stop {
    Optional<Value> last = Optional.empty();
    for (JavaText.Piece piece : text.pieces(analysis, magics().getLineMagicNames())) {
      last = evaluate(piece, text);
    }
    return last;
  }

  private Optional<Value> evaluate(JavaText.Piece piece, JavaText text) throws Failure, Stop {
    if (piece instanceof JavaText.Snippet snippet) {
      return snippets.run(snippet, text);
    }
    if (piece instanceof JavaText.LineMagic magic) {
      calls.<@Nullable Object>call(
          () -> magics().evalLineMagic(kernel, magic.name(), magic.arguments()),
          text,
          text.span(magic));
    } else if (piece instanceof JavaText.CellMagic magic) {
      calls.<@Nullable Object>call(
          () -> magics().evalCellMagic(kernel, magic.name(), magic.arguments(), magic.body()),
          text,
          text.span(magic));
    }
    return Optional.empty();
  }

  private MagicsRegistry magics() {
    return kernel.getMagicsRegistry();
  }

  /** Runs a text that code on the thread of the cells hands in. */
  Optional<Value> runWithin(JavaText text) throws Exception {
    if (CellThread.current().filter(thread.get()::equals).isEmpty()) {
      throw new IllegalStateException("Code can be handed in only by the cell that runs.");
    }
    // JShell reads files, which an interrupt of its thread would close for good.
    return thread.get().shielded(() -> evaluate(text));
  }

  /**
   * Adds jars and folders of classes to what cells can use, with the extensions in them; on the
   * thread of the cells.
   */
  void add(List<Path> paths) throws Exception {
    thread.get().shielded(() -> addToClassPath(paths));
    kernel.installExtensions();
  }

  private Set<Path> addToClassPath(List<Path> paths) {
    for (Path path : paths) {
      Path absolute = path.toAbsolutePath().normalize();
      if (added.add(absolute)) {
        shell.addToClasspath(absolute.toString());
      }
    }
    return added;
  }

  @Override
  public void close() {
    kernel.uninstall();
    shell.close();
  }
}
