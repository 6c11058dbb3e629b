package plusward.handout;

import java.util.List;
import plusward.exam.Reason;

/** What parents can look for at home. What calls for the clinic at once stands at the end of every sheet. */
final class WatchTheEyes implements Paragraph {

    @Override
    public List<Reason> say(SheetFacts facts) {
        return List.of(facts.sentence(facts.lenses().areMissing() ? "watch.without" : "watch.with"));
    }
}
