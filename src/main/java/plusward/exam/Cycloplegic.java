package plusward.exam;

import org.jspecify.annotations.Nullable;
import plusward.optics.Lens;

/**
 * A refraction with focusing put to rest by drops, and how that was done; any part may be missing.
 *
 * <p>Atropine is often given at home over days; then the minutes stay empty. Nothing is judged from drops and minutes; they
 * are there for whoever weighs the refraction.
 *
 * <p>Refused with {@link IllegalArgumentException}: other than 1 to 10 drops or 1 to 1440 minutes (a day). Common practice,
 * no source.
 *
 * @param refraction what retinoscopy found in each eye, at the spectacle plane
 * @param agent the drops; absent when not recorded, which is not the same as none
 * @param drops how many drops were given in each eye
 * @param minutes how long was waited from the first drop to the refraction
 */
public record Cycloplegic(
        PerEye<Lens> refraction,
        @Nullable CycloplegicAgent agent,
        @Nullable Integer drops,
        @Nullable Integer minutes) {

    /** No cycloplegic refraction at this visit. */
    public static final Cycloplegic NONE = new Cycloplegic(PerEye.none(), null, null, null);

    static final int MOST_DROPS = 10;
    static final int LONGEST_WAIT = 1440;

    public Cycloplegic {
        if (drops != null && (drops < 1 || drops > MOST_DROPS)) {
            throw new IllegalArgumentException("drops outside 1 to " + MOST_DROPS + ": " + drops);
        }
        if (minutes != null && (minutes < 1 || minutes > LONGEST_WAIT)) {
            throw new IllegalArgumentException("minutes outside 1 to " + LONGEST_WAIT + ": " + minutes);
        }
    }

    /** True when neither eye was refracted; an agent alone is no refraction. */
    public boolean isEmpty() {
        return refraction.isEmpty();
    }

    /** As the mirror shows it: the refractions change eyes, their axes are mirrored. */
    public Cycloplegic swapped() {
        return new Cycloplegic(refraction.map(Lens::mirrored).swapped(), agent, drops, minutes);
    }
}
