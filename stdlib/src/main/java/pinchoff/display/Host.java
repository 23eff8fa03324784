package pinchoff.display;

import java.util.Map;
import java.util.Optional;

/**
 * What the code of a cell may ask of the place where it runs. A notebook kernel installs one for
 * its process; the default prints plain text on standard output and knows no session.
 *
 * <p>All methods may be called from any thread.
 */
public interface Host {

  /** The host of this process. */
  static Host current() {
    return CurrentHost.get();
  }

  /**
   * Makes a host the one of this process.
   *
   * @return the host that it replaces
   */
  static Host install(Host host) {
    return CurrentHost.replaceBy(host);
  }

  /**
   * The present value of a variable that the session's cells declared at top level.
   *
   * @return the value, or empty if there is no such variable or it is null
   */
  default Optional<Object> lookup(String name) {
    return Optional.empty();
  }

  /**
   * What is known of a name as it stands in a cell: signature and meaning.
   *
   * @return the help, or empty if nothing is known of it
   */
  default Optional<MimeBundle> help(String name) {
    return Optional.empty();
  }

  /** The names for which {@link #premise} has been asked, in order, separated by blanks. */
  default String premisesRead() {
    return "";
  }

  /**
   * A value given from outside for a premise, as text.
   *
   * @param name the premise's name
   */
  default Optional<String> premise(String name) {
    return Optional.empty();
  }

  /** The technology files that have been read: name to hash of the content, in order. */
  default Map<String, String> technologies() {
    return Map.of();
  }

  /** Shows a result at once, beside whatever value the cell ends with. */
  void publish(MimeBundle bundle);

  /**
   * Shows a result that a later {@link #update} can replace.
   *
   * @param displayId a name for the place, unique in the session
   */
  default void publish(String displayId, MimeBundle bundle) {
    publish(bundle);
  }

  /** Replaces every result that was published under this id. */
  default void update(String displayId, MimeBundle bundle) {}

  /**
   * Shows a long text beside the notebook, in the pager of the front end, instead of in the
   * notebook. Where there is no pager it is published.
   */
  default void page(MimeBundle bundle) {
    publish(bundle);
  }

  /**
   * Removes the cell's outputs so far.
   *
   * @param wait true to remove them only when the next output comes
   */
  default void clear(boolean wait) {}

  /**
   * Asks the user for a line of text.
   *
   * @param prompt what to ask
   * @param password true to hide what is typed
   * @throws IllegalStateException if nobody can be asked, with the reason
   */
  default String ask(String prompt, boolean password) {
    throw new IllegalStateException("nobody can be asked for input here: \"" + prompt + "\"");
  }

  /**
   * To be called again and again by every loop that can take long: returns at once, or throws when
   * the user has asked to stop.
   */
  default void checkpoint() {}

  /**
   * Notes that a technology file has been read.
   *
   * @param name the file's name as the cell gave it
   * @param contentHash the hash of its content
   */
  default void noteTechnology(String name, String contentHash) {}
}
