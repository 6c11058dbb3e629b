/**
 * The children of the clinic: register, find, correct. Its door is {@link plusward.child.Children}.
 */
@NullMarked
package plusward.child;

import org.jspecify.annotations.NullMarked;
