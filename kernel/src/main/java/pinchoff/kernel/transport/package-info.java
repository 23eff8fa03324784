/**
 * The kernel's sockets and threads.
 *
 * <p>A socket belongs to one thread. One thread owns the three sockets that front ends talk to, one
 * the broadcasts, one the heartbeat; everybody else leaves messages in a mailbox. None of them ever
 * waits for the code of a cell. This package and {@code client} are the home of JeroMQ.
 */
@NullMarked
package pinchoff.kernel.transport;

import org.jspecify.annotations.NullMarked;
