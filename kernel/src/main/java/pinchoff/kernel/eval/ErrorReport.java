package pinchoff.kernel.eval;

import java.util.ArrayList;
import java.util.Collections;
import java.util.IdentityHashMap;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.jspecify.annotations.Nullable;

/** Writes for the reader of a cell what went wrong and where. */
final class ErrorReport {
  private static final int MAX_CELL_FRAMES = 12;
  private static final int MAX_LIBRARY_FRAMES = 6;
  private static final int MAX_CAUSES = 8;
  private static final int MAX_PROBLEMS = 20;

  private final FrameMap frames;

  ErrorReport(FrameMap frames) {
    this.frames = frames;
  }

  /** The report on a cell that does not compile: all errors of a unit. */
  static CellOutcome.Failure ofProblems(List<CompileProblem> errors) {
    List<String> lines = new ArrayList<>();
    CompileProblem first = errors.get(0);
    for (CompileProblem problem : errors.subList(0, Math.min(MAX_PROBLEMS, errors.size()))) {
      CellText.Place place = problem.place();
      lines.add("CompileError: " + problem.message());
      lines.add("at " + place.inWords());
      lines.addAll(place.underlined());
      Hints.on(problem).ifPresent(hint -> lines.add("hint: " + hint));
    }
    if (errors.size() > MAX_PROBLEMS) {
      lines.add("and " + (errors.size() - MAX_PROBLEMS) + " more errors");
    }
    String message = first.message() + " (" + first.place().inWords() + ")";
    return new CellOutcome.Failure("CompileError", message, lines);
  }

  /** The report on an interrupted cell. */
  static CellOutcome.Failure interrupted(String message) {
    return new CellOutcome.Failure("Interrupted", message, List.of("Interrupted: " + message));
  }

  /** The report on an exception that a cell's code threw. */
  CellOutcome.Failure ofThrown(Throwable thrown) {
    List<String> lines = new ArrayList<>();
    Set<Throwable> seen = Collections.newSetFromMap(new IdentityHashMap<>());
    Throwable at = thrown;
    while (at != null && seen.add(at) && seen.size() <= MAX_CAUSES) {
      String prefix = seen.size() == 1 ? "" : "caused by ";
      lines.add(prefix + headline(at));
      lines.addAll(trace(at, seen.size() == 1));
      for (Throwable suppressed : at.getSuppressed()) {
        lines.add("  also: " + headline(suppressed));
      }
      at = at.getCause();
    }
    return new CellOutcome.Failure(nameOf(thrown), messageOf(thrown), lines);
  }

  private static String headline(Throwable thrown) {
    String message = messageOf(thrown);
    return message.isEmpty() ? nameOf(thrown) : nameOf(thrown) + ": " + message;
  }

  private static String nameOf(Throwable thrown) {
    String name = thrown.getClass().getSimpleName();
    return name.isEmpty() ? thrown.getClass().getSuperclass().getSimpleName() : name;
  }

  private static String messageOf(Throwable thrown) {
    try {
      String message = thrown.getLocalizedMessage();
      return message == null ? "" : message;
    } catch (RuntimeException | StackOverflowError e) {
      return "(its message cannot be read: " + e.getClass().getSimpleName() + ")";
    }
  }

  private List<String> trace(Throwable thrown, boolean withSource) {
    List<String> lines = new ArrayList<>();
    StackTraceElement[] trace = traceOf(thrown);
    boolean sourceShown = !withSource;
    int library = 0;
    int cell = 0;
    int left = 0;
    String lastFrame = "";
    @Nullable StackTraceElement inner = null;
    for (StackTraceElement frame : trace) {
      Optional<CellText.Place> place = frames.placeOf(frame);
      if (place.isPresent()) {
        if (cell++ >= MAX_CELL_FRAMES) {
          left++;
        } else {
          CellText.Place precise = CallColumn.refine(place.get(), inner, thrown);
          String line = "at " + precise.inWords() + inMethod(frame);
          if (line.equals(lastFrame)) {
            cell--;
            left++;
          } else {
            lines.add(line);
            lastFrame = line;
          }
          if (!sourceShown) {
            lines.addAll(precise.underlined());
            sourceShown = true;
          }
        }
      } else if (cell == 0 && !isOurs(frame)) {
        if (library++ < MAX_LIBRARY_FRAMES) {
          lines.add("in " + frame);
        }
      }
      inner = frame;
    }
    if (library > MAX_LIBRARY_FRAMES) {
      lines.add(
          MAX_LIBRARY_FRAMES, "in " + (library - MAX_LIBRARY_FRAMES) + " more library frames");
    }
    if (left > 0) {
      lines.add("and " + left + " more frames");
    }
    return lines;
  }

  private static StackTraceElement[] traceOf(Throwable thrown) {
    try {
      StackTraceElement[] trace = thrown.getStackTrace();
      return trace == null ? new StackTraceElement[0] : trace;
    } catch (RuntimeException | StackOverflowError e) {
      return new StackTraceElement[0];
    }
  }

  private static String inMethod(StackTraceElement frame) {
    String method = frame.getMethodName();
    return method.startsWith("do_it$") || method.startsWith("lambda$") ? "" : " in " + method;
  }

  /** Frames of Pinchoff itself, the compiler's engine and reflection say nothing about the cell. */
  private static boolean isOurs(StackTraceElement frame) {
    String type = frame.getClassName();
    return type.startsWith("pinchoff.")
        || type.startsWith("jdk.internal.reflect.")
        || type.startsWith("java.lang.reflect.")
        || (type.equals("java.lang.Thread") && frame.getMethodName().equals("run"))
        || FrameMap.isOfCell(type);
  }
}
