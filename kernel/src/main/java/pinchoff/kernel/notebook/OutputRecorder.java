package pinchoff.kernel.notebook;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * Collects the outputs of a notebook's cells while they run, and turns them into what a file
 * stores. Not safe for use by several threads at once.
 */
public final class OutputRecorder {
  private final Map<String, Page> pages = new HashMap<>();

  /** The place for the outputs of one cell, empty at first. */
  public Page page(String cellId) {
    return pages.computeIfAbsent(cellId, id -> new Page());
  }

  /** What a cell has shown, with all updates until now. */
  public List<Output> outputs(String cellId) {
    return page(cellId).outputs();
  }

  /** Replaces the content of everything that was shown under an id, in any cell. */
  public void update(String displayId, Map<String, Object> data, Map<String, Object> metadata) {
    pages.values().forEach(page -> page.update(displayId, data, metadata));
  }

  /** The outputs of one cell. */
  public static final class Page {
    private final List<Entry> entries = new ArrayList<>();
    private boolean clearBeforeNext;

    private Page() {}

    /** Adds printed text. */
    public void print(String streamName, String text) {
      makeRoom();
      if (!entries.isEmpty()
          && entries.get(entries.size() - 1) instanceof Printed last
          && last.stream.equals(streamName)) {
        last.text.append(text);
      } else {
        entries.add(new Printed(streamName, new StringBuilder(text)));
      }
    }

    /**
     * Adds an output.
     *
     * @param displayId the id under which it can be updated
     */
    public void add(Output output, Optional<String> displayId) {
      makeRoom();
      entries.add(new Shown(output, displayId));
    }

    /**
     * Removes the outputs.
     *
     * @param wait true to keep them until the next output comes
     */
    public void clear(boolean wait) {
      clearBeforeNext = wait;
      if (!wait) {
        entries.clear();
      }
    }

    private void makeRoom() {
      if (clearBeforeNext) {
        clear(false);
      }
    }

    private void update(String id, Map<String, Object> data, Map<String, Object> metadata) {
      entries.replaceAll(
          entry ->
              entry instanceof Shown shown
                      && shown.displayId.filter(id::equals).isPresent()
                      && shown.output instanceof Output.Rich rich
                  ? new Shown(rich.with(data, metadata), shown.displayId)
                  : entry);
    }

    private List<Output> outputs() {
      List<Output> outputs = new ArrayList<>();
      for (Entry entry : entries) {
        Output output = entry.output();
        if (!(output instanceof Output.StreamText stream && stream.text().isEmpty())) {
          outputs.add(output);
        }
      }
      return outputs;
    }
  }

  private sealed interface Entry {
    Output output();
  }

  private record Printed(String stream, StringBuilder text) implements Entry {
    @Override
    public Output output() {
      return new Output.StreamText(stream, TerminalText.settle(text.toString()));
    }
  }

  private record Shown(Output output, Optional<String> displayId) implements Entry {}
}
