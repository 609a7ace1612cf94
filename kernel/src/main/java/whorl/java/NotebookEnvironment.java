package whorl.java;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.Optional;
import org.dflib.jjava.jupyter.channels.ShellReplyEnvironment;
import org.dflib.jjava.jupyter.messages.ContentType;
import org.dflib.jjava.jupyter.messages.publish.PublishClearOutput;
import org.dflib.jjava.jupyter.messages.publish.PublishDisplayData;
import org.dflib.jjava.jupyter.messages.publish.PublishStream;
import org.dflib.jjava.jupyter.messages.publish.PublishUpdateDisplayData;

/**
 * Where the display library publishes: the output of the cell that runs, in place of sockets.
 * Messages that are not about output have no receiver.
 */
final class NotebookEnvironment extends ShellReplyEnvironment {
  NotebookEnvironment() {
    super(null, null, null, null);
  }

  @Override
  public <T extends ContentType<T>> void publish(T content) {
    CellRun.current().ifPresent(run -> publish(content, run));
  }

  private static void publish(Object content, CellRun run) {
    JavaOutput output = run.output();
    if (content instanceof PublishDisplayData display) {
      Shown shown = Shown.of(display);
      shown.id().ifPresent(run::noteShown);
      output.display(shown.data(), shown.metadata(), shown.id().orElse(null));
    } else if (content instanceof PublishUpdateDisplayData display) {
      Shown shown = Shown.of(display);
      shown.id().ifPresent(id -> output.update(shown.data(), shown.metadata(), id));
    } else if (content instanceof PublishStream stream) {
      boolean err = stream.getStreamType() == PublishStream.StreamType.ERR;
      output.print(err ? JavaOutput.Stream.ERR : JavaOutput.Stream.OUT, stream.getText());
    } else if (content instanceof PublishClearOutput clear) {
      output.clear(clear.shouldWait());
    }
  }

  @Override
  public String readFromStdIn(String prompt, boolean secret) {
    try {
      Optional<CellRun> run = CellRun.current();
      return run.isEmpty() ? "" : run.get().output().ask(prompt, secret);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }
}
