package plusward.exam;

import java.time.LocalDate;
import org.jspecify.annotations.Nullable;

/**
 * The glasses worn when the child came: as ordered, since when, and for how long each day.
 *
 * <p>Without a lens on record there are no glasses to judge by. An absent date means that it is not known since when.
 */
public record Glasses(
        LensPair asOrdered,
        @Nullable LocalDate since,
        @Nullable HoursPerDay wear) {

    public static final Glasses NONE = new Glasses(LensPair.NONE, null, null);

    /** True when at least one lens is on record. */
    public boolean areWorn() {
        return !asOrdered.lenses().isEmpty();
    }

    public boolean haveAdd() {
        return asOrdered.hasAdd();
    }

    public Glasses swapped() {
        return new Glasses(asOrdered.swapped(), since, wear);
    }
}
