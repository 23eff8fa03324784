package pinchoff.kernel.eval;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.Optional;

/** Standard input of cells: each line is asked of the user of the cell that reads. */
final class AskingInputStream extends InputStream {
  /** What some consoles send for the end of the input. */
  private static final String END = "\u0004";

  private final InputStream original;
  private byte[] line = {};
  private int next;

  AskingInputStream(InputStream original) {
    this.original = original;
  }

  @Override
  public int read() throws IOException {
    byte[] one = new byte[1];
    return read(one, 0, 1) < 0 ? -1 : one[0] & 0xff;
  }

  @Override
  public synchronized int read(byte[] buffer, int offset, int length) throws IOException {
    if (length == 0) {
      return 0;
    }
    if (next >= line.length) {
      Optional<CellScope> scope = CellScope.current();
      if (scope.isEmpty()) {
        return original.read(buffer, offset, length);
      }
      String answer = SessionHost.ask(scope.get(), "", false);
      if (answer.equals(END)) {
        return -1;
      }
      line = (answer + "\n").getBytes(StandardCharsets.UTF_8);
      next = 0;
    }
    int count = Math.min(length, line.length - next);
    System.arraycopy(line, next, buffer, offset, count);
    next += count;
    return count;
  }

  @Override
  public synchronized int available() throws IOException {
    return line.length - next;
  }

  /** Forgets what a cell has left unread. */
  synchronized void forget() {
    next = line.length;
  }

  @Override
  public void close() {
    forget();
  }
}
