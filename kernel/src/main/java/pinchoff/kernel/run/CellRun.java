package pinchoff.kernel.run;

import java.util.Optional;
import pinchoff.kernel.protocol.ErrorInfo;

/**
 * How one code cell ended.
 *
 * @param place its place among all cells of the notebook, from 1
 * @param id its id
 * @param ending how it ended
 * @param executionCount the number that the kernel gave it, if it ran
 * @param error what went wrong, if anything did
 */
public record CellRun(
    int place,
    String id,
    Ending ending,
    Optional<Integer> executionCount,
    Optional<ErrorInfo> error) {

  /** The ways in which a cell can end. */
  public enum Ending {
    /** It ran to its end. */
    DONE,
    /** It failed, as its author's tag {@code raises-exception} says it may. */
    FAILED_AS_EXPECTED,
    /** It failed. */
    FAILED,
    /** It took longer than its limit and was stopped. */
    OUT_OF_TIME,
    /** The kernel ended while it ran. */
    KERNEL_GONE,
    /** An earlier cell ended the run. */
    NOT_REACHED,
    /** It is blank. */
    BLANK,
    /** Its author's tag {@code skip-execution} says not to run it; its outputs are as before. */
    SKIPPED;

    /** Whether this is something to tell the user about. */
    public boolean isFinding() {
      return this == FAILED || this == OUT_OF_TIME || this == KERNEL_GONE;
    }
  }

  /** What a reader knows the cell by: its number in brackets if it ran, else its place. */
  public String label() {
    return executionCount
        .map(number -> "cell [" + number + "]")
        .orElse("the cell at place " + place);
  }

  static CellRun of(int place, String id, Ending ending) {
    return new CellRun(place, id, ending, Optional.empty(), Optional.empty());
  }
}
