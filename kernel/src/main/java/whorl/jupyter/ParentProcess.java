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
    find(environment).ifPresent(parent -> parent.onExit().thenRun(task));
  }

  private static Optional<ProcessHandle> find(Map<String, String> environment) {
    try {
      long id = Long.parseLong(environment.getOrDefault(VARIABLE, ""));
      // Where front ends give something else than the parent's number, this finds no parent.
      return ProcessHandle.current().parent().filter(parent -> parent.pid() == id);
    } catch (NumberFormatException e) {
      return Optional.empty();
    }
  }
}
