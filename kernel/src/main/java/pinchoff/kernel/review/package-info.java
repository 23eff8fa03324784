/**
 * Review of a notebook: it is run again in a fresh kernel, and what it says now is compared with
 * what is stored in it, value by value.
 *
 * <p>Only canonical values are compared, never pictures or HTML. A rerun with no finding says that
 * an honest notebook reproduces; it cannot say that an author was honest, since whoever wrote the
 * notebook also wrote what is stored in it.
 */
@NullMarked
package pinchoff.kernel.review;

import org.jspecify.annotations.NullMarked;
