package whorl.jupyter;

import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.net.ServerSocket;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.concurrent.CompletableFuture;
import whorl.page.PlainLanguage;

/** A kernel at work, with a page made of scripts. */
final class Served implements AutoCloseable {
  static final String KEY = "a key";

  private final ScriptPage page = new ScriptPage();
  private final StringWriter log = new StringWriter();
  private final ConnectionFile connection;
  private final Kernel kernel;
  private final CompletableFuture<Void> run;

  Served() throws IOException {
    this(KEY);
  }

  Served(String key) throws IOException {
    this(key, () -> {});
  }

  Served(String key, Runnable warmUp) throws IOException {
    connection = new ConnectionFile("127.0.0.1", freePorts(), key);
    kernel = new Kernel(connection, PlainLanguage.SHEET, () -> page, warmUp, new PrintWriter(log));
    run = CompletableFuture.runAsync(this::runKernel, task -> new Thread(task, "kernel").start());
  }

  private void runKernel() {
    try {
      kernel.run();
    } catch (KernelException e) {
      throw new IllegalStateException(e);
    }
  }

  static EnumMap<Channel, Integer> freePorts() throws IOException {
    var ports = new EnumMap<Channel, Integer>(Channel.class);
    List<ServerSocket> held = new ArrayList<>();
    for (Channel channel : Channel.values()) {
      var socket = new ServerSocket(0);
      held.add(socket);
      ports.put(channel, socket.getLocalPort());
    }
    for (ServerSocket socket : held) {
      socket.close();
    }
    return ports;
  }

  ScriptPage page() {
    return page;
  }

  ConnectionFile connection() {
    return connection;
  }

  String log() {
    return log.toString();
  }

  Client client() throws BadMessageException {
    return new Client(connection);
  }

  /** Waits until a cell runs. */
  void awaitCell() {
    while (!page.isRunning()) {
      Thread.onSpinWait();
    }
  }

  void stop() {
    kernel.stop();
  }

  /** Waits until the kernel has ended. */
  void join() {
    run.join();
  }

  @Override
  public void close() {
    kernel.stop();
    join();
  }
}
