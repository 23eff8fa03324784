package pinchoff.kernel.session;

import java.util.Optional;
import java.util.concurrent.BlockingQueue;
import java.util.concurrent.LinkedBlockingQueue;
import java.util.concurrent.locks.ReentrantLock;
import pinchoff.kernel.protocol.InputReply;
import pinchoff.kernel.protocol.InputRequest;
import pinchoff.kernel.wire.Message;

/** Asks the user of the front end whose cell runs, one question at a time. */
final class Questions {
  private final Outbox outbox;

  /** Replies in the order in which they came; an empty one says that the wait is over. */
  private final BlockingQueue<Optional<Request>> replies = new LinkedBlockingQueue<>();

  private final ReentrantLock oneAtATime = new ReentrantLock(true);

  Questions(Outbox outbox) {
    this.outbox = outbox;
  }

  /** Takes a reply that has come; whether it answers the question that is open shows later. */
  void received(Request reply) {
    replies.add(Optional.of(reply));
  }

  /** Ends the wait for a reply, if somebody waits. */
  void interrupt() {
    replies.add(Optional.empty());
  }

  String ask(Request cell, String prompt, boolean password) throws InterruptedException {
    oneAtATime.lockInterruptibly();
    try {
      replies.clear();
      Message question =
          outbox.messages().reply(cell.message(), new InputRequest(prompt, password));
      if (!outbox.port().ask(question)) {
        throw new IllegalStateException(
            "the front end that runs this cell cannot be asked for input: \"" + prompt + "\"");
      }
      while (true) {
        Request reply =
            replies
                .take()
                .orElseThrow(() -> new InterruptedException("the question was withdrawn"));
        Optional<String> parent = reply.message().parentId();
        boolean ours = parent.isEmpty() || parent.get().equals(question.header().id());
        if (ours && reply.content() instanceof InputReply answer) {
          return answer.value();
        }
      }
    } finally {
      oneAtATime.unlock();
    }
  }
}
