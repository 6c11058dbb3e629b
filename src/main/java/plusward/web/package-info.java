/**
 * The shell around every page: layout, errors, how core values are shown, how reasons are worded, the clock.
 *
 * <p>Knows no feature. A page uses {@code templates/web/layout.html}; a template asks the beans {@code @sentences},
 * {@code @shown} and {@code @clinic}.
 */
@NullMarked
package plusward.web;

import org.jspecify.annotations.NullMarked;
