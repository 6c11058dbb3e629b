package plusward.exam;

import org.jspecify.annotations.Nullable;

/** Distance acuity of each eye and of both together, under one condition; any may be missing. */
public record Acuities(PerEye<Acuity> each, @Nullable Acuity both) {

    public static final Acuities NONE = new Acuities(PerEye.none(), null);

    public Acuities swapped() {
        return new Acuities(each.swapped(), both);
    }
}
