package whorl.cli;

import java.io.IOException;
import java.io.PrintWriter;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.concurrent.Callable;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.ArgGroup;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Spec;
import whorl.install.Installation;
import whorl.install.JavaCommand;
import whorl.install.JupyterFolders;
import whorl.install.Program;

/** {@code whorl install}: puts the kernel where Jupyter finds it. */
@Command(
    name = "install",
    description = {
      "Put the kernel where Jupyter finds it; a kernel of the same name is replaced.",
      "Each kernel gets a copy of the program of its own and starts on the JDK of this command.",
      "To remove one: jupyter kernelspec uninstall NAME"
    },
    mixinStandardHelpOptions = true,
    sortOptions = false)
final class InstallCommand implements Callable<Integer> {
  @Spec private CommandSpec spec = CommandSpec.create();

  @ArgGroup private Place place = new Place();

  @Option(
      names = "--name",
      paramLabel = "NAME",
      defaultValue = "whorl",
      description =
          "what Jupyter calls the kernel: ${DEFAULT-VALUE} unless given; the kernel whose cells are"
              + " in Java is called NAME-java")
  private String name = "";

  @Option(
      names = "--jvm-option",
      paramLabel = "OPTION",
      description = "an option for the kernel's JVM, such as -Xmx4g; may be given several times")
  private List<String> options = new ArrayList<>();

  /** Where the kernel goes. */
  private static final class Place {
    @Option(names = "--user", description = "among your own kernels; this is so unless --prefix")
    private boolean user;

    @Option(
        names = "--prefix",
        paramLabel = "FOLDER",
        description = "among the kernels of the Python environment in FOLDER")
    private @Nullable Path prefix;
  }

  @Override
  public Integer call() throws IOException {
    if (!name.matches("[A-Za-z0-9._-]+")) {
      throw new ParameterException(
          spec.commandLine(),
          "--name: Jupyter allows letters, digits, dots, underscores and hyphens: " + name);
    }
    Path kernels = kernels();
    Program program = Program.running();
    JavaCommand java = JavaCommand.running(options);
    PrintWriter err = spec.commandLine().getErr();
    err.println("Installing; this takes a few seconds …");
    err.flush();
    Map<Path, String> written = new Installation(kernels, name, java).install(program);
    PrintWriter out = spec.commandLine().getOut();
    out.println("Jupyter now has these kernels:");
    written.forEach((folder, title) -> out.println("  " + title + ", in " + folder));
    out.println("They run on " + java.java() + "; install again when that JDK is replaced.");
    out.println("Now choose one of them in JupyterLab, or start: whorl lab");
    return ExitStatus.HOLDS.code();
  }

  private Path kernels() {
    if (place.user || place.prefix == null) {
      return new JupyterFolders(System.getProperty("os.name"), System.getenv()).kernelsOfUser();
    }
    if (!Files.isDirectory(place.prefix)) {
      throw new ParameterException(
          spec.commandLine(),
          "--prefix: "
              + place.prefix
              + (Files.exists(place.prefix) ? " is not a folder" : " does not exist"));
    }
    return JupyterFolders.kernelsOf(place.prefix);
  }
}
