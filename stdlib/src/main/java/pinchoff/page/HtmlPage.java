package pinchoff.page;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.stream.Collectors;

/**
 * Sets a page as HTML that is complete by itself: the style stands in it, pictures are part of it.
 *
 * <p>Front ends set formulas between dollar signs wherever they find them; two class names ask them
 * not to do so here.
 */
final class HtmlPage {
  private static final String STYLE = "<style>" + styleSheet() + "</style>";

  private final StringBuilder out = new StringBuilder();

  private HtmlPage() {}

  static String of(Page page) {
    HtmlPage html = new HtmlPage();
    html.out.append("<div class=\"pinchoff-page tex2jax_ignore mathjax_ignore\">").append(STYLE);
    if (!page.title().isEmpty()) {
      html.line("p class=\"pinchoff-title\"", "<b>" + HtmlEntries.html(page.title()) + "</b>");
    }
    html.write(page.blocks());
    return html.out.append("</div>").toString();
  }

  /** The style sheet without comments and line ends: it is repeated in every output. */
  private static String styleSheet() {
    try (InputStream in = HtmlPage.class.getResourceAsStream("page.css")) {
      if (in == null) {
        throw new IllegalStateException("the style sheet page.css is missing from the library");
      }
      String css = new String(in.readAllBytes(), StandardCharsets.UTF_8);
      return css.replaceAll("(?s)/\\*.*?\\*/", "")
          .lines()
          .map(String::strip)
          .collect(Collectors.joining());
    } catch (IOException e) {
      throw new UncheckedIOException("the style sheet page.css cannot be read", e);
    }
  }

  private void write(List<Block> blocks) {
    blocks.forEach(this::write);
  }

  private void write(Block block) {
    if (block instanceof Heading heading) {
      line("p class=\"pinchoff-heading\"", "<b>" + HtmlEntries.html(heading.text()) + "</b>");
    } else if (block instanceof Prose prose) {
      line("p", HtmlEntries.html(prose.text()));
    } else if (block instanceof RelationBlock relation) {
      line("div class=\"pinchoff-relation\"", relation.relation().mathMl());
    } else if (block instanceof Table table) {
      line("div class=\"pinchoff-scroll\"", HtmlTable.of(table));
    } else if (block instanceof PictureBlock picture) {
      writePicture(picture);
    } else if (block instanceof VerdictBlock verdict) {
      writeVerdict(verdict);
    } else if (block instanceof CautionBlock caution) {
      line(
          "div class=\"pinchoff-caution\" role=\"note\"",
          "<b>Caution:</b> " + HtmlEntries.html(caution.text()));
    } else if (block instanceof Listing listing) {
      line("pre class=\"pinchoff-listing\"", Escape.html(listing.text()));
    } else if (block instanceof TrustLine trust) {
      line(
          "p class=\"pinchoff-trust\"",
          HtmlEntries.sign(trust.standing())
              + " <span>Trust: "
              + HtmlEntries.html(trust.text())
              + "</span>");
    } else if (block instanceof Fold fold) {
      out.append("<details class=\"pinchoff-fold\"><summary>");
      out.append(HtmlEntries.html(fold.summary())).append("</summary>");
      write(fold.blocks());
      out.append("</details>");
    } else {
      throw new IllegalStateException("a block of an unknown kind: " + block.getClass());
    }
  }

  private void writeVerdict(VerdictBlock block) {
    String subject = HtmlEntries.html(block.subject());
    line(
        "p class=\"pinchoff-line\"",
        HtmlEntries.sign(block.verdict().standing())
            + " "
            + (block.subject().isEmpty() ? "" : subject + ": ")
            + Escape.html(block.verdict().statement()));
  }

  private void writePicture(PictureBlock block) {
    Picture picture = block.picture();
    out.append("<figure class=\"pinchoff-figure\"><img src=\"").append(picture.dataUri());
    out.append("\" width=\"").append(picture.width());
    out.append("\" height=\"").append(picture.height());
    out.append("\" alt=\"").append(Escape.html(picture.alternative())).append("\">");
    if (!block.caption().isEmpty()) {
      line("figcaption", HtmlEntries.html(block.caption()));
    }
    out.append("</figure>");
  }

  /** An element with its attributes, and what is in it. */
  private void line(String opening, String content) {
    int end = opening.indexOf(' ');
    out.append('<').append(opening).append('>').append(content);
    out.append("</").append(end < 0 ? opening : opening.substring(0, end)).append('>');
  }
}
