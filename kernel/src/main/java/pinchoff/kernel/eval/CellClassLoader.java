package pinchoff.kernel.eval;

import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;

/** Holds the compiled classes of the cells; everything else comes from the application. */
final class CellClassLoader extends ClassLoader {
  private final Map<String, byte[]> classFiles = new ConcurrentHashMap<>();

  CellClassLoader(ClassLoader parent) {
    super("cells", parent);
    setDefaultAssertionStatus(true);
  }

  /** Adds a class to those that can be loaded. */
  void add(String name, byte[] woven) {
    classFiles.put(name, woven);
  }

  @Override
  protected Class<?> findClass(String name) throws ClassNotFoundException {
    byte[] classFile = classFiles.remove(name);
    if (classFile == null) {
      throw new ClassNotFoundException(name);
    }
    return defineClass(name, classFile, 0, classFile.length);
  }
}
