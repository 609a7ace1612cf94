package whorl.install;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.nio.file.Path;
import java.util.HashMap;
import java.util.Map;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Jupyter's own rules, as {@code jupyter --paths} applies them. */
class JupyterFoldersTest {
  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "Linux      | HOME=/h                                 | /h/.local/share/jupyter/kernels",
        "Linux      | HOME=/h XDG_DATA_HOME=/x                | /x/jupyter/kernels",
        "Linux      | HOME=/h XDG_DATA_HOME=                  | /h/.local/share/jupyter/kernels",
        "Linux      | HOME=/h XDG_DATA_HOME=/x JUPYTER_DATA_DIR=/d | /d/kernels",
        "FreeBSD    | HOME=/h                                 | /h/.local/share/jupyter/kernels",
        "Mac OS X   | HOME=/h XDG_DATA_HOME=/x                | /h/Library/Jupyter/kernels",
        "Mac OS X   | HOME=/h JUPYTER_DATA_DIR=/d             | /d/kernels",
        "Windows 11 | USERPROFILE=/u APPDATA=/a HOME=/h       | /a/jupyter/kernels",
        "Windows 11 | USERPROFILE=/u HOME=/h                  | /u/.jupyter/data/kernels",
        "Windows 11 | USERPROFILE=/u JUPYTER_CONFIG_DIR=/c    | /c/data/kernels",
      })
  void kernelsOfAUserAreWhereJupyterLooks(String system, String variables, Path kernels) {
    Map<String, String> environment = new HashMap<>();
    for (String variable : variables.split(" ", -1)) {
      String[] parts = variable.split("=", 2);
      environment.put(parts[0], parts[1]);
    }
    assertEquals(kernels, new JupyterFolders(system, environment).kernelsOfUser());
  }
}
