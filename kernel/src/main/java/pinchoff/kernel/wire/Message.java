package pinchoff.kernel.wire;

import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * One message of the protocol.
 *
 * @param identities routing frames before the delimiter; on the broadcast channel the topic
 * @param header its header
 * @param parent the header of the message that caused it; empty for none
 * @param metadata its metadata
 * @param content its content
 * @param buffers binary frames after the content
 */
public record Message(
    List<byte[]> identities,
    Header header,
    Map<String, Object> parent,
    Map<String, Object> metadata,
    Map<String, Object> content,
    List<byte[]> buffers) {

  /** Copies the lists of frames. */
  public Message {
    identities = List.copyOf(identities);
    buffers = List.copyOf(buffers);
  }

  /** The id of the message that caused this one, if it names one. */
  public Optional<String> parentId() {
    return parent.get("msg_id") instanceof String id ? Optional.of(id) : Optional.empty();
  }
}
