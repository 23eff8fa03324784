package pinchoff.kernel.eval;

import java.util.Collection;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import pinchoff.display.Displayable;
import pinchoff.display.MimeBundle;

/**
 * Turns the value of a cell into what the reader sees. Runs user code (display and toString), so
 * call it on the cell's own thread.
 */
final class ValueDisplay {
  private ValueDisplay() {}

  /** What a value shows; nothing for null. */
  static Optional<MimeBundle> of(@Nullable Object value) {
    if (value == null) {
      return Optional.empty();
    }
    if (value instanceof MimeBundle bundle) {
      return Optional.of(bundle);
    }
    if (value instanceof Displayable displayable) {
      return Optional.of(displayed(displayable));
    }
    if (value instanceof Optional<?> optional && optional.isPresent()) {
      return of(optional.get());
    }
    if (ImageDisplay.isImage(value)) {
      return Optional.of(ImageDisplay.of(value));
    }
    Optional<ValueTable> table = ValueTable.of(value);
    if (table.isPresent()) {
      String text = value instanceof Collection<?> ? table.get().asText() : ValueText.of(value);
      return Optional.of(table.get().asBundle(text));
    }
    return Optional.of(MimeBundle.text(ValueText.of(value)));
  }

  private static MimeBundle displayed(Displayable value) {
    try {
      MimeBundle bundle = value.display();
      if (bundle != null && bundle.textOf(MimeBundle.TEXT).isPresent()) {
        return bundle;
      }
      return fallback(value, "its display() gave nothing");
    } catch (CellInterrupted e) {
      throw e;
    } catch (RuntimeException | StackOverflowError | LinkageError e) {
      return fallback(value, "its display() failed with " + e);
    }
  }

  private static MimeBundle fallback(Displayable value, String reason) {
    String text = ValueText.guarded(value::toString, value);
    return MimeBundle.text(text + "\n(shown as plain text: " + reason + ")");
  }
}
