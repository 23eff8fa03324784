package pinchoff.technology;

import java.util.Optional;
import pinchoff.quantity.Dimension;
import pinchoff.quantity.Quantity;

/** The values below one path of a document, by their keys there. */
record Section(Document document, String path) {

  /** A section of this section. */
  Section in(String key) {
    return new Section(document, path(key));
  }

  String path(String key) {
    return DocumentReader.below(path, key);
  }

  /** True if the file states anything here. */
  boolean isStated() {
    return document.has(path);
  }

  Optional<Quantity> amount(String key) {
    return document.amount(path(key));
  }

  /** A quantity that the format requires. */
  Quantity required(String key) {
    return amount(key)
        .orElseThrow(() -> new IllegalStateException(path(key) + " was checked to be there"));
  }

  /** A quantity, or zero if it is not stated. */
  Quantity orZero(String key, Dimension dimension) {
    return amount(key).orElse(Quantity.ofSi(0, dimension));
  }

  double ratio(String key) {
    return required(key).ratio();
  }

  String words(String key) {
    return document.words(path(key)).orElse("");
  }
}
