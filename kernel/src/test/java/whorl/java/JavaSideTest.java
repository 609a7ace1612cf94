package whorl.java;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.PrintStream;
import java.util.stream.Stream;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

class JavaSideTest {
  private static final JavaCells JAVA = new JavaCells();

  @AfterAll
  static void close() {
    JAVA.close();
  }

  static Stream<Arguments> values() {
    return Stream.of(
        Arguments.of("6 * 7", "42"),
        Arguments.of("int a = 1; int b = 2;\na + b", "3"),
        Arguments.of("int quiet = 1;", ""),
        Arguments.of("quiet = 5", ""),
        Arguments.of("\"text\"", "text"),
        Arguments.of("new int[] {1, 2}", "[1, 2]"),
        Arguments.of("new double[][] {{1, 2}, {3}}", "[[1.0, 2.0], [3.0]]"),
        Arguments.of("List.of(new int[] {1}, \"x\")", "[[1], x]"),
        Arguments.of("Map.of(\"k\", new int[] {1})", "{k=[1]}"),
        Arguments.of("new HashMap<String, Integer>().get(\"x\")", "null"),
        Arguments.of("new HashMap<String, Integer>().put(\"x\", 1);", ""),
        Arguments.of("new ArrayList<String>().add(\"x\");", "true"),
        Arguments.of("System.out.print(\"\");", ""),
        Arguments.of("", ""),
        Arguments.of("// nothing", ""),
        Arguments.of("%%java\n1 + 1", "2"),
        Arguments.of("record Disc(double m) {}\nnew Disc(2)", "Disc[m=2.0]"),
        Arguments.of("for (int i = 0; i < 3; i++) {\n}\n\n// end\n", ""),
        Arguments.of("1;2", "2"),
        Arguments.of("String block = \"\"\"\n    %jars x\n    \"\"\";\nblock", "%jars x\n"),
        Arguments.of("7 /* 𝜔 */ % 4", "3"));
  }

  @ParameterizedTest
  @MethodSource("values")
  void theValueOfTheLastExpressionIsTheResult(String code, String value) {
    assertEquals(value, JAVA.run(code).result());
  }

  static Stream<Arguments> failures() {
    return Stream.of(
        Arguments.of(
            "int x = 1;\nint y = x + nothing;",
            """
            cannot find symbol: variable nothing

              2 | int y = x + nothing;
                              ^^^^^^^\
            """),
        Arguments.of(
            "String 𝜔 = \"𝜔\" - 3;",
            """
            bad operand types for binary operator '-'

              1 | String 𝜔 = "𝜔" - 3;
                             ^^^^^^^

            first type:  java.lang.String
            second type: int\
            """),
        Arguments.of(
            "foo bar baz",
            """
            ';' expected

              1 | foo bar baz
                         ^\
            """),
        Arguments.of(
            "if (true) {\n  int q = 1;\n\n",
            """
            reached end of file while parsing

              2 |   int q = 1;
                             ^\
            """),
        Arguments.of(
            "int half(int n) {\n  return 1 / n;\n}\n\nhalf(0)",
            """
            ArithmeticException: / by zero

              2 |   return 1 / n;
                    ^^^^^^^^^^^^^

            in half, cell [1], line 2:  return 1 / n;
            in cell [1], line 5:  half(0)\
            """),
        Arguments.of(
            "\nthrow new IllegalStateException(\"outer\", new IOException(\"inner\"));",
            """
            IllegalStateException: outer

              2 | throw new IllegalStateException("outer", new IOException("inner"));
                  ^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^

            Caused by IOException: inner
            in cell [1], line 2:  throw new IllegalStateException("outer", new IOException("inner"));\
            """),
        Arguments.of(
            "void g() {\n  h();\n}\ng();",
            """
            g() mentions method h(), which is not declared.

              4 | g();
                  ^^^^\
            """),
        Arguments.of(
            """
            class Own extends RuntimeException {}
            class Thrower {
              Thrower() {
                throw new Own();
              }
            }
            Runnable r = () -> {
              new Thrower();
            };
            r.run();
            """,
            """
            Own

              4 |     throw new Own();
                      ^^^^^^^^^^^^^^^^

            in new Thrower, cell [1], line 4:  throw new Own();
            in a lambda, cell [1], line 8:  new Thrower();
            in cell [1], line 10:  r.run();\
            """),
        Arguments.of(
            """
            class Bad {
              public String toString() { throw new IllegalStateException("no text"); }
            }
            new Bad()
            """,
            """
            IllegalStateException: no text

              2 |   public String toString() { throw new IllegalStateException("no text"); }
                    ^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^

            in Bad.toString, cell [1], line 2:  public String toString() { throw new \
            IllegalStateException("no text"); }\
            """),
        Arguments.of(
            """
            int even(int n) {
              return n == 0 ? 1 / n : odd(n - 1);
            }
            int odd(int n) {
              return even(n - 1);
            }
            even(2)
            """,
            """
            ArithmeticException: / by zero

              2 |   return n == 0 ? 1 / n : odd(n - 1);
                    ^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^

            in even, cell [1], line 2:  return n == 0 ? 1 / n : odd(n - 1);  (2 times)
            in odd, cell [1], line 5:  return even(n - 1);
            in cell [1], line 7:  even(2)\
            """),
        Arguments.of(
            "import foo.bar;",
            """
            package foo does not exist

              1 | import foo.bar;
                         ^^^^^^^\
            """));
  }

  @ParameterizedTest
  @MethodSource("failures")
  void aFailureSaysWhatIsWrongAndWhere(String code, String message) {
    assertEquals(message, JAVA.failure(code));
  }

  @Test
  void aRecursionWithoutEndIsToldInFewLines() {
    String message = JAVA.failure("int deep(int n) {\n  return deep(n + 1);\n}\ndeep(0)");
    assertTrue(message.startsWith("StackOverflowError\n\n  2 |   return deep(n + 1);"), message);
    assertTrue(message.endsWith(" times)"), message);
    assertTrue(message.lines().count() < 10, message);
  }

  @Test
  void aLibraryThatThrowsIsNamedWithTheCallInTheCell() {
    String message = JAVA.failure("int parsed =\n    Integer.parseInt(\"x\");");
    assertTrue(message.startsWith("NumberFormatException: For input string: \"x\""), message);
    assertTrue(message.contains("at java.base/java.lang.Integer.parseInt"), message);
    assertTrue(message.endsWith("in cell [1], line 2:  Integer.parseInt(\"x\");"), message);
  }

  @Test
  void aFailureInAnotherCellIsToldWithItsPlaceThere() {
    JAVA.side().run("cell [3]", "\nint third(int n) {\n  return 1 / n;\n}", new Collected());
    JavaOutcome.Failed failed = JAVA.failed("cell [4]", "int fine = 1;\nthird(0)");
    assertEquals(
        """
        ArithmeticException: / by zero

          2 | third(0)
              ^^^^^^^^

        in third, cell [3], line 3:  return 1 / n;
        in cell [4], line 2:  third(0)\
        """,
        String.join("\n", failed.lines()));
    assertEquals("ArithmeticException", failed.name());
    assertEquals("ArithmeticException: / by zero", failed.summary());
  }

  @Test
  void aFailingSnippetStopsTheCellAndWhatStandsBeforeItIsKept() {
    JAVA.failure("int before = 1;\nint wrong = 1 / 0;\nint behind = 2;");
    assertEquals("1", JAVA.run("before").result());
    assertTrue(JAVA.failure("behind").startsWith("cannot find symbol: variable behind"));
  }

  @Test
  void aMethodThatMentionsSomethingUndeclaredIsSaidAndWorksOnceItIsDeclared() {
    assertEquals(
        "outer() mentions method inner(), which is not declared yet.\n",
        JAVA.run("int outer() { return inner(); }").err());
    assertEquals("3", JAVA.run("int inner() { return 3; }\nouter()").result());
  }

  @Test
  void aVariableThatLosesItsValueBecauseOfItsTypeIsSaid() {
    JAVA.run("class Part { int n = 1; }\nPart part = new Part();");
    assertEquals(
        "part has lost its value, for Part was declared anew.\n",
        JAVA.run("class Part { int m = 2; }").err());
  }

  @Test
  void whatACellPrintsGoesToItsOwnOutput() {
    Collected output =
        JAVA.run("System.out.println(\"ω = 1\");\nSystem.err.print(\"late\");\nprintf(\"%d\", 3);");
    assertEquals("ω = 1\n3", output.out());
    assertEquals("late", output.err());
  }

  @Test
  void otherThreadsOfTheCellPrintToItToo() {
    Collected output =
        JAVA.run(
            "IntStream.range(0, 500).parallel().forEach(i -> System.out.print(\"x\"));\n"
                + "Thread t = new Thread(() -> System.out.print(\"y\"));\nt.start();\nt.join();");
    assertEquals("x".repeat(500) + "y", output.out());
  }

  @Test
  void bytesOfACharacterMayComeOneByOne() {
    assertEquals(
        "ω", JAVA.run("for (byte b : \"ω\".getBytes(\"UTF-8\")) System.out.write(b);").out());
  }

  @Test
  void aLongOutputComesWholeAndNotPieceByPiece() {
    Collected output =
        JAVA.run(
            "for (int i = 0; i < 100_000; i++) System.out.println(\"line \" + i + \" of many\");");
    assertEquals(100_000, output.out().lines().count());
    assertTrue(output.prints() <= 200_000, () -> "printed " + output.prints() + " times");
  }

  @Test
  void whatACellReadsIsAskedOfTheUser() {
    var output = new Collected().answering("first", "second");
    String code = "var lines = new Scanner(System.in);\nlines.nextLine() + lines.nextLine()";
    assertEquals("firstsecond", JAVA.run(code, output).result());
  }

  @Test
  void theStreamsOfTheJvmComeBackWhenJavaIsClosed() {
    PrintStream before = System.out;
    try (var java = new JavaCells()) {
      java.run("System.out.print(1);");
    }
    assertSame(before, System.out);
  }
}
