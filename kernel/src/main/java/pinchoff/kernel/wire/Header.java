package pinchoff.kernel.wire;

import java.util.LinkedHashMap;
import java.util.Map;
import pinchoff.kernel.json.Fields;

/**
 * The header of a message.
 *
 * @param id id of this message
 * @param session id of the process that sent it
 * @param type message type
 * @param fields the whole header as received or as sent, also fields that are not known here
 */
public record Header(String id, String session, String type, Map<String, Object> fields) {

  /**
   * Reads a header.
   *
   * @throws pinchoff.kernel.json.JsonException if a field is missing or no string
   */
  public static Header read(Map<String, Object> fields) {
    Fields in = Fields.of(fields, "header");
    in.string("username", "");
    in.string("date", "");
    in.string("version", "");
    return new Header(in.string("msg_id"), in.string("session", ""), in.string("msg_type"), fields);
  }

  /** Makes a header with all the fields that the protocol requires. */
  public static Header of(
      String id, String session, String username, String date, String type, String version) {
    Map<String, Object> fields = new LinkedHashMap<>();
    fields.put("msg_id", id);
    fields.put("session", session);
    fields.put("username", username);
    fields.put("date", date);
    fields.put("msg_type", type);
    fields.put("version", version);
    return new Header(id, session, type, fields);
  }
}
