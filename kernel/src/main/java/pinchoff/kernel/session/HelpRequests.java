package pinchoff.kernel.session;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import pinchoff.display.MimeBundle;
import pinchoff.kernel.eval.CellEvaluator;
import pinchoff.kernel.eval.Completeness;
import pinchoff.kernel.eval.Completions;
import pinchoff.kernel.json.Json;
import pinchoff.kernel.protocol.CompleteReply;
import pinchoff.kernel.protocol.CompleteRequest;
import pinchoff.kernel.protocol.InspectReply;
import pinchoff.kernel.protocol.InspectRequest;
import pinchoff.kernel.protocol.IsCompleteReply;
import pinchoff.kernel.protocol.IsCompleteRequest;
import pinchoff.kernel.protocol.Positions;

/** Help while typing: translates between the protocol's positions and Java's. */
final class HelpRequests {

  private HelpRequests() {}

  static CompleteReply complete(CompleteRequest asked, CellEvaluator evaluator) {
    String code = asked.code();
    Completions found = evaluator.complete(code, Positions.toUtf16(code, asked.cursorPos()));
    int cursor = Positions.toCodePoints(code, Positions.toUtf16(code, asked.cursorPos()));
    if (found.items().isEmpty()) {
      return new CompleteReply(List.of(), cursor, cursor, Map.of());
    }
    int start = Positions.toCodePoints(code, found.start());
    int end = Positions.toCodePoints(code, found.end());
    List<String> matches = new ArrayList<>();
    List<Object> types = new ArrayList<>();
    for (Completions.Item item : found.items()) {
      matches.add(item.text());
      types.add(
          Json.object(
              "start",
              start,
              "end",
              end,
              "text",
              item.text(),
              "type",
              item.type(),
              "signature",
              item.signature()));
    }
    return new CompleteReply(
        matches, start, end, Json.object("_jupyter_types_experimental", types));
  }

  static InspectReply inspect(InspectRequest asked, CellEvaluator evaluator) {
    Optional<MimeBundle> found =
        evaluator.inspect(
            asked.code(), Positions.toUtf16(asked.code(), asked.cursorPos()), asked.detailLevel());
    return found
        .map(help -> new InspectReply(true, help.data(), RequestOutput.metadata(help)))
        .orElseGet(() -> new InspectReply(false, Map.of(), Map.of()));
  }

  static IsCompleteReply isComplete(IsCompleteRequest asked, CellEvaluator evaluator) {
    Completeness verdict = evaluator.completeness(asked.code());
    return new IsCompleteReply(verdict.status().name().toLowerCase(Locale.ROOT), verdict.indent());
  }
}
