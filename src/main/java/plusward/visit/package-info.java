/**
 * Visits: log, correct, read. Its door is {@link plusward.visit.Visits}, which hands out a child's course.
 *
 * <p>{@link plusward.visit.VisitRow} is the stored form of an examination; the {@code Stored…} records are its parts and
 * turn values of the core into columns and back, without any notation.
 */
@NullMarked
package plusward.visit;

import org.jspecify.annotations.NullMarked;
