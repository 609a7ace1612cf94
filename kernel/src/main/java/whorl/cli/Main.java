package whorl.cli;

import java.io.FileDescriptor;
import java.io.FileOutputStream;
import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;
import java.util.Optional;
import java.util.concurrent.Callable;
import java.util.stream.Collectors;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.IVersionProvider;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Spec;
import picocli.CommandLine.UnmatchedArgumentException;
import whorl.notebook.NoteFileException;

/** The {@code whorl} command. */
@Command(
    name = "whorl",
    description = "Checked calculation notes for engineers who calculate things that spin.",
    subcommands = {
      RunCommand.class,
      RecheckCommand.class,
      KernelCommand.class,
      InstallCommand.class,
      LabCommand.class,
      RehearseCommand.class
    },
    mixinStandardHelpOptions = true,
    versionProvider = Main.Version.class,
    exitCodeListHeading = "%nExit status:%n",
    exitCodeList = {
      "0:everything holds",
      "1:a check or an assumption fails, or a recheck differs",
      "2:the note has an error",
      "3:the command was wrong, or a file cannot be read or written"
    })
public final class Main implements Callable<Integer> {
  @Spec private CommandSpec spec = CommandSpec.create();

  /** Runs the command and ends the program. */
  public static void main(String[] args) {
    PrintWriter out = writer(FileDescriptor.out);
    PrintWriter err = writer(FileDescriptor.err);
    int status = run(out, err, args);
    // On a terminal what is wrong stands below the steps. Results that could not be printed, for
    // example onto a full disk, are not a success; checkError also flushes.
    boolean printed = !out.checkError();
    err.flush();
    System.exit(printed ? status : ExitStatus.USAGE.code());
  }

  /** Runs the command, and returns its exit status. */
  static int run(PrintWriter out, PrintWriter err, String... args) {
    Optional<KernelStart> kernel = KernelStart.of(args);
    return kernel.isPresent()
        ? kernel.get().run(err)
        : new CommandLine(new Main())
            .setOut(out)
            .setErr(err)
            .setParameterExceptionHandler(Main::wrongCommand)
            .setExecutionExceptionHandler(Main::failure)
            .execute(args);
  }

  /** Without a command there is nothing to do. */
  @Override
  public Integer call() {
    throw new ParameterException(
        spec.commandLine(), "a command is missing: " + commands(spec.commandLine()));
  }

  private static int wrongCommand(ParameterException e, String[] args) {
    CommandLine command = e.getCommandLine();
    PrintWriter err = command.getErr();
    err.println("whorl: " + problem(e, command));
    err.println("Help: " + command.getCommandSpec().qualifiedName() + " --help");
    return ExitStatus.USAGE.code();
  }

  private static String problem(ParameterException e, CommandLine command) {
    boolean unknown =
        e instanceof UnmatchedArgumentException unmatched
            && command.getParent() == null
            && !unmatched.isUnknownOption();
    return unknown
        ? "there is no such command; there are: " + commands(command)
        : String.valueOf(e.getMessage());
  }

  private static String commands(CommandLine command) {
    return command.getSubcommands().values().stream()
        .map(CommandLine::getCommandSpec)
        .filter(spec -> !spec.usageMessage().hidden())
        .map(CommandSpec::name)
        .collect(Collectors.joining(", "));
  }

  private static int failure(Exception e, CommandLine command, CommandLine.ParseResult parsed)
      throws Exception {
    if (e instanceof NoteFileException) {
      command.getErr().println("whorl: " + e.getMessage());
      return ExitStatus.USAGE.code();
    }
    throw e;
  }

  private static PrintWriter writer(FileDescriptor stream) {
    return new PrintWriter(new FileOutputStream(stream), false, StandardCharsets.UTF_8);
  }

  /** The version that the jar was built as. */
  static final class Version implements IVersionProvider {
    @Override
    public String[] getVersion() {
      String version = Main.class.getPackage().getImplementationVersion();
      return new String[] {"whorl " + (version == null ? "from source" : version)};
    }
  }
}
