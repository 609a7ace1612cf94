package whorl.java;

import java.net.MalformedURLException;
import java.net.URL;
import java.net.URLClassLoader;
import java.nio.file.Path;
import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;
import jdk.jshell.spi.ExecutionControl.ClassBytecodes;

/** Loads the classes of cells, with polls woven in, and those of the libraries that cells add. */
final class CellLoader extends URLClassLoader {
  private final Map<String, byte[]> declared = new ConcurrentHashMap<>();

  CellLoader() {
    super("java cells", new URL[0], CellLoader.class.getClassLoader());
  }

  /**
   * Loads classes, which may mention each other.
   *
   * @throws LinkageError if one of them cannot be linked
   */
  void load(ClassBytecodes[] classes) throws ClassNotFoundException {
    for (ClassBytecodes each : classes) {
      declared.put(each.name(), Polls.in(each.bytecodes()));
    }
    for (ClassBytecodes each : classes) {
      // Looking at the methods links the class, so that what is wrong with it shows here.
      var unused = loadClass(each.name()).getDeclaredMethods();
    }
  }

  @Override
  protected Class<?> findClass(String name) throws ClassNotFoundException {
    byte[] bytecode = declared.remove(name);
    return bytecode == null
        ? super.findClass(name)
        : defineClass(name, bytecode, 0, bytecode.length);
  }

  /** Adds a folder of classes or a jar. */
  void add(Path path) throws MalformedURLException {
    addURL(path.toUri().toURL());
  }
}
