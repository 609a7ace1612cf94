package whorl.cli;

import com.google.gson.JsonObject;
import java.io.IOException;
import java.io.PrintWriter;
import java.io.Writer;
import java.net.InetAddress;
import java.net.ServerSocket;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.Callable;
import java.util.stream.Stream;
import picocli.CommandLine.Command;
import whorl.jupyter.ConnectionFile;
import whorl.jupyter.Rehearsal;
import whorl.page.WarmUp;

/**
 * {@code whorl rehearse}: does what most runs do, so that the JVM can archive the classes which
 * that takes.
 */
@Command(name = "rehearse", hidden = true)
final class RehearseCommand implements Callable<Integer> {
  private static final String NOTE = WarmUp.CELLS.get(0) + WarmUp.CELLS.get(1);
  private static final String SLIP = WarmUp.CELLS.get(2);

  @Override
  public Integer call() throws IOException, InterruptedException {
    Path folder = Files.createTempDirectory("whorl-");
    Path sheet = folder.resolve("sheet.whorl");
    Path note = folder.resolve("note.ipynb");
    Path record = folder.resolve("record.json");
    Path connection = folder.resolve("connection.json");
    try {
      Files.writeString(sheet, NOTE);
      whorl("run", sheet, "--out", note, "--json", record);
      whorl("recheck", note);
      Files.writeString(sheet, WarmUp.CELLS.get(0) + SLIP);
      whorl("run", sheet);
      Files.writeString(connection, connection().toString());
      serve(connection);
    } finally {
      for (Path file : List.of(sheet, note, record, connection, folder)) {
        Files.deleteIfExists(file);
      }
    }
    return ExitStatus.HOLDS.code();
  }

  private static void whorl(Object... words) {
    var nowhere = new PrintWriter(Writer.nullWriter());
    Main.run(nowhere, nowhere, Stream.of(words).map(Object::toString).toArray(String[]::new));
  }

  private static void serve(Path connection) throws IOException, InterruptedException {
    var kernel = new Thread(() -> whorl("kernel", connection));
    kernel.setDaemon(true);
    kernel.start();
    try (var front = new Rehearsal(ConnectionFile.read(connection))) {
      var cells = new ArrayList<>(WarmUp.CELLS);
      cells.addAll(List.of("n [rpm] = 7000", "%%java\n6 * 7"));
      front.run(cells);
    }
    kernel.join();
  }

  /** A connection file with ports that are free. */
  private static JsonObject connection() throws IOException {
    var connection = new JsonObject();
    connection.addProperty("key", "rehearsal");
    var taken = new ArrayList<ServerSocket>();
    try {
      for (String channel : List.of("shell", "control", "stdin", "iopub", "hb")) {
        var socket = new ServerSocket(0, 1, InetAddress.getLoopbackAddress());
        taken.add(socket);
        connection.addProperty(channel + "_port", socket.getLocalPort());
      }
    } finally {
      for (ServerSocket socket : taken) {
        socket.close();
      }
    }
    return connection;
  }
}
