/** Visits as they are being typed, kept for the account that types them until they are saved or thrown away. */
@NullMarked
package plusward.draft;

import org.jspecify.annotations.NullMarked;
