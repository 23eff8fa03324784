package pinchoff.kernel.eval;

import java.util.Optional;
import pinchoff.display.MimeBundle;

/**
 * Runs the Java of a session's cells. One cell runs at a time; the other methods may be called from
 * any thread, also while a cell runs.
 */
public interface CellEvaluator extends AutoCloseable {

  /**
   * Runs one cell to its end, its first failure or its interrupt. What ran before a failing
   * statement stays, nothing after it is declared.
   *
   * @param cell the cell
   * @param output where everything goes that the cell prints, shows or asks; also afterwards, when
   *     a thread that the cell started goes on printing
   */
  CellOutcome run(Cell cell, CellOutput output);

  /** Evaluates one expression for its value, as the user expressions of a request ask. */
  CellOutcome express(String expression, CellOutput output);

  /** Asks the running cell to stop; does nothing when none runs. Returns at once. */
  void interrupt();

  /** Whether the text can be run as it stands or its author is still typing. */
  Completeness completeness(String code);

  /**
   * What could be typed at a place.
   *
   * @param cursor offset in UTF-16 units
   */
  Completions complete(String code, int cursor);

  /**
   * Help on the name at a place.
   *
   * @param cursor offset in UTF-16 units
   * @param detail 0 for the usual, 1 for more
   */
  Optional<MimeBundle> inspect(String code, int cursor, int detail);

  @Override
  void close();
}
