package pinchoff.kernel.protocol;

/** Names that both ends agree on. */
public final class Protocol {
  /** The version of the protocol that is spoken here. */
  public static final String VERSION = "5.5";

  /** What a front end sends as the whole input when its user ends the input. */
  public static final String END_OF_INPUT = "\u0004";

  private static final String REQUEST = "_request";

  private Protocol() {}

  /** The reply type of a request type. */
  public static String replyType(String requestType) {
    return requestType.endsWith(REQUEST)
        ? requestType.substring(0, requestType.length() - REQUEST.length()) + "_reply"
        : requestType + "_reply";
  }
}
