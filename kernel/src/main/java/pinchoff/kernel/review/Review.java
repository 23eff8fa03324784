package pinchoff.kernel.review;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;
import java.util.Set;
import pinchoff.kernel.notebook.CodeCell;
import pinchoff.kernel.notebook.Notebook;
import pinchoff.kernel.run.CellRun;
import pinchoff.kernel.run.NotebookRun;

/**
 * The comparison of a notebook's stored outputs with those of a rerun.
 *
 * @param findings what a reviewer has to know, causes first
 * @param compared how many stored values were found again and compared
 * @param stored how many values were stored
 */
public record Review(List<Finding> findings, int compared, int stored) {

  /** Relative difference that is allowed where a value has no tolerance of its own. */
  public static final double STANDARD = 1e-9;

  /** Copies the list. */
  public Review {
    findings = List.copyOf(findings);
  }

  /** True if everything was reproduced and everything holds. */
  public boolean ok() {
    return findings.isEmpty();
  }

  /** Compares a notebook with its rerun. */
  public static Review of(Notebook before, NotebookRun run) {
    Comparison comparison = new Comparison();
    comparison.cells(run);
    comparison.compare(cells(before), cells(run.notebook()));
    return comparison.result();
  }

  private static Map<String, CellValues> cells(Notebook notebook) {
    Map<String, CellValues> all = new LinkedHashMap<>();
    int place = 0;
    for (var cell : notebook.cells()) {
      if (cell instanceof CodeCell code) {
        place++;
        all.put(code.id(), CellValues.of(code, place));
      }
    }
    return all;
  }

  /** Collects findings. */
  private static final class Comparison {
    private final List<Finding> findings = new ArrayList<>();
    private int compared;
    private int stored;

    Review result() {
      List<Finding> sorted = new ArrayList<>(findings);
      sorted.sort(java.util.Comparator.comparing(Finding::kind).thenComparing(Finding::cell));
      return new Review(sorted, compared, stored);
    }

    private void add(Finding.Kind kind, int cell, String what, String message) {
      findings.add(new Finding(kind, cell, what, message));
    }

    void cells(NotebookRun run) {
      int place = 0;
      for (CellRun cell : run.cells()) {
        place++;
        boolean missed = cell.ending() == CellRun.Ending.NOT_REACHED;
        if (cell.ending().isFinding() || missed) {
          String why =
              missed
                  ? "not reached"
                  : cell.error().map(e -> e.name() + ": " + e.value()).orElse("failed");
          add(Finding.Kind.CELL, place, cell.label(), why);
        }
      }
    }

    void compare(Map<String, CellValues> before, Map<String, CellValues> now) {
      stored = before.values().stream().mapToInt(c -> c.values().size()).sum();
      if (stored == 0) {
        add(
            Finding.Kind.NOTHING,
            0,
            "notebook",
            "the notebook stores no values: run it and save it before it can be reviewed");
      }
      Set<String> files = new LinkedHashSet<>();
      Set<String> premises = new LinkedHashSet<>();
      now.forEach(
          (id, cell) -> {
            CellValues old = before.get(id);
            cell.repeated().forEach(r -> add(Finding.Kind.REPEATED, cell.place(), r, r));
            judge(cell);
            if (old == null || stored == 0) {
              return;
            }
            differences(
                files,
                Finding.Kind.TECHNOLOGY,
                cell.place(),
                old.technologies(),
                cell.technologies());
            differences(
                premises, Finding.Kind.PREMISE, cell.place(), old.premises(), cell.premises());
            values(old, cell);
            if (!old.printed().equals(cell.printed())) {
              add(Finding.Kind.TEXT, cell.place(), "stdout", "it prints something else");
            }
          });
    }

    private void differences(
        Set<String> told,
        Finding.Kind kind,
        int place,
        Map<String, String> old,
        Map<String, String> now) {
      now.forEach(
          (name, value) -> {
            String was = old.get(name);
            if (was != null && !was.equals(value) && told.add(name)) {
              add(kind, place, name, name + " was " + was + ", is " + value);
            }
          });
    }

    private void values(CellValues old, CellValues now) {
      old.values()
          .forEach(
              (id, was) -> {
                StoredValue is = now.values().get(id);
                if (is == null) {
                  add(Finding.Kind.GONE, now.place(), id, was.name() + " is not there any more");
                } else {
                  compared++;
                  value(now.place(), was, is);
                }
              });
      now.values()
          .forEach(
              (id, is) -> {
                if (!old.values().containsKey(id)) {
                  add(Finding.Kind.ADDED, now.place(), id, is.name() + " was not there before");
                }
              });
    }

    private void value(int place, StoredValue was, StoredValue is) {
      if (!was.promise().equals(is.promise()) || !was.relation().equals(is.relation())) {
        add(
            Finding.Kind.PROMISE,
            place,
            is.id(),
            is.name() + ": its formula, limits or tolerance are not those that are stored");
      }
      if (!was.unit().equals(is.unit())) {
        add(
            Finding.Kind.MOVED,
            place,
            is.id(),
            "%s was in %s, is in %s".formatted(is.name(), was.unit(), is.unit()));
      } else if (was.number().isPresent() && is.number().isPresent()) {
        number(place, was, is, was.number().get(), is.number().get());
      } else if (!was.words().equals(is.words())
          || was.number().isPresent() != is.number().isPresent()) {
        add(
            Finding.Kind.MOVED,
            place,
            is.id(),
            "%s was \"%s\", is \"%s\""
                .formatted(
                    is.name(), was.words().orElse("a number"), is.words().orElse("a number")));
      }
      if (!was.standing().equals(is.standing())) {
        add(
            Finding.Kind.VERDICT,
            place,
            is.id(),
            "%s was \"%s\", is \"%s\""
                .formatted(
                    is.name(),
                    was.standing().orElse("not judged"),
                    is.standing().orElse("not judged")));
      }
    }

    private void number(int place, StoredValue was, StoredValue is, double old, double now) {
      double allowed = was.allowed(old, STANDARD);
      double off = Math.abs(now - old);
      if (off <= allowed) {
        return;
      }
      String share =
          old == 0
              ? ""
              : String.format(Locale.ROOT, ", %+.3g %%", 100 * (now - old) / Math.abs(old));
      String times =
          was.hasTolerance() && allowed > 0
              ? String.format(Locale.ROOT, ", %.3g times its tolerance", off / allowed)
              : "";
      add(
          Finding.Kind.MOVED,
          place,
          is.id(),
          "%s was %s %s, is %s %s%s%s"
              .formatted(is.name(), shown(old), was.unit(), shown(now), is.unit(), share, times));
    }

    private static String shown(double value) {
      return String.format(Locale.ROOT, "%.6g", value);
    }

    /** Specs and checks of the rerun that do not hold, stored or not. */
    private void judge(CellValues cell) {
      for (StoredValue value : cell.values().values()) {
        Optional<String> standing = value.standing();
        boolean promises = Set.of("spec", "verdict").contains(value.kind());
        if (promises && standing.isPresent() && Objects.equals(standing.get(), "fails")) {
          add(Finding.Kind.BROKEN, cell.place(), value.id(), value.name());
        }
      }
    }
  }
}
