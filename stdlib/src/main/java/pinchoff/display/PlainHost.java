package pinchoff.display;

import java.io.FileDescriptor;
import java.io.FileOutputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;

/** The host of an ordinary program: results are printed as plain text in UTF-8. */
final class PlainHost implements Host {
  private final PrintStream out;

  PlainHost() {
    this(new PrintStream(new FileOutputStream(FileDescriptor.out), true, StandardCharsets.UTF_8));
  }

  PlainHost(PrintStream out) {
    this.out = out;
  }

  @Override
  public void publish(MimeBundle bundle) {
    out.println(bundle.plainText());
  }
}
