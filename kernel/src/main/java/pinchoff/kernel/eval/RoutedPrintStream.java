package pinchoff.kernel.eval;

import java.io.OutputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.util.Locale;
import java.util.Optional;
import org.jspecify.annotations.Nullable;

/**
 * A print stream whose text goes to the cell that the printing thread works for. It takes no lock
 * of its own and cannot be closed.
 */
final class RoutedPrintStream extends PrintStream {
  private final CellOutput.Stream stream;
  private final PrintStream original;
  private final ThreadLocal<Utf8Pieces> bytes = ThreadLocal.withInitial(Utf8Pieces::new);

  RoutedPrintStream(CellOutput.Stream stream, PrintStream original) {
    super(OutputStream.nullOutputStream(), false, StandardCharsets.UTF_8);
    this.stream = stream;
    this.original = original;
  }

  private void text(String text) {
    Optional<CellScope> scope = CellScope.current();
    if (scope.isPresent()) {
      scope.get().output().write(stream, text);
      CellGuard.check();
    } else {
      original.print(text);
    }
  }

  private void line(String text) {
    text(text + "\n");
  }

  @Override
  public void write(int b) {
    write(new byte[] {(byte) b}, 0, 1);
  }

  @Override
  public void write(byte[] buffer, int offset, int length) {
    String text = bytes.get().decode(buffer, offset, length);
    if (!text.isEmpty()) {
      text(text);
    }
  }

  @Override
  public void write(byte[] buffer) {
    write(buffer, 0, buffer.length);
  }

  @Override
  public void writeBytes(byte[] buffer) {
    write(buffer, 0, buffer.length);
  }

  @Override
  public void flush() {
    if (CellScope.current().isEmpty()) {
      original.flush();
    }
  }

  @Override
  public void close() {
    flush();
  }

  @Override
  public boolean checkError() {
    return false;
  }

  @Override
  public void print(boolean b) {
    text(String.valueOf(b));
  }

  @Override
  public void print(char c) {
    text(String.valueOf(c));
  }

  @Override
  public void print(int i) {
    text(String.valueOf(i));
  }

  @Override
  public void print(long l) {
    text(String.valueOf(l));
  }

  @Override
  public void print(float f) {
    text(String.valueOf(f));
  }

  @Override
  public void print(double d) {
    text(String.valueOf(d));
  }

  @Override
  public void print(char[] s) {
    text(String.valueOf(s));
  }

  @Override
  public void print(@Nullable String s) {
    text(String.valueOf(s));
  }

  @Override
  public void print(@Nullable Object o) {
    text(String.valueOf(o));
  }

  @Override
  public void println() {
    line("");
  }

  @Override
  public void println(boolean b) {
    line(String.valueOf(b));
  }

  @Override
  public void println(char c) {
    line(String.valueOf(c));
  }

  @Override
  public void println(int i) {
    line(String.valueOf(i));
  }

  @Override
  public void println(long l) {
    line(String.valueOf(l));
  }

  @Override
  public void println(float f) {
    line(String.valueOf(f));
  }

  @Override
  public void println(double d) {
    line(String.valueOf(d));
  }

  @Override
  public void println(char[] s) {
    line(String.valueOf(s));
  }

  @Override
  public void println(@Nullable String s) {
    line(String.valueOf(s));
  }

  @Override
  public void println(@Nullable Object o) {
    line(String.valueOf(o));
  }

  /** The same text on every machine: the decimal point does not depend on where it stands. */
  @Override
  public PrintStream printf(String format, @Nullable Object... arguments) {
    return format(Locale.ROOT, format, arguments);
  }

  @Override
  public PrintStream printf(@Nullable Locale locale, String format, @Nullable Object... arguments) {
    return format(locale, format, arguments);
  }

  @Override
  public PrintStream format(String format, @Nullable Object... arguments) {
    return format(Locale.ROOT, format, arguments);
  }

  @Override
  public PrintStream format(@Nullable Locale locale, String format, @Nullable Object... arguments) {
    text(String.format(locale, format, arguments));
    return this;
  }

  @Override
  public PrintStream append(@Nullable CharSequence text) {
    text(String.valueOf(text));
    return this;
  }

  @Override
  public PrintStream append(@Nullable CharSequence text, int start, int end) {
    text(String.valueOf(text).substring(start, end));
    return this;
  }

  @Override
  public PrintStream append(char c) {
    text(String.valueOf(c));
    return this;
  }
}
