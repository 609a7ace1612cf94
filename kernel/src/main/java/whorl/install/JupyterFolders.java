package whorl.install;

import java.nio.file.Path;
import java.util.Locale;
import java.util.Map;
import org.jspecify.annotations.Nullable;

/** Where Jupyter looks for kernels. Its rules are kept here, so that no Python is needed. */
public final class JupyterFolders {
  private final String system;
  private final Map<String, String> environment;

  /**
   * The folders of a user.
   *
   * @param system the name of the operating system, as Java gives it
   * @param environment the variables that the user set
   */
  public JupyterFolders(String system, Map<String, String> environment) {
    this.system = system.toLowerCase(Locale.ROOT);
    this.environment = Map.copyOf(environment);
  }

  /** The kernels of a Python environment. */
  public static Path kernelsOf(Path prefix) {
    return prefix.resolve("share").resolve("jupyter").resolve("kernels");
  }

  /** The user's own kernels. */
  public Path kernelsOfUser() {
    return data().resolve("kernels");
  }

  private Path data() {
    String chosen = variable("JUPYTER_DATA_DIR");
    if (chosen != null) {
      return Path.of(chosen);
    }
    if (system.startsWith("windows")) {
      String applications = variable("APPDATA");
      return applications == null
          ? configuration().resolve("data")
          : Path.of(applications, "jupyter");
    }
    if (system.startsWith("mac")) {
      return home().resolve("Library").resolve("Jupyter");
    }
    String shared = variable("XDG_DATA_HOME");
    Path place = shared == null ? home().resolve(".local").resolve("share") : Path.of(shared);
    return place.resolve("jupyter");
  }

  private Path configuration() {
    String chosen = variable("JUPYTER_CONFIG_DIR");
    return chosen == null ? home().resolve(".jupyter") : Path.of(chosen);
  }

  /** Jupyter follows the variable, and the JVM does not. */
  private Path home() {
    String chosen = variable(system.startsWith("windows") ? "USERPROFILE" : "HOME");
    return Path.of(chosen == null ? System.getProperty("user.home") : chosen);
  }

  private @Nullable String variable(String name) {
    String value = environment.get(name);
    return value == null || value.isEmpty() ? null : value;
  }
}
