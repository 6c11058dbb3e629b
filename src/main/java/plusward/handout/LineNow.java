package plusward.handout;

import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import plusward.course.SegmentPlace;
import plusward.exam.Eye;
import plusward.exam.Reason;
import plusward.optics.Millimetres;

/** Where the line sits on this child now. */
final class LineNow implements Paragraph {

    private static final List<String> RULES =
            List.of("segment-below-pupil", "segment-above-pupil-centre", "segment-uneven");

    @Override
    public List<Reason> say(SheetFacts facts) {
        if (!facts.lenses().haveAdd() || !facts.visit().exam().segment().hasLine()) {
            return List.of();
        }
        if (!facts.visit().glasses().haveAdd()) {
            return List.of(facts.sentence("line.check-new"));
        }
        Optional<SegmentPlace> place = facts.line();
        return place.isEmpty() ? List.of(facts.sentence("line.not-measured")) : measured(facts, place.get());
    }

    private static List<Reason> measured(SheetFacts facts, SegmentPlace place) {
        List<Reason> low = Stream.of(Eye.values())
                .filter(eye -> isTooLow(facts, place.belowEdge().of(eye)))
                .map(eye -> tooLow(facts, place, eye))
                .toList();
        if (!low.isEmpty()) {
            return Stream.concat(low.stream(), Stream.of(facts.sentence("line.low")))
                    .toList();
        }
        if (RULES.stream().anyMatch(facts::found)) {
            return List.of(facts.sentence("line.off"));
        }
        boolean right = place.top().isComplete() && RULES.stream().allMatch(facts::ruledOut);
        return right ? List.of(facts.sentence("line.right")) : List.of();
    }

    static boolean isTooLow(SheetFacts facts, @Nullable Millimetres belowEdge) {
        return belowEdge != null && belowEdge.isOver(facts.limits().segmentTolerance());
    }

    private static Reason tooLow(SheetFacts facts, SegmentPlace place, Eye eye) {
        String millimetres = String.valueOf(place.belowEdge().of(eye)).replace("+", "");
        return facts.sentence("line.low-by", Phrases.side(eye), millimetres.replaceAll("\\.0$", ""));
    }
}
