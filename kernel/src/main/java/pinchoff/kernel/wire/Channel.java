package pinchoff.kernel.wire;

import java.util.Locale;

/** The five channels between a front end and a kernel. */
public enum Channel {
  /** Requests in order, and their replies. */
  SHELL("shell_port"),
  /** Broadcasts to every front end. */
  IOPUB("iopub_port"),
  /** Questions of the kernel to the user. */
  STDIN("stdin_port"),
  /** Requests that are served while a cell runs. */
  CONTROL("control_port"),
  /** Echo that shows the process to be alive. */
  HEARTBEAT("hb_port");

  private final String portKey;

  Channel(String portKey) {
    this.portKey = portKey;
  }

  /** The key of its port in a connection file. */
  public String portKey() {
    return portKey;
  }

  /** The name in lower case, for messages. */
  public String label() {
    return name().toLowerCase(Locale.ROOT);
  }
}
