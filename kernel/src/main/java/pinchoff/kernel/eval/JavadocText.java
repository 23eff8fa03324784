package pinchoff.kernel.eval;

import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** A documentation comment as plain text. */
final class JavadocText {
  private static final Pattern INLINE = Pattern.compile("\\{@(\\w+)\\s+([^{}]*)\\}");

  private JavadocText() {}

  /** Tags of the comment become words; inline tags and HTML leave their text. */
  static String plain(String comment) {
    String text = comment.replaceAll("(?m)^ ", "");
    Matcher inline = INLINE.matcher(text);
    StringBuilder out = new StringBuilder();
    while (inline.find()) {
      inline.appendReplacement(
          out, Matcher.quoteReplacement(shown(inline.group(1), inline.group(2))));
    }
    inline.appendTail(out);
    return out.toString()
        .replaceAll("(?i)<p>\\s*", "")
        .replaceAll("(?i)<li>\\s*", "- ")
        .replaceAll("</?[a-zA-Z][^<>]*>", "")
        .replace("&lt;", "<")
        .replace("&gt;", ">")
        .replace("&amp;", "&")
        .replaceAll("(?m)^@param\\s+(\\S+)\\s+", "parameter $1: ")
        .replaceAll("(?m)^@return\\s+", "returns ")
        .replaceAll("(?m)^@throws\\s+(\\S+)\\s+", "throws $1 ")
        .replaceAll("(?m)^@(\\w+)\\s+", "$1: ")
        .strip();
  }

  private static String shown(String tag, String body) {
    if (!tag.startsWith("link")) {
      return body;
    }
    String[] parts = body.strip().split("\\s+", 2);
    String target = parts.length > 1 ? parts[1] : parts[0];
    return parts.length > 1 ? target : target.replaceFirst("^#", "").replace('#', '.');
  }
}
