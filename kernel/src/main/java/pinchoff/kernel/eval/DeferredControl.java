package pinchoff.kernel.eval;

import java.lang.instrument.ClassDefinition;
import java.lang.instrument.Instrumentation;
import java.lang.instrument.UnmodifiableClassException;
import java.lang.reflect.Method;
import java.util.ArrayList;
import java.util.List;
import jdk.jshell.execution.DirectExecutionControl;
import jdk.jshell.execution.LoaderDelegate;
import jdk.jshell.spi.ExecutionControl;

/**
 * The engine that the compiler loads classes into. It only remembers the methods that it is told to
 * run: the evaluator runs them afterwards, with no lock of the compiler held, and so gets the real
 * values and the real exceptions.
 */
final class DeferredControl extends DirectExecutionControl {
  private final CellClassLoader loader;
  private final List<Method> deferred = new ArrayList<>();

  DeferredControl(CellClassLoader loader) {
    super(new Loader(loader));
    this.loader = loader;
  }

  /** The methods to run since the last call, in order. */
  List<Method> takeDeferred() {
    List<Method> taken = List.copyOf(deferred);
    deferred.clear();
    return taken;
  }

  @Override
  protected String invoke(Method method) {
    method.setAccessible(true);
    deferred.add(method);
    return "";
  }

  @Override
  public void redefine(ClassBytecodes[] changed) throws ClassInstallException {
    boolean[] none = new boolean[changed.length];
    Instrumentation instrumentation =
        RedefinitionAgent.instrumentation()
            .orElseThrow(() -> new ClassInstallException("no means to redefine classes", none));
    try {
      ClassDefinition[] definitions = new ClassDefinition[changed.length];
      for (int i = 0; i < changed.length; i++) {
        Class<?> type = Class.forName(changed[i].name(), false, loader);
        definitions[i] = new ClassDefinition(type, InterruptWeaver.weave(changed[i].bytecodes()));
      }
      instrumentation.redefineClasses(definitions);
    } catch (ClassNotFoundException
        | UnmodifiableClassException
        | UnsupportedOperationException
        | LinkageError e) {
      // Another shape: the compiler then loads the declaration under a new class name.
      throw new ClassInstallException("redefine: " + e, none);
    }
  }

  /** Loads the compiler's classes, woven. */
  private record Loader(CellClassLoader loader) implements LoaderDelegate {

    @Override
    public void load(ExecutionControl.ClassBytecodes[] classes)
        throws ExecutionControl.ClassInstallException {
      boolean[] loaded = new boolean[classes.length];
      try {
        for (ExecutionControl.ClassBytecodes c : classes) {
          loader.add(c.name(), InterruptWeaver.weave(c.bytecodes()));
        }
        for (int i = 0; i < classes.length; i++) {
          loaded[i] = loader.loadClass(classes[i].name()).getClassLoader() == loader;
        }
      } catch (ClassNotFoundException | LinkageError e) {
        throw new ExecutionControl.ClassInstallException("load: " + e, loaded);
      }
    }

    @Override
    public void classesRedefined(ExecutionControl.ClassBytecodes[] classes) {
      // Nothing is kept of the class files.
    }

    @Override
    public void addToClasspath(String path) throws ExecutionControl.InternalException {
      throw new ExecutionControl.InternalException("the class path is that of the application");
    }

    @Override
    public Class<?> findClass(String name) throws ClassNotFoundException {
      return loader.loadClass(name);
    }
  }
}
