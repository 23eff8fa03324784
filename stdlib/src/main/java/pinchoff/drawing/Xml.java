package pinchoff.drawing;

/** Makes text harmless in XML, between tags and in attributes alike. */
final class Xml {
  private Xml() {}

  static String text(String text) {
    StringBuilder out = new StringBuilder(text.length() + 16);
    text.codePoints()
        .forEach(
            letter -> {
              switch (letter) {
                case '&' -> out.append("&amp;");
                case '<' -> out.append("&lt;");
                case '>' -> out.append("&gt;");
                case '"' -> out.append("&quot;");
                case '\'' -> out.append("&#39;");
                default -> out.appendCodePoint(isAllowed(letter) ? letter : 0xFFFD);
              }
            });
    return out.toString();
  }

  /** True for the characters of XML 1.0, section 2.2, without its discouraged controls. */
  private static boolean isAllowed(int letter) {
    return letter == '\t'
        || letter == '\n'
        || (letter >= 0x20 && letter < 0x7F)
        || (letter >= 0xA0 && letter < 0xD800)
        || (letter >= 0xE000 && letter < 0xFFFE)
        || letter >= 0x10000;
  }
}
