package whorl.java;

import java.util.Objects;
import java.util.concurrent.Callable;
import java.util.concurrent.ExecutionException;
import java.util.function.Supplier;
import org.dflib.jjava.jupyter.kernel.magic.UndefinedMagicException;
import org.jspecify.annotations.Nullable;
import whorl.diagnostic.Span;

/** Runs on the thread of the cells what may be code of theirs, and words what it throws. */
final class CellCalls {
  private final Supplier<CellThread> thread;
  private final JavaErrors errors;

  CellCalls(Supplier<CellThread> thread, JavaErrors errors) {
    this.thread = thread;
    this.errors = errors;
  }

  /**
   * Runs a task.
   *
   * @param text for which it runs
   * @param place in the text
   */
  <T extends @Nullable Object> T call(Callable<T> task, JavaText text, Span place)
      throws Failure, Stop {
    try {
      return thread.get().call(task);
    } catch (Stop stop) {
      throw stop;
    } catch (Failure failure) {
      throw failure.within(text, place);
    } catch (MagicFailure failure) {
      throw JavaErrors.magic(String.valueOf(failure.getMessage()), text, place);
    } catch (UndefinedMagicException unknown) {
      String sign = unknown.isLineMagic() ? "%" : "%%";
      throw JavaErrors.magic(
          "There is no magic " + sign + unknown.getMagicName() + ".", text, place);
    } catch (ExecutionException e) {
      throw thrown(Objects.requireNonNullElse(e.getCause(), e), text, place);
    } catch (Exception e) {
      throw thrown(e, text, place);
    }
  }

  /** Words an exception of a cell, which may have methods that are code of the cell. */
  Failure thrown(Throwable thrown, JavaText text, Span place) throws Stop {
    try {
      return thread.get().call(() -> errors.thrown(thrown, text, place));
    } catch (Stop stop) {
      throw stop;
    } catch (Exception unsayable) {
      return JavaErrors.unsayable(thrown, text, place);
    }
  }
}
