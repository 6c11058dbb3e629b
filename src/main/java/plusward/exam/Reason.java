package plusward.exam;

import java.util.List;

/**
 * A sentence without a language: the key of a message and the values that go into it.
 *
 * <p>The core gives reasons, the screen words them. Values are quantities, dates, counts, limits or other reasons, in the
 * order in which the message numbers them.
 *
 * @param key the message's key, lower case with points and hyphens
 * @param values what the message's {0}, {1} … stand for
 */
public record Reason(String key, List<Object> values) {

    public Reason {
        values = List.copyOf(values);
    }

    /** A reason with its values in order. */
    public static Reason of(String key, Object... values) {
        return new Reason(key, List.of(values));
    }
}
