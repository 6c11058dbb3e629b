/**
 * The entry page of a visit: type it, read it, correct it, and settle two versions of it. No public door: others link to
 * {@code /children/{child}/visits/new}, {@code /children/{child}/visits/{visit}} and {@code …/edit}.
 *
 * <p>Typed text is a {@link plusward.entry.VisitForm}; {@link plusward.entry.EntryDesk} reads it through the core and
 * stores it, or says everything that is wrong with it; {@link plusward.entry.EntryPage} is what the page shows.
 */
@NullMarked
package plusward.entry;

import org.jspecify.annotations.NullMarked;
