/**
 * What a kernel does with requests: order, status, execution counts, outputs, history, questions.
 *
 * <p>Opens no socket: messages come in by method calls and leave by a {@link
 * pinchoff.kernel.session.MessagePort}. Requests on the shell channel are handled one after the
 * other on one thread, those on the control channel on another, so that a cell can be stopped.
 */
@NullMarked
package pinchoff.kernel.session;

import org.jspecify.annotations.NullMarked;
