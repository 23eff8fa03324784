/**
 * Frames on the wire and the signed messages in them, without any socket.
 *
 * <p>{@link pinchoff.kernel.wire.WireFormat} turns frames into a {@link
 * pinchoff.kernel.wire.Message} and back. A message that is not to be trusted (unsigned, signed
 * with another key, seen before, too large, no JSON object where one belongs) is a {@link
 * pinchoff.kernel.wire.WireException} whose text says why and never holds the key.
 *
 * <p>{@link pinchoff.kernel.wire.ConnectionInfo} is the content of a connection file, which both
 * ends read: where the five channels are and which key signs. The signature is an HMAC over the
 * bytes of the four JSON frames, as RFC 2104 defines it.
 */
@NullMarked
package pinchoff.kernel.wire;

import org.jspecify.annotations.NullMarked;
