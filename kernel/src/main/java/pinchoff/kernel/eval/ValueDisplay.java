package pinchoff.kernel.eval;

import java.util.Optional;
import org.jspecify.annotations.Nullable;
import pinchoff.display.Displayable;
import pinchoff.display.MimeBundle;

/** Turns the value of a cell into what the reader sees. */
final class ValueDisplay {
  private ValueDisplay() {}

  static Optional<MimeBundle> of(@Nullable Object value) {
    if (value == null) {
      return Optional.empty();
    }
    if (value instanceof Displayable d) {
      return Optional.of(d.display());
    }
    return Optional.of(MimeBundle.text(String.valueOf(value)));
  }
}
