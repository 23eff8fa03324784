/**
 * JSON as plain trees: {@code Map<String, Object>} in order, {@code List<Object>}, {@code String},
 * {@code Long}, {@code BigInteger}, {@code Double}, {@code Boolean}, and a null element where the
 * text says {@code null}.
 *
 * <p>Reading and writing stream through the JSON library, without data binding: its first use costs
 * a tenth of the time. This package is the library's home in the kernel. What is written is always
 * well-formed: lone surrogates are replaced by U+FFFD, and NaN and infinity are refused.
 */
@NullMarked
package pinchoff.kernel.json;

import org.jspecify.annotations.NullMarked;
