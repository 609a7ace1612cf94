package whorl.cli;

import java.io.IOException;
import java.io.PrintWriter;
import java.io.Writer;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;

/**
 * {@code whorl rehearse}: does what most runs do, so that the JVM can archive the classes which
 * that takes.
 */
@Command(name = "rehearse", hidden = true)
final class RehearseCommand implements Callable<Integer> {
  private static final String SHEET =
      """
      m [kg] = 412           # weighed
      D [mm] = 900
      n [rpm] = 6000
      I [kg·m²] = 1/2 * m * (D/2)^2
      E [MJ] = 1/2 * I * n^2
      speed(r [m], n [rpm]) = r * n
      v [m/s] = speed(D/2, n)
      check E <= 10 MJ
      assume v < 300 m/s
      E [ft·lbf]
      wrong [s] = E
      """;

  @Override
  public Integer call() throws IOException {
    Path sheet = Files.createTempFile("whorl-", ".whorl");
    Path record = Files.createTempFile("whorl-", ".json");
    try {
      Files.writeString(sheet, SHEET);
      var nowhere = new PrintWriter(Writer.nullWriter());
      Main.run(nowhere, nowhere, "run", sheet.toString(), "--json", record.toString());
    } finally {
      Files.delete(sheet);
      Files.delete(record);
    }
    return ExitStatus.HOLDS.code();
  }
}
