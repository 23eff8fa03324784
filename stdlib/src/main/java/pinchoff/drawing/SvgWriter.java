package pinchoff.drawing;

import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.zip.CRC32;

/** Writes a scene as SVG 1.1: one path element per path, text as text, two decimals. */
final class SvgWriter {
  private final StringBuilder out = new StringBuilder();
  private final String prefix;
  private int windows;

  private SvgWriter(String prefix) {
    this.prefix = prefix;
  }

  static String write(Scene scene, String alternative) {
    String head =
        "<svg xmlns=\"http://www.w3.org/2000/svg\" width=\"%1$d\" height=\"%2$d\" viewBox=\"0 0 %1$d %2$d\" role=\"img\" font-family=\"%3$s\">"
            .formatted(scene.width(), scene.height(), Typeface.FAMILIES);
    String draft = body(scene, "");
    // Identifiers are unique on a page of several pictures, and the same in every run.
    CRC32 sum = new CRC32();
    sum.update(draft.getBytes(StandardCharsets.UTF_8));
    String prefix = "p" + Long.toHexString(sum.getValue()) + "-";
    return head
        + "<title>"
        + Xml.text(scene.title().isEmpty() ? alternative : scene.title())
        + "</title><desc>"
        + Xml.text(alternative)
        + "</desc>"
        + body(scene, prefix)
        + "</svg>";
  }

  private static String body(Scene scene, String prefix) {
    SvgWriter writer = new SvgWriter(prefix);
    writer.out.append("<rect width=\"100%\" height=\"100%\" fill=\"#fff\"/>\n");
    writer.all(scene.elements());
    return writer.out.toString();
  }

  private void all(List<Element> elements) {
    for (Element element : elements) {
      if (element instanceof Element.Shape shape) {
        shape(shape);
      } else if (element instanceof Element.Text text) {
        text(text);
      } else if (element instanceof Element.Clipped clipped) {
        clipped(clipped);
      }
    }
  }

  private void clipped(Element.Clipped clipped) {
    String id = prefix + windows++;
    Rect r = clipped.window();
    out.append("<clipPath id=\"" + id + "\"><rect");
    attribute("x", r.x());
    attribute("y", r.y());
    attribute("width", r.width());
    attribute("height", r.height());
    out.append("/></clipPath><g clip-path=\"url(#" + id + ")\">\n");
    all(clipped.elements());
    out.append("</g>\n");
  }

  private void shape(Element.Shape shape) {
    if (shape.path().isEmpty()) {
      return;
    }
    out.append("<path");
    paint("fill", shape.fill());
    if (shape.fill().isPresent()) {
      out.append(" fill-rule=\"evenodd\"");
    }
    shape.pen().ifPresent(this::pen);
    out.append(" d=\"");
    shape.path().walk(new SvgPath(out));
    out.append("\"/>\n");
  }

  private void pen(Pen pen) {
    paint("stroke", Optional.of(pen.colour()));
    attribute("stroke-width", pen.width());
    out.append(" stroke-linejoin=\"round\"");
    if (!pen.dash().pattern().isEmpty()) {
      out.append(" stroke-dasharray=\"");
      pen.dash().pattern().forEach(length -> out.append(number(length)).append(' '));
      out.setLength(out.length() - 1);
      out.append('"');
    }
  }

  private void paint(String attribute, Optional<Colour> paint) {
    out.append(' ').append(attribute).append("=\"");
    out.append(paint.map(Colour::hex).orElse("none")).append('"');
    paint
        .filter(colour -> colour.opacity() < 1)
        .ifPresent(colour -> attribute(attribute + "-opacity", colour.opacity()));
  }

  private void text(Element.Text text) {
    if (text.line().isEmpty()) {
      return;
    }
    out.append("<text xml:space=\"preserve\"");
    attribute("x", text.x());
    attribute("y", text.y());
    attribute("font-size", text.size());
    paint("fill", Optional.of(text.colour()));
    if (text.anchor() != Element.Anchor.START) {
      out.append(" text-anchor=\"").append(text.anchor().word()).append('"');
    }
    if (text.angle() != 0) {
      out.append(" transform=\"rotate(")
          .append(number(-text.angle()) + " " + number(text.x()) + " " + number(text.y()))
          .append(")\"");
    }
    if (text.halo() > 0) {
      out.append(" stroke=\"#fff\" stroke-linejoin=\"round\" paint-order=\"stroke\"");
      attribute("stroke-width", 2 * text.halo());
    }
    out.append('>');
    double drop = 0;
    for (TextLine.Span span : text.line().spans()) {
      drop = span(span, text.size(), drop);
    }
    out.append("</text>\n");
  }

  /** Writes a run of letters; returns how far below the line the next one begins. */
  private double span(TextLine.Span span, double size, double drop) {
    double target = span.level().drop() * size;
    boolean plain =
        span.level() == TextLine.Level.LINE && !span.slanted() && Math.abs(target - drop) < 1e-9;
    if (plain) {
      out.append(Xml.text(span.text()));
      return drop;
    }
    out.append("<tspan");
    if (Math.abs(target - drop) >= 1e-9) {
      attribute("dy", target - drop);
    }
    if (span.level().size() != 1) {
      attribute("font-size", span.level().size() * size);
    }
    if (span.slanted()) {
      out.append(" font-style=\"italic\"");
    }
    out.append('>').append(Xml.text(span.text())).append("</tspan>");
    return target;
  }

  private void attribute(String name, double value) {
    out.append(' ').append(name).append("=\"").append(number(value)).append('"');
  }

  /** A number with at most two decimals and no needless zeros. */
  static String number(double value) {
    long hundredths = Math.round(value * 100);
    if (hundredths % 100 == 0) {
      return Long.toString(hundredths / 100);
    }
    String text = String.format(Locale.ROOT, "%.2f", hundredths / 100.0);
    return text.endsWith("0") ? text.substring(0, text.length() - 1) : text;
  }
}
