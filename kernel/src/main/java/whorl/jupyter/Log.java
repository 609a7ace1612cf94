package whorl.jupyter;

import java.io.PrintWriter;

/** Says what went wrong, one line for each problem, to whoever started the kernel. */
final class Log {
  private final PrintWriter out;

  Log(PrintWriter out) {
    this.out = out;
  }

  void line(String problem) {
    out.println("whorl: " + problem.replaceAll("\\s*\\R\\s*", " "));
    out.flush();
  }

  /** A problem whose cause is a fault of the program: where it arose helps to find it. */
  void line(String problem, Throwable cause) {
    StackTraceElement[] trace = cause.getStackTrace();
    line(problem + ": " + cause + (trace.length == 0 ? "" : ", at " + trace[0]));
  }
}
