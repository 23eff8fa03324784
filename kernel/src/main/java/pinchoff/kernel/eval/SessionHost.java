package pinchoff.kernel.eval;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.function.Function;
import java.util.regex.Pattern;
import pinchoff.display.Host;
import pinchoff.display.MimeBundle;

/** What the code of cells may ask of their session. */
final class SessionHost implements Host {
  private static final Pattern NAME = Pattern.compile("[\\p{L}_$][\\p{L}\\p{N}_$.]{0,199}");

  private final SessionVariables variables;
  private final Map<String, String> premises;
  private final Set<String> premisesRead = Collections.synchronizedSet(new LinkedHashSet<>());
  private final Function<String, Optional<MimeBundle>> help;
  private final Map<String, String> technologies =
      Collections.synchronizedMap(new LinkedHashMap<>());

  /**
   * The host of a session.
   *
   * @param help what is known of a name
   */
  SessionHost(
      SessionVariables variables,
      Map<String, String> premises,
      Function<String, Optional<MimeBundle>> help) {
    this.variables = variables;
    this.help = help;
    this.premises = Map.copyOf(premises);
  }

  /** The technology files that cells have read: name to hash of the content. */
  @Override
  public Map<String, String> technologies() {
    synchronized (technologies) {
      return Collections.unmodifiableMap(new LinkedHashMap<>(technologies));
    }
  }

  @Override
  public Optional<Object> lookup(String name) {
    return variables.value(name);
  }

  @Override
  public Optional<MimeBundle> help(String name) {
    return NAME.matcher(name).matches() ? help.apply(name) : Optional.empty();
  }

  @Override
  public Optional<String> premise(String name) {
    premisesRead.add(name);
    return Optional.ofNullable(premises.get(name));
  }

  @Override
  public String premisesRead() {
    synchronized (premisesRead) {
      return String.join(" ", premisesRead);
    }
  }

  @Override
  public void publish(MimeBundle bundle) {
    output().ifPresent(output -> output.publish(Optional.empty(), bundle));
    checkpoint();
  }

  @Override
  public void publish(String displayId, MimeBundle bundle) {
    output().ifPresent(output -> output.publish(Optional.of(displayId), bundle));
    checkpoint();
  }

  @Override
  public void page(MimeBundle bundle) {
    output().ifPresent(output -> output.page(bundle));
    checkpoint();
  }

  @Override
  public void update(String displayId, MimeBundle bundle) {
    output().ifPresent(output -> output.update(displayId, bundle));
    checkpoint();
  }

  @Override
  public void clear(boolean wait) {
    output().ifPresent(output -> output.clear(wait));
  }

  @Override
  public String ask(String prompt, boolean password) {
    CellScope scope =
        CellScope.current()
            .or(CellScope::latest)
            .orElseThrow(() -> new IllegalStateException("no cell has run: nobody can be asked"));
    return ask(scope, prompt, password);
  }

  /** Asks the user of a cell. An interrupt while waiting ends the cell. */
  static String ask(CellScope scope, String prompt, boolean password) {
    try {
      return scope.output().ask(prompt, password);
    } catch (InterruptedException e) {
      CellGuard.check();
      Thread.currentThread().interrupt();
      throw new IllegalStateException("the question \"" + prompt + "\" was interrupted", e);
    }
  }

  @Override
  public void checkpoint() {
    CellGuard.check();
  }

  @Override
  public void noteTechnology(String name, String contentHash) {
    technologies.put(name, contentHash);
  }

  private static Optional<CellOutput> output() {
    return CellScope.current().or(CellScope::latest).map(CellScope::output);
  }
}
