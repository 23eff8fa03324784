package pinchoff.page;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.concurrent.atomic.AtomicLong;
import java.util.function.LongSupplier;
import java.util.stream.Collectors;
import pinchoff.display.Host;
import pinchoff.display.MimeBundle;

/**
 * Shows how far a long calculation is: one display that is updated in place, at most ten times a
 * second, with the time that is left.
 *
 * <pre>{@code
 * try (var p = Progress.of("corners", 27)) {
 *   for (var corner : corners) {
 *     solve(corner);
 *     p.step();
 *   }
 * }
 * }</pre>
 *
 * <p>Each step is also a place where the calculation can be stopped: it calls {@link
 * Host#checkpoint()}. What stays on the page in the end says no time, so that a rerun leaves the
 * same text. Safe for use by several threads.
 */
public final class Progress implements AutoCloseable {
  private static final long PERIOD_NANOS = 100_000_000;
  private static final AtomicLong IDS = new AtomicLong();

  private final String name;
  private final long total;
  private final Board board;
  private final long begin;
  private long done;
  private boolean closed;

  /** The display that a calculation shares with its parts. */
  private static final class Board {
    private final Host host;
    private final String displayId;
    private final LongSupplier nanoTime;
    private final List<Progress> lines = new ArrayList<>();
    private boolean published;
    private long last;

    Board(Host host, String displayId, LongSupplier nanoTime) {
      this.host = host;
      this.displayId = displayId;
      this.nanoTime = nanoTime;
    }

    /** Shows the present state; unless it must, not so soon after the last one. */
    void show(boolean must) {
      long time = nanoTime.getAsLong();
      if (published && !must && time - last < PERIOD_NANOS) {
        return;
      }
      last = time;
      MimeBundle bundle =
          MimeBundle.builder(
                  lines.stream().map(line -> line.text(time)).collect(Collectors.joining("\n")))
              .with(
                  MimeBundle.HTML,
                  lines.stream().map(line -> line.html(time)).collect(Collectors.joining()))
              .build();
      if (published) {
        host.update(displayId, bundle);
      } else {
        published = true;
        host.publish(displayId, bundle);
      }
    }
  }

  private Progress(String name, long total, Board board) {
    this.name = name;
    this.total = total;
    this.board = board;
    this.begin = board.nanoTime.getAsLong();
  }

  private Progress started() {
    synchronized (board) {
      board.lines.add(this);
      board.show(true);
    }
    return this;
  }

  /**
   * A calculation of a known number of steps.
   *
   * @param name what is calculated
   * @param total number of steps, at least 1
   */
  public static Progress of(String name, long total) {
    return of(name, total, Host.current(), System::nanoTime);
  }

  /** A calculation whose number of steps is not known. */
  public static Progress of(String name) {
    return new Progress(name, 0, newBoard(Host.current(), System::nanoTime)).started();
  }

  static Progress of(String name, long total, Host host, LongSupplier nanoTime) {
    if (total < 1) {
      throw new IllegalArgumentException(
          "progress of \"" + name + "\" in " + total + " steps: expected at least 1");
    }
    return new Progress(name, total, newBoard(host, nanoTime)).started();
  }

  private static Board newBoard(Host host, LongSupplier nanoTime) {
    return new Board(host, "pinchoff-progress-" + IDS.incrementAndGet(), nanoTime);
  }

  /** A part of this calculation with steps of its own, shown on a line below while it runs. */
  public Progress part(String partName, long steps) {
    return new Progress(partName, Math.max(1, steps), board).started();
  }

  /** One more step is done. */
  public void step() {
    step(1);
  }

  /**
   * More steps are done.
   *
   * @param steps how many, not negative
   */
  public void step(long steps) {
    if (steps < 0) {
      throw new IllegalArgumentException("progress of \"" + name + "\" by " + steps + " steps");
    }
    synchronized (board) {
      done += steps;
      board.show(false);
    }
    board.host.checkpoint();
  }

  /** The number of steps done. */
  public long done() {
    synchronized (board) {
      return done;
    }
  }

  /** Ends this calculation; what was done stays on the page. The line of a part goes away. */
  @Override
  public void close() {
    synchronized (board) {
      if (closed) {
        return;
      }
      closed = true;
      if (board.lines.get(0) != this) {
        board.lines.remove(this);
      }
      board.show(true);
    }
  }

  private String text(long time) {
    String count =
        total > 0
            ? String.format(Locale.ROOT, "%d of %d (%d %%)", done, total, percent())
            : done + " done";
    return Escape.visible(name) + ": " + count + left(time).map(s -> ", " + s + " left").orElse("");
  }

  private String html(long time) {
    String bar =
        total > 0
            ? "<span style=\"display:inline-block;width:12em;height:.55em;border:1px solid;"
                + "margin:0 .8em;vertical-align:middle\"><span style=\"display:block;height:100%;width:"
                + percent()
                + "%;background:currentColor\"></span></span>"
            : " ";
    return "<div style=\"font-variant-numeric:tabular-nums\">"
        + Escape.html(name)
        + bar
        + (total > 0 ? done + " of " + total : done + " done")
        + left(time).map(s -> " · " + s + " left").orElse("")
        + "</div>";
  }

  private long percent() {
    return Math.min(100, Math.round(100.0 * done / total));
  }

  /** How long the rest will take at the speed so far; nothing at the start and at the end. */
  private Optional<String> left(long time) {
    if (closed || total == 0 || done == 0 || done >= total) {
      return Optional.empty();
    }
    double seconds = (time - begin) * 1e-9 * (total - done) / done;
    if (seconds < 90) {
      return Optional.of(Math.max(1, Math.round(seconds)) + " s");
    }
    return Optional.of(
        seconds < 5400 ? Math.round(seconds / 60) + " min" : Math.round(seconds / 3600) + " h");
  }
}
