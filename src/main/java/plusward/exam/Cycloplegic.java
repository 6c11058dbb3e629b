package plusward.exam;

import org.jspecify.annotations.Nullable;
import plusward.optics.Lens;

/** A refraction with focusing put to rest by drops, and which drops; any part may be missing. */
public record Cycloplegic(PerEye<Lens> refraction, @Nullable CycloplegicAgent agent) {

    public static final Cycloplegic NONE = new Cycloplegic(PerEye.none(), null);

    public boolean isEmpty() {
        return refraction.isEmpty();
    }

    public Cycloplegic swapped() {
        return new Cycloplegic(refraction.map(Lens::mirrored).swapped(), agent);
    }
}
