/**
 * The messages of the Jupyter messaging protocol, version 5.5, as one sealed family.
 *
 * <p>Each message type is a record that reads itself from, and writes itself to, the content of a
 * message. Reading is tolerant: unknown fields are ignored, missing ones take their defaults,
 * unknown types become {@link pinchoff.kernel.protocol.UnknownContent}; a field of a wrong type is
 * an error that names it. Writing is strict: every field that a receiver may require is present.
 *
 * <p>Both ends use these records: the kernel reads requests and writes replies, a client does the
 * opposite. Ids and the time come from outside, see {@link
 * pinchoff.kernel.protocol.MessageFactory}, so that tests see the same messages each time.
 */
@NullMarked
package pinchoff.kernel.protocol;

import org.jspecify.annotations.NullMarked;
