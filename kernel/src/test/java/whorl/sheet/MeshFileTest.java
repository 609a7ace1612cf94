package whorl.sheet;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import whorl.diagnostic.DiagnosticText;
import whorl.eval.Value;

/** Meshes that a sheet reads from the folder of its note. */
class MeshFileTest {
  private static final Path BLOCK = Path.of("src/test/resources/whorl/sheet/meshes/block.stl");
  private static final String LINE = "b = mesh(\"block.stl\", unit = 1 mm, density = 7850 kg/m³)";

  @TempDir Path parent;
  private Path folder;

  @BeforeEach
  void copyBlock() throws IOException {
    folder = Files.createDirectory(parent.resolve("note"));
    Files.copy(BLOCK, folder.resolve("block.stl"));
  }

  private String messages(String text) {
    CellOutcome outcome = new Sheet(folder).run(new CellId("a"), "cell [1]", text);
    return outcome.errors().stream()
        .map(error -> DiagnosticText.render(error, outcome.source()))
        .reduce("", String::concat);
  }

  private static double mass(Sheet sheet) {
    return ((Value.Real) sheet.quantity("m").orElseThrow().value()).value();
  }

  /** Steel block of 100 mm x 60 mm x 40 mm: 7850 kg/m³ times its volume. */
  @Test
  void theUnitOfLengthDecidesTheMass() {
    var sheet = new Sheet(folder);
    sheet.run(new CellId("a"), "cell [1]", LINE + "\nm = b.mass");
    assertEquals(1.884, mass(sheet), 1e-12);
    sheet.run(new CellId("a"), "cell [1]", LINE.replace("1 mm", "1 in") + "\nm = b.mass");
    assertEquals(1.884 * 25.4 * 25.4 * 25.4, mass(sheet), 1e-7);
  }

  @Test
  void aCellThatIsRunAgainReadsTheFileAgain() throws IOException {
    var sheet = new Sheet(folder);
    String text = LINE + "\nm = b.mass";
    sheet.run(new CellId("a"), "cell [1]", text);
    Path file = folder.resolve("block.stl");
    Files.writeString(file, Files.readString(file).replace(" 100 ", " 200 "));
    sheet.run(new CellId("a"), "cell [1]", text);
    assertEquals(2 * 1.884, mass(sheet), 1e-12);
  }

  @Test
  void theOriginOfTheFileIsKnown() {
    var sheet = new Sheet(folder);
    sheet.run(new CellId("a"), "cell [1]", LINE + "\nv = b.centre - b.datum");
    var vector = (Value.Vector) sheet.quantity("v").orElseThrow().value();
    assertEquals(0.05, vector.x(), 1e-12);
    assertEquals(0.03, vector.y(), 1e-12);
    assertEquals(0.02, vector.z(), 1e-12);
  }

  @Test
  void withoutAUnitOfLengthAMeshIsRefused() {
    String message = messages("b = mesh(\"block.stl\", density = 7850 kg/m³)");
    assertTrue(message.contains("leaves out unit"), message);
  }

  @Test
  void anOpenMeshIsRefused() throws IOException {
    Path file = folder.resolve("block.stl");
    String text = Files.readString(file);
    int last = text.lastIndexOf(" facet normal");
    Files.writeString(file, text.substring(0, last) + "endsolid\n");
    String message = messages(LINE);
    assertTrue(message.contains("mesh: The mesh is open"), message);
  }

  @Test
  void aFileThatIsNotThereIsNamed() {
    String message = messages(LINE.replace("block", "rotor"));
    assertTrue(message.contains("There is no file “rotor.stl”"), message);
    assertTrue(message.contains("\"rotor.stl\""), message);
  }

  @Test
  void nothingOutsideTheFolderIsRead() throws IOException {
    Files.copy(BLOCK, parent.resolve("other.stl"));
    for (String name :
        new String[] {"../other.stl", "a/../../other.stl", parent + "/other.stl", ""}) {
      String message = messages("b = mesh(\"" + name + "\", unit = 1 mm, mass = 1 kg)");
      assertTrue(message.contains("does not lie below the folder"), message);
    }
  }

  @Test
  void aLinkOutOfTheFolderIsNotFollowed() throws IOException {
    Files.copy(BLOCK, parent.resolve("other.stl"));
    Files.createSymbolicLink(folder.resolve("link.stl"), parent.resolve("other.stl"));
    String message = messages("b = mesh(\"link.stl\", unit = 1 mm, mass = 1 kg)");
    assertTrue(message.contains("does not lie below the folder"), message);
  }
}
