package plusward.exam;

import java.util.EnumSet;
import java.util.Locale;
import java.util.Map;
import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** Reads the notation of ductions; see {@link Ductions#parse}. */
final class DuctionsNotation {

    /** An eye and one of its movements. */
    private static final Pattern LIMITED =
            Pattern.compile("(right|r|od|left|l|os)\\s+(abduction|adduction|elevation|depression)");

    private static final Map<String, Eye> EYES = Map.of(
            "right", Eye.RIGHT, "r", Eye.RIGHT, "od", Eye.RIGHT, "left", Eye.LEFT, "l", Eye.LEFT, "os", Eye.LEFT);

    /** As it was typed, for the refusal. */
    private final String text;

    private final Set<Duction> right = EnumSet.noneOf(Duction.class);
    private final Set<Duction> left = EnumSet.noneOf(Duction.class);

    private DuctionsNotation(String text) {
        this.text = text;
    }

    static Ductions parse(String text) {
        String typed = Notation.DUCTIONS.typed(text).toLowerCase(Locale.ROOT);
        return typed.equals(Ductions.NORMAL_WORD) ? Ductions.NORMAL : new DuctionsNotation(text).limited(typed);
    }

    /** Reads every part; an empty one, as a comma at the end leaves it, is refused as a part that was forgotten. */
    private Ductions limited(String typed) {
        for (String part : typed.split("[,;]", -1)) {
            Matcher limited = LIMITED.matcher(part.strip());
            if (!limited.matches()) {
                throw Notation.DUCTIONS.refused(Problem.UNREADABLE, text);
            }
            Set<Duction> ofThatEye = EYES.get(limited.group(1)) == Eye.RIGHT ? right : left;
            ofThatEye.add(Duction.valueOf(limited.group(2).toUpperCase(Locale.ROOT)));
        }
        return new Ductions(right, left);
    }
}
