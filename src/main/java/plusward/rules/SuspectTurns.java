package plusward.rules;

import java.util.stream.Stream;
import plusward.course.TurnChange;
import plusward.course.Visit;
import plusward.exam.ExaminationReader;
import plusward.exam.Reason;
import plusward.exam.TurnCondition;
import plusward.optics.PrismDioptres;

/** Turns that have doubled since the last comparable reading, as when the readings of two eyes were added. */
final class SuspectTurns {

    /** Under this, 10 Δ, a turn may double within what is often seen. */
    private static final Limit<PrismDioptres> NOTABLE = Limit.atLeast(PrismDioptres.of(10));

    private SuspectTurns() {}

    static Stream<Suspicion> doubled(Visit visit) {
        return Stream.of(TurnCondition.values())
                .flatMap(condition -> TurnChange.at(visit, condition).stream())
                .filter(SuspectTurns::isDoubled)
                .map(change -> new Suspicion(
                        "turn-doubled",
                        ExaminationReader.fieldOf(change.condition()),
                        String.valueOf(visit.exam().turns().at(change.condition())),
                        Reason.of("suspicion.turn-doubled", change.after(), change.before(), change.since())));
    }

    private static boolean isDoubled(TurnChange change) {
        double before = change.before().amount();
        double after = change.after().amount();
        boolean sameSide = before * after > 0;
        return sameSide && !NOTABLE.isCrossedBy(change.before().size()) && Math.abs(after) >= 2 * Math.abs(before);
    }
}
