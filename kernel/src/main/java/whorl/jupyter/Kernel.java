package whorl.jupyter;

import com.google.gson.JsonObject;
import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.concurrent.CompletableFuture;
import java.util.concurrent.CountDownLatch;
import java.util.function.Supplier;
import org.jspecify.annotations.Nullable;
import whorl.page.Page;
import whorl.page.PlainLanguage;

/**
 * A page behind the connection of a front end.
 *
 * <p>Each thread has one task. That of the sockets takes messages in and out; those of shell and
 * control serve requests; that of the outbox sends. Cells run on that of shell.
 */
public final class Kernel {
  private static final long STACK_FOR_CELLS = 16 << 20;
  private static final long DEFAULT_STACK = 0;

  /** How long a thread may take to end, in milliseconds. */
  private static final long PATIENCE = 1_000;

  private final Log log;
  private final Session session = new Session("kernel");
  private final WireFormat format;
  private final Inbox shellInbox = new Inbox();
  private final Inbox controlInbox = new Inbox();
  private final Questions questions;
  private final Execution execution;
  private final Sockets sockets;
  private final Outbox outbox;
  private final CompletableFuture<Page> page = new CompletableFuture<>();
  private final CountDownLatch ended = new CountDownLatch(1);
  private volatile @Nullable KernelException failure;
  private final Thread shell;
  private final Thread control;
  private final Thread sending;
  private final Thread moving;
  private final Thread loading;

  /**
   * Binds the sockets; from here on front ends can connect, though nothing is served yet.
   *
   * @param connection where front ends connect
   * @param language of plain cells
   * @param pages makes the page; called once, while first requests are served already
   * @param warmUp runs beside the first requests once the page is there
   * @param err where trouble is told, one line each
   */
  public Kernel(
      ConnectionFile connection,
      PlainLanguage language,
      Supplier<Page> pages,
      Runnable warmUp,
      PrintWriter err)
      throws KernelException {
    log = new Log(err);
    format = new WireFormat(new Signatures(connection.key()));
    sockets = new Sockets(connection, new Arrivals(), this::fail, log);
    outbox = new Outbox(session, format, sockets, log);
    questions = new Questions(session, format, outbox, log);
    var info = new KernelInfo(language);

    Map<String, Handler> onControl =
        Map.of(
            "kernel_info_request", info,
            "interrupt_request", this::interrupt,
            "shutdown_request", this::shutDown);
    var history = new History();
    execution = new Execution(page::join, shellInbox, history, outbox, questions, log);
    var onShell = new HashMap<String, Handler>();
    onShell.put("kernel_info_request", info);
    onShell.put("execute_request", execution);
    onShell.put("history_request", history);
    onShell.put("shutdown_request", this::shutDown);
    onShell.putAll(new CodeQuestions(page::join).handlers());
    onShell.putAll(Comms.handlers());

    shell =
        thread(
            "shell",
            STACK_FOR_CELLS,
            new RequestLoop(Channel.SHELL, shellInbox, onShell, format, session, outbox, log));
    control =
        thread(
            "control",
            DEFAULT_STACK,
            new RequestLoop(
                Channel.CONTROL, controlInbox, onControl, format, session, outbox, log));
    sending =
        thread(
            "outbox",
            DEFAULT_STACK,
            () -> {
              outbox.run();
              sockets.end();
            });
    moving = thread("sockets", DEFAULT_STACK, sockets);
    loading = thread("page", DEFAULT_STACK, () -> load(pages, warmUp));
  }

  private Thread thread(String name, long stack, Runnable task) {
    var thread = new Thread(null, task, name, stack);
    thread.setDaemon(true);
    thread.setUncaughtExceptionHandler(this::fail);
    return thread;
  }

  private void load(Supplier<Page> pages, Runnable warmUp) {
    page.complete(pages.get());
    try {
      warmUp.run();
    } catch (RuntimeException e) {
      // A cold kernel is slow, and that is all.
      log.line("a failure in the warm-up", e);
    }
  }

  /**
   * Serves until a front end, or {@link #stop}, shuts the kernel down.
   *
   * @throws KernelException if a part of the kernel failed so that the rest is of no use
   */
  public void run() throws KernelException {
    List.of(moving, sending, control, shell, loading).forEach(Thread::start);
    try {
      ended.await();
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
    }
    close();
    if (failure != null) {
      throw failure;
    }
  }

  /** Makes {@link #run} return soon; from any thread. */
  public void stop() {
    ended.countDown();
  }

  /** A thread that everything else needs has ended. */
  private void fail(Thread thread, Throwable cause) {
    log.line("the thread " + thread.getName() + " failed", cause);
    failure = new KernelException("the kernel had to end", cause);
    page.completeExceptionally(cause);
    stop();
  }

  private void interrupt(Request request) {
    interruptCell();
    request.succeed(new JsonObject());
  }

  private void interruptCell() {
    execution.expectInterrupt();
    if (page.isDone() && !page.isCompletedExceptionally()) {
      page.join().interrupt();
    }
    questions.cancel();
  }

  private void shutDown(Request request) throws BadContentException {
    var content = new JsonObject();
    content.addProperty("restart", request.content().flag("restart", false));
    request.succeed(content);
    request.publish("shutdown_reply", content);
    stop();
  }

  /** Ends the threads in the order in which what one has left to do may still pass the next. */
  private void close() {
    controlInbox.end();
    join(control);
    interruptCell();
    shellInbox.end();
    boolean idle = join(shell);
    outbox.end();
    join(sending);
    join(moving);
    if (idle && page.isDone() && !page.isCompletedExceptionally()) {
      page.join().close();
    }
  }

  /** Whether the thread ended within a moment. */
  private static boolean join(Thread thread) {
    try {
      thread.join(PATIENCE);
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
    }
    return !thread.isAlive();
  }

  /** Passes on what arrives at the sockets. */
  private final class Arrivals implements Sockets.Receiver {
    private boolean welcomed;

    @Override
    public void received(Channel channel, List<byte[]> frames) {
      switch (channel) {
        case SHELL -> shellInbox.add(frames);
        case CONTROL -> controlInbox.add(frames);
        case STDIN -> questions.received(frames);
        case IOPUB, HEARTBEAT -> throw new IllegalArgumentException(channel.portName());
      }
    }

    /** The first that comes also learns that the kernel has just started. */
    @Override
    public List<List<byte[]>> welcome(byte[] topic) {
      var messages = new ArrayList<List<byte[]>>();
      String text = new String(topic, StandardCharsets.UTF_8);
      messages.add(message(topic, "iopub_welcome", "subscription", text));
      if (!welcomed) {
        welcomed = true;
        messages.add(message(topic, "status", "execution_state", "starting"));
      }
      return messages;
    }

    private List<byte[]> message(byte[] topic, String type, String field, String value) {
      var content = new JsonObject();
      content.addProperty(field, value);
      return format.write(
          new Message(
              List.of(topic),
              session.header(type),
              new JsonObject(),
              new JsonObject(),
              content,
              List.of()));
    }
  }
}
