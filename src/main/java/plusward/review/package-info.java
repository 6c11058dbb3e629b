/** The Course page: one child's story with its findings and charts, and the same course as data. */
@NullMarked
package plusward.review;

import org.jspecify.annotations.NullMarked;
