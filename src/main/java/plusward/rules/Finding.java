package plusward.rules;

import java.util.List;
import java.util.Map;
import plusward.exam.Reason;

/**
 * What a rule found at a visit. Three answers: met, not met, or undecided because something is missing.
 *
 * <p>An explanation is part of the answer and is never worked out a second time.
 */
public sealed interface Finding {

    /** The name of the rule, as data and messages write it: {@code segment-below-pupil}. */
    String code();

    /** The sentence that says why, with its numbers. */
    Reason because();

    /**
     * The rule's condition holds.
     *
     * @param weight what it asks of the reader
     * @param evidence the numbers it came from by name, in D, Δ, mm, hours, days or logMAR; {@code limit} is the limit crossed
     * @param checkFirst what to rule out before anything else, in order
     * @param source where the rule comes from
     */
    record Met(
            String code,
            Weight weight,
            Reason because,
            Map<String, Object> evidence,
            List<Reason> checkFirst,
            Source source)
            implements Finding {

        public Met {
            checkFirst = List.copyOf(checkFirst);
        }
    }

    /** The condition does not hold, and all that it takes was measured (or the rule does not apply, and says so). */
    record NotMet(String code, Reason because) implements Finding {}

    /** It cannot be told: the reason names what is missing. */
    record Undecided(String code, Reason because) implements Finding {}
}
