package plusward.exam;

import java.util.Optional;
import org.jspecify.annotations.Nullable;
import plusward.optics.LogMar;

/**
 * How well an eye sees, as it was written down.
 *
 * <p>A Snellen fraction, a decimal or a logMAR value has a number; counting fingers, hand movements, light perception, no
 * light perception, and fixing and following have none: their {@link #logMar()} is empty, and they are never averaged or
 * subtracted. The text stays as typed; words are brought to one spelling.
 *
 * <p>Refused with {@link IllegalArgumentException}: a chart reading without a size, and a size with any other kind.
 *
 * <p>Worked example: {@code 20/25-2} is the 20/25 line, log10(25/20) = 0.097, less two letters of 0.02: 0.14 logMAR (Holladay,
 * J Cataract Refract Surg 2004).
 *
 * @param kind the way in which it was written
 * @param written the text, as typed
 * @param size the size of the letters read; absent for words
 */
public record Acuity(Kind kind, String written, @Nullable LogMar size) {

    public Acuity {
        if ((kind == Kind.CHART) != (size != null)) {
            throw new IllegalArgumentException("a chart has a size, words have none: " + written);
        }
    }

    /** The ways of writing it. */
    public enum Kind {
        /** A letter chart: Snellen, decimal or logMAR. */
        CHART,
        /** Counts fingers. */
        CF,
        /** Sees hand movements. */
        HM,
        /** Perceives light. */
        LP,
        /** Does not perceive light. */
        NLP,
        /** Fixes on and follows a target: the child is too young for a chart; says nothing of how small. */
        FIXES_AND_FOLLOWS
    }

    /**
     * Reads {@code 20/25}, {@code 6/7.5}, {@code 20/25-2}, {@code 0.8}, {@code 0.10 logMAR}, {@code CF}, {@code HM},
     * {@code LP}, {@code NLP}, {@code fixes and follows}; words in any case.
     *
     * @throws NotationException when it is none of these, or outside −0.5 to 2.0 logMAR
     */
    public static Acuity parse(String text) {
        return AcuityNotation.parse(text);
    }

    /** An entry in words, which has no size. */
    static Acuity of(Kind words) {
        return new Acuity(words, words == Kind.FIXES_AND_FOLLOWS ? "fixes and follows" : words.name(), null);
    }

    /** The size of the letters read; empty when the entry has no number. A letter more or less counts 0.02. */
    public Optional<LogMar> logMar() {
        return Optional.ofNullable(size);
    }

    /** True when it is worse than any chart line: fingers, hand movements, light, or no light. */
    public boolean isBelowTheChart() {
        return kind == Kind.CF || kind == Kind.HM || kind == Kind.LP || kind == Kind.NLP;
    }

    @Override
    public String toString() {
        return written;
    }
}
