package pinchoff.kernel.run;

import java.util.List;
import pinchoff.kernel.notebook.Output;

/** Hears how a run goes on. Each method does nothing unless it is overridden. */
public interface RunListener {

  /** A listener that ignores everything. */
  RunListener NONE = new RunListener() {};

  /**
   * A cell starts.
   *
   * @param index which of the code cells it is, from 1
   * @param count number of code cells
   */
  default void cellStarts(int index, int count) {}

  /**
   * A cell has had its turn.
   *
   * @param cell how it ended
   * @param outputs what it has shown until now
   */
  default void cellEnded(CellRun cell, List<Output> outputs) {}
}
