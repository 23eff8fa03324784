package pinchoff.page;

/**
 * A picture.
 *
 * @param picture what to show
 * @param caption a sentence below it; may be empty
 */
public record PictureBlock(Picture picture, Phrase caption) implements Block {

  /** A picture without a caption. */
  public PictureBlock(Picture picture) {
    this(picture, Phrase.plain(""));
  }
}
