package pinchoff.page;

import java.util.List;
import java.util.Optional;
import pinchoff.display.MimeBundle;

/** Gathers the forms of a page. */
final class PageBundle {
  private PageBundle() {}

  static MimeBundle of(Page page) {
    MimeBundle.Builder bundle = MimeBundle.builder(page.text());
    Optional<Picture> picture = page.solePicture();
    if (picture.isPresent()) {
      addPicture(bundle, picture.get());
    } else {
      bundle.with(MimeBundle.HTML, page.html());
      if (!hasPicture(page.blocks())) {
        bundle.with(MimeBundle.LATEX, page.latex());
      }
    }
    if (!page.values().isEmpty()) {
      bundle.withJson(MimeBundle.VALUES, page.values().json());
    }
    return bundle.build();
  }

  private static void addPicture(MimeBundle.Builder bundle, Picture picture) {
    if (picture.type().equals(MimeBundle.PNG)) {
      bundle.withPng(picture.bytes(), picture.width(), picture.height());
    } else {
      bundle.with(MimeBundle.SVG, picture.svgText());
    }
  }

  /** LaTeX in a notebook cannot hold a picture: those who prefer LaTeX must not lose it. */
  private static boolean hasPicture(List<Block> blocks) {
    return blocks.stream()
        .anyMatch(
            block ->
                block instanceof PictureBlock
                    || (block instanceof Fold fold && hasPicture(fold.blocks())));
  }
}
