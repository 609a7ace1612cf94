package whorl;

import static com.tngtech.archunit.core.domain.JavaClass.Predicates.resideInAPackage;
import static com.tngtech.archunit.core.domain.JavaClass.Predicates.resideOutsideOfPackages;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static com.tngtech.archunit.library.Architectures.layeredArchitecture;
import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;

import com.tngtech.archunit.core.importer.ImportOption;
import com.tngtech.archunit.junit.AnalyzeClasses;
import com.tngtech.archunit.junit.ArchTest;
import com.tngtech.archunit.lang.ArchRule;
import com.tngtech.archunit.library.Architectures.LayeredArchitecture;
import java.util.Map;
import java.util.Set;
import java.util.stream.Stream;

/**
 * Which room of the kernel may use which other. Data goes one way: text, tree, checked tree, value,
 * sheet, report, and from there into a note or a file.
 */
@AnalyzeClasses(packages = "whorl", importOptions = ImportOption.DoNotIncludeTests.class)
class PackageDependencyTest {
  private static final String ROOT = "whorl";

  /**
   * Room to rooms that it may use. All but {@code diagnostic} and {@code mechanics} may also use
   * {@code units}.
   */
  private static final Map<String, Set<String>> MAY_USE =
      Map.ofEntries(
          entry("diagnostic"),
          entry("syntax", "diagnostic"),
          entry("mechanics"),
          entry("laws", "mechanics"),
          entry("check", "laws", "mechanics", "syntax", "diagnostic"),
          entry("eval", "check", "laws", "mechanics", "syntax", "diagnostic"),
          entry("sheet", "eval", "check", "laws", "mechanics", "syntax", "diagnostic"),
          // A step holds its statement and its value, so their printer knows both.
          entry("report", "sheet", "eval", "laws", "mechanics", "syntax", "diagnostic"),
          entry("java", "assist", "sheet", "eval", "check", "laws", "diagnostic"),
          entry("assist", "report", "sheet", "eval", "check", "laws", "syntax", "diagnostic"),
          // A run of a note ends with values compared with those stored.
          entry("notebook", "java", "report", "sheet", "eval", "check", "syntax", "diagnostic"),
          entry(
              "page", "assist", "java", "report", "sheet", "eval", "check", "syntax", "diagnostic"),
          // A file is replaced in one step there.
          entry("install", "notebook"),
          entry("jupyter", "page", "assist", "diagnostic"),
          entry(
              "cli",
              "install",
              "jupyter",
              "page",
              "assist",
              "notebook",
              "java",
              "report",
              "sheet",
              "eval",
              "check",
              "syntax",
              "diagnostic"));

  private static Map.Entry<String, Set<String>> entry(String room, String... mayUse) {
    return Map.entry(room, Set.of(mayUse));
  }

  @ArchTest static final ArchRule ROOMS_USE_ONLY_WHAT_THEY_MAY = rooms();

  @ArchTest
  static final ArchRule NO_TWO_ROOMS_USE_EACH_OTHER =
      slices().matching(ROOT + ".(*)..").should().beFreeOfCycles();

  @ArchTest
  static final ArchRule UNITS_NEED_THE_JDK_ONLY =
      noClasses()
          .that()
          .resideInAPackage(ROOT + ".units..")
          .should()
          .dependOnClassesThat(
              resideOutsideOfPackages(
                  ROOT + ".units..", "java..", /* annotations only */ "org.jspecify.."));

  @ArchTest
  static final ArchRule MESSAGES_KNOW_NOTHING_OF_UNITS =
      noClasses()
          .that()
          .resideInAPackage(ROOT + ".diagnostic..")
          .should()
          .dependOnClassesThat(resideInAPackage(ROOT + ".units.."));

  @ArchTest
  static final ArchRule MECHANICS_CALCULATES_IN_PLAIN_NUMBERS =
      noClasses()
          .that()
          .resideInAPackage(ROOT + ".mechanics..")
          .should()
          .dependOnClassesThat(resideInAPackage(ROOT + ".units.."));

  @ArchTest
  static final ArchRule EVERY_CLASS_STANDS_IN_A_ROOM =
      noClasses()
          .should()
          .resideOutsideOfPackages(
              Stream.concat(MAY_USE.keySet().stream(), Stream.of("units"))
                  .map(room -> ROOT + "." + room + "..")
                  .toArray(String[]::new));

  private static LayeredArchitecture rooms() {
    LayeredArchitecture rooms = layeredArchitecture().consideringOnlyDependenciesInLayers();
    for (String room : MAY_USE.keySet()) {
      rooms = rooms.optionalLayer(room).definedBy(ROOT + "." + room + "..");
    }
    for (Map.Entry<String, Set<String>> entry : MAY_USE.entrySet()) {
      var room = rooms.whereLayer(entry.getKey());
      String[] used = entry.getValue().toArray(String[]::new);
      rooms = used.length == 0 ? room.mayNotAccessAnyLayer() : room.mayOnlyAccessLayers(used);
    }
    return rooms;
  }
}
