package whorl.cli;

import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/**
 * {@code whorl lab}: JupyterLab with the kernel in it. The launcher does it, so that JupyterLab
 * takes its place and no JVM stands in between; what is left to do here is to say so.
 */
@Command(
    name = "lab",
    description = {
      "Open a note in JupyterLab, which is put into a Python environment of its own on first use;"
          + " this needs Python 3.9 or newer and a network, and takes a minute or two."
    },
    footerHeading = "%nEnvironment variables:%n",
    footer = {
      "  WHORL_LAB      the folder of the Python environment;",
      "                 whorl/lab among your caches unless given",
      "  WHORL_PYTHON   the Python to make it with; python3 unless given"
    })
final class LabCommand implements Callable<Integer> {
  @Spec private CommandSpec spec = CommandSpec.create();

  @Option(
      names = {"-h", "--help"},
      usageHelp = true,
      description = "show this help")
  private boolean help;

  @Parameters(
      arity = "0..1",
      paramLabel = "NOTE",
      description = "a notebook; without one the demo notes are opened")
  private String note = "";

  @Parameters(
      index = "1..*",
      paramLabel = "OPTION",
      description = "options for JupyterLab, such as --no-browser --port=8890")
  private List<String> options = new ArrayList<>();

  @Override
  public Integer call() {
    throw new ParameterException(
        spec.commandLine(), "JupyterLab is started by the launcher, kernel/bin/whorl lab");
  }
}
