package plusward.rules;

import java.util.List;
import java.util.stream.Stream;
import plusward.course.Visit;
import plusward.exam.Field;
import plusward.exam.Reason;

/**
 * Something that was typed at a visit and is possible, but is more often a slip of the hand than the truth.
 *
 * <p>It asks once and decides nothing: whoever typed it says that it is right, and then it stands. Only this visit and
 * earlier ones are looked at. All limits here are our own choice, no source: they weigh a question too many against a slip
 * that is stored.
 *
 * @param code what is suspected: {@code sign-flipped}, {@code sides-exchanged}, {@code under-manifest}, {@code turn-doubled}
 * @param field where the slip may be
 * @param written what stands in that field; a confirmation is for this text and no other
 * @param because the suspicion in words, with both values
 */
public record Suspicion(String code, Field field, String written, Reason because) {

    /** All suspicions about what was typed at this visit. */
    public static List<Suspicion> at(Visit visit) {
        return Stream.of(
                        SuspectLenses.signsFlipped(visit),
                        SuspectLenses.sidesExchanged(visit),
                        SuspectLenses.underManifest(visit),
                        SuspectTurns.doubled(visit))
                .flatMap(each -> each)
                .toList();
    }

    /** A name for this suspicion about this very text, by which a confirmation is known again. */
    public String token() {
        return code + ":" + field.column() + ":" + written;
    }
}
