package pinchoff.kernel.session;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.CompletableFuture;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.Timeout;
import pinchoff.kernel.eval.CellEvaluator;
import pinchoff.kernel.limits.Limits;
import pinchoff.kernel.protocol.AbortedReply;
import pinchoff.kernel.protocol.CommClose;
import pinchoff.kernel.protocol.CommInfoReply;
import pinchoff.kernel.protocol.CommInfoRequest;
import pinchoff.kernel.protocol.CommMsg;
import pinchoff.kernel.protocol.CommOpen;
import pinchoff.kernel.protocol.CompleteReply;
import pinchoff.kernel.protocol.CompleteRequest;
import pinchoff.kernel.protocol.Content;
import pinchoff.kernel.protocol.ErrorReply;
import pinchoff.kernel.protocol.ExecuteReply;
import pinchoff.kernel.protocol.ExecuteRequest;
import pinchoff.kernel.protocol.ExecuteResult;
import pinchoff.kernel.protocol.HistoryReply;
import pinchoff.kernel.protocol.HistoryRequest;
import pinchoff.kernel.protocol.InputReply;
import pinchoff.kernel.protocol.InputRequest;
import pinchoff.kernel.protocol.InspectReply;
import pinchoff.kernel.protocol.InspectRequest;
import pinchoff.kernel.protocol.InterruptReply;
import pinchoff.kernel.protocol.InterruptRequest;
import pinchoff.kernel.protocol.IsCompleteReply;
import pinchoff.kernel.protocol.IsCompleteRequest;
import pinchoff.kernel.protocol.KernelInfoReply;
import pinchoff.kernel.protocol.KernelInfoRequest;
import pinchoff.kernel.protocol.ShutdownReply;
import pinchoff.kernel.protocol.ShutdownRequest;
import pinchoff.kernel.protocol.Status;
import pinchoff.kernel.protocol.StreamText;
import pinchoff.kernel.protocol.UnknownContent;
import pinchoff.kernel.protocol.UpdateDisplayData;
import pinchoff.kernel.session.Front.Answer;
import pinchoff.kernel.wire.Channel;
import pinchoff.kernel.wire.Message;

/**
 * What a kernel does, whatever carries its messages. The numbers in comments are sections of the
 * messaging protocol's checklist: 4 wire, 5 every request, 6 shell, 7 broadcasts, 8 failures, 9
 * control, 10 kernel information, 11 questions.
 */
@Timeout(120)
public abstract class KernelContract {
  /** Limits small enough to be reached by tests. */
  protected static final Limits LIMITS = Limits.standard().withOutput(10_000, 1000, 2000);

  /** Runs the cells of the present test. */
  protected final FakeEvaluator cells = new FakeEvaluator();

  /** The front end of the present test. */
  protected Front front;

  /** Starts a kernel. */
  protected abstract Front start(CompletableFuture<CellEvaluator> evaluator) throws Exception;

  @BeforeEach
  void startKernel() throws Exception {
    front = start(CompletableFuture.completedFuture(cells));
  }

  @AfterEach
  void endKernel() throws InterruptedException {
    cells.close();
    front.close();
  }

  // 5.1, 5.2, 6: busy, input, outputs, result, reply, idle; all with the request as parent.
  @Test
  void aCellGoesThroughTheWholeSequence() throws InterruptedException {
    Answer answer = front.run("print a", "show b", "value c");
    assertEquals(Status.BUSY, answer.outputs().get(0));
    assertEquals(
        List.of("execute_input", "stream", "display_data", "execute_result"), answer.types());
    assertEquals(Status.IDLE, answer.outputs().get(answer.outputs().size() - 1));
    assertEquals(new ExecuteReply(1, Map.of(), List.of()), answer.reply());
    assertTrue(answer.replyMessage().metadata().containsKey("started"));
    assertEquals(answer.request().header().fields(), answer.replyMessage().parent());
  }

  // 4: header fields are complete, one session for all channels, ids unique, version 5.5.
  @Test
  void headersAreComplete() throws InterruptedException {
    front.run("print a");
    front.ask(Channel.CONTROL, new KernelInfoRequest());
    List<Message> all = front.came().stream().map(Front.Received::message).toList();
    assertEquals(1, all.stream().map(m -> m.header().session()).distinct().count());
    assertEquals(all.size(), all.stream().map(m -> m.header().id()).distinct().count());
    for (Message message : all) {
      assertEquals("5.5", message.header().fields().get("version"));
      assertTrue(
          String.valueOf(message.header().fields().get("date"))
              .matches("\\d{4}-\\d\\d-\\d\\dT\\d\\d:\\d\\d:\\d\\d\\.\\d{6}Z"));
    }
  }

  // 6: the count starts at 1, failed cells count, empty and unstored ones do not.
  @Test
  void countingFollowsTheRules() throws InterruptedException {
    assertEquals(0, count(front.run("").reply()));
    assertEquals(1, count(front.run("value a").reply()));
    assertEquals(2, count(front.run("fail b").reply()));
    ExecuteRequest unstored = new ExecuteRequest("value c", false, false, Map.of(), true, true);
    Answer answer = front.ask(Channel.SHELL, unstored);
    assertEquals(2, count(answer.reply()));
    assertEquals(2, ((ExecuteResult) answer.between().get(1)).executionCount());
    assertEquals(3, count(front.run("value d").reply()));
    assertEquals(3, count(front.run("  \n").reply()));
  }

  // 6: a silent cell broadcasts nothing but its status; its failure aborts nothing (8).
  @Test
  void aSilentCellIsSilent() throws InterruptedException {
    ExecuteRequest silent = new ExecuteRequest("print a\nfail b", true, true, Map.of(), true, true);
    Answer answer = front.ask(Channel.SHELL, silent);
    assertEquals(List.of(), answer.types());
    assertInstanceOf(ErrorReply.class, answer.reply());
    assertEquals(List.of(), history(tail(10)));
    assertEquals(1, count(front.run("value c").reply()));
  }

  // 6: user expressions after a successful run; a bad one does not fail the cell.
  @Test
  @SuppressWarnings("unchecked")
  void userExpressionsAreEvaluated() throws InterruptedException {
    ExecuteRequest asked =
        ExecuteRequest.of("print a").withUserExpressions(Map.of("x", "W", "y", "bad one"));
    ExecuteReply reply = (ExecuteReply) front.ask(Channel.SHELL, asked).reply();
    Map<String, Object> good = (Map<String, Object>) reply.userExpressions().get("x");
    assertEquals("ok", good.get("status"));
    assertEquals(Map.of("text/plain", "<W>"), good.get("data"));
    Map<String, Object> bad = (Map<String, Object>) reply.userExpressions().get("y");
    assertEquals("error", bad.get("status"));
    assertEquals("bad one", bad.get("evalue"));
  }

  // 6: a failing cell broadcasts one error and replies with the count.
  @Test
  void aFailingCellSaysSoOnce() throws InterruptedException {
    Answer answer = front.run("print a", "fail too wide");
    assertEquals(List.of("execute_input", "stream", "error"), answer.types());
    ErrorReply reply = (ErrorReply) answer.reply();
    assertEquals("Planned", reply.error().name());
    assertEquals("too wide", reply.error().value());
    assertEquals(Optional.of(1), reply.executionCount());
  }

  // 5.4: errors inside the kernel become error replies, and the session goes on.
  @Test
  void aBrokenEvaluatorIsReportedNotFatal() throws InterruptedException {
    assertEquals(
        "UnsupportedOperationException", ((ErrorReply) front.run("broken").reply()).error().name());
    assertEquals("StackOverflowError", ((ErrorReply) front.run("overflow").reply()).error().name());
    Content reply = front.ask(Channel.SHELL, new CompleteRequest("broken", 1)).reply();
    assertEquals("IllegalArgumentException", ((ErrorReply) reply).error().name());
    assertInstanceOf(ExecuteReply.class, front.run("value a").reply());
  }

  // 5.1: requests that are not known are busy and idle without a reply.
  @Test
  void anUnknownRequestIsOnlyBusyAndIdle() throws InterruptedException {
    for (Channel channel : List.of(Channel.SHELL, Channel.CONTROL)) {
      Message request = front.send(channel, new UnknownContent("moon_request", Map.of("a", 1)));
      assertEquals(List.of(Status.BUSY, Status.IDLE), front.outputs(request));
    }
    front.run("print a");
    assertTrue(front.came().stream().noneMatch(r -> r.content().type().equals("moon_reply")));
    assertTrue(front.log().stream().anyMatch(line -> line.contains("moon_request")));
  }

  // 7: neighbouring text of one stream comes together; order between kinds of output is kept.
  @Test
  void streamsAreGatheredInOrder() throws InterruptedException {
    Answer answer = front.run("print a", "print b", "err c", "print d", "show e", "print f");
    assertEquals(
        List.of("stdout:a\nb\n", "stderr:c\n", "stdout:d\n", "display_data", "stdout:f\n"),
        answer.between().stream().skip(1).map(KernelContract::shown).toList());
  }

  // 7: a flood of lines becomes few messages, nothing of it is lost.
  @Test
  void manyLinesBecomeFewMessages() throws InterruptedException {
    Answer answer = front.run("repeat 500");
    String text = text(answer);
    assertTrue(text.startsWith("line 0\n") && text.endsWith("line 499\n"));
    assertTrue(answer.between().size() < 60, () -> answer.between().size() + " messages");
  }

  // 7: a large text is split, and what passes the limit of a cell is replaced by one note.
  @Test
  void outputOfACellIsBounded() throws InterruptedException {
    Answer answer = front.run("large 9000", "large 9000", "large 9000");
    String text = text(answer);
    assertEquals(10_000, text.chars().filter(c -> c == 'x').count());
    assertTrue(text.contains("10000 bytes"));
    assertTrue(
        answer.between().stream()
            .allMatch(c -> !(c instanceof StreamText s) || s.text().length() <= 1000));
    assertTrue(text(front.run("large 100")).length() == 100, "the next cell starts afresh");
  }

  // 7: a result that is too large is replaced by a note.
  @Test
  void aHugeDisplayIsReplacedByANote() throws InterruptedException {
    ExecuteResult result = (ExecuteResult) front.run("value " + "x".repeat(3000)).between().get(1);
    assertTrue(String.valueOf(result.data().get("text/plain")).contains("3000 characters"));
  }

  // 7: displays can be replaced by their id, outputs can be removed.
  @Test
  void displaysAreUpdatedAndCleared() throws InterruptedException {
    Answer answer = front.run("display a", "update b", "clear", "show c");
    assertEquals(
        List.of(
            "execute_input", "display_data", "update_display_data", "clear_output", "display_data"),
        answer.types());
    assertEquals(
        new UpdateDisplayData(Map.of("text/plain", "b"), Map.of(), "spot"),
        answer.between().get(2));
  }

  // 7: output of a thread that goes on after idle still belongs to its cell.
  @Test
  void lateOutputKeepsItsCell() throws InterruptedException {
    Answer first = front.run("later tardy");
    front.run("print b");
    cells.gate.countDown();
    Front.Received late =
        front.await(
            "late text", r -> r.content() instanceof StreamText s && s.text().equals("tardy"));
    assertTrue(late.of(first.request()));
  }

  // 8: what waits when a cell fails is aborted; other requests that wait are answered.
  @Test
  void whatWaitsIsAborted() throws InterruptedException {
    Message failing =
        front.send(Channel.SHELL, ExecuteRequest.of("ask go?\nfail a").withStdin(true));
    front.await("a question", r -> r.content() instanceof InputRequest);
    Message second = front.send(Channel.SHELL, ExecuteRequest.of("print never"));
    Message info = front.send(Channel.SHELL, new KernelInfoRequest());
    Message third = front.send(Channel.SHELL, ExecuteRequest.of("print never"));
    // Control and shell come over different sockets; a round trip says that these have arrived.
    front.ask(Channel.CONTROL, new KernelInfoRequest());
    settle();
    front.send(Channel.STDIN, new InputReply("yes"));
    assertInstanceOf(ErrorReply.class, front.finish(failing).reply());
    assertEquals(new AbortedReply("execute_reply"), front.finish(second).reply());
    assertEquals(Map.of("status", "aborted"), front.finish(second).replyMessage().content());
    assertInstanceOf(KernelInfoReply.class, front.finish(info).reply());
    assertEquals(new AbortedReply("execute_reply"), front.finish(third).reply());
    assertEquals(List.of(), front.finish(third).types());
    assertEquals(1, cells.ran.size());
    assertEquals(2, count(front.run("value a").reply()), "aborted cells are not counted");
  }

  // 8: a request sent after the failure was seen must run.
  @Test
  void whatComesAfterAFailureRuns() throws InterruptedException {
    for (int i = 0; i < 20; i++) {
      front.run("fail a");
      assertInstanceOf(ExecuteReply.class, front.run("value b").reply());
    }
  }

  // 8: without stop_on_error nothing is aborted.
  @Test
  void withoutStopOnErrorNothingIsAborted() throws InterruptedException {
    Message failing =
        front.send(
            Channel.SHELL,
            ExecuteRequest.of("ask go?\nfail a").withStdin(true).withStopOnError(false));
    front.await("a question", r -> r.content() instanceof InputRequest);
    Message second = front.send(Channel.SHELL, ExecuteRequest.of("value b"));
    front.send(Channel.STDIN, new InputReply("yes"));
    assertInstanceOf(ErrorReply.class, front.finish(failing).reply());
    assertInstanceOf(ExecuteReply.class, front.finish(second).reply());
  }

  // 6: history by tail, range and search; with outputs; repeats are kept, unique drops them.
  @Test
  void historyIsKept() throws InterruptedException {
    front.run("value one");
    front.run("print two");
    front.run("value one");
    assertEquals(
        List.of(List.of(1L, 2L, "print two"), List.of(1L, 3L, "value one")), history(tail(2)));
    assertEquals(
        List.of(List.of(1L, 1L, "value one")),
        history(new HistoryRequest(false, true, "range", 9, 0, 1, 2, "", false)));
    assertEquals(
        List.of(List.of(1L, 1L, List.of("value one", "one"))),
        history(new HistoryRequest(true, true, "range", 9, 1, 1, 2, "", false)));
    assertEquals(2, history(search("value*", false)).size());
    assertEquals(List.of(List.of(1L, 3L, "value one")), history(search("*o?e", true)));
    assertEquals(List.of(), history(search("value", true)));
  }

  // 6: positions are code points; a replaced range and types come with the matches.
  @Test
  void completionCountsCodePoints() throws InterruptedException {
    String code = "\uD83D\uDE00ab";
    CompleteReply reply =
        (CompleteReply) front.ask(Channel.SHELL, new CompleteRequest(code, 2)).reply();
    assertEquals(List.of("width()"), reply.matches());
    assertEquals(1, reply.cursorStart());
    assertEquals(2, reply.cursorEnd());
    assertEquals(
        List.of(
            Map.of(
                "start", 1L, "end", 2L, "text", "width()", "type", "function", "signature", "()")),
        reply.metadata().get("_jupyter_types_experimental"));
    CompleteReply none =
        (CompleteReply) front.ask(Channel.SHELL, new CompleteRequest(code, -7)).reply();
    assertEquals(List.of(), none.matches());
    assertEquals(0, none.cursorStart());
    assertEquals(0, none.cursorEnd());
  }

  // 6: help is found or not found; positions outside are clamped.
  @Test
  void helpIsFoundOrNot() throws InterruptedException {
    InspectReply found =
        (InspectReply) front.ask(Channel.SHELL, new InspectRequest("W", 99, 1)).reply();
    assertEquals(new InspectReply(true, Map.of("text/plain", "W|1"), Map.of()), found);
    assertEquals(
        new InspectReply(false, Map.of(), Map.of()),
        front.ask(Channel.SHELL, new InspectRequest("W", 0, 0)).reply());
  }

  // 6: is_complete has a verdict instead of ok, and an indent if incomplete.
  @Test
  void completenessIsJudged() throws InterruptedException {
    assertEquals(
        new IsCompleteReply("incomplete", "  "),
        front.ask(Channel.SHELL, new IsCompleteRequest("if (a) {")).reply());
    Answer complete = front.ask(Channel.SHELL, new IsCompleteRequest("a"));
    assertEquals(Map.of("status", "complete"), complete.replyMessage().content());
  }

  // 6: comms without a target are closed; messages for unknown ones are ignored; none is listed.
  @Test
  void commsWithoutATargetAreClosed() throws InterruptedException {
    Message open = front.send(Channel.SHELL, new CommOpen("c1", "none", Map.of()));
    assertEquals(
        List.of(Status.BUSY, new CommClose("c1", Map.of()), Status.IDLE), front.outputs(open));
    Message data = front.send(Channel.SHELL, new CommMsg("c1", Map.of()));
    assertEquals(List.of(Status.BUSY, Status.IDLE), front.outputs(data));
    Message close = front.send(Channel.SHELL, new CommClose("c1", Map.of()));
    assertEquals(List.of(Status.BUSY, Status.IDLE), front.outputs(close));
    assertEquals(
        new CommInfoReply(Map.of()),
        front.ask(Channel.SHELL, new CommInfoRequest(Optional.empty())).reply());
  }

  // 10: what the kernel says of itself, on shell and control.
  @Test
  void kernelInfoIsComplete() throws InterruptedException {
    for (Channel channel : List.of(Channel.SHELL, Channel.CONTROL)) {
      KernelInfoReply info = (KernelInfoReply) front.ask(channel, new KernelInfoRequest()).reply();
      assertEquals("5.5", info.protocolVersion());
      assertEquals("pinchoff", info.implementation());
      assertFalse(info.implementationVersion().isEmpty());
      assertNotEquals("${project.version}", info.implementationVersion());
      assertFalse(info.banner().isEmpty());
      assertEquals("java", info.languageInfo().get("name"));
      assertEquals(".java", info.languageInfo().get("file_extension"));
      assertEquals("text/x-java", info.languageInfo().get("mimetype"));
      assertEquals(List.of(), info.supportedFeatures());
      assertEquals(List.of(), info.helpLinks());
    }
  }

  // 9: control is served while a cell runs; an interrupt ends the cell, and is fine without one.
  @Test
  void anInterruptEndsTheCell() throws InterruptedException {
    assertEquals(new InterruptReply(), front.ask(Channel.CONTROL, new InterruptRequest()).reply());
    Message running = front.send(Channel.SHELL, ExecuteRequest.of("print go\nblock"));
    front.await("output", r -> r.of(running) && r.content() instanceof StreamText);
    Answer info = front.ask(Channel.CONTROL, new KernelInfoRequest());
    assertEquals(List.of(Status.BUSY, Status.IDLE), info.outputs());
    front.ask(Channel.CONTROL, new InterruptRequest());
    ErrorReply reply = (ErrorReply) front.finish(running).reply();
    assertEquals("Interrupted", reply.error().name());
    assertInstanceOf(ExecuteReply.class, front.run("value a").reply());
  }

  // 11: text printed before goes first, the question has the cell as parent, the answer arrives.
  @Test
  void aQuestionIsAnswered() throws InterruptedException {
    Message cell = front.send(Channel.SHELL, ExecuteRequest.of("print a\nask W?").withStdin(true));
    Front.Received question = front.await("a question", r -> r.content() instanceof InputRequest);
    assertEquals(new InputRequest("W?", false), question.content());
    assertTrue(question.of(cell));
    front.await("flushed text", r -> r.of(cell) && r.content() instanceof StreamText);
    front.send(Channel.STDIN, new InputReply("2 um"));
    assertEquals("a\ngot 2 um", text(front.finish(cell)));
  }

  // 11: a reply with the question as parent is ours, one that names another request is not.
  @Test
  void strayAnswersAreIgnored() throws InterruptedException {
    Message cell = front.send(Channel.SHELL, ExecuteRequest.of("secret key?").withStdin(true));
    Front.Received question = front.await("a question", r -> r.content() instanceof InputRequest);
    assertEquals(new InputRequest("key?", true), question.content());
    Message other = front.messages.request(new KernelInfoRequest());
    front.send(Channel.STDIN, front.messages.reply(other, new InputReply("stray")));
    front.send(Channel.STDIN, front.messages.reply(question.message(), new InputReply("right")));
    assertEquals("got right", text(front.finish(cell)));
  }

  // 11: an answer that was there before the question is no answer.
  @Test
  void staleAnswersAreDropped() throws InterruptedException {
    front.send(Channel.STDIN, new InputReply("stale"));
    settle();
    Message cell = front.send(Channel.SHELL, ExecuteRequest.of("ask W?").withStdin(true));
    front.await("a question", r -> r.content() instanceof InputRequest);
    front.send(Channel.STDIN, new InputReply("fresh"));
    assertEquals("got fresh", text(front.finish(cell)));
  }

  // 6, 11: without allow_stdin reading fails at once and says why.
  @Test
  void whoMayNotBeAskedIsNotAsked() throws InterruptedException {
    ErrorReply reply = (ErrorReply) front.run("ask W?").reply();
    assertTrue(reply.error().value().contains("W?"), reply.error().value());
  }

  // 9, 11: an interrupt frees a cell that waits for input.
  @Test
  void anInterruptFreesAQuestion() throws InterruptedException {
    Message cell = front.send(Channel.SHELL, ExecuteRequest.of("ask W?").withStdin(true));
    front.await("a question", r -> r.content() instanceof InputRequest);
    front.ask(Channel.CONTROL, new InterruptRequest());
    assertEquals("Interrupted", ((ErrorReply) front.finish(cell).reply()).error().name());
  }

  // 9: shutdown on control while a cell runs, and on shell; reply, then idle.
  @Test
  void shutdownIsAnsweredWhileACellRuns() throws InterruptedException {
    Message running = front.send(Channel.SHELL, ExecuteRequest.of("print go\nblock"));
    front.await("output", r -> r.of(running) && r.content() instanceof StreamText);
    Answer answer = front.ask(Channel.CONTROL, new ShutdownRequest(true));
    assertEquals(new ShutdownReply(true), answer.reply());
    awaitEnd();
  }

  // 9: the old form on shell.
  @Test
  void shutdownOnShellIsAccepted() throws InterruptedException {
    assertEquals(
        new ShutdownReply(false), front.ask(Channel.SHELL, new ShutdownRequest(false)).reply());
    awaitEnd();
  }

  // 2: kernel information and an empty cell need no evaluator; a cell waits for it.
  @Test
  void theFirstCellWaitsForTheEvaluator() throws Exception {
    CompletableFuture<CellEvaluator> late = new CompletableFuture<>();
    front.close();
    front = start(late);
    assertInstanceOf(
        KernelInfoReply.class, front.ask(Channel.SHELL, new KernelInfoRequest()).reply());
    assertEquals(0, count(front.run("").reply()));
    Message cell = front.send(Channel.SHELL, ExecuteRequest.of("value a"));
    front.await("busy", r -> r.of(cell) && r.content().equals(Status.BUSY));
    assertInstanceOf(
        KernelInfoReply.class, front.ask(Channel.CONTROL, new KernelInfoRequest()).reply());
    late.complete(cells);
    assertEquals(1, count(front.finish(cell).reply()));
  }

  // 5.4: an evaluator that cannot start is an error reply to each cell.
  @Test
  void anEvaluatorThatCannotStartIsReported() throws Exception {
    front.close();
    front = start(CompletableFuture.failedFuture(new IllegalStateException("no compiler here")));
    Answer answer = front.run("value a");
    assertTrue(((ErrorReply) answer.reply()).error().value().contains("no compiler here"));
    assertEquals(List.of("error"), answer.types());
  }

  /** Waits until the kernel wants to end. */
  protected abstract void awaitEnd() throws InterruptedException;

  /** Waits until what was sent on other channels has arrived. */
  protected void settle() throws InterruptedException {}

  private List<Object> history(HistoryRequest asked) throws InterruptedException {
    return ((HistoryReply) front.ask(Channel.SHELL, asked).reply()).history();
  }

  private static HistoryRequest tail(int n) {
    return new HistoryRequest(false, true, "tail", n, 0, 0, 0, "", false);
  }

  private static HistoryRequest search(String pattern, boolean unique) {
    return new HistoryRequest(false, true, "search", 10, 0, 0, 0, pattern, unique);
  }

  private static int count(Content reply) {
    return reply instanceof ExecuteReply ok
        ? ok.executionCount()
        : ((ErrorReply) reply).executionCount().orElseThrow();
  }

  private static String text(Answer answer) {
    StringBuilder text = new StringBuilder();
    for (Content content : answer.between()) {
      if (content instanceof StreamText stream) {
        text.append(stream.text());
      }
    }
    return text.toString();
  }

  private static String shown(Content content) {
    return content instanceof StreamText s ? s.name() + ":" + s.text() : content.type();
  }
}
