package plusward.exam;

import org.jspecify.annotations.Nullable;
import plusward.optics.Lens;

/**
 * A refraction with focusing put to rest by drops, and which drops; any part may be missing.
 *
 * @param refraction what retinoscopy found in each eye, at the spectacle plane
 * @param agent the drops; absent when not recorded, which is not the same as none
 */
public record Cycloplegic(PerEye<Lens> refraction, @Nullable CycloplegicAgent agent) {

    /** No cycloplegic refraction at this visit. */
    public static final Cycloplegic NONE = new Cycloplegic(PerEye.none(), null);

    /** True when neither eye was refracted; an agent alone is no refraction. */
    public boolean isEmpty() {
        return refraction.isEmpty();
    }

    /** As the mirror shows it: the refractions change eyes, their axes are mirrored. */
    public Cycloplegic swapped() {
        return new Cycloplegic(refraction.map(Lens::mirrored).swapped(), agent);
    }
}
