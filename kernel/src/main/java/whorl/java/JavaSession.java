package whorl.java;

import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;
import java.util.concurrent.Callable;
import java.util.concurrent.ExecutionException;
import java.util.function.Supplier;
import jdk.jshell.DeclarationSnippet;
import jdk.jshell.JShell;
import jdk.jshell.MethodSnippet;
import jdk.jshell.Snippet;
import jdk.jshell.Snippet.Status;
import jdk.jshell.SnippetEvent;
import jdk.jshell.SourceCodeAnalysis;
import jdk.jshell.UnresolvedReferenceException;
import jdk.jshell.VarSnippet;
import jdk.jshell.spi.ExecutionControl;
import jdk.jshell.spi.ExecutionControlProvider;
import jdk.jshell.spi.ExecutionEnv;
import org.dflib.jjava.jupyter.kernel.BaseNotebookStatics;
import org.dflib.jjava.jupyter.kernel.display.DisplayData;
import org.jspecify.annotations.Nullable;
import whorl.diagnostic.Span;

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
          "static " + JavaSheet.class.getName() + ".*");

  static {
    // The display library logs, and SLF4J would tell the user that nobody reads it. A binding on
    // the class path is used all the same.
    System.getProperties().putIfAbsent("slf4j.internal.verbosity", "ERROR");
  }

  private final CellLoader loader = new CellLoader();
  private final Supplier<CellThread> thread;
  private final CellControl control;
  private final JShell shell;
  private final SourceCodeAnalysis analysis;
  private final Origins origins;
  private final Frames frames;
  private final JavaErrors errors;
  private final NotebookKernel kernel;

  /** A value to be shown, which may be null. */
  private record Value(@Nullable Object object) {}

  /**
   * A session without declarations.
   *
   * @param thread where code of cells runs; now and then another
   */
  JavaSession(Supplier<CellThread> thread) {
    this.thread = thread;
    control = new CellControl(loader, thread);
    shell = JShell.builder().executionEngine(new Engine(control), Map.of()).build();
    analysis = shell.sourceCodeAnalysis();
    origins = new Origins(analysis);
    frames = new Frames(origins);
    errors = new JavaErrors(frames);
    kernel = new NotebookKernel(this);
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

  Frames frames() {
    return frames;
  }

  ClassLoader loader() {
    return loader;
  }

  /** Runs a text and shows its value. */
  void run(JavaText text, CellRun run) throws Failure, Stop {
    thread.get().use(loader);
    kernel.install();
    Optional<Value> value = evaluate(text);
    if (value.isPresent() && !run.isShown(value.get().object())) {
      Shown shown = call(() -> Shown.of(rendered(value.get().object())), text, text.lastLine());
      run.output().result(shown.data(), shown.metadata());
    }
  }

  private DisplayData rendered(@Nullable Object value) {
    if (value == null) {
      return new DisplayData("null");
    }
    return value instanceof DisplayData display ? display : kernel.getRenderer().render(value);
  }

  /**
   * Runs code that code of a cell hands in.
   *
   * @return its value; null if it has none
   */
  @Nullable Object evaluateWithin(String code) {
    if (CellThread.current().filter(thread.get()::equals).isEmpty()) {
      throw new IllegalStateException("Code can be run only by the cell that runs.");
    }
    try {
      return thread
          .get()
          .shielded(() -> evaluate(new JavaText("the code", code)))
          .map(Value::object)
          .orElse(null);
    } catch (Stop stop) {
      throw new CellStopped();
    } catch (Exception e) {
      throw new IllegalArgumentException(e.getMessage(), e);
    }
  }

  /** Runs a text; what comes out is the value of its last piece, if that has one to be shown. */
  private Optional<Value> evaluate(JavaText text) throws Failure, Stop {
    Optional<Value> last = Optional.empty();
    for (JavaText.Piece piece :
        text.pieces(analysis, kernel.getMagicsRegistry().getLineMagicNames())) {
      last = piece instanceof JavaText.Snippet snippet ? evaluate(snippet, text) : Optional.empty();
    }
    return last;
  }

  private Optional<Value> evaluate(JavaText.Snippet snippet, JavaText text) throws Failure, Stop {
    List<SnippetEvent> events = shell.eval(snippet.code());
    Optional<Value> last = Optional.empty();
    for (SnippetEvent event : events) {
      if (event.causeSnippet() == null) {
        origins.add(event.snippet(), text, snippet.start());
        last = settled(event, snippet, text);
      } else {
        tellReset(event);
      }
    }
    return last;
  }

  private Optional<Value> settled(SnippetEvent event, JavaText.Snippet snippet, JavaText text)
      throws Failure, Stop {
    Snippet declared = event.snippet();
    String className = analysis.wrapper(declared).fullClassName();
    Optional<CellControl.Ran> ran = control.take(className);
    Optional<Stop> stop = ran.flatMap(CellControl.Ran::stop);
    if (stop.isPresent()) {
      throw stop.get();
    }
    if (thread.get().isStopping()) {
      throw new Stop(Stop.Ending.ENDED);
    }
    if (event.status() == Status.REJECTED) {
      throw JavaErrors.refused(shell.diagnostics(declared).toList(), text, snippet);
    }
    Span place = text.span(snippet);
    if (event.exception() instanceof UnresolvedReferenceException unresolved) {
      throw errors.unresolved(
          name(unresolved.getSnippet()), missing(unresolved.getSnippet()), text, place);
    }
    Optional<Throwable> thrown = ran.flatMap(CellControl.Ran::thrown);
    if (thrown.isPresent()) {
      throw call(() -> errors.thrown(thrown.get(), text, place), text, place);
    }
    if (event.status() != Status.VALID && declared instanceof DeclarationSnippet declaration) {
      tell(
          name(declaration)
              + " mentions "
              + String.join(" and ", missing(declaration))
              + ", which is not declared yet.");
    }
    return switch (declared.subKind()) {
      case TEMP_VAR_EXPRESSION_SUBKIND -> {
        drop((VarSnippet) declared, className);
        yield value(ran, snippet);
      }
      case VAR_VALUE_SUBKIND, OTHER_EXPRESSION_SUBKIND -> value(ran, snippet);
      default -> Optional.empty();
    };
  }

  /** That a call gave nothing is no news where its author closed it as a statement. */
  private static Optional<Value> value(Optional<CellControl.Ran> ran, JavaText.Snippet snippet) {
    return ran.map(CellControl.Ran::value)
        .map(Value::new)
        .or(() -> snippet.closed() ? Optional.empty() : Optional.of(new Value(null)));
  }

  /** JShell keeps the value of every expression in a variable that nobody knows of. */
  private void drop(VarSnippet variable, String className) {
    shell.drop(variable);
    origins.remove(variable);
    control.clear(className, variable.name());
  }

  private static String name(DeclarationSnippet declaration) {
    return declaration instanceof MethodSnippet method
        ? method.name() + "(" + method.parameterTypes() + ")"
        : declaration.name();
  }

  private List<String> missing(DeclarationSnippet declaration) {
    return shell.unresolvedDependencies(declaration).toList();
  }

  /** JShell makes a variable anew, without its value, when its type is declared anew. */
  private void tellReset(SnippetEvent event) {
    if (event.snippet() instanceof VarSnippet variable
        && event.status() == Status.VALID
        && event.previousStatus() == Status.VALID) {
      tell(
          variable.name()
              + " has lost its value, for "
              + name((DeclarationSnippet) event.causeSnippet())
              + " was declared anew.");
    }
  }

  private void tell(String notice) {
    thread.get().run().ifPresent(run -> run.output().print(JavaOutput.Stream.ERR, notice + "\n"));
  }

  private <T> T call(Callable<T> task, JavaText text, Span place) throws Failure, Stop {
    try {
      return thread.get().call(task);
    } catch (Stop stop) {
      throw stop;
    } catch (Failure failure) {
      throw failure.within(text, place);
    } catch (ExecutionException e) {
      throw errors.thrown(Objects.requireNonNullElse(e.getCause(), e), text, place);
    } catch (Exception e) {
      throw errors.thrown(e, text, place);
    }
  }

  @Override
  public void close() {
    kernel.uninstall();
    shell.close();
  }
}
