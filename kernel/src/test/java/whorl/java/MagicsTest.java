package whorl.java;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import java.io.File;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.concurrent.CompletableFuture;
import java.util.concurrent.TimeUnit;
import java.util.stream.Stream;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.Timeout;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

@Timeout(value = 5, unit = TimeUnit.MINUTES)
class MagicsTest {
  private static final JavaCells JAVA = new JavaCells();

  @TempDir private static Path folder = Path.of("");

  @AfterAll
  static void close() {
    JAVA.close();
  }

  private static Path jar(String name) throws IOException {
    return TestJar.of(
        folder.resolve(name + ".jar"),
        "parts." + name,
        "package parts; public class " + name + " { public static int teeth() { return 17; } }");
  }

  @Test
  void aJarIsAddedByAPattern() throws IOException {
    jar("Gear");
    assertEquals(
        "17", JAVA.run("%jars " + folder + "/G*.jar\nimport parts.Gear;\nGear.teeth()").result());
  }

  @Test
  void magicsStandAmongStatements() throws IOException {
    String code =
        """
        int twice(int n) { // %% of
          return 2
              %% 3 * n;
        }
          %%classpath "%s"

        // behind it
        parts.Pinion.teeth() + twice(1)
        """
            .formatted(jar("Pinion"));
    assertEquals("19", JAVA.run(code).result());
  }

  @Test
  void aFolderOfClassesIsAdded() throws IOException {
    TestJar.classes(
        folder.resolve("classes"),
        "parts.Rack",
        "package parts; public class Rack { public static String name() { return \"rack\"; } }");
    assertEquals("rack", JAVA.run("%classpath " + folder + "/classes\nparts.Rack.name()").result());
  }

  @Test
  void whatALibraryLoadsByNameIsFound() throws IOException {
    jar("Worm");
    assertEquals(
        "class parts.Worm",
        JAVA.run(
                "%jars "
                    + folder
                    + "/Worm.jar\nThread.currentThread().getContextClassLoader().loadClass(\"parts.Worm\")")
            .result());
  }

  @Test
  void aSourceFileIsLoaded() throws IOException {
    Path file = folder.resolve("helpers.jshell");
    Files.writeString(file, "int helper() {\n  return 5;\n}\n%classpath " + jar("Cam") + "\n");
    assertEquals("5", JAVA.run("%load " + file + "\nhelper()").result());
    assertEquals("17", JAVA.run("parts.Cam.teeth()").result());
  }

  static Stream<Arguments> notebooks() {
    return Stream.of(
        Arguments.of("java", "int plain = 1;", "%%sheet\\nx = 2", "plain"),
        Arguments.of("whorl", "x = 2", "%%java\\nint marked = 1;", "marked"));
  }

  @ParameterizedTest
  @MethodSource("notebooks")
  void theJavaCellsOfANotebookAreLoaded(String language, String one, String other, String name)
      throws IOException {
    Path file = folder.resolve(language + ".ipynb");
    Files.writeString(
        file,
        """
        {"cells": [
          {"cell_type": "markdown", "source": ["int prose = 1;"]},
          {"cell_type": "code", "source": ["%s"]},
          {"cell_type": "code", "source": "%s"}
        ], "metadata": {"kernelspec": {"language": "%s"}}}
        """
            .formatted(one, other, language));
    assertEquals("1", JAVA.run("%load " + file + "\n" + name).result());
  }

  @Test
  void aMistakeInALoadedFileIsShownThere() throws IOException {
    Path file = folder.resolve("wrong.java");
    Files.writeString(file, "int fine = 1;\nint wrong = fine / 0;\n");
    assertEquals(
        """
        ArithmeticException: / by zero

          2 | %%load %s
              %s

        In wrong.java:

          2 | int wrong = fine / 0;
              ^^^^^^^^^^^^^^^^^^^^^\
        """
            .formatted(file, "^".repeat(("%load " + file).length())),
        JAVA.failure("int before = 1;\n%load " + file));
  }

  @Test
  void aFileThatLoadsItselfIsRefused() throws IOException {
    Path file = folder.resolve("round.java");
    Files.writeString(file, "%load " + file);
    String message = JAVA.failure("%load " + file);
    assertTrue(message.startsWith(file + " loads itself."), message);
  }

  static Stream<Arguments> mistakes() {
    return Stream.of(
        Arguments.of("%jars nowhere/*.jar", "There is no file nowhere/*.jar (looked for from "),
        Arguments.of("%classpath nowhere", "There is no file nowhere (looked for from "),
        Arguments.of("%load nowhere.java", "There is no file nowhere.java (looked for from "),
        Arguments.of("%jars", "%jars needs something behind it."),
        Arguments.of("%time 1 + 1", "There is no magic %time."),
        Arguments.of("%%bash\nls", "There is no magic %%bash."),
        Arguments.of(
            "%maven commons-lang3",
            "A library is named group:artifact:version, as org.example:parts:1.0; this is not:"
                + " commons-lang3"));
  }

  @ParameterizedTest
  @MethodSource("mistakes")
  void aMagicThatCannotSaysWhy(String code, String reason) {
    String message = JAVA.failure(code);
    assertTrue(message.startsWith(reason), message);
    assertTrue(message.contains("1 | " + code.lines().findFirst().orElseThrow()), message);
  }

  private static boolean hasMaven() {
    return Arrays.stream(System.getenv("PATH").split(File.pathSeparator))
        .anyMatch(path -> Files.isExecutable(Path.of(path, "mvn")));
  }

  private static final String LIBRARY = "%maven org.apache.commons:commons-lang3:3.17.0\n";

  @Test
  void aLibraryIsFoundByMaven() {
    assumeTrue(hasMaven(), "no mvn on the PATH");
    JavaOutcome outcome = JAVA.side().run("cell [1]", LIBRARY, new Collected());
    // A machine that never fetched the library and has no network cannot find it.
    assumeTrue(
        !(outcome instanceof JavaOutcome.Failed failed)
            || !failed.summary().startsWith("Maven cannot fetch"));
    String code = "org.apache.commons.lang3.StringUtils.reverse(\"abc\")";
    assertEquals("cba", JAVA.run(code).result());
  }

  static Stream<Arguments> logs() {
    String goal = "[ERROR] Failed to execute goal on project cells: Could not resolve: ";
    return Stream.of(
        Arguments.of(
            goal
                + "Could not find artifact org.example:parts:jar:1.0 in here (https://example.org)"
                + " -> [Help 1]\n[ERROR] \n[ERROR] For more information",
            "Maven does not find org.example:parts:1.0 in its repositories."),
        Arguments.of(
            goal
                + "The following artifacts could not be resolved: a:b:jar:1, c:d:jar:x:2: Could not"
                + " find artifact a:b:jar:1 in here\nCould not find artifact c:d:jar:x:2 in here",
            "Maven does not find a:b:1 and c:d:2 in its repositories."),
        Arguments.of(
            goal
                + "Could not transfer artifact org.example:parts:pom:1.0 from/to here"
                + " (https://example.org): example.org: Name or service not known\n",
            "Maven cannot fetch org.example:parts:1.0: example.org: Name or service not known"),
        Arguments.of("[ERROR] The settings are wrong\n", "Maven failed: The settings are wrong"),
        Arguments.of("", "Maven failed, and did not say why."));
  }

  @ParameterizedTest
  @MethodSource("logs")
  void whatMavenSaysIsToldInShort(String log, String reason) {
    assertEquals(reason, Maven.reason(log));
  }

  @Test
  void anInterruptEndsMaven() throws Exception {
    assumeTrue(hasMaven(), "no mvn on the PATH");
    var outcome =
        CompletableFuture.supplyAsync(() -> JAVA.side().run("cell [1]", LIBRARY, new Collected()));
    while (!outcome.isDone() && ProcessHandle.current().descendants().findAny().isEmpty()) {
      Thread.onSpinWait();
    }
    JAVA.side().interrupt();
    assertFalse(assertInstanceOf(JavaOutcome.Interrupted.class, outcome.get()).restarted());
    while (ProcessHandle.current().descendants().findAny().isPresent()) {
      Thread.onSpinWait();
    }
  }
}
