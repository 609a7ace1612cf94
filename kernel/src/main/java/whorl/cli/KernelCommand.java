package whorl.cli;

import java.nio.file.Path;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;
import whorl.page.PlainLanguage;

/** {@code whorl kernel}: serves Jupyter front ends. */
@Command(
    name = KernelStart.COMMAND,
    description = "Serve Jupyter front ends; it is they that start it.",
    mixinStandardHelpOptions = true,
    hidden = true)
final class KernelCommand implements Callable<Integer> {
  @Spec private CommandSpec spec = CommandSpec.create();

  @Parameters(paramLabel = "CONNECTION_FILE", description = "tells where they connect")
  private Path file = Path.of("");

  @Option(names = KernelStart.JAVA, description = "plain cells are in Java")
  private boolean java;

  @Override
  public Integer call() {
    PlainLanguage language = java ? PlainLanguage.JAVA : PlainLanguage.SHEET;
    return new KernelStart(language, file).run(spec.commandLine().getErr());
  }
}
