package whorl.units;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.SplittableRandom;
import java.util.concurrent.Callable;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import whorl.units.kind.Kind;

/** Properties of random units and random texts. */
class UnitPropertiesTest {

  private static final UnitCatalogue CATALOGUE = UnitCatalogue.standard();

  static Stream<UnitText> units() {
    return RandomUnits.texts(7, 200);
  }

  @ParameterizedTest
  @MethodSource("units")
  void aPrintedUnitIsReadAsItself(UnitText text) {
    assertEquals(text, UnitReader.read(text.plain()));
    assertEquals(text, UnitReader.read(text.typeset()));
    assertEquals(text, UnitReader.read(text.plain().replace('·', '*')));
    assertEquals(text, UnitReader.read(text.plain().replace('·', ' ').replace("^", " ^ ")));
  }

  @ParameterizedTest
  @MethodSource("units")
  void theCoherentUnitIsCoherentAndOfTheSameDimension(UnitText text) {
    Unit unit = CATALOGUE.resolve(text);
    assertTrue(unit.coherent().factor().isOne());
    assertEquals(unit.dimension(), unit.coherent().dimension());
    for (Kind kind : unit.kinds()) {
      assertEquals(unit.dimension(), kind.dimension());
    }
  }

  @ParameterizedTest
  @MethodSource("units")
  void theOrderOfMembersMakesNoDifferenceToTheSize(UnitText text) {
    Unit unit = CATALOGUE.resolve(text);
    List<UnitText.Power> backwards = new ArrayList<>(text.members());
    Collections.reverse(backwards);
    Unit other = CATALOGUE.resolve(UnitText.product(backwards));
    if (!unit.isReading()) {
      assertEquals(unit.factor(), other.factor());
      assertEquals(unit.dimension(), other.dimension());
    }
  }

  static Stream<String> texts() {
    var random = new SplittableRandom(11);
    String alphabet = "kgNmsradlbftin·*./()^²³⁻¹ 12-µ°CΔ%′[]{}_'\"𝄞\u0000";
    int[] points = alphabet.codePoints().toArray();
    return Stream.generate(
            () -> {
              var text = new StringBuilder();
              int length = random.nextInt(12);
              for (int i = 0; i < length; i++) {
                text.appendCodePoint(points[random.nextInt(points.length)]);
              }
              return text.toString();
            })
        .limit(3000);
  }

  @Test
  void anyTextIsAUnitOrIsRefusedInOrder() {
    texts()
        .forEach(
            text -> {
              readOrRefuse(text, () -> CATALOGUE.resolve(UnitReader.read(text)));
              readOrRefuse(text, () -> CATALOGUE.resolve(UnitReader.readUcum(text)));
              readOrRefuse(text, () -> CATALOGUE.resolveHeading(text));
            });
  }

  private static void readOrRefuse(String text, Callable<Unit> reading) {
    try {
      assertTrue(Double.isFinite(reading.call().toSi(1)), text);
    } catch (UnitSyntaxException refused) {
      int length = text.codePointCount(0, text.length());
      assertTrue(refused.offset() >= 0, text);
      assertTrue(refused.offset() + refused.length() <= length, text);
    } catch (UnknownUnitException unknown) {
      assertTrue(unknown.near().size() <= 4, text);
    } catch (Exception e) {
      throw new AssertionError(text, e);
    }
  }

  @Test
  void hugeUnitsAreRefusedQuickly() {
    var members = Collections.nCopies(5000, new UnitText.Power("Qm", 99));
    assertThrows(
        UnitSyntaxException.class, () -> CATALOGUE.resolve(new UnitText(members, List.of())));
  }

  @Test
  void severalThreadsGetTheSameUnits() throws InterruptedException, ExecutionException {
    List<UnitText> texts = RandomUnits.texts(13, 300).toList();
    Callable<List<Unit>> task = () -> texts.stream().map(CATALOGUE::resolve).toList();
    var threads = Executors.newFixedThreadPool(4);
    try {
      List<Future<List<Unit>>> answers = threads.invokeAll(List.of(task, task, task, task));
      for (Future<List<Unit>> answer : answers) {
        assertEquals(answers.get(0).get(), answer.get());
      }
    } finally {
      threads.shutdownNow();
    }
    assertSame(CATALOGUE.resolve(texts.get(0)), CATALOGUE.resolve(texts.get(0)));
  }
}
