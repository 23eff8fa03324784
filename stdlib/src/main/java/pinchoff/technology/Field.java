package pinchoff.technology;

import java.util.Optional;
import pinchoff.page.Symbol;

/**
 * A key of the format and what it means.
 *
 * @param key how the file spells it
 * @param shape what may stand there
 * @param required true if it must be there
 * @param symbol how the trade writes it, if it has a symbol
 * @param meaning what it is, in one phrase
 */
record Field(String key, Shape shape, boolean required, Optional<Symbol> symbol, String meaning) {

  static Field of(String key, Shape shape, String meaning) {
    return new Field(key, shape, false, Optional.empty(), meaning);
  }

  static Field of(String key, String symbol, Shape shape, String meaning) {
    return new Field(key, shape, false, Optional.of(Symbol.of(symbol)), meaning);
  }

  /** The same key, which must be there. */
  Field must() {
    return new Field(key, shape, true, symbol, meaning);
  }
}
