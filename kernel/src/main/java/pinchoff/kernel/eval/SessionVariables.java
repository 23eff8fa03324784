package pinchoff.kernel.eval;

import java.lang.reflect.Field;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.ConcurrentHashMap;
import org.jspecify.annotations.Nullable;

/** The top-level variables of a session: which loaded class holds each of them now. */
final class SessionVariables {
  private final Map<String, Class<?>> holders = new ConcurrentHashMap<>();

  /** The value a variable has now; empty if there is none of that name or it is null. */
  Optional<Object> value(String name) {
    Class<?> holder = holders.get(name);
    return holder == null ? Optional.empty() : Optional.ofNullable(read(holder, name));
  }

  /** The type a variable was declared with. */
  Optional<Class<?>> type(String name) {
    return Optional.ofNullable(holders.get(name)).flatMap(h -> field(h, name)).map(Field::getType);
  }

  /** A variable was declared by the cell that runs. */
  void declared(String name, Class<?> holder) {
    holders.put(name, holder);
  }

  void removed(String name) {
    holders.remove(name);
  }

  /**
   * A variable was compiled anew because something that it depends on has changed, and its
   * initialiser does not run again: carries its value over.
   *
   * @return false if the value was lost
   */
  boolean moved(String name, Class<?> newHolder) {
    Class<?> old = holders.put(name, newHolder);
    if (old == null || old == newHolder) {
      return true;
    }
    Object value = read(old, name);
    if (value == null) {
      return true;
    }
    Optional<Field> field = field(newHolder, name);
    try {
      if (field.isPresent()) {
        field.get().set(null, value);
        return true;
      }
    } catch (IllegalAccessException | IllegalArgumentException e) {
      // Of a type that no longer fits.
      return false;
    }
    return false;
  }

  private static @Nullable Object read(Class<?> holder, String name) {
    try {
      Optional<Field> field = field(holder, name);
      return field.isEmpty() ? null : field.get().get(null);
    } catch (IllegalAccessException e) {
      return null;
    }
  }

  private static Optional<Field> field(Class<?> holder, String name) {
    try {
      Field field = holder.getDeclaredField(name);
      field.setAccessible(true);
      return Optional.of(field);
    } catch (NoSuchFieldException e) {
      return Optional.empty();
    }
  }
}
