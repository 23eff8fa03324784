package pinchoff.kernel.session;

import java.util.Map;
import pinchoff.kernel.protocol.Content;
import pinchoff.kernel.protocol.MessageFactory;
import pinchoff.kernel.wire.Channel;

/** Makes messages and sends them. */
final class Outbox {
  private final MessageFactory messages;
  private final MessagePort port;

  Outbox(MessageFactory messages, MessagePort port) {
    this.messages = messages;
    this.port = port;
  }

  void broadcast(Map<String, Object> parent, Content content) {
    port.send(Channel.IOPUB, messages.broadcast(parent, content));
  }

  void reply(Channel channel, Request request, Content content) {
    port.send(channel, messages.reply(request.message(), content));
  }

  void reply(Channel channel, Request request, Content content, String started) {
    port.send(channel, messages.reply(request.message(), content, started));
  }

  MessageFactory messages() {
    return messages;
  }

  MessagePort port() {
    return port;
  }
}
