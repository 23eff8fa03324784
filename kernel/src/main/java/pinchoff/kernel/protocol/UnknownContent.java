package pinchoff.kernel.protocol;

import java.util.Map;

/**
 * A message of a type that is not known here.
 *
 * @param type its type
 * @param fields its content
 */
public record UnknownContent(String type, Map<String, Object> fields) implements Content {
  @Override
  public Map<String, Object> toJson() {
    return fields;
  }
}
