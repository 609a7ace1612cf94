package whorl.cli;

import java.nio.file.Path;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;
import whorl.jupyter.ConnectionFile;
import whorl.jupyter.Kernel;
import whorl.jupyter.KernelException;
import whorl.jupyter.ParentProcess;
import whorl.page.PlainLanguage;

/** {@code whorl kernel}: serves Jupyter front ends. */
@Command(
    name = "kernel",
    description = "Serve Jupyter front ends; it is they that start it.",
    mixinStandardHelpOptions = true,
    hidden = true)
final class KernelCommand implements Callable<Integer> {
  @Spec private CommandSpec spec = CommandSpec.create();

  @Parameters(paramLabel = "CONNECTION_FILE", description = "tells where they connect")
  private Path file = Path.of("");

  @Option(names = "--java", description = "plain cells are in Java")
  private boolean java;

  @Override
  public Integer call() throws KernelException {
    PlainLanguage language = java ? PlainLanguage.JAVA : PlainLanguage.SHEET;
    var kernel =
        new Kernel(
            ConnectionFile.read(file),
            language,
            () -> new whorl.page.LivePage(language),
            spec.commandLine().getErr());
    ParentProcess.whenGone(System.getenv(), kernel::stop);
    kernel.run();
    return ExitStatus.HOLDS.code();
  }
}
