package pinchoff.kernel.cli;

import java.io.FileDescriptor;
import java.io.FileOutputStream;
import java.io.OutputStream;
import java.io.PrintStream;
import java.lang.reflect.Method;
import java.nio.charset.StandardCharsets;

/**
 * Where a command prints.
 *
 * @param out its results
 * @param err progress and faults
 * @param terminal whether somebody watches who wants one updating line of progress
 */
record Streams(PrintStream out, PrintStream err, boolean terminal) {

  /** The streams of this process, in UTF-8 whatever the locale is. */
  static Streams ofProcess() {
    return of(
        new FileOutputStream(FileDescriptor.out),
        new FileOutputStream(FileDescriptor.err),
        isTerminal());
  }

  /** UTF-8 text on these streams. */
  static Streams of(OutputStream out, OutputStream err, boolean terminal) {
    return new Streams(
        new PrintStream(out, true, StandardCharsets.UTF_8),
        new PrintStream(err, true, StandardCharsets.UTF_8),
        terminal);
  }

  /** A console exists without a terminal from JDK 22 on, where it can be asked. */
  @SuppressWarnings("SystemConsoleNull")
  private static boolean isTerminal() {
    java.io.Console console = System.console();
    if (console == null) {
      return false;
    }
    try {
      Method asks = java.io.Console.class.getMethod("isTerminal");
      return Boolean.TRUE.equals(asks.invoke(console));
    } catch (NoSuchMethodException e) {
      return true;
    } catch (ReflectiveOperationException e) {
      return false;
    }
  }
}
