/** The segment measured on a photograph: marks come in, lengths go out, and the picture stays in the browser. */
@NullMarked
package plusward.photo;

import org.jspecify.annotations.NullMarked;
