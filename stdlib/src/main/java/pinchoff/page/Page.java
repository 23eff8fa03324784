package pinchoff.page;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Consumer;
import pinchoff.display.Displayable;
import pinchoff.display.MimeBundle;

/**
 * A result as it is shown: a title, blocks, and the values that a rerun compares.
 *
 * @param title the title; may be empty
 * @param blocks what it consists of, in order
 * @param values the canonical values and what they rest on
 */
public record Page(Phrase title, List<Block> blocks, ValuesSheet values) implements Displayable {

  /** Copies the blocks. */
  public Page {
    blocks = List.copyOf(blocks);
  }

  /** A page of these blocks, without title and values. */
  public static Page of(Block... blocks) {
    return new Page(Phrase.plain(""), List.of(blocks), ValuesSheet.EMPTY);
  }

  /** Starts a page with a title. Places and arguments as in {@link Phrase#of}. */
  public static Builder titled(String template, Object... arguments) {
    return new Builder(Phrase.of(template, arguments));
  }

  /** Starts a page without a title. */
  public static Builder untitled() {
    return new Builder(Phrase.plain(""));
  }

  /** The page as plain text of at most 96 columns where its tables allow. */
  public String text() {
    return PlainPage.of(this);
  }

  /** The page as HTML that is complete by itself. */
  public String html() {
    return HtmlPage.of(this);
  }

  /**
   * The page as LaTeX for a document; a picture is given by its alternative text. It needs the
   * packages {@code amsmath}, {@code amssymb} and {@code longtable}.
   */
  public String latex() {
    return LatexPage.of(this);
  }

  /**
   * All forms of the page. A page of one picture without a title is shown as that picture; LaTeX is
   * among the forms only if nothing would be lost by it.
   */
  @Override
  public MimeBundle display() {
    return PageBundle.of(this);
  }

  /** The picture, if the page is one picture and nothing else. */
  Optional<Picture> solePicture() {
    return title.isEmpty()
            && blocks.size() == 1
            && blocks.get(0) instanceof PictureBlock block
            && block.caption().isEmpty()
        ? Optional.of(block.picture())
        : Optional.empty();
  }

  /** The relation, if the page is one relation and nothing else. */
  Optional<Relation> soleRelation() {
    return title.isEmpty() && blocks.size() == 1 && blocks.get(0) instanceof RelationBlock block
        ? Optional.of(block.relation())
        : Optional.empty();
  }

  /** Collects the blocks and values of a page. Sentences are written as in {@link Phrase#of}. */
  public static final class Builder {
    private final Phrase title;
    private final List<Block> blocks = new ArrayList<>();
    private final List<ValuesSheet> sheets = new ArrayList<>();

    private Builder(Phrase title) {
      this.title = title;
    }

    /** Any block. */
    public Builder block(Block block) {
      blocks.add(block);
      return this;
    }

    /** A heading. */
    public Builder heading(String template, Object... arguments) {
      return block(new Heading(Phrase.of(template, arguments)));
    }

    /** A paragraph. */
    public Builder prose(String template, Object... arguments) {
      return block(new Prose(Phrase.of(template, arguments)));
    }

    /** A relation on a line of its own. */
    public Builder relation(Relation relation) {
      return block(new RelationBlock(relation));
    }

    /** A table. */
    public Builder table(Table table) {
      return block(table);
    }

    /** A table. */
    public Builder table(Table.Builder table) {
      return block(table.build());
    }

    /** A picture. */
    public Builder picture(Picture picture) {
      return block(new PictureBlock(picture));
    }

    /** A picture with a sentence below it. */
    public Builder picture(Picture picture, String caption, Object... arguments) {
      return block(new PictureBlock(picture, Phrase.of(caption, arguments)));
    }

    /** The outcome of a check, after the sentence that says what was checked. */
    public Builder verdict(Verdict verdict, String subject, Object... arguments) {
      return block(new VerdictBlock(Phrase.of(subject, arguments), verdict));
    }

    /** A caution. */
    public Builder caution(String template, Object... arguments) {
      return block(new CautionBlock(Phrase.of(template, arguments)));
    }

    /** Lines of text as they are, in letters of equal width. */
    public Builder listing(String text) {
      return block(new Listing(text));
    }

    /** The trust line of what stands above it. */
    public Builder trust(Standing standing, String template, Object... arguments) {
      return block(new TrustLine(standing, Phrase.of(template, arguments)));
    }

    /** Details that are closed at first. */
    public Builder fold(String summary, Consumer<Builder> details) {
      Builder inner = untitled();
      details.accept(inner);
      blocks.add(new Fold(Phrase.plain(summary), inner.blocks));
      sheets.addAll(inner.sheets);
      return this;
    }

    /** Another page's title as a heading, its blocks and its values. */
    public Builder include(Page other) {
      return include("", other);
    }

    /** Another page's title as a heading, its blocks, and its values with a prefix to their ids. */
    public Builder include(String idPrefix, Page other) {
      if (!other.title.isEmpty()) {
        block(new Heading(other.title));
      }
      blocks.addAll(other.blocks);
      return values(other.values.under(idPrefix));
    }

    /** A canonical value. It is compared on a rerun, not shown. */
    public Builder value(Value value) {
      return values(new ValuesSheet(List.of(value), List.of(), List.of(), Optional.empty()));
    }

    /** Canonical values and what they rest on. */
    public Builder values(ValuesSheet more) {
      sheets.add(more);
      return this;
    }

    /** A premise that the values rest on. */
    public Builder premise(ValuesSheet.Premise premise) {
      return values(new ValuesSheet(List.of(), List.of(premise), List.of(), Optional.empty()));
    }

    /** A technology file that the values rest on. */
    public Builder technology(String name, String contentHash) {
      var file = new ValuesSheet.TechnologyFile(name, contentHash);
      return values(new ValuesSheet(List.of(), List.of(), List.of(file), Optional.empty()));
    }

    /** How much of the work was done. */
    public Builder completeness(long done, long of) {
      var completeness = new ValuesSheet.Completeness(done, of);
      return values(new ValuesSheet(List.of(), List.of(), List.of(), Optional.of(completeness)));
    }

    /**
     * The finished page.
     *
     * @throws IllegalArgumentException if two values have the same id
     */
    public Page build() {
      return new Page(title, blocks, ValuesSheet.join(sheets));
    }
  }
}
