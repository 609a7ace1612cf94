package whorl.sheet;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.List;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import whorl.laws.Example;
import whorl.laws.Law;
import whorl.laws.Laws;

/** Every law of the catalogue does what its worked example says. */
class LawExamplesTest {
  static Stream<Law> laws() {
    return Laws.all().stream();
  }

  @ParameterizedTest
  @MethodSource("laws")
  void theWorkedExampleComesOut(Law law) {
    Example example = law.example();
    assertTrue(example.expression().contains(law.name() + "(") || exampleLines(law), law.head());
    String check =
        "check " + example.expression() + " = " + example.value() + " within " + example.within();
    String text =
        Stream.concat(example.lines().stream(), Stream.of(check)).collect(Collectors.joining("\n"));
    var sheet = new Sheet(Path.of("src/test/resources/whorl/sheet/meshes"));
    CellOutcome outcome = sheet.run(new CellId("example"), "cell [1]", text);
    assertEquals(List.of(), outcome.errors(), text);
    Step last = outcome.steps().get(outcome.steps().size() - 1);
    assertTrue(last instanceof Step.Reproduced reproduced && reproduced.holds(), last.toString());
  }

  private static boolean exampleLines(Law law) {
    return law.example().lines().stream().anyMatch(line -> line.contains(law.name() + "("));
  }

  @ParameterizedTest
  @MethodSource("laws")
  void allPapersAreThere(Law law) {
    assertFalse(law.title().isEmpty(), law.head());
    assertFalse(law.formula().isEmpty(), law.head());
    assertFalse(law.source().isEmpty(), law.head());
    assertFalse(law.example().source().isEmpty(), law.head());
    law.parameters().forEach(p -> assertFalse(p.explanation().isEmpty(), law.head() + p.word()));
  }
}
