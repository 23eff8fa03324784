/**
 * Notebook files of the open format 4: an immutable model, reading, writing, and the rules by which
 * messages become stored outputs.
 *
 * <p>{@link pinchoff.kernel.notebook.NotebookFile} reads and writes files. Reading takes every
 * minor version of format 4: older ones are raised to 4.5, with cell ids that depend on nothing but
 * the cells, and whatever a newer one brings is kept as it came. Multi-line texts, which a file may
 * hold as one string or as a list of pieces, are whole strings in the model. Writing follows the
 * style of the format's reference implementation (sorted keys, one space of indent, texts cut at
 * their line ends), so that a version control system shows small differences, and replaces a file
 * in one step.
 *
 * <p>{@link pinchoff.kernel.notebook.OutputRecorder} turns the outputs of running cells into what
 * is stored: it joins neighbouring texts of one stream, applies carriage returns, clears, and later
 * updates of displays.
 */
@NullMarked
package pinchoff.kernel.notebook;

import org.jspecify.annotations.NullMarked;
