package plusward.handout;

import java.time.LocalDate;
import java.util.List;
import plusward.exam.Reason;

/** When the child should come again. */
final class NextVisit implements Paragraph {

    @Override
    public List<Reason> say(SheetFacts facts) {
        LocalDate next = facts.visit().exam().nextVisit();
        Integer weeks = facts.visit().exam().nextVisitWeeks();
        if (next == null || weeks == null) {
            return List.of(facts.sentence("next.none"));
        }
        if (next.isBefore(facts.today())) {
            return List.of(facts.sentence("next.passed", Phrases.date(next)));
        }
        return List.of(facts.sentence(weeks == 1 ? "next.in-a-week" : "next.in-weeks", Phrases.date(next), weeks));
    }
}
