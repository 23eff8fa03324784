package pinchoff.kernel.run;

import java.time.Duration;
import java.util.Optional;

/**
 * How a notebook is run.
 *
 * @param pastErrors true to go on after a cell that fails
 * @param cellLimit how long one cell may take before it is interrupted; empty for no limit
 * @param grace how long an interrupted cell may take to stop before the kernel is killed
 */
public record RunOptions(boolean pastErrors, Optional<Duration> cellLimit, Duration grace) {

  /** Refuses a limit that would let no cell run. */
  public RunOptions {
    cellLimit
        .filter(limit -> limit.isNegative() || limit.isZero())
        .ifPresent(
            limit -> {
              throw new IllegalArgumentException(
                  "time limit of " + limit.toMillis() + " ms: expected more than 0");
            });
  }

  /** Stop at the first failure, no limit of time. */
  public static RunOptions standard() {
    return new RunOptions(false, Optional.empty(), Duration.ofSeconds(5));
  }

  /** These options, going on after a failure or not. */
  public RunOptions withPastErrors(boolean goOn) {
    return new RunOptions(goOn, cellLimit, grace);
  }

  /** These options with a limit for each cell. */
  public RunOptions withCellLimit(Duration limit) {
    return new RunOptions(pastErrors, Optional.of(limit), grace);
  }

  /** These options with another patience after an interrupt. */
  public RunOptions withGrace(Duration patience) {
    return new RunOptions(pastErrors, cellLimit, patience);
  }
}
