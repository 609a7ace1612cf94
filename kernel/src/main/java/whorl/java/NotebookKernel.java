package whorl.java;

import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Set;
import org.dflib.jjava.jupyter.kernel.BaseKernel;
import org.dflib.jjava.jupyter.kernel.JupyterIO;
import org.dflib.jjava.jupyter.kernel.LanguageInfo;
import org.dflib.jjava.jupyter.kernel.ReplacementOptions;
import org.dflib.jjava.jupyter.kernel.comm.CommManager;
import org.dflib.jjava.jupyter.kernel.display.DisplayData;
import org.dflib.jjava.jupyter.kernel.magic.MagicsRegistry;
import org.dflib.jjava.jupyter.kernel.util.StringStyler;
import org.jspecify.annotations.Nullable;

/**
 * The kernel as the display library knows it, for the extensions that render values and add magics:
 * it shows, renders and evaluates. It speaks no protocol.
 */
final class NotebookKernel extends BaseKernel {
  private final JavaSession session;

  NotebookKernel(JavaSession session) {
    super(
        "whorl",
        "",
        new LanguageInfo(
            "Java",
            System.getProperty("java.version"),
            "text/x-java-source",
            ".java",
            "java",
            "text/x-java",
            "script"),
        List.of(),
        null,
        new Output(),
        new CommManager(),
        new PlainTexts(),
        null,
        new MagicsRegistry(),
        true,
        new StringStyler.Builder().build());
    this.session = session;
  }

  private static final class Output extends JupyterIO {
    Output() {
      super(StandardCharsets.UTF_8);
      setEnv(new NotebookEnvironment());
      setJupyterInEnabled(true);
    }
  }

  /** Lets the static methods of the library, which cells call, speak to this kernel. */
  void install() {
    notebookKernel = this;
  }

  /** Takes the place back, if no other kernel took it since. */
  void uninstall() {
    if (notebookKernel == this) {
      uninstallExtension();
      notebookKernel = null;
    }
  }

  /**
   * Installs the extensions that are on the class path of cells and not yet installed.
   *
   * @return which are installed now
   */
  Set<String> installExtensions() {
    installDefaultExtensions();
    return extensions.keySet();
  }

  @Override
  protected ClassLoader getClassLoader() {
    return session.loader();
  }

  @Override
  public @Nullable Object evalRaw(String code) {
    try {
      return session.runWithin(new JavaText("the code", code)).map(Value::object).orElse(null);
    } catch (Stop stop) {
      throw new CellStopped();
    } catch (RuntimeException e) {
      throw e;
    } catch (Exception e) {
      throw new IllegalArgumentException(e.getMessage(), e);
    }
  }

  @Override
  public DisplayData inspect(String code, int at, boolean extraDetail) {
    return DisplayData.EMPTY;
  }

  @Override
  public ReplacementOptions complete(String code, int at) {
    return new ReplacementOptions(List.of(), at, at);
  }

  @Override
  public String isComplete(String code) {
    return IS_COMPLETE_MAYBE;
  }
}
