package pinchoff.kernel.protocol;

import java.util.Map;
import java.util.Optional;
import java.util.function.Function;
import pinchoff.kernel.json.Fields;
import pinchoff.kernel.wire.Message;

/** Finds the record of a message and reads it. */
public final class ContentReader {
  private static final Map<String, Function<Fields, Content>> READERS =
      Map.ofEntries(
          Map.entry(ClearOutput.TYPE, ClearOutput::read),
          Map.entry(CommClose.TYPE, CommClose::read),
          Map.entry(CommInfoReply.TYPE, CommInfoReply::read),
          Map.entry(CommInfoRequest.TYPE, CommInfoRequest::read),
          Map.entry(CommMsg.TYPE, CommMsg::read),
          Map.entry(CommOpen.TYPE, CommOpen::read),
          Map.entry(CompleteReply.TYPE, CompleteReply::read),
          Map.entry(CompleteRequest.TYPE, CompleteRequest::read),
          Map.entry(DisplayData.TYPE, DisplayData::read),
          Map.entry(ErrorOutput.TYPE, ErrorOutput::read),
          Map.entry(ExecuteInput.TYPE, ExecuteInput::read),
          Map.entry(ExecuteReply.TYPE, ExecuteReply::read),
          Map.entry(ExecuteRequest.TYPE, ExecuteRequest::read),
          Map.entry(ExecuteResult.TYPE, ExecuteResult::read),
          Map.entry(HistoryReply.TYPE, HistoryReply::read),
          Map.entry(HistoryRequest.TYPE, HistoryRequest::read),
          Map.entry(InputReply.TYPE, InputReply::read),
          Map.entry(InputRequest.TYPE, InputRequest::read),
          Map.entry(InspectReply.TYPE, InspectReply::read),
          Map.entry(InspectRequest.TYPE, InspectRequest::read),
          Map.entry(InterruptReply.TYPE, InterruptReply::read),
          Map.entry(InterruptRequest.TYPE, InterruptRequest::read),
          Map.entry(IopubWelcome.TYPE, IopubWelcome::read),
          Map.entry(IsCompleteReply.TYPE, IsCompleteReply::read),
          Map.entry(IsCompleteRequest.TYPE, IsCompleteRequest::read),
          Map.entry(KernelInfoReply.TYPE, KernelInfoReply::read),
          Map.entry(KernelInfoRequest.TYPE, KernelInfoRequest::read),
          Map.entry(ShutdownReply.TYPE, ShutdownReply::read),
          Map.entry(ShutdownRequest.TYPE, ShutdownRequest::read),
          Map.entry(Status.TYPE, Status::read),
          Map.entry(StreamText.TYPE, StreamText::read),
          Map.entry(UpdateDisplayData.TYPE, UpdateDisplayData::read));

  private ContentReader() {}

  /**
   * The content of a message.
   *
   * @throws pinchoff.kernel.json.JsonException if a field has a wrong type or a required one is
   *     missing
   */
  public static Content read(Message message) {
    return read(message.header().type(), message.content());
  }

  /**
   * The content of a message of this type.
   *
   * @throws pinchoff.kernel.json.JsonException as {@link #read(Message)}
   */
  public static Content read(String type, Map<String, Object> content) {
    Fields in = Fields.of(content, type);
    if (type.endsWith("_reply") && content.get("status") instanceof String status) {
      if (status.equals("error")) {
        return new ErrorReply(type, ErrorInfo.read(in), count(in));
      }
      if (status.equals("aborted") || status.equals("abort")) {
        return new AbortedReply(type);
      }
    }
    Function<Fields, Content> reader = READERS.get(type);
    return reader == null ? new UnknownContent(type, content) : reader.apply(in);
  }

  private static Optional<Integer> count(Fields in) {
    return in.has("execution_count") ? in.optionalInteger("execution_count") : Optional.empty();
  }
}
