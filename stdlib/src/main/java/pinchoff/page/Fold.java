package pinchoff.page;

import java.util.List;

/**
 * Details that are closed at first and open on demand; printed in full, as in plain text.
 *
 * @param summary what it is about
 * @param blocks the details
 */
public record Fold(Phrase summary, List<Block> blocks) implements Block {

  /** Copies the blocks. */
  public Fold {
    blocks = List.copyOf(blocks);
  }
}
