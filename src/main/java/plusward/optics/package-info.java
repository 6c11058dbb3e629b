/**
 * What lenses and prisms do: value types with a unit in their name, and the formulas of ophthalmic optics.
 *
 * <p>Signs throughout: plus lenses positive, inward (eso) turns positive, outward (exo) turns negative. Nothing here
 * knows a child, a visit or a clinic, and nothing here imports another package of the project.
 */
@NullMarked
package plusward.optics;

import org.jspecify.annotations.NullMarked;
