package pinchoff.page;

import java.util.HashMap;
import java.util.Locale;
import java.util.Map;
import java.util.function.UnaryOperator;

/**
 * The one place where text becomes part of a document. Each format first makes text {@linkplain
 * #visible visible}, then replaces what means something in the format.
 */
final class Escape {
  /** Longest text that is shown; what is longer is cut, with a note that says so. */
  static final int MAX_SHOWN = 4_000;

  private static final String PLAIN_ESCAPES = "{}_#$%&";
  private static final Map<Character, String> TEXT_COMMANDS =
      commands(
          Map.ofEntries(
              Map.entry('\\', "\\textbackslash{}"),
              Map.entry('~', "\\textasciitilde{}"),
              Map.entry('^', "\\textasciicircum{}"),
              Map.entry('<', "\\textless{}"),
              Map.entry('>', "\\textgreater{}"),
              Map.entry('|', "\\textbar{}"),
              Map.entry('`', "\\textasciigrave{}"),
              Map.entry('"', "\\textquotedbl{}"),
              Map.entry('✓', "\\(\\checkmark\\)"),
              Map.entry('✗', "\\(\\times\\)"),
              Map.entry('≈', "\\(\\approx\\)"),
              Map.entry('≤', "\\(\\le\\)"),
              Map.entry('≥', "\\(\\ge\\)"),
              Map.entry('−', "\\(-\\)"),
              Map.entry('·', "\\(\\cdot\\)"),
              Map.entry('√', "\\(\\surd\\)"),
              Map.entry('×', "\\(\\times\\)"),
              Map.entry('±', "\\(\\pm\\)"),
              Map.entry('°', "\\(^{\\circ}\\)"),
              Map.entry('µ', "\\(\\mu\\)"),
              Map.entry('²', "\\(^{2}\\)"),
              Map.entry('³', "\\(^{3}\\)"),
              Map.entry('\u00a0', "~")),
          letter -> "\\(" + letter + "\\)");
  private static final Map<Character, String> MATH_COMMANDS =
      commands(
          Map.ofEntries(
              Map.entry('\\', "\\backslash "),
              Map.entry('~', "{\\sim}"),
              Map.entry('^', "{\\wedge}"),
              Map.entry('<', "{\\lt}"),
              Map.entry('>', "{\\gt}"),
              Map.entry('\'', "{\\prime}"),
              Map.entry('\u2032', "{\\prime}"),
              Map.entry('µ', "\\mu "),
              Map.entry(' ', "\\ "),
              Map.entry('\u00a0', "\\ ")),
          letter -> letter + " ");

  private Escape() {}

  /** The commands of one mode: its own, the escapes of all modes, and the Greek letters. */
  private static Map<Character, String> commands(
      Map<Character, String> own, UnaryOperator<String> letter) {
    Map<Character, String> all = new HashMap<>(own);
    PLAIN_ESCAPES.chars().forEach(c -> all.put((char) c, "\\" + (char) c));
    Greek.LETTERS.forEach((name, c) -> all.put(c, letter.apply("\\" + name)));
    return Map.copyOf(all);
  }

  /**
   * Replaces what cannot be seen by something that can, so that text does the same in every place:
   * line ends and tabs become spaces, control characters their control pictures (an escape sequence
   * loses its power over a terminal), lone surrogates the replacement character, and marks that
   * reorder or hide text their code point in angle brackets.
   */
  static String visible(String text) {
    int length = text.length();
    return length <= MAX_SHOWN
        ? cleaned(text)
        : cleaned(text.substring(0, MAX_SHOWN)) + "… (" + length + " characters)";
  }

  /** As {@link #visible}, but in full, for programs that compare it. */
  static String cleaned(String text) {
    StringBuilder out = new StringBuilder(text.length() + 16);
    for (int i = 0; i < text.length(); ) {
      int c = text.codePointAt(i);
      i += Character.charCount(c);
      appendVisible(out, c);
    }
    return out.toString();
  }

  private static void appendVisible(StringBuilder out, int c) {
    if (c == '\n' || c == '\t' || c == '\r') {
      out.append(' ');
    } else if (c < 0x20) {
      out.append((char) (0x2400 + c));
    } else if (c == 0x7f) {
      out.append('\u2421');
    } else if (c <= 0x7e) {
      out.append((char) c);
    } else if (c < 0xa0 || isNoCharacter(c)) {
      out.append('\ufffd');
    } else if (isHidden(c)) {
      out.append("⟨U+").append(String.format(Locale.ROOT, "%04X", c)).append('⟩');
    } else {
      out.appendCodePoint(c);
    }
  }

  private static boolean isNoCharacter(int c) {
    return (c >= 0xd800 && c <= 0xdfff) || (c & 0xfffe) == 0xfffe || (c >= 0xfdd0 && c <= 0xfdef);
  }

  /**
   * Marks that act without being seen; the joiners that some scripts cannot do without may stay.
   */
  private static boolean isHidden(int c) {
    if (c == 0x200c || c == 0x200d) {
      return false;
    }
    int type = Character.getType(c);
    return type == Character.FORMAT
        || type == Character.LINE_SEPARATOR
        || type == Character.PARAGRAPH_SEPARATOR;
  }

  /** For the text and the attributes of HTML and MathML. */
  static String html(String text) {
    String visible = visible(text);
    StringBuilder out = new StringBuilder(visible.length() + 16);
    for (int i = 0; i < visible.length(); i++) {
      char c = visible.charAt(i);
      switch (c) {
        case '&' -> out.append("&amp;");
        case '<' -> out.append("&lt;");
        case '>' -> out.append("&gt;");
        case '"' -> out.append("&quot;");
        case '\'' -> out.append("&#39;");
        default -> out.append(c);
      }
    }
    return out.toString();
  }

  /** For LaTeX outside formulas. */
  static String latex(String text) {
    return replaced(text, TEXT_COMMANDS);
  }

  /** For LaTeX inside formulas, in an upright group or alone. */
  static String latexMath(String text) {
    return replaced(text, MATH_COMMANDS);
  }

  private static String replaced(String text, Map<Character, String> commands) {
    String visible = visible(text);
    StringBuilder out = new StringBuilder(visible.length() + 16);
    for (int i = 0; i < visible.length(); i++) {
      char c = visible.charAt(i);
      String command = commands.get(c);
      if (command == null) {
        out.append(c);
      } else {
        out.append(command);
      }
    }
    return out.toString();
  }

  /** One field of a CSV line, see {@link Table#csv}. */
  static String csv(String text) {
    String visible = visible(text);
    String safe = !visible.isEmpty() && isFormulaStart(visible.charAt(0)) ? "'" + visible : visible;
    boolean quoted = safe.indexOf(',') >= 0 || safe.indexOf('"') >= 0;
    return quoted ? '"' + safe.replace("\"", "\"\"") + '"' : safe;
  }

  private static boolean isFormulaStart(char c) {
    return "=+-@＝＋－＠".indexOf(c) >= 0;
  }
}
