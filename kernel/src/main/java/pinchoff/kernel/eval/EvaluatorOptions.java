package pinchoff.kernel.eval;

import java.util.Map;
import java.util.function.Consumer;

/**
 * What an evaluator is created with.
 *
 * @param classPath where the compiler finds the classes that cells may use
 * @param premises values given from outside for premises, by name
 * @param log takes lines for those who run the kernel, not for its users
 */
public record EvaluatorOptions(
    String classPath, Map<String, String> premises, Consumer<String> log) {

  /** Copies the premises. */
  public EvaluatorOptions {
    premises = Map.copyOf(premises);
  }

  /** The application's own class path, no premises, and a log that nobody reads. */
  public static EvaluatorOptions standard() {
    return new EvaluatorOptions(System.getProperty("java.class.path", ""), Map.of(), line -> {});
  }

  /** The same with these premises. */
  public EvaluatorOptions withPremises(Map<String, String> newPremises) {
    return new EvaluatorOptions(classPath, newPremises, log);
  }

  /** The same with this log. */
  public EvaluatorOptions withLog(Consumer<String> newLog) {
    return new EvaluatorOptions(classPath, premises, newLog);
  }
}
