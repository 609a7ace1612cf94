package whorl.java;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import java.util.concurrent.CompletableFuture;
import java.util.concurrent.TimeUnit;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.Timeout;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import whorl.check.Routine;
import whorl.check.RoutineFailure;
import whorl.sheet.CellId;
import whorl.sheet.CellOutcome;
import whorl.sheet.PublishedFunction;
import whorl.sheet.Sheet;

@Timeout(value = 2, unit = TimeUnit.MINUTES)
class BridgeTest {
  private static final Sheet SHEET = new Sheet();
  private static final JavaCells JAVA = new JavaCells(SheetReading.of(SHEET));

  @BeforeAll
  static void define() {
    CellOutcome outcome =
        SHEET.run(
            new CellId("1"),
            "cell [1]",
            """
            n [rpm] = 6000
            speed = n
            I [kg·m²] = 41.715
            L [kN·m·s] = I * n
            T [N·m] = 350
            k = 2/3
            E [J] = 2 * 617283945 J
            p [N] = 2 * 60 N
            F = (1, 2, 3) kN
            """);
    assertEquals(List.of(), outcome.errors());
  }

  @AfterAll
  static void close() {
    JAVA.close();
  }

  @ParameterizedTest
  @CsvSource({
    "'sheet.value(\"n\", \"rpm\")', 6000.0",
    "'sheet.value(\"n\", \"rad/s\")', 628.3185307179587",
    "'sheet.value(\"T\", \"N*m\")', 350.0",
    "'sheet.value(\"T\", \"kN·m\")', 0.35",
    "'sheet.value(\"k\", \"%\")', 66.66666666666666",
    "'sheet.quantity(\"L\")', 26.2103 kN·m·s",
    "'sheet.quantity(\"T\").text()', 350 N·m",
    "'sheet.quantity(\"T\").kind()', torque",
    "'sheet.quantity(\"n\").unit()', rpm",
    "'sheet.quantity(\"k\")', 0.666667",
    "'sheet.quantity(\"E\")', 1.23457E+9 J",
    "'sheet.quantity(\"p\")', 120 N",
  })
  void aCellReadsTheSheet(String code, String value) {
    assertEquals(value, JAVA.run(code).result());
  }

  static Stream<Arguments> mistakes() {
    return Stream.of(
        Arguments.of(
            "sheet.value(\"spede\", \"rpm\")",
            "The sheet has no value for spede; near it are speed"),
        Arguments.of("sheet.quantity(\"zzz\")", "The sheet has no value for zzz"),
        Arguments.of(
            "sheet.value(\"T\", \"J\")",
            "T is a torque, which J does not measure; the sheet shows it in N·m"),
        Arguments.of(
            "sheet.value(\"n\", \"Hz\")",
            "n is an angular velocity, which Hz does not measure; the sheet shows it in rpm"),
        Arguments.of("sheet.value(\"T\", \"Nx\")", "there is no unit \"Nx\""),
        Arguments.of("sheet.value(\"T\", \"N·\")", "\"N·\" is no unit"),
        Arguments.of("sheet.value(\"F\", \"kN\")", "F is a vector; a cell in Java reads numbers"),
        Arguments.of(
            "sheet.function(\"f(x [m]) [m]\", (x, y) -> x)",
            "f(x [m]) [m] has 1 parameter, and the function in Java takes 2"),
        Arguments.of(
            "sheet.function(\"f\", x -> x)",
            "The head of a function is written as in the sheet, such as drag(v [m/s], A [m²]) [N];"
                + " this is not: f"));
  }

  @ParameterizedTest
  @MethodSource("mistakes")
  void aWrongUseIsRefusedWithItsReason(String code, String reason) {
    String message = JAVA.failure("\n" + code);
    assertTrue(message.startsWith("IllegalArgumentException: " + reason), message);
    assertTrue(message.contains("2 | " + code), message);
  }

  @Test
  void whatACellReadIsKnownWithWhatItSaw() {
    JavaOutcome.Done done =
        JAVA.done(
            "sheet.value(\"n\", \"rpm\"); sheet.quantity(\"n\");\n"
                + "try { sheet.quantity(\"later\"); } catch (IllegalArgumentException e) {}",
            new Collected());
    assertEquals(List.of("n", "later"), List.copyOf(done.reads().keySet()));
    assertEquals(SHEET.quantity("n"), done.reads().get("n"));
    assertEquals(Optional.empty(), done.reads().get("later"));
    JavaOutcome.Failed failed = JAVA.failed("cell [2]", "sheet.quantity(\"T\"); throw null;");
    assertEquals(List.of("T"), List.copyOf(failed.reads().keySet()));
  }

  @Test
  void theSheetIsOutOfReachWhenTheCellHasEnded() throws InterruptedException {
    var output = new Collected();
    JAVA.run(
        """
        new Thread(() -> {
          try {
            while (true) {
              sheet.quantity("n");
              Thread.sleep(1);
            }
          } catch (InterruptedException | IllegalStateException e) {
            System.out.print(e.getMessage());
          }
        }).start();
        """,
        output);
    output.awaitPrint();
    assertTrue(output.out().startsWith("The sheet can be read and given functions only while"));
  }

  private static List<PublishedFunction> functions(String code) {
    return JAVA.done(code, new Collected()).functions();
  }

  private static double apply(Routine routine, double... arguments) throws RoutineFailure {
    return routine.apply(arguments);
  }

  @Test
  void functionsOfUpToSixParametersArePublishedInOrder() throws RoutineFailure {
    List<PublishedFunction> functions =
        functions(
            """
            sheet.function("f0() [m]", () -> 7);
            sheet.function("f1(a [m]) [m]", a -> a);
            sheet.function("f2(a [m], b [1/(m·s)]) [m]", (a, b) -> a - b);
            sheet.function("f3(a [m], b [m], c [m]) [m]", (a, b, c) -> a * b * c);
            sheet.function("f4(a, b, c, d)", (a, b, c, d) -> d);
            sheet.function("f5(a, b, c, d, e)", (a, b, c, d, e) -> e);
            sheet.function("f6(a, b, c, d, e, f)", (a, b, c, d, e, f) -> f);
            sheet.function("root(a)", Math::sqrt);
            """);
    assertEquals(8, functions.size());
    assertEquals("f2(a [m], b [1/(m·s)]) [m]", functions.get(2).head());
    assertEquals(7, apply(functions.get(0).routine()));
    assertEquals(-1, apply(functions.get(2).routine(), 1, 2));
    assertEquals(6, apply(functions.get(6).routine(), 1, 2, 3, 4, 5, 6));
    assertEquals(3, apply(functions.get(7).routine(), 9));
  }

  @Test
  void aPublishedFunctionIsOneOfTheSheet() {
    List<PublishedFunction> functions =
        functions(
            """
            double drag(double v, double A) {
              return 0.5 * 1.2 * v * v * A;
            }
            sheet.function("drag(v [m/s], A [m²]) [N]", (v, A) -> drag(v, A));
            """);
    assertEquals(List.of(), SHEET.publish(new CellId("java"), "cell [2]", functions).errors());
    CellOutcome outcome =
        SHEET.run(new CellId("3"), "cell [3]", "D [N] = drag(36 km/h, 20000 cm^2)");
    assertEquals(List.of(), outcome.errors());
    assertEquals("120 N", JAVA.run("sheet.quantity(\"D\")").result());
  }

  @Test
  void aCellThatFailsPublishesNothing() {
    JavaOutcome outcome =
        JAVA.side()
            .run("cell [1]", "sheet.function(\"f(a)\", a -> a);\nthrow null;", new Collected());
    assertTrue(outcome instanceof JavaOutcome.Failed);
  }

  @Test
  void aFunctionThatThrowsSaysWhere() {
    Routine routine =
        functions(
                "int third(int n) {\n  return 1 / n;\n}\nsheet.function(\"g(n)\", n -> third((int) n));")
            .get(0)
            .routine();
    RoutineFailure failure = assertThrows(RoutineFailure.class, () -> apply(routine, 0));
    assertEquals("ArithmeticException: / by zero (cell [1], line 2)", failure.getMessage());
    assertEquals(false, failure.interrupted());
  }

  @Test
  void aFunctionCannotReadTheSheet() {
    Routine routine =
        functions("sheet.function(\"g(n)\", n -> n * sheet.value(\"T\", \"N·m\"));")
            .get(0)
            .routine();
    RoutineFailure failure = assertThrows(RoutineFailure.class, () -> apply(routine, 0));
    String said = String.valueOf(failure.getMessage());
    assertTrue(said.contains("give a function what it needs as an argument"), said);
  }

  private static RoutineFailure interrupted(Routine routine, @Nullable Runnable interrupt)
      throws Exception {
    var failure = new CompletableFuture<RoutineFailure>();
    var caller =
        new Thread(
            () -> failure.complete(assertThrows(RoutineFailure.class, () -> apply(routine, 1))));
    caller.start();
    while (caller.getState() == Thread.State.NEW || caller.getState() == Thread.State.RUNNABLE) {
      Thread.onSpinWait();
    }
    if (interrupt == null) {
      caller.interrupt();
    } else {
      interrupt.run();
    }
    return failure.get();
  }

  @Test
  void anEndlessFunctionEndsWhenItIsInterrupted() throws Exception {
    Routine routine =
        functions("int kept = 3;\nsheet.function(\"g(n)\", n -> { while (true) {} });")
            .get(0)
            .routine();
    assertTrue(interrupted(routine, () -> JAVA.side().interrupt()).interrupted());
    assertTrue(interrupted(routine, null).interrupted());
    assertEquals("3", JAVA.run("kept").result());
  }

  @Test
  void aFunctionThatSwallowsTheInterruptIsLeftBehindAndOthersCanBeCalled() throws Exception {
    List<PublishedFunction> functions =
        functions(
            """
            int still = 4;
            sheet.function("g(n)", n -> {
              while (true) {
                try {
                  while (true) {}
                } catch (Throwable t) {
                }
              }
            });
            sheet.function("h(n)", n -> 2 * n);
            """);
    assertTrue(
        interrupted(functions.get(0).routine(), () -> JAVA.side().interrupt()).interrupted());
    assertEquals(6, apply(functions.get(1).routine(), 3));
    assertEquals("4", JAVA.run("still").result());
  }

  @Test
  void aFunctionOutlivesTheRestartOfJava() throws Exception {
    try (var java = new JavaCells()) {
      Routine routine =
          java.done("sheet.function(\"g(n)\", n -> 1 / (int) n);", new Collected())
              .functions()
              .get(0)
              .routine();
      java.interrupted(
          "while (true) { try { System.out.print(1); while (true) {} } catch (Throwable t) {} }");
      assertEquals(1, apply(routine, 1));
      assertThrows(RoutineFailure.class, () -> apply(routine, 0));
    }
  }
}
