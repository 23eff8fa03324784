package pinchoff.kernel.protocol;

import java.nio.charset.StandardCharsets;
import java.time.Clock;
import java.util.List;
import java.util.Map;
import pinchoff.kernel.json.Json;
import pinchoff.kernel.wire.Header;
import pinchoff.kernel.wire.Message;

/** Makes the messages of one process, which has one session id for all its channels. */
public final class MessageFactory {
  private final IdSource ids;
  private final Clock clock;
  private final String session;
  private final String username;

  /**
   * Made once for a process.
   *
   * @param ids ids of messages; the first one becomes the session id
   * @param clock the time in headers
   * @param username whom headers name as the sender
   */
  public MessageFactory(IdSource ids, Clock clock, String username) {
    this.ids = ids;
    this.clock = clock;
    this.session = ids.next();
    this.username = username;
  }

  /** The id of this process in headers. */
  public String session() {
    return session;
  }

  /** A message that no other one caused. */
  public Message request(Content content) {
    return make(List.of(), Map.of(), Map.of(), content);
  }

  /** The reply to a request, to be routed back to its sender. */
  public Message reply(Message request, Content content) {
    return make(request.identities(), request.header().fields(), Map.of(), content);
  }

  /**
   * The reply to a request that took its time.
   *
   * @param started the date at which it was taken up
   */
  public Message reply(Message request, Content content, String started) {
    return make(
        request.identities(), request.header().fields(), Json.object("started", started), content);
  }

  /** A broadcast; its topic is the message type. */
  public Message broadcast(Map<String, Object> parent, Content content) {
    return broadcast(content.type(), parent, content);
  }

  /** A broadcast on a topic. */
  public Message broadcast(String topic, Map<String, Object> parent, Content content) {
    return make(List.of(topic.getBytes(StandardCharsets.UTF_8)), parent, Map.of(), content);
  }

  /** The date now. */
  public String now() {
    return Dates.format(clock.instant());
  }

  private Message make(
      List<byte[]> identities,
      Map<String, Object> parent,
      Map<String, Object> metadata,
      Content content) {
    Header header =
        Header.of(ids.next(), session, username, now(), content.type(), Protocol.VERSION);
    return new Message(identities, header, parent, metadata, content.toJson(), List.of());
  }
}
