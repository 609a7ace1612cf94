package whorl.java;

import java.io.File;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.function.Function;
import java.util.regex.MatchResult;
import java.util.regex.Pattern;

/**
 * Finds libraries with the Maven that is installed, whose settings name the repositories. It is
 * first asked without a network: what has been fetched before needs none.
 */
final class Maven implements AutoCloseable {
  private static final String GOAL =
      "org.apache.maven.plugins:maven-dependency-plugin:3.8.1:build-classpath";
  private static final Pattern PART = Pattern.compile("[\\w.-]+");
  private static final Pattern MISSING =
      Pattern.compile("Could not find artifact ([\\w.-]+:[\\w.-]+)(?::[\\w.-]+)*:([\\w.-]+)");
  private static final Pattern UNREACHED =
      Pattern.compile(
          "Could not transfer artifact ([\\w.-]+:[\\w.-]+)(?::[\\w.-]+)*:([\\w.-]+) from.*?\\): (.*)");
  private static final Pattern ERROR = Pattern.compile("\\[ERROR\\] (.*)");

  private final Path folder;

  /** Makes a folder for Maven to work in. */
  Maven() throws IOException {
    folder = Files.createTempDirectory("whorl-maven");
  }

  /**
   * The jars of libraries and of all that they need.
   *
   * @param coordinates as {@code group:artifact:version}; type and classifier may stand before the
   *     version
   */
  List<Path> jars(List<String> coordinates) throws MagicFailure, IOException, InterruptedException {
    var dependencies = new StringBuilder();
    for (String each : coordinates) {
      dependencies.append(dependency(each));
    }
    Files.writeString(
        folder.resolve("pom.xml"),
        """
        <project>
          <modelVersion>4.0.0</modelVersion>
          <groupId>cells</groupId>
          <artifactId>cells</artifactId>
          <version>1</version>
          <packaging>pom</packaging>
          <dependencies>
        %s  </dependencies>
        </project>
        """
            .formatted(dependencies));
    if (!run("--offline") && !run("--update-snapshots")) {
      throw new MagicFailure(reason(Files.readString(log())));
    }
    return Arrays.stream(Files.readString(found()).strip().split(File.pathSeparator))
        .filter(path -> !path.isEmpty())
        .map(Path::of)
        .toList();
  }

  private static String dependency(String coordinates) throws MagicFailure {
    List<String> parts = List.of(coordinates.split(":", -1));
    int count = parts.size();
    if (count < 3 || count > 5 || !parts.stream().allMatch(part -> PART.matcher(part).matches())) {
      throw new MagicFailure(
          "A library is named group:artifact:version, as org.example:parts:1.0; this is not: "
              + coordinates);
    }
    return "    <dependency>"
        + element("groupId", parts.get(0))
        + element("artifactId", parts.get(1))
        + (count > 3 ? element("type", parts.get(2)) : "")
        + (count > 4 ? element("classifier", parts.get(3)) : "")
        + element("version", parts.get(count - 1))
        + "</dependency>\n";
  }

  private static String element(String name, String text) {
    return "<" + name + ">" + text + "</" + name + ">";
  }

  private Path log() {
    return folder.resolve("log.txt");
  }

  private Path found() {
    return folder.resolve("found.txt");
  }

  /** Whether Maven found all. */
  private boolean run(String option) throws MagicFailure, InterruptedException {
    boolean windows = System.getProperty("os.name").toLowerCase(Locale.ROOT).startsWith("windows");
    var builder =
        new ProcessBuilder(
                windows ? "mvn.cmd" : "mvn",
                "-B",
                "-q",
                option,
                GOAL,
                "-Dmdep.outputFile=" + found())
            .directory(folder.toFile())
            .redirectErrorStream(true)
            .redirectOutput(log().toFile());
    builder.environment().putIfAbsent("JAVA_HOME", System.getProperty("java.home"));
    Process process;
    try {
      process = builder.start();
    } catch (IOException e) {
      throw new MagicFailure("%maven needs Maven, and there is no mvn on the PATH.", e);
    }
    try {
      return process.waitFor() == 0;
    } finally {
      process.descendants().forEach(ProcessHandle::destroy);
      process.destroy();
    }
  }

  /** Why Maven did not find all, from what it printed. */
  static String reason(String log) {
    List<String> missing = named(MISSING, log, found -> found.group(1) + ":" + found.group(2));
    if (!missing.isEmpty()) {
      return "Maven does not find " + String.join(" and ", missing) + " in its repositories.";
    }
    List<String> unreached =
        named(
            UNREACHED, log, found -> found.group(1) + ":" + found.group(2) + ": " + found.group(3));
    if (!unreached.isEmpty()) {
      return "Maven cannot fetch " + unreached.get(0);
    }
    return ERROR
        .matcher(log)
        .results()
        .findFirst()
        .map(error -> "Maven failed: " + error.group(1))
        .orElse("Maven failed, and did not say why.");
  }

  private static List<String> named(
      Pattern pattern, String log, Function<MatchResult, String> name) {
    return pattern.matcher(log).results().map(name).distinct().toList();
  }

  /** Removes the folder. */
  @Override
  public void close() throws IOException {
    for (Path file : List.of(folder.resolve("pom.xml"), log(), found(), folder)) {
      Files.deleteIfExists(file);
    }
  }
}
