/** Plusward: follows children with accommodative esotropia. See DEVELOPERS.md for the tour by package. */
@NullMarked
package plusward;

import org.jspecify.annotations.NullMarked;
