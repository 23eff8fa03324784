/**
 * What a result looks like: pages of blocks, and the only place that renders them.
 *
 * <p>A domain type describes itself as a {@link pinchoff.page.Page}: a title and a list of {@link
 * pinchoff.page.Block}s, with the {@link pinchoff.page.Value}s that a rerun compares beside them.
 * It knows no HTML. The page renders itself as plain text for a terminal, as HTML that is complete
 * by itself, as LaTeX, and as canonical values; a {@link pinchoff.page.Table} also as CSV.
 *
 * <p>Words of this package: a <em>block</em> is what stands on a line of its own, an <em>entry</em>
 * is what stands in a cell of a table or in a sentence, a <em>phrase</em> is a sentence of entries,
 * a <em>symbol</em> is a quantity's name in trade notation, a <em>relation</em> is a formula to be
 * typeset, a <em>standing</em> is how a check came out.
 *
 * <p>Design notes. All text is taken to be hostile: it is made visible and then escaped in one
 * class, at the moment of writing. Numbers are formatted by {@code quantity} alone. HTML inherits
 * the colours of the page around it, because an output cannot know whether that page is light or
 * dark; a verdict is a sign and a word, and colour only repeats it. Front ends strip styles and
 * MathML from outputs that they do not trust, so that every page can be read without both: the
 * linear form of a relation is carried inside its MathML as text that is not displayed.
 *
 * <p>Everything here is immutable except builders, which belong to one thread. No method accepts or
 * returns null.
 */
@NullMarked
package pinchoff.page;

import org.jspecify.annotations.NullMarked;
