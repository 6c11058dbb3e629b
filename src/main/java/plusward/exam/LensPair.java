package plusward.exam;

import org.jspecify.annotations.Nullable;
import plusward.optics.Dioptres;
import plusward.optics.Lens;

/**
 * A pair of lenses with the near add that both share; any part may be missing.
 *
 * <p>The add in dioptres, 0 to 4; absent means no segment, and so does 0.
 */
public record LensPair(PerEye<Lens> lenses, @Nullable Dioptres add) {

    public static final LensPair NONE = new LensPair(PerEye.none(), null);

    public boolean isEmpty() {
        return lenses.isEmpty() && add == null;
    }

    public boolean hasAdd() {
        return add != null && add.isOver(Dioptres.ZERO);
    }

    /** The add, 0 when there is no segment. */
    public Dioptres addOrZero() {
        return add == null ? Dioptres.ZERO : add;
    }

    public LensPair swapped() {
        return new LensPair(lenses.map(Lens::mirrored).swapped(), add);
    }
}
