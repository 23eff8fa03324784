package pinchoff.kernel.notebook;

/** How the content of a MIME type is held in a file. */
final class MimeTypes {
  private MimeTypes() {}

  /** Whether the content is a JSON tree, which is never joined or cut. */
  static boolean isJson(String type) {
    return type.equals("application/json")
        || (type.startsWith("application/") && type.endsWith("+json"));
  }

  /** Whether the content is text for a reader, which is cut at its line ends. */
  static boolean isCut(String type) {
    return type.startsWith("text/")
        || type.equals("image/svg+xml")
        || type.equals("application/javascript");
  }
}
