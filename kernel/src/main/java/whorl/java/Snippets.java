package whorl.java;

import java.util.Optional;
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
import org.jspecify.annotations.Nullable;
import whorl.diagnostic.Span;

/** Runs snippets in JShell, and says what came of them in the words of the one who wrote them. */
final class Snippets {
  private final JShell shell;
  private final SourceCodeAnalysis analysis;
  private final CellControl control;
  private final Origins origins;
  private final CellCalls calls;
  private final Supplier<CellThread> thread;

  Snippets(
      JShell shell,
      CellControl control,
      Origins origins,
      CellCalls calls,
      Supplier<CellThread> thread) {
    this.shell = shell;
    this.analysis = shell.sourceCodeAnalysis();
    this.control = control;
    this.origins = origins;
    this.calls = calls;
    this.thread = thread;
  }

  /** Runs a snippet; what comes out is its value, if it is an expression. */
  Optional<Value> run(JavaText.Snippet snippet, JavaText text) throws Failure, Stop {
    Optional<Value> last = Optional.empty();
    for (SnippetEvent event : shell.eval(snippet.code())) {
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
      DeclarationSnippet used = unresolved.getSnippet();
      throw JavaErrors.unresolved(name(used), missing(used), text, place);
    }
    Optional<Throwable> thrown = ran.flatMap(CellControl.Ran::thrown);
    if (thrown.isPresent()) {
      throw calls.thrown(thrown.get(), text, place);
    }
    if (event.status() != Status.VALID && declared instanceof DeclarationSnippet declaration) {
      tell(
          name(declaration) + " mentions " + missing(declaration) + ", which is not declared yet.");
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
    @Nullable Object object = ran.map(CellControl.Ran::value).orElse(null);
    return object == null && snippet.closed() ? Optional.empty() : Optional.of(new Value(object));
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

  private String missing(DeclarationSnippet declaration) {
    return String.join(" and ", shell.unresolvedDependencies(declaration).toList());
  }

  /** JShell makes a variable anew, without its value, when its type is declared anew. */
  private void tellReset(SnippetEvent event) {
    if (event.snippet() instanceof VarSnippet variable
        && event.causeSnippet() instanceof DeclarationSnippet type
        && event.status() == Status.VALID
        && event.previousStatus() == Status.VALID) {
      tell(variable.name() + " has lost its value, for " + name(type) + " was declared anew.");
    }
  }

  private void tell(String notice) {
    thread.get().run().ifPresent(run -> run.output().print(JavaOutput.Stream.ERR, notice + "\n"));
  }
}
