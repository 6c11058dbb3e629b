package plusward.handout;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import plusward.course.Worn;
import plusward.exam.Eye;
import plusward.exam.Reason;
import plusward.optics.Dioptres;

/** How much of the focusing the lenses take over; and that there are none yet, where there are none. */
final class GlassesFocus implements Paragraph {

    @Override
    public List<Reason> say(SheetFacts facts) {
        Lenses lenses = facts.lenses();
        if (lenses.areMissing()) {
            return List.of(facts.sentence("do.no-glasses"));
        }
        List<Reason> said = new ArrayList<>();
        if (lenses.areNew()) {
            said.add(facts.sentence(lenses.areFirst() ? "do.first" : "do.new"));
        }
        said.add(facts.sentence(isFull(facts, lenses) ? "do.all" : "do.part"));
        if (lenses.haveAdd()) {
            said.add(facts.sentence("do.add"));
        }
        return said;
    }

    /** True when both eyes are known to get all their plus, to within what counts as full. */
    private static boolean isFull(SheetFacts facts, Lenses lenses) {
        return Stream.of(Eye.values()).allMatch(eye -> {
            Dioptres lens = lenses.equivalent().of(eye);
            Dioptres found = facts.cycloplegic().equivalent().of(eye);
            return lens != null && found != null && !found.minus(lens).isOver(Worn.FULL_WITHIN);
        });
    }
}
