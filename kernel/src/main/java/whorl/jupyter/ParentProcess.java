package whorl.jupyter;

import java.util.Map;
import java.util.Optional;

/** The program that started the kernel, if it said that the kernel is to end with it. */
public final class ParentProcess {
  private static final String VARIABLE = "JPY_PARENT_PID";

  private ParentProcess() {}

  /**
   * Lets something be done when that program is gone.
   *
   * @param environment the variables of the kernel's process
   */
  public static void whenGone(Map<String, String> environment, Runnable task) {
    // Aside, for the system takes its time to tell, and front ends wait for the kernel.
    var watch = new Thread(() -> watch(environment, task), "parent");
    watch.setDaemon(true);
    watch.start();
  }

  private static void watch(Map<String, String> environment, Runnable task) {
    Optional<ProcessHandle> parent = find(environment);
    if (parent.isPresent()) {
      parent.get().onExit().join();
      task.run();
    }
  }

  /** Looked for among those that this process comes from: elsewhere the number means another. */
  private static Optional<ProcessHandle> find(Map<String, String> environment) {
    String id = environment.getOrDefault(VARIABLE, "");
    Optional<ProcessHandle> found =
        id.isEmpty() ? Optional.empty() : ProcessHandle.current().parent();
    while (found.isPresent() && !id.equals(String.valueOf(found.get().pid()))) {
      found = found.get().parent();
    }
    return found;
  }
}
