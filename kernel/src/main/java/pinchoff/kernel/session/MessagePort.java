package pinchoff.kernel.session;

import java.util.List;
import pinchoff.kernel.wire.Channel;
import pinchoff.kernel.wire.Message;

/** Where a session's messages leave, and what it must know of those that wait. */
public interface MessagePort {

  /** Sends a message; messages of one channel keep their order. Any thread may. */
  void send(Channel channel, Message message);

  /**
   * Sends a question on the stdin channel.
   *
   * @return whether there is a front end to receive it
   */
  boolean ask(Message question) throws InterruptedException;

  /** Takes away the shell requests that have already arrived and wait, in order. */
  List<Request> takeWaiting();
}
