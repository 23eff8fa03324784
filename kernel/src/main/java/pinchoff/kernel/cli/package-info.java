/**
 * The command line. The only package that prints on the process's streams and ends the process.
 *
 * <p>{@link pinchoff.kernel.cli.Pinchoff#run} takes arguments and streams and gives an exit code,
 * so that tests call it as the shell does; {@link pinchoff.kernel.cli.Main} only connects it to the
 * process. Exit codes: 0 fine, 1 a finding (a cell failed), 2 usage or unreadable input, 3 a fault
 * of our own. The streams are UTF-8 whatever the locale says.
 *
 * <p>A registered kernel is complete by itself: the kernelspec's folder holds a copy of the jar and
 * a start-up archive of loaded classes, and names the Java that registered it. The archive is
 * written by {@code register} alone; a kernel that finds it missing or of another Java starts
 * without it.
 */
@NullMarked
package pinchoff.kernel.cli;

import org.jspecify.annotations.NullMarked;
