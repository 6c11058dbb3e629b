package plusward.exam;

import java.time.LocalDate;
import org.jspecify.annotations.Nullable;

/**
 * The glasses worn when the child came: as ordered, since when, and for how long each day.
 *
 * <p>Without a lens on record there are no glasses to judge by. An absent date means that it is not known since when; absent
 * hours, that nobody asked.
 *
 * @param asOrdered the prescription the glasses were made from, not the lensmeter reading
 * @param since the day on which these glasses were first worn
 * @param wear hours on an ordinary day, as the family says
 */
public record Glasses(
        LensPair asOrdered,
        @Nullable LocalDate since,
        @Nullable HoursPerDay wear) {

    /** No glasses on record. */
    public static final Glasses NONE = new Glasses(LensPair.NONE, null, null);

    /** True when at least one lens is on record. */
    public boolean areWorn() {
        return !asOrdered.lenses().isEmpty();
    }

    /** True when the glasses have a near add over 0. */
    public boolean haveAdd() {
        return asOrdered.hasAdd();
    }

    /** As the mirror shows them: the lenses change eyes, their axes are mirrored. */
    public Glasses swapped() {
        return new Glasses(asOrdered.swapped(), since, wear);
    }
}
