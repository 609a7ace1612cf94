package whorl.java;

import java.lang.reflect.Field;
import java.lang.reflect.InvocationTargetException;
import java.lang.reflect.Method;
import java.net.MalformedURLException;
import java.nio.file.Path;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;
import java.util.concurrent.ConcurrentHashMap;
import java.util.function.Supplier;
import jdk.jshell.spi.ExecutionControl;
import jdk.jshell.spi.SPIResolutionException;
import org.jspecify.annotations.Nullable;

/**
 * Runs what JShell compiled on the thread of the cells, and keeps what came out as it is: JShell
 * itself passes on only texts of values and of exceptions.
 */
final class CellControl implements ExecutionControl {
  private final CellLoader loader;
  private final Supplier<CellThread> thread;
  private final Map<String, Ran> ran = new ConcurrentHashMap<>();

  /** What code came to: a value or an exception, or how it was interrupted. */
  record Ran(@Nullable Object value, Optional<Throwable> thrown, Optional<Stop> stop) {}

  CellControl(CellLoader loader, Supplier<CellThread> thread) {
    this.loader = loader;
    this.thread = thread;
  }

  /** Takes out what the code of a class came to; nothing if it did not run. */
  Optional<Ran> take(String className) {
    return Optional.ofNullable(ran.remove(className));
  }

  /** Lets a variable of a class go. */
  void clear(String className, String variable) {
    try {
      Field field = Class.forName(className, false, loader).getDeclaredField(variable);
      if (!field.getType().isPrimitive()) {
        field.setAccessible(true);
        field.set(null, null);
      }
    } catch (ReflectiveOperationException e) {
      throw new IllegalStateException(e);
    }
  }

  @Override
  public void load(ClassBytecodes[] classes) throws ClassInstallException {
    try {
      loader.load(classes);
    } catch (ClassNotFoundException | LinkageError e) {
      throw new ClassInstallException(e.toString(), new boolean[classes.length]);
    }
  }

  @Override
  public void redefine(ClassBytecodes[] classes) throws NotImplementedException {
    throw new NotImplementedException("JShell loads the class under another name instead");
  }

  @Override
  public String invoke(String className, String methodName) throws RunException, InternalException {
    try {
      Method method = Class.forName(className, false, loader).getDeclaredMethod(methodName);
      method.setAccessible(true);
      Object value = thread.get().call(() -> method.invoke(null));
      ran.put(className, new Ran(value, Optional.empty(), Optional.empty()));
      return "";
    } catch (Stop stop) {
      ran.put(className, new Ran(null, Optional.empty(), Optional.of(stop)));
      throw new StoppedException();
    } catch (InvocationTargetException e) {
      Throwable cause = Objects.requireNonNullElse(e.getCause(), e);
      ran.put(className, new Ran(null, Optional.of(cause), Optional.empty()));
      throw forJShell(cause);
    } catch (Exception e) {
      throw new InternalException(e.toString());
    }
  }

  private static RunException forJShell(Throwable cause) {
    return cause instanceof SPIResolutionException unresolved
        ? new ResolutionException(unresolved.id(), cause.getStackTrace())
        : new UserException("", cause.getClass().getName(), cause.getStackTrace());
  }

  @Override
  public String varValue(String className, String varName) throws InternalException {
    throw new InternalException("nobody asks for variables as text");
  }

  @Override
  public void addToClasspath(String path) throws InternalException {
    try {
      loader.add(Path.of(path));
    } catch (MalformedURLException e) {
      throw new InternalException(e.toString());
    }
  }

  @Override
  public void stop() {
    thread.get().interrupt();
  }

  @Override
  public Object extensionCommand(String command, Object argument) throws NotImplementedException {
    throw new NotImplementedException(command);
  }

  @Override
  public void close() {
    // The thread serves the next session.
  }
}
