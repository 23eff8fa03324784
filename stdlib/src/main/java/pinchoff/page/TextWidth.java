package pinchoff.page;

import java.util.ArrayList;
import java.util.List;

/** How wide text is in a terminal, and how it breaks into lines. */
final class TextWidth {
  private TextWidth() {}

  /** The columns that a text takes: two for wide characters, none for combining ones. */
  static int of(String text) {
    int width = 0;
    for (int i = 0; i < text.length(); ) {
      int c = text.codePointAt(i);
      i += Character.charCount(c);
      width += width(c);
    }
    return width;
  }

  private static int width(int c) {
    if (c < 0x300) {
      return 1;
    }
    int type = Character.getType(c);
    if (type == Character.NON_SPACING_MARK
        || type == Character.ENCLOSING_MARK
        || type == Character.FORMAT) {
      return 0;
    }
    return isWide(c) ? 2 : 1;
  }

  /** The blocks that terminals draw two columns wide: Hangul, CJK, full-width forms, emoji. */
  private static boolean isWide(int c) {
    return (c >= 0x1100 && c <= 0x115f)
        || (c >= 0x2e80 && c <= 0xa4cf && c != 0x303f)
        || (c >= 0xac00 && c <= 0xd7a3)
        || (c >= 0xf900 && c <= 0xfaff)
        || (c >= 0xfe30 && c <= 0xfe6f)
        || (c >= 0xff00 && c <= 0xff60)
        || (c >= 0xffe0 && c <= 0xffe6)
        || (c >= 0x1f300 && c <= 0x1faff)
        || (c >= 0x20000 && c <= 0x3fffd);
  }

  /** The text with spaces after it. */
  static String left(String text, int width) {
    return text + " ".repeat(Math.max(0, width - of(text)));
  }

  /** The text with spaces before it. */
  static String right(String text, int width) {
    return " ".repeat(Math.max(0, width - of(text))) + text;
  }

  /** The text with spaces on both sides. */
  static String centered(String text, int width) {
    int space = Math.max(0, width - of(text));
    return left(" ".repeat(space / 2) + text, width);
  }

  /** Breaks a text at spaces; a word that is too long for a line is cut. */
  static List<String> wrapped(String text, int width) {
    List<String> lines = new ArrayList<>();
    StringBuilder line = new StringBuilder();
    int used = 0;
    for (String word : text.split(" ", -1)) {
      for (String piece : pieces(word, width)) {
        int length = of(piece);
        if (!line.isEmpty() && used + 1 + length > width) {
          lines.add(line.toString());
          line.setLength(0);
          used = 0;
        }
        if (!line.isEmpty()) {
          line.append(' ');
          used++;
        }
        line.append(piece);
        used += length;
      }
    }
    lines.add(line.toString());
    return lines;
  }

  private static List<String> pieces(String word, int width) {
    List<String> pieces = new ArrayList<>();
    int from = 0;
    int used = 0;
    for (int i = 0; i < word.length(); ) {
      int c = word.codePointAt(i);
      int next = i + Character.charCount(c);
      if (used + width(c) > width && i > from) {
        pieces.add(word.substring(from, i));
        from = i;
        used = 0;
      }
      used += width(c);
      i = next;
    }
    pieces.add(word.substring(from));
    return pieces;
  }
}
