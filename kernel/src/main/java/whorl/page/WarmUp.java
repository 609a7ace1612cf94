package whorl.page;

import java.io.IOException;
import java.util.List;
import java.util.Optional;
import org.jspecify.annotations.Nullable;

/**
 * Runs a small note on a page of its own. A JVM loads and compiles what it runs for the first time;
 * this does it while nobody waits, so that a person's first cell does not.
 */
public final class WarmUp implements Runnable {
  /** Cells that use what nearly every note uses; the last has a slip. */
  public static final List<String> CELLS =
      List.of(
          """
          m [kg] = 412           # weighed
          D [mm] = 900
          n [rpm] = 6000
          """,
          """
          I [kg·m²] = 1/2 * m * (D/2)^2
          E [MJ] = 1/2 * I * n^2
          speed(r [m], n [rpm]) = r * n
          v [m/s] = speed(D/2, n)
          check E <= 10 MJ
          assume v < 300 m/s
          E [ft·lbf]
          """,
          "t [s] = E");

  /** Enough for the first compiler of the JVM to take up what each cell runs. */
  private static final int ROUNDS = 20;

  private static final Front NOWHERE = new Nowhere();

  @Override
  public void run() {
    try (var page = new LivePage(PlainLanguage.SHEET)) {
      for (int round = 0; round < ROUNDS; round++) {
        for (int cell = 0; cell < CELLS.size(); cell++) {
          var id = Optional.of(Integer.toString(cell));
          page.run(new CellRequest(id, List.of(), "", cell + 1, CELLS.get(cell), false), NOWHERE);
        }
      }
    }
  }

  /** Shows nothing. */
  private static final class Nowhere implements Front {
    @Override
    public void print(Stream stream, String text) {}

    @Override
    public void display(Bundle bundle, @Nullable String id) {}

    @Override
    public void update(Bundle bundle, String id) {}

    @Override
    public void result(Bundle bundle) {}

    @Override
    public void clear(boolean wait) {}

    @Override
    public String ask(String prompt, boolean secret) throws IOException {
      throw new IOException("nobody is there to be asked");
    }
  }
}
