/**
 * The rulebook: one class a rule, and findings that explain themselves.
 *
 * <p>A rule looks at one visit and what came before it, and answers met, not met, or undecided with what is missing; missing
 * data is never "not met". {@link plusward.rules.Rulebook} lists the rules in the order in which their findings are shown.
 */
@NullMarked
package plusward.rules;

import org.jspecify.annotations.NullMarked;
