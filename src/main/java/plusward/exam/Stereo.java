package plusward.exam;

import java.util.OptionalInt;
import org.jspecify.annotations.Nullable;

/**
 * Depth seen with both eyes at near, in seconds of arc; a smaller number is finer. {@code nil} means that none was found,
 * which is a finding and not a missing measurement.
 */
public record Stereo(@Nullable Integer finest) {

    public static final Stereo NIL = new Stereo(null);

    private static final int COARSEST = 10_000;

    /**
     * Reads whole seconds of arc from 1 to 10000, or {@code nil}.
     *
     * @throws NotationException when it is neither
     */
    public static Stereo parse(String text) {
        String typed = text.strip();
        if (typed.equalsIgnoreCase("nil")) {
            return NIL;
        }
        if (!typed.matches("\\d{1,5}") || Integer.parseInt(typed) < 1 || Integer.parseInt(typed) > COARSEST) {
            throw new NotationException("stereo", "unreadable", text);
        }
        return new Stereo(Integer.valueOf(typed));
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
