package whorl.java;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.google.gson.JsonObject;
import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class DisplayTest {
  private static final JavaCells JAVA = new JavaCells();

  @AfterAll
  static void close() {
    JAVA.close();
  }

  private static String text(JsonObject data, String mime) {
    return data.get(mime).getAsString();
  }

  @Test
  void anImageIsShownAsOne() {
    Collected output =
        JAVA.run(
            "import java.awt.image.BufferedImage;\n"
                + "new BufferedImage(2, 2, BufferedImage.TYPE_INT_RGB)");
    assertTrue(text(output.resultData(), "image/png").startsWith("iVBOR"));
  }

  @Test
  void displayShowsAndAnswersAHandleThatIsNoResult() {
    Collected output = JAVA.run("display(\"<b>x</b>\", \"text/html\")");
    assertEquals("<b>x</b>", text(output.displays().get(0), "text/html"));
    assertEquals("", output.result());
  }

  @Test
  void anOutputIsShownAnewInPlace() {
    Collected output =
        JAVA.run(
            "String handle = display(1);\nupdateDisplay(handle, 2);\nupdateDisplay(handle, 3);");
    assertEquals(List.of("1"), output.displays().stream().map(d -> text(d, "text/plain")).toList());
    assertEquals(
        List.of("2", "3"), output.updates().stream().map(d -> text(d, "text/plain")).toList());
    // A later cell may show it anew too.
    assertEquals("4", text(JAVA.run("updateDisplay(handle, 4)").updates().get(0), "text/plain"));
  }

  @Test
  void aCellClearsWhatItHasShown() {
    Collected output = JAVA.run("display(1);\nclearOutput(true);\ndisplay(2);");
    assertEquals(List.of("2"), output.displays().stream().map(d -> text(d, "text/plain")).toList());
  }

  @Test
  void whatIsRenderedIsShownAsItIs() {
    JsonObject data = JAVA.run("render(\"# Head\", \"text/markdown\")").resultData();
    assertEquals("# Head", text(data, "text/markdown"));
    assertEquals("# Head", text(data, "text/plain"));
  }

  @Test
  void aLongCollectionIsCut() {
    String text = JAVA.run("new double[5000]").result();
    assertTrue(text.startsWith("[0.0, 0.0, "));
    assertTrue(text.endsWith(", … 4000 more]"));
  }

  @Test
  void aCollectionThatHoldsItselfIsShown() {
    assertTrue(
        JAVA.run("var own = new ArrayList<Object>();\nown.add(own);\nown").result().contains("…"));
  }

  @Test
  void aClassOfTheCellMayShowItself() {
    JsonObject data =
        JAVA.run(
                """
                import org.dflib.jjava.jupyter.kernel.display.*;
                class Dial implements DisplayDataRenderable {
                  public void render(RenderContext context) {
                    context.renderIfRequested(
                        org.dflib.jjava.jupyter.kernel.display.mime.MIMEType.TEXT_HTML,
                        () -> "<meter></meter>");
                  }
                  public Set<org.dflib.jjava.jupyter.kernel.display.mime.MIMEType> getPreferredRenderTypes() {
                    return Set.of(org.dflib.jjava.jupyter.kernel.display.mime.MIMEType.TEXT_HTML);
                  }
                  public String toString() {
                    return "dial";
                  }
                }
                new Dial()
                """)
            .resultData();
    assertEquals("<meter></meter>", text(data, "text/html"));
    assertEquals("dial", text(data, "text/plain"));
  }

  private static final String EXTENSION =
      """
      package parts;
      import org.dflib.jjava.jupyter.Extension;
      import org.dflib.jjava.jupyter.kernel.BaseKernel;
      public class Shafts implements Extension {
        public record Shaft(double d) {}
        @Override
        public void install(BaseKernel kernel) {
          kernel.getRenderer()
              .createRegistration(Shaft.class)
              .preferring("text/html")
              .register((shaft, context) ->
                  context.renderIfRequested(
                      org.dflib.jjava.jupyter.kernel.display.mime.MIMEType.TEXT_HTML,
                      () -> "<i>shaft " + shaft.d() + "</i>"));
          kernel.getMagicsRegistry()
              .registerLineMagic("shaft", (k, arguments) -> {
                k.display(k.getRenderer().render(new Shaft(Double.parseDouble(arguments.get(0)))));
                return null;
              });
          kernel.getMagicsRegistry()
              .registerCellMagic("twice", (k, arguments, body) -> k.evalRaw(body + body));
          kernel.evalRaw("import parts.Shafts.Shaft;");
          System.out.println("shafts installed");
        }
      }
      """;

  @Test
  void anExtensionInAJarRendersAddsMagicsAndRunsCode(@TempDir Path folder) throws IOException {
    Path jar =
        TestJar.of(
            folder.resolve("shafts.jar"),
            "parts.Shafts",
            EXTENSION,
            Map.of("META-INF/services/org.dflib.jjava.jupyter.Extension", "parts.Shafts\n"));
    assertEquals("shafts installed\n", JAVA.run("%jars " + jar).out());
    assertEquals("", JAVA.run("%jars " + jar).out(), "it is installed once");
    assertEquals("<i>shaft 20.0</i>", text(JAVA.run("new Shaft(20)").resultData(), "text/html"));
    assertEquals(
        "<i>shaft 30.0</i>",
        text(JAVA.run("int n = 1;\n%shaft 30\nn").displays().get(0), "text/html"));
    assertEquals("xx", JAVA.run("%%twice now\nSystem.out.print(\"x\");").out());
  }

  @Test
  void cellsMayRunCodeThatTheyMake() {
    assertEquals("6", JAVA.run("eval(\"int made = 5;\");\neval(\"made + 1\")").result());
    assertTrue(
        JAVA.failure("eval(\"nothing at all\")")
            .startsWith("IllegalArgumentException: ';' expected"));
  }
}
