package pinchoff.kernel.cli;

/** Where the process starts. */
public final class Main {
  private Main() {}

  /** Runs one command and ends the process with its exit code. */
  public static void main(String[] args) {
    int code = Pinchoff.run(args, Streams.ofProcess());
    Pinchoff.end(args, code);
  }
}
