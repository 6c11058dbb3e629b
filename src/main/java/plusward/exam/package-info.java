/**
 * What is seen and measured at one visit, in which convention, with its notation.
 *
 * <p>An {@link plusward.exam.Examination} holds one visit's measurements and is valid by construction. Text becomes values
 * only here, in {@code parse}, and values become text again in {@code toString}; the two are held together by tests.
 * What was not measured is absent, never zero.
 */
@NullMarked
package plusward.exam;

import org.jspecify.annotations.NullMarked;
