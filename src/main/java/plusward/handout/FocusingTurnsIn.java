package plusward.handout;

import java.util.List;
import plusward.course.Estimate;
import plusward.exam.Reason;
import plusward.optics.PrismPerDioptre;

/** How focusing and the turn hang together, and how far that holds in this child. */
final class FocusingTurnsIn implements Paragraph {

    @Override
    public List<Reason> say(SheetFacts facts) {
        return switch (facts.pattern().kind()) {
            case NON_ACCOMMODATIVE -> List.of(facts.sentence("pull"), facts.sentence("pull.not-here"));
            case PARTLY_ACCOMMODATIVE -> List.of(facts.sentence("pull"), facts.sentence("pull.partly"));
            default ->
                isSeenInTheNumbers(facts)
                        ? List.of(facts.sentence("pull"), facts.sentence("pull.seen"))
                        : List.of(facts.sentence("pull"));
        };
    }

    /** True when the whole interval of the turn for each dioptre of focusing lies above 0. */
    private static boolean isSeenInTheNumbers(SheetFacts facts) {
        Estimate<PrismPerDioptre> slope = facts.model().perDioptre();
        return slope != null && slope.low().amount() > 0;
    }
}
