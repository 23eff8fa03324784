package pinchoff.page;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.StringReader;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import javax.xml.parsers.DocumentBuilderFactory;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.xml.sax.InputSource;
import pinchoff.display.MimeBundle;
import pinchoff.testing.Gen;
import pinchoff.testing.Golden;

/** The forms of a page. */
class PageGoldenTest {

  @Test
  void everyFormIsAsReviewed() {
    Page page = Samples.everything();
    Golden.assertMatches("page/everything.txt", page.text());
    Golden.assertMatches("page/everything.html", page.html());
    Golden.assertMatches("page/everything.tex", page.latex());
    Golden.assertMatches(
        "page/everything.values.txt", String.valueOf(page.display().data().get(MimeBundle.VALUES)));
    Golden.assertMatches("page/sweep.csv", Samples.sweep().csv().replace("\r\n", "\n"));
  }

  static Stream<Relation> relations() {
    return Stream.of(
        Samples.squareLaw(), Samples.overdrive(), Samples.bodyEffect(), Samples.inversion());
  }

  @ParameterizedTest
  @MethodSource("relations")
  void mathMlIsWellFormed(Relation relation) throws Exception {
    String xml = relation.mathMl().replace("&nbsp;", " ");
    DocumentBuilderFactory.newInstance()
        .newDocumentBuilder()
        .parse(new InputSource(new StringReader(xml)));
    long open = relation.latex().chars().filter(c -> c == '{').count();
    assertEquals(open, relation.latex().chars().filter(c -> c == '}').count());
  }

  private static final Pattern TAG = Pattern.compile("<(/?[A-Za-z!?][^>]*)>");

  /** Elements of a page do not depend on its texts, whatever these hold. */
  @Test
  void noTextBecomesMarkup() {
    List<String> plain = tags("plain");
    for (String evil :
        List.of(
            "<script>alert(1)</script>",
            "\"><img src=x onerror=alert(1)>",
            "</style><b>",
            "&lt;b&gt; & ]]>",
            "$x$ \\(y\\) \\input{/etc/passwd}",
            "\u202e\u0000\u0007\u001b[31m",
            "=HYPERLINK(\"x\")")) {
      assertEquals(plain, tags(evil), evil);
    }
    Gen.check(
        "texts",
        300,
        gen -> {
          StringBuilder text = new StringBuilder();
          for (int i = gen.between(1, 20); i > 0; i--) {
            text.append("<>&\"'/=$\\{}#%~^_`x ".charAt(gen.between(0, 18)));
          }
          assertEquals(plain, tags(text.toString()), text.toString());
        });
  }

  private static List<String> tags(String text) {
    String words = text.isBlank() ? "blank" : text;
    Page page =
        Page.titled("{}", words)
            .heading("{}", words)
            .prose("{}", words)
            .table(Table.of(Column.of(words)).row(words).caption("{}", words).note("{}", words))
            .caution("{}", words)
            .verdict(Verdict.holds().saying(words), "{}", words)
            .trust(Standing.EDGE, "{}", words)
            .listing(words)
            .fold("more", inner -> inner.prose("{}", words))
            .build();
    List<String> found = new ArrayList<>();
    Matcher matcher = TAG.matcher(page.html().replaceAll("(?s)<style.*?</style>", ""));
    while (matcher.find()) {
      found.add(matcher.group(1).replaceAll("\\s.*", ""));
    }
    return found;
  }

  @Test
  void aPageLoadsNothingAndRunsNothing() {
    String html = Samples.everything().html();
    for (String part :
        List.of("<script", "http-equiv", "<link", "@import", "url(", "javascript:")) {
      assertFalse(html.contains(part), part);
    }
  }

  @Test
  void formulasOfSpreadsheetsAreDefused() {
    for (String evil : List.of("=1+1", "+1", "-cmd", "@x", "\tx", "＝1")) {
      String csv = Table.of(Column.of("a")).row(evil).build().csv();
      String field = csv.split("\r\n")[1];
      assertTrue(
          field.startsWith("'")
              || field.startsWith("\"'")
              || !"=+-@＝".contains(field.substring(0, 1)),
          csv);
    }
  }

  @Test
  void aVeryLongTableIsCutWithANote() {
    Table.Builder table = Table.of(Column.of("n"));
    for (int i = 0; i < 5000; i++) {
      table.row(i);
    }
    Table built = table.build();
    String html = Page.of(built).html();
    assertTrue(html.contains("more rows"), "no note");
    assertTrue(html.length() < 200_000, () -> html.length() + " characters");
    assertEquals(5001, built.csv().split("\r\n").length, "the file has all rows");
  }
}
