package plusward.exam;

import java.util.OptionalInt;
import org.jspecify.annotations.Nullable;

/**
 * Depth seen with both eyes at near: stereoacuity.
 *
 * <p>Whole seconds of arc, 1 to 10000; a smaller number is finer. {@code nil} means that none was found, which is a finding
 * and not a missing measurement.
 *
 * <p>Refused with {@link IllegalArgumentException}: a number outside that range.
 *
 * @param finest seconds of arc; absent when no depth was seen
 */
public record Stereo(@Nullable Integer finest) {

    /** No depth was seen. */
    public static final Stereo NIL = new Stereo(null);

    /** Far coarser than any test shows; beyond it a slip is likelier (common practice, no source). */
    private static final int COARSEST = 10_000;

    public Stereo {
        if (finest != null && (finest < 1 || finest > COARSEST)) {
            throw new IllegalArgumentException("stereoacuity outside 1 to 10000: " + finest);
        }
    }

    /**
     * Reads whole seconds of arc from 1 to 10000, or {@code nil} in any case.
     *
     * @throws NotationException when it is neither: {@code unreadable}, {@code range}, {@code long}
     */
    public static Stereo parse(String text) {
        return Notation.STEREO.typed(text).equalsIgnoreCase("nil")
                ? NIL
                : new Stereo(MeasureNotation.wholeNumber(Notation.STEREO, text, 1, COARSEST));
    }

    /** Seconds of arc; empty when no depth was seen. */
    public OptionalInt inSecondsOfArc() {
        return finest == null ? OptionalInt.empty() : OptionalInt.of(finest);
    }

    @Override
    public String toString() {
        return finest == null ? "nil" : finest.toString();
    }
}
