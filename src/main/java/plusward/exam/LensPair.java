package plusward.exam;

import org.jspecify.annotations.Nullable;
import plusward.optics.Dioptres;
import plusward.optics.Lens;

/**
 * A pair of lenses with the near add that both share; any part may be missing.
 *
 * <p>The add in dioptres, 0 to 4; absent means no segment, and so does 0.
 *
 * <p>Refused with {@link IllegalArgumentException}: an add outside 0 to 4.
 *
 * @param lenses the distance power before each eye
 * @param add the extra plus of the near part, the same in both lenses
 */
public record LensPair(PerEye<Lens> lenses, @Nullable Dioptres add) {

    /** Neither lens is on record. */
    public static final LensPair NONE = new LensPair(PerEye.none(), null);

    private static final Dioptres STRONGEST_ADD = Dioptres.of(4);

    public LensPair {
        if (add != null && (add.isUnder(Dioptres.ZERO) || add.isOver(STRONGEST_ADD))) {
            throw new IllegalArgumentException("add outside 0 to 4: " + add);
        }
    }

    /** True when neither a lens nor an add is on record. */
    public boolean isEmpty() {
        return lenses.isEmpty() && add == null;
    }

    /** True when the lenses have a segment, or a progressive zone, with power. */
    public boolean hasAdd() {
        return add != null && add.isOver(Dioptres.ZERO);
    }

    /** The add, 0 when there is no segment. */
    public Dioptres addOrZero() {
        return add == null ? Dioptres.ZERO : add;
    }

    /** As the mirror shows it: the lenses change eyes, their axes are mirrored. */
    public LensPair swapped() {
        return new LensPair(lenses.map(Lens::mirrored).swapped(), add);
    }
}
