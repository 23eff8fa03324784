package pinchoff.kernel.protocol;

import java.util.Map;

/** The content of one message: one record for each message type. */
public sealed interface Content
    permits AbortedReply,
        ClearOutput,
        CommClose,
        CommInfoReply,
        CommInfoRequest,
        CommMsg,
        CommOpen,
        CompleteReply,
        CompleteRequest,
        DisplayData,
        ErrorOutput,
        ErrorReply,
        ExecuteInput,
        ExecuteReply,
        ExecuteRequest,
        ExecuteResult,
        HistoryReply,
        HistoryRequest,
        InputReply,
        InputRequest,
        InspectReply,
        InspectRequest,
        InterruptReply,
        InterruptRequest,
        IopubWelcome,
        IsCompleteReply,
        IsCompleteRequest,
        KernelInfoReply,
        KernelInfoRequest,
        ShutdownReply,
        ShutdownRequest,
        Status,
        StreamText,
        UnknownContent,
        UpdateDisplayData {

  /** The message type in the header. */
  String type();

  /** The content as a tree. */
  Map<String, Object> toJson();
}
