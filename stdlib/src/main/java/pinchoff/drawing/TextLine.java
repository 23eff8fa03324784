package pinchoff.drawing;

import java.text.Normalizer;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import pinchoff.page.Symbol;

/**
 * One line of typeset text: runs of upright and slanted letters on the line, below or above it.
 *
 * <p>Text from outside may hold anything: line breaks and tabs become spaces, other control and
 * format characters and lone surrogates become {@code U+FFFD}.
 *
 * @param spans the runs in order
 */
public record TextLine(List<Span> spans) {

  /** No text. */
  public static final TextLine EMPTY = new TextLine(List.of());

  /** A symbol within a text: a single letter with a subscript. */
  private static final Pattern SYMBOL =
      Pattern.compile(
          "(?<![\\p{L}\\p{N}_])(?:\\d{0,3}√?\\p{L}['′]?_[\\p{L}\\p{N}]+(?:,[\\p{L}][\\p{L}\\p{N}]*)*)(?:/\\p{L}_[\\p{L}\\p{N}]+)?(?![\\p{L}\\p{N}_])");

  /** Sums of widths differ by less than this. */
  private static final double ROUNDING = 1e-6;

  /** Where a run stands. */
  public enum Level {
    /** On the line, full size. */
    LINE(0, 1),
    /** Lowered and smaller. */
    SUBSCRIPT(0.2, 0.74),
    /** Raised and smaller. */
    SUPERSCRIPT(-0.36, 0.74);

    private final double drop;
    private final double size;

    Level(double drop, double size) {
      this.drop = drop;
      this.size = size;
    }

    /** How far the run's baseline lies below the line's, in units of the text size. */
    double drop() {
      return drop;
    }

    /** The run's size in units of the text size. */
    double size() {
      return size;
    }
  }

  /**
   * A run of letters of one kind.
   *
   * @param text the letters
   * @param slanted true for the slanted letters of variables
   * @param level where the run stands
   */
  public record Span(String text, boolean slanted, Level level) {

    /** Makes the text harmless. */
    public Span {
      text = harmless(text);
    }

    double width() {
      return level.size() * text.codePoints().mapToDouble(Typeface::advance).sum();
    }
  }

  /** Copies the spans and leaves out empty ones. */
  public TextLine {
    spans = spans.stream().filter(s -> !s.text().isEmpty()).toList();
  }

  /** Upright text, as it is. */
  public static TextLine plain(String text) {
    return new TextLine(List.of(new Span(text, false, Level.LINE)));
  }

  /** A symbol: single letters slanted, subscripts lowered. */
  public static TextLine of(Symbol symbol) {
    List<Span> spans = new ArrayList<>();
    for (Symbol.Atom atom : symbol.atoms()) {
      spans.add(new Span(atom.lead(), false, Level.LINE));
      spans.add(new Span(atom.base(), atom.italic(), Level.LINE));
      spans.add(new Span(atom.primed() ? "′" : "", false, Level.LINE));
      spans.add(new Span(atom.subscript(), false, Level.SUBSCRIPT));
    }
    return new TextLine(spans);
  }

  /** Text in which single letters with a subscript, such as {@code V_GS}, are typeset. */
  public static TextLine of(String text) {
    List<Span> spans = new ArrayList<>();
    Matcher matcher = SYMBOL.matcher(text);
    int from = 0;
    while (matcher.find()) {
      spans.add(new Span(text.substring(from, matcher.start()), false, Level.LINE));
      spans.addAll(of(Symbol.of(matcher.group())).spans());
      from = matcher.end();
    }
    spans.add(new Span(text.substring(from), false, Level.LINE));
    return new TextLine(spans);
  }

  /** A power such as 10⁻⁶ with a raised exponent. */
  public static TextLine power(String base, String exponent) {
    return new TextLine(
        List.of(new Span(base, false, Level.LINE), new Span(exponent, false, Level.SUPERSCRIPT)));
  }

  /** This line followed by another. */
  public TextLine plus(TextLine next) {
    List<Span> all = new ArrayList<>(spans);
    all.addAll(next.spans);
    return new TextLine(all);
  }

  /** This line followed by upright text. */
  public TextLine plus(String next) {
    return plus(plain(next));
  }

  /** True if there is no text. */
  public boolean isEmpty() {
    return spans.isEmpty();
  }

  /**
   * How wide the line is.
   *
   * @param size text size in CSS pixels
   */
  public double width(double size) {
    return size * spans.stream().mapToDouble(Span::width).sum();
  }

  /** This line, or as much of it as fits, with an ellipsis at its end. */
  public TextLine within(double width, double size) {
    if (width(size) <= width + ROUNDING) {
      return this;
    }
    double room = width / size - Typeface.advance('…');
    List<Span> kept = new ArrayList<>();
    for (Span span : spans) {
      int end = 0;
      while (end < span.text().length()) {
        int letter = span.text().codePointAt(end);
        room -= span.level().size() * Typeface.advance(letter);
        if (room < 0) {
          break;
        }
        end += Character.charCount(letter);
      }
      kept.add(new Span(span.text().substring(0, end), span.slanted(), span.level()));
      if (room < 0) {
        break;
      }
    }
    return new TextLine(kept).plus("…");
  }

  /** The letters without their setting. */
  public String text() {
    StringBuilder all = new StringBuilder();
    for (Span span : spans) {
      all.append(
          switch (span.level()) {
            case LINE -> "";
            case SUBSCRIPT -> "_";
            case SUPERSCRIPT -> "^";
          });
      all.append(span.text());
    }
    return all.toString();
  }

  @Override
  public String toString() {
    return text();
  }

  private static String harmless(String text) {
    StringBuilder clean = new StringBuilder();
    Normalizer.normalize(text, Normalizer.Form.NFC)
        .codePoints()
        .forEach(letter -> clean.appendCodePoint(harmless(letter)));
    return clean.toString();
  }

  private static int harmless(int letter) {
    if (letter == '\n' || letter == '\r' || letter == '\t') {
      return ' ';
    }
    return switch (Character.getType(letter)) {
      case Character.CONTROL,
          Character.FORMAT,
          Character.SURROGATE,
          Character.UNASSIGNED,
          Character.PRIVATE_USE ->
          0xFFFD;
      case Character.LINE_SEPARATOR, Character.PARAGRAPH_SEPARATOR -> ' ';
      default -> letter;
    };
  }
}
