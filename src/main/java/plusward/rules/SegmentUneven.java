package plusward.rules;

import java.util.List;
import plusward.course.SegmentPlace;
import plusward.optics.Millimetres;

/** Right and left segment lines lie at different heights: by more than 1.0 mm, whatever tolerance the clinic gives to their place. */
final class SegmentUneven implements SegmentRule {

    private static final Limit<Millimetres> LIMIT = Limit.atMost(AnsiZ801.SEGMENTS_APART);

    @Override
    public String code() {
        return "segment-uneven";
    }

    @Override
    public Source source() {
        return Source.ANSI_Z80_1;
    }

    @Override
    public List<Weight> weights() {
        return List.of(Weight.LOOK);
    }

    @Override
    public Finding judge(Situation situation, SegmentPlace place) {
        Millimetres right = place.top().right();
        Millimetres left = place.top().left();
        if (right == null || left == null) {
            return missing();
        }
        Millimetres difference = right.minus(left).size();
        return LIMIT.isCrossedBy(difference)
                ? met(
                        Weight.LOOK,
                        SegmentRule.evidence(place)
                                .and("difference", difference)
                                .limit(LIMIT),
                        checks(1),
                        EyeValues.of(place.top()),
                        new Size(difference),
                        LIMIT)
                : not(LIMIT);
    }
}
