/**
 * Brings children and visits in from the two CSV files: on the page, by a machine, and for the demonstration clinic.
 *
 * <p>{@link plusward.exchange.SheetReader} reads a file, {@link plusward.exchange.ChildRows} and {@link
 * plusward.exchange.VisitRows} judge its rows against the clinic, {@link plusward.exchange.Imports} stores all or nothing.
 */
@NullMarked
package plusward.exchange;

import org.jspecify.annotations.NullMarked;
