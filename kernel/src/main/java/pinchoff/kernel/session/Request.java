package pinchoff.kernel.session;

import java.util.Map;
import pinchoff.kernel.protocol.Content;
import pinchoff.kernel.protocol.ContentReader;
import pinchoff.kernel.wire.Message;

/**
 * A message from a front end with its content read.
 *
 * @param message the message as received
 * @param content its content
 */
public record Request(Message message, Content content) {

  /**
   * Reads the content of a message.
   *
   * @throws pinchoff.kernel.json.JsonException if a field has a wrong type or is missing
   */
  public static Request of(Message message) {
    return new Request(message, ContentReader.read(message));
  }

  /** Its header, which everything that it causes names as parent. */
  Map<String, Object> header() {
    return message.header().fields();
  }
}
