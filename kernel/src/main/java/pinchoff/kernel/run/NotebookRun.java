package pinchoff.kernel.run;

import java.util.List;
import java.util.Set;
import pinchoff.kernel.notebook.Notebook;

/**
 * A notebook after a run.
 *
 * @param notebook the notebook with the outputs of this run
 * @param cells how each code cell ended, in order
 * @param premisesRead the premises that cells have asked for
 */
public record NotebookRun(Notebook notebook, List<CellRun> cells, Set<String> premisesRead) {

  /** Copies the collections. */
  public NotebookRun {
    cells = List.copyOf(cells);
    premisesRead = Set.copyOf(premisesRead);
  }

  /** The cells that failed, ran out of time or lost their kernel. */
  public List<CellRun> findings() {
    return cells.stream().filter(cell -> cell.ending().isFinding()).toList();
  }

  /** Whether nothing failed that was not expected to. */
  public boolean ok() {
    return findings().isEmpty();
  }

  /** Whether every cell had its turn. */
  public boolean reachedEnd() {
    return cells.stream()
        .noneMatch(
            cell ->
                cell.ending() == CellRun.Ending.NOT_REACHED
                    || cell.ending() == CellRun.Ending.KERNEL_GONE);
  }

  /** How many cells ran, to whatever end. */
  public int ran() {
    return (int) cells.stream().filter(cell -> cell.executionCount().isPresent()).count();
  }
}
