/**
 * The other side of the protocol: starts a kernel, sends it requests, receives what it answers.
 *
 * <p>{@link pinchoff.kernel.client.KernelProcess} starts a kernel process and notices its death;
 * {@link pinchoff.kernel.client.KernelClient} speaks with a kernel that runs. A request is finished
 * when its reply and its idle status have come, in either order: only then are its outputs
 * complete.
 *
 * <p>One thread owns the sockets of a client. Callbacks run on the thread that made the request, in
 * the order in which the kernel sent the outputs.
 */
@NullMarked
package pinchoff.kernel.client;

import org.jspecify.annotations.NullMarked;
