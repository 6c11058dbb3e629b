package plusward.exam;

import org.jspecify.annotations.Nullable;

/**
 * Distance acuity of each eye and of both together, under one condition; any may be missing.
 *
 * @param each the acuity of each eye with the other covered
 * @param both the acuity with both eyes open; absent when not measured
 */
public record Acuities(PerEye<Acuity> each, @Nullable Acuity both) {

    /** Nothing was measured. */
    public static final Acuities NONE = new Acuities(PerEye.none(), null);

    /** As the mirror shows it: right and left change places. */
    public Acuities swapped() {
        return new Acuities(each.swapped(), both);
    }
}
