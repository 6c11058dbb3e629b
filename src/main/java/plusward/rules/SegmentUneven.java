package plusward.rules;

import plusward.course.SegmentPlace;
import plusward.optics.Millimetres;

/** Right and left segment lines lie at different heights. */
final class SegmentUneven implements SegmentRule {

    @Override
    public String code() {
        return "segment-uneven";
    }

    @Override
    public Source source() {
        return Source.ANSI_Z80_1;
    }

    @Override
    public Finding judge(Situation situation, SegmentPlace place) {
        Limit<Millimetres> limit = Limit.atMost(situation.limits().segmentTolerance());
        Millimetres right = place.top().right();
        Millimetres left = place.top().left();
        if (right == null || left == null) {
            return missing();
        }
        Millimetres difference = right.minus(left).size();
        return limit.isCrossedBy(difference)
                ? met(
                        Weight.LOOK,
                        SegmentRule.evidence(place)
                                .and("difference", difference)
                                .limit(limit),
                        checks(1),
                        EyeValues.of(place.top()),
                        difference,
                        limit)
                : not(limit);
    }
}
