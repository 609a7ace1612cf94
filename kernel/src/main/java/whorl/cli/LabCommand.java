package whorl.cli;

import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
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
    mixinStandardHelpOptions = true,
    customSynopsis = "whorl lab [-hV] [NOTE] [OPTION...]",
    footerHeading = "%nEnvironment variables:%n",
    footer = {
      "  WHORL_LAB      the folder of the Python environment;",
      "                 whorl/lab among your caches unless given",
      "  WHORL_PYTHON   the Python to make it with; python3 unless given"
    })
final class LabCommand implements Callable<Integer> {
  @Spec private CommandSpec spec = CommandSpec.create();

  @Parameters(
      paramLabel = "NOTE OPTION",
      description = {
        "a notebook, and options for JupyterLab such as --no-browser --port=8890;",
        "without a notebook the demo notes are opened"
      })
  private List<String> words = new ArrayList<>();

  @Override
  public Integer call() {
    throw new ParameterException(
        spec.commandLine(),
        "JupyterLab is started by the launcher: kernel/bin/whorl lab " + String.join(" ", words));
  }
}
