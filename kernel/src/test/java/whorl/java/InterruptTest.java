package whorl.java;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.concurrent.TimeUnit;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.Timeout;

@Timeout(value = 5, unit = TimeUnit.MINUTES, threadMode = Timeout.ThreadMode.SEPARATE_THREAD)
class InterruptTest {
  /** Cells that do not end by themselves, and print when they have begun. */
  private static final List<String> ENDLESS =
      List.of(
          "{ System.out.print(1); while (true) {} }",
          "{ System.out.print(1); do {} while (true); }",
          "{ System.out.print(1); for (int i = 0; ; i++) { i ^= 1; } }",
          "{ System.out.print(1); while (true) { switch (1) { case 2: break; default: } } }",
          "{ System.out.print(1); Thread.sleep(Long.MAX_VALUE); }",
          "{ System.out.print(1); new CountDownLatch(1).await(); }",
          "{ new Scanner(System.in).nextLine(); }",
          """
          {
            var in = new PipedInputStream(new PipedOutputStream());
            System.out.print(1);
            in.read();
          }
          """,
          """
          double fib(int n) {
            return n < 2 ? n : fib(n - 1) + fib(n - 2);
          }
          { System.out.print(1); fib(1000); }
          """,
          "{ System.out.print(1); Stream.iterate(1, x -> x + 1).forEach(x -> {}); }",
          """
          IntStream.range(0, 100).parallel().forEach(i -> {
            System.out.print(i);
            while (true) {}
          });
          """,
          """
          {
            Thread other = new Thread(() -> {
              System.out.print(1);
              while (true) {}
            });
            other.start();
            other.join();
          }
          """,
          """
          {
            System.out.print(1);
            while (true) {
              try {
                Thread.sleep(1);
              } catch (InterruptedException e) {
              }
            }
          }
          """,
          """
          try {
            System.out.print(1);
            while (true) {}
          } finally {
            for (int i = 0; i < 100; i++) {
              cleared++;
            }
          }
          """);

  private static void assertEnded(JavaOutcome outcome) {
    // On a busy machine the end of a cell may be late, so that its thread is left behind.
    assertFalse(assertInstanceOf(JavaOutcome.Interrupted.class, outcome).restarted());
  }

  @Test
  void endlessCellsEndAndLeaveTheirStateAHundredTimesInARow() throws Exception {
    try (var java = new JavaCells()) {
      java.run("int kept = 0;\nint cleared = 0;");
      for (int i = 1; i <= 100; i++) {
        String code = ENDLESS.get(i % ENDLESS.size());
        assertEnded(java.interrupted(code));
        assertEquals(String.valueOf(i), java.run("++kept").result(), code);
      }
      int cleanings = 100 / ENDLESS.size();
      assertEquals(String.valueOf(100 * cleanings), java.run("cleared").result());
    }
  }

  @Test
  void aCellThatSwallowsTheInterruptLosesTheDeclarations() throws Exception {
    try (var java = new JavaCells()) {
      java.run("int lost = 1;");

      JavaOutcome outcome =
          java.interrupted(
              """
              while (true) {
                try {
                  System.out.print(1);
                  while (true) {}
                } catch (Throwable t) {
                }
              }
              """);

      var interrupted = assertInstanceOf(JavaOutcome.Interrupted.class, outcome);
      assertTrue(interrupted.restarted());
      assertTrue(interrupted.notice().contains("declarations of all cells in Java are gone"));
      assertTrue(java.failure("lost").startsWith("cannot find symbol: variable lost"));
      assertEquals("2", java.run("1 + 1").result());
      assertEnded(java.interrupted(ENDLESS.get(0)));
    }
  }

  @Test
  void aCellThatWaitsWhereNothingCanReachItIsLeftBehind() throws Exception {
    try (var java = new JavaCells()) {
      java.run("int kept = 1;\nvar door = new ServerSocket(0);");

      JavaOutcome outcome = java.interrupted("{ System.out.print(1); door.accept(); }\n");

      var interrupted = assertInstanceOf(JavaOutcome.Interrupted.class, outcome);
      assertTrue(interrupted.notice().contains("All declarations are kept"), interrupted.notice());
      assertEquals("1", java.run("door.close();\nkept").result());
    }
  }

  @Test
  void anInterruptOfTheThreadThatWaitsEndsTheCell() throws Exception {
    try (var java = new JavaCells()) {
      var output = new Collected();
      var outcome = new java.util.concurrent.CompletableFuture<JavaOutcome>();
      var waiting =
          new Thread(() -> outcome.complete(java.side().run("cell [1]", ENDLESS.get(0), output)));
      waiting.start();
      output.awaitPrint();
      waiting.interrupt();
      assertEnded(outcome.get());
    }
  }

  @Test
  void anInterruptWhenNothingRunsDoesNoHarm() {
    try (var java = new JavaCells()) {
      java.side().interrupt();
      java.run("int a = 1;");
      java.side().interrupt();
      assertEquals("1", java.run("a").result());
    }
  }
}
