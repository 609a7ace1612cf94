package whorl.java;

import java.io.IOException;
import java.io.InputStream;
import java.io.OutputStream;
import java.io.PrintStream;
import java.nio.ByteBuffer;
import java.nio.CharBuffer;
import java.nio.charset.CharsetDecoder;
import java.nio.charset.CodingErrorAction;
import java.nio.charset.StandardCharsets;
import java.util.Optional;
import org.jspecify.annotations.Nullable;

/**
 * The standard streams of the JVM while Java cells are at home in it: what code of cells prints
 * goes to the cell, what it reads is asked of the user, and everybody else has the streams as they
 * were.
 */
final class SystemStreams {
  private static int users;
  private static @Nullable SystemStreams installed;

  private final PrintStream out = System.out;
  private final PrintStream err = System.err;
  private final InputStream in = System.in;

  private SystemStreams() {}

  /** Puts the streams in place, unless they are. */
  static synchronized void open() {
    if (users++ == 0) {
      installed = new SystemStreams();
      installed.install();
    }
  }

  /** Restores the streams of the JVM when the last user is gone. */
  static synchronized void close() {
    if (--users == 0 && installed != null) {
      installed.restore();
      installed = null;
    }
  }

  private void install() {
    System.setOut(printStream(new ToCell(JavaOutput.Stream.OUT, out)));
    System.setErr(printStream(new ToCell(JavaOutput.Stream.ERR, err)));
    System.setIn(new FromUser(in));
  }

  private void restore() {
    System.setOut(out);
    System.setErr(err);
    System.setIn(in);
  }

  private static PrintStream printStream(OutputStream stream) {
    return new PrintStream(stream, false, StandardCharsets.UTF_8);
  }

  private static final class ToCell extends OutputStream {
    private final JavaOutput.Stream stream;
    private final PrintStream elsewhere;
    private final CharsetDecoder decoder =
        StandardCharsets.UTF_8
            .newDecoder()
            .onMalformedInput(CodingErrorAction.REPLACE)
            .onUnmappableCharacter(CodingErrorAction.REPLACE);
    private ByteBuffer held = ByteBuffer.allocate(0);

    ToCell(JavaOutput.Stream stream, PrintStream elsewhere) {
      this.stream = stream;
      this.elsewhere = elsewhere;
    }

    @Override
    public void write(int one) {
      write(new byte[] {(byte) one}, 0, 1);
    }

    @Override
    public void write(byte[] bytes, int offset, int length) {
      Optional<CellThread> thread = CellThread.current();
      if (thread.isEmpty()) {
        elsewhere.write(bytes, offset, length);
        return;
      }
      // Code that was left behind prints to nobody.
      thread
          .flatMap(CellThread::run)
          .ifPresent(run -> run.output().print(stream, decoded(bytes, offset, length)));
    }

    /** Half a character is held back until its other half comes. */
    private synchronized String decoded(byte[] bytes, int offset, int length) {
      var all = ByteBuffer.allocate(held.remaining() + length);
      all.put(held).put(bytes, offset, length).flip();
      var text = CharBuffer.allocate(all.remaining());
      decoder.reset().decode(all, text, false);
      held = ByteBuffer.allocate(all.remaining()).put(all).flip();
      return text.flip().toString();
    }

    @Override
    public void flush() {
      if (CellThread.current().isEmpty()) {
        elsewhere.flush();
      }
    }
  }

  private static final class FromUser extends InputStream {
    private final InputStream elsewhere;
    private ByteBuffer line = ByteBuffer.allocate(0);
    private @Nullable CellRun reader;

    FromUser(InputStream elsewhere) {
      this.elsewhere = elsewhere;
    }

    @Override
    public int read() throws IOException {
      var one = new byte[1];
      return read(one, 0, 1) < 0 ? -1 : one[0] & 0xff;
    }

    @Override
    public int read(byte[] bytes, int offset, int length) throws IOException {
      if (CellThread.current().isEmpty()) {
        return elsewhere.read(bytes, offset, length);
      }
      Optional<CellRun> run = CellRun.current();
      if (run.isEmpty()) {
        return -1;
      }
      // No lock is held while the user thinks: a cell that is left behind would keep it.
      if (length > 0 && rest(run.get()) == 0) {
        answer(run.get().output().ask("", false) + "\n");
      }
      return take(bytes, offset, length);
    }

    /** What is left of the line that the cell asked for; other cells have no use for it. */
    private synchronized int rest(CellRun run) {
      if (reader != run) {
        reader = run;
        line = ByteBuffer.allocate(0);
      }
      return line.remaining();
    }

    private synchronized void answer(String text) {
      line = ByteBuffer.wrap(text.getBytes(StandardCharsets.UTF_8));
    }

    private synchronized int take(byte[] bytes, int offset, int length) {
      int count = Math.min(length, line.remaining());
      line.get(bytes, offset, count);
      return count;
    }

    @Override
    public int available() throws IOException {
      return CellThread.current().isEmpty()
          ? elsewhere.available()
          : CellRun.current().map(this::rest).orElse(0);
    }
  }
}
