/**
 * Technology files: what a process is, in a form that people write and review.
 *
 * <p>A file is read in four steps, each of which notes all the faults that it finds and leaves the
 * rest to the next: text to JSON with places, JSON to values by the table of keys (the format),
 * rules between values, and values to devices, rails and passives. One table describes every key,
 * its dimension, its range and its meaning; reader, writer, JSON Schema and display are made from
 * it. To add a parameter, add one line there, use it where devices are made, and let the test of
 * the schema write the new schema.
 *
 * <p><b>Why words for keys.</b> Parameter codes of a few capitals mean different things in
 * different places. A file that others must trust spells them out, with a unit on each value, so
 * that a slip of a prefix or a dimension is found by the reader and not by the silicon.
 *
 * <p><b>Why the sign of a threshold is checked.</b> It is the one signed parameter, and half of the
 * published tables give it as a magnitude. The file says {@code enhancement} or {@code depletion},
 * and a threshold that contradicts it is a fault.
 *
 * <p><b>What the content hash covers.</b> Everything that is stated, values to the last bit and
 * texts to the last letter; layout, the order of keys and the spelling of units are not in it.
 *
 * <p>All that comes from a file is hostile until checked: length, depth, number of keys and length
 * of each text are limited, names are letters, digits, hyphens and underscores, and no text has
 * control characters.
 *
 * <p>All types are immutable and safe for use by several threads. No method accepts or returns
 * null.
 */
@NullMarked
package pinchoff.technology;

import org.jspecify.annotations.NullMarked;
