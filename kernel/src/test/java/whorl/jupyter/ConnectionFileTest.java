package whorl.jupyter;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import com.google.gson.JsonObject;
import com.google.gson.JsonParser;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class ConnectionFileTest {
  private static final String WHOLE =
      """
      {"transport": "tcp", "ip": "127.0.0.1", "shell_port": 1, "iopub_port": 2, "stdin_port": 3,
       "control_port": 4, "hb_port": 65535, "key": "k", "signature_scheme": "hmac-sha256",
       "kernel_name": "whorl"}
      """;

  @TempDir private Path folder;

  private ConnectionFile read(String text) throws IOException {
    return ConnectionFile.read(Files.writeString(folder.resolve("c.json"), text));
  }

  private ConnectionFile with(String field, String value) throws IOException {
    JsonObject file = JsonParser.parseString(WHOLE).getAsJsonObject();
    if (value.isEmpty()) {
      file.remove(field);
    } else {
      file.add(field, JsonParser.parseString(value));
    }
    return read(file.toString());
  }

  @Test
  void aFileIsRead() throws IOException {
    ConnectionFile connection = read(WHOLE);
    assertEquals("tcp://127.0.0.1:1", connection.address(Channel.SHELL));
    assertEquals("tcp://127.0.0.1:65535", connection.address(Channel.HEARTBEAT));
    assertEquals("k", connection.key());
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "ip               | \"10.1.2.3\" | tcp://10.1.2.3:1",
        "ip               | \"0.0.0.0\"  | tcp://0.0.0.0:1",
        "ip               | \"::1\"      | tcp://[::1]:1",
        "ip               | ''           | tcp://127.0.0.1:1",
        "transport        | ''           | tcp://127.0.0.1:1",
        "signature_scheme | ''           | tcp://127.0.0.1:1",
        "key              | \"\"         | tcp://127.0.0.1:1",
      })
  void itListensAtTheAddressOfTheFileAndElseAtLoopback(String field, String value, String address)
      throws IOException {
    assertEquals(address, with(field, value).address(Channel.SHELL));
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "shell_port       | ''           | shell_port is missing",
        "hb_port          | 0            | hb_port must be a number from 1 to 65535, but is 0",
        "hb_port          | 65536        | hb_port must be a number from 1 to 65535, but is 65536",
        "hb_port          | 1.5          | hb_port must be a number from 1 to 65535, but is 1.5",
        "hb_port          | \"5\"        | hb_port must be a number from 1 to 65535, but is \"5\"",
        "hb_port          | null         | hb_port must be a number from 1 to 65535, but is null",
        "key              | ''           | key is missing",
        "key              | 5            | key must be a text, but is 5",
        "ip               | []           | ip must be a text, but is []",
        "transport        | \"ipc\"      | its transport is ipc, but Whorl knows tcp only",
        "signature_scheme | \"hmac-md5\" | its signature_scheme is hmac-md5, but Whorl knows hmac-sha256 only",
      })
  void whatIsWrongInAFileIsNamed(String field, String value, String problem) {
    var e = assertThrows(KernelException.class, () -> with(field, value));
    assertEquals(
        folder.resolve("c.json") + " is not a connection file: " + problem, e.getMessage());
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {"''", "[]", "{", "{} {}", "{a: 1}", "not JSON"})
  void whatIsNoObjectIsNoConnectionFile(String text) {
    var e = assertThrows(KernelException.class, () -> read(text));
    assertEquals(
        folder.resolve("c.json") + " is not a connection file: it is not a JSON object",
        e.getMessage());
  }

  @Test
  void aFileThatIsNotThereIsNamed() {
    Path file = folder.resolve("none.json");
    var e = assertThrows(KernelException.class, () -> ConnectionFile.read(file));
    assertEquals("there is no file " + file, e.getMessage());
  }

  @Test
  void aFolderCannotBeRead() {
    var e = assertThrows(KernelException.class, () -> ConnectionFile.read(folder));
    assertEquals(folder + " cannot be read: Is a directory", e.getMessage());
  }
}
