package pinchoff.kernel.session;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Deque;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Collectors;
import pinchoff.kernel.protocol.HistoryReply;
import pinchoff.kernel.protocol.HistoryRequest;

/** The inputs of this session with the plain text of their results, oldest first. */
final class History {
  /** The number of this session in replies: there is only this one. */
  private static final int SESSION = 1;

  private final int most;
  private final Deque<Entry> entries = new ArrayDeque<>();

  private record Entry(int line, String input, Optional<String> output) {
    List<Object> toJson(boolean withOutput) {
      return withOutput
          ? Arrays.asList(SESSION, line, Arrays.asList(input, output.orElse(null)))
          : List.of(SESSION, line, input);
    }
  }

  History(int most) {
    this.most = most;
  }

  synchronized void add(int line, String input, Optional<String> output) {
    if (entries.size() == most) {
      entries.removeFirst();
    }
    entries.addLast(new Entry(line, input, output));
  }

  synchronized HistoryReply answer(HistoryRequest asked) {
    List<Entry> found =
        switch (asked.accessType()) {
          case "range" -> range(asked);
          case "search" -> search(asked);
          default -> last(List.copyOf(entries), asked.n());
        };
    return new HistoryReply(
        found.stream().<Object>map(e -> e.toJson(asked.output())).collect(Collectors.toList()));
  }

  private List<Entry> range(HistoryRequest asked) {
    if (asked.session() != 0 && asked.session() != SESSION) {
      return List.of();
    }
    return entries.stream()
        .filter(e -> e.line() >= asked.start() && e.line() < asked.stop())
        .toList();
  }

  private List<Entry> search(HistoryRequest asked) {
    List<Entry> found = new ArrayList<>();
    for (Entry entry : entries) {
      if (Glob.matches(asked.pattern(), entry.input())) {
        found.add(entry);
      }
    }
    return last(asked.unique() ? unique(found) : found, asked.n());
  }

  /** Of equal inputs the newest one, in the place of the newest one. */
  private static List<Entry> unique(List<Entry> found) {
    Map<String, Entry> newest = new LinkedHashMap<>();
    for (Entry entry : found) {
      newest.remove(entry.input());
      newest.put(entry.input(), entry);
    }
    return List.copyOf(newest.values());
  }

  private static List<Entry> last(List<Entry> found, int n) {
    return found.subList(Math.max(0, found.size() - Math.max(0, n)), found.size());
  }
}
