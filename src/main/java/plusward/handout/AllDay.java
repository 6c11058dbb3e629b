package plusward.handout;

import java.util.ArrayList;
import java.util.List;
import plusward.exam.HoursPerDay;
import plusward.exam.Reason;

/** All waking hours, and how that compares with what was told at the visit. */
final class AllDay implements Paragraph {

    @Override
    public List<Reason> say(SheetFacts facts) {
        if (facts.lenses().areMissing()) {
            return List.of(facts.sentence("wear.later"));
        }
        List<Reason> said = new ArrayList<>(List.of(facts.sentence("wear.all-day"), facts.sentence("wear.fit")));
        HoursPerDay hours = facts.visit().glasses().wear();
        if (hours != null && facts.visit().glasses().areWorn()) {
            boolean enough = !hours.isUnder(facts.limits().wear());
            said.add(facts.sentence(enough ? "wear.enough" : "wear.more", hours.toString()));
        }
        return said;
    }
}
