package pinchoff.kernel.eval;

import java.nio.ByteBuffer;
import java.nio.CharBuffer;
import java.nio.charset.CharsetDecoder;
import java.nio.charset.CodingErrorAction;
import java.nio.charset.StandardCharsets;

/** Decodes UTF-8 that arrives in pieces, which may end inside a character. For one thread. */
final class Utf8Pieces {
  private final CharsetDecoder decoder =
      StandardCharsets.UTF_8
          .newDecoder()
          .onMalformedInput(CodingErrorAction.REPLACE)
          .onUnmappableCharacter(CodingErrorAction.REPLACE);
  private byte[] rest = {};

  /** The characters that are complete now. */
  String decode(byte[] buffer, int offset, int length) {
    ByteBuffer bytes = ByteBuffer.allocate(rest.length + length);
    bytes.put(rest).put(buffer, offset, length).flip();
    CharBuffer text = CharBuffer.allocate(bytes.remaining());
    decoder.reset().decode(bytes, text, false);
    rest = new byte[bytes.remaining()];
    bytes.get(rest);
    return text.flip().toString();
  }
}
