/** What is understood of a visit while it is typed: each field read back, and what the visit would raise. */
@NullMarked
package plusward.readback;

import org.jspecify.annotations.NullMarked;
