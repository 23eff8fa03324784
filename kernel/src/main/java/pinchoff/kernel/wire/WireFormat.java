package pinchoff.kernel.wire;

import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import pinchoff.kernel.json.Json;
import pinchoff.kernel.json.JsonException;
import pinchoff.kernel.limits.Limits;

/**
 * Frames to messages and back, for one key. Safe for use by several threads.
 *
 * <p>Order of the frames: identities, delimiter, signature, header, parent header, metadata,
 * content, buffers.
 */
public final class WireFormat {
  private static final byte[] DELIMITER = "<IDS|MSG>".getBytes(StandardCharsets.US_ASCII);
  private static final int JSON_FRAMES = 4;

  private final Signer signer;
  private final Limits limits;
  private final SeenSignatures seen;

  /** Made for one process: all its channels share one memory of signatures. */
  public WireFormat(Signer signer, Limits limits) {
    this.signer = signer;
    this.limits = limits;
    this.seen = new SeenSignatures(limits.rememberedSignatures());
  }

  /** The frames of a message, signed. */
  public List<byte[]> encode(Message message) {
    List<byte[]> parts =
        List.of(
            Json.bytes(message.header().fields()),
            Json.bytes(message.parent()),
            Json.bytes(message.metadata()),
            Json.bytes(message.content()));
    List<byte[]> frames = new ArrayList<>(message.identities());
    frames.add(DELIMITER);
    frames.add(signer.sign(parts));
    frames.addAll(parts);
    frames.addAll(message.buffers());
    return frames;
  }

  /**
   * The message in frames as they were received.
   *
   * @throws WireException if it must be dropped, with the reason
   */
  public Message decode(List<byte[]> frames) throws WireException {
    checkSizes(frames);
    int delimiter = delimiter(frames);
    int buffers = delimiter + 2 + JSON_FRAMES;
    if (frames.size() < buffers) {
      throw new WireException(
          (frames.size() - delimiter - 1) + " frames after the delimiter: expected at least 5");
    }
    byte[] signature = frames.get(delimiter + 1);
    List<byte[]> parts = frames.subList(delimiter + 2, buffers);
    if (!signer.verifies(signature, parts)) {
      throw new WireException(signature.length == 0 ? "no signature" : "wrong signature");
    }
    if (signer.signs() && !seen.isNew(signature)) {
      throw new WireException("a signature seen before");
    }
    try {
      return new Message(
          frames.subList(0, delimiter),
          Header.read(object(parts, 0)),
          object(parts, 1),
          object(parts, 2),
          object(parts, 3),
          frames.subList(buffers, frames.size()));
    } catch (JsonException e) {
      throw new WireException(e.getMessage());
    }
  }

  private void checkSizes(List<byte[]> frames) throws WireException {
    if (frames.size() > limits.frames()) {
      throw new WireException(frames.size() + " frames: expected at most " + limits.frames());
    }
    for (byte[] frame : frames) {
      if (frame.length > limits.frameBytes()) {
        throw new WireException(
            "a frame of " + frame.length + " bytes: expected at most " + limits.frameBytes());
      }
    }
  }

  private static int delimiter(List<byte[]> frames) throws WireException {
    for (int i = 0; i < frames.size(); i++) {
      if (Arrays.equals(frames.get(i), DELIMITER)) {
        return i;
      }
    }
    throw new WireException("no delimiter in " + frames.size() + " frames");
  }

  private Map<String, Object> object(List<byte[]> parts, int index) {
    return Json.parseObject(parts.get(index), limits);
  }
}
