/** Which children need a look, most urgent first, and who is expected today. */
@NullMarked
package plusward.recall;

import org.jspecify.annotations.NullMarked;
