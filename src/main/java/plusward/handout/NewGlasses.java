package plusward.handout;

import java.util.List;
import plusward.exam.Reason;

/** What to expect of new lenses. */
final class NewGlasses implements Paragraph {

    @Override
    public List<Reason> say(SheetFacts facts) {
        return facts.lenses().areNew() ? List.of(facts.sentence("wear.new")) : List.of();
    }
}
