package whorl.cli;

import java.io.PrintWriter;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.Optional;
import whorl.jupyter.ConnectionFile;
import whorl.jupyter.Kernel;
import whorl.jupyter.KernelException;
import whorl.jupyter.ParentProcess;
import whorl.page.LivePage;
import whorl.page.PlainLanguage;
import whorl.page.WarmUp;

/**
 * Starts a kernel.
 *
 * @param language of plain cells
 * @param connectionFile tells where front ends connect
 */
record KernelStart(PlainLanguage language, Path connectionFile) {
  static final String COMMAND = "kernel";
  static final String JAVA = "--java";

  /**
   * The command as front ends give it. That it is read here saves a third of the time that they
   * wait for the kernel; whatever else people write is read like any other command.
   */
  static Optional<KernelStart> of(String... args) {
    int last = args.length - 1;
    boolean java = args.length == 3 && args[1].equals(JAVA);
    boolean plain = args.length == 2;
    if (!(java || plain) || !args[0].equals(COMMAND) || args[last].startsWith("-")) {
      return Optional.empty();
    }
    try {
      PlainLanguage language = java ? PlainLanguage.JAVA : PlainLanguage.SHEET;
      return Optional.of(new KernelStart(language, Path.of(args[last])));
    } catch (InvalidPathException e) {
      return Optional.empty();
    }
  }

  /** Serves until the kernel is shut down, and returns the exit status. */
  int run(PrintWriter err) {
    try {
      var kernel =
          new Kernel(
              ConnectionFile.read(connectionFile),
              language,
              () -> new LivePage(language),
              new WarmUp(),
              err);
      ParentProcess.whenGone(System.getenv(), kernel::stop);
      kernel.run();
      return ExitStatus.HOLDS.code();
    } catch (KernelException e) {
      err.println("whorl: " + e.getMessage());
      return ExitStatus.USAGE.code();
    }
  }
}
