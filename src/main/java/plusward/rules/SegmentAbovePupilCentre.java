package plusward.rules;

import java.util.List;
import plusward.course.SegmentPlace;
import plusward.optics.Millimetres;

/** The segment line lies too far above the pupil centre, so that the child looks far through the add. */
final class SegmentAbovePupilCentre implements SegmentRule {

    @Override
    public String code() {
        return "segment-above-pupil-centre";
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
        Limit<Millimetres> limit = Limit.atMost(situation.limits().segmentTolerance());
        if (place.top().measured().anyMatch(limit::isCrossedBy)) {
            return met(
                    Weight.LOOK, SegmentRule.evidence(place).limit(limit), checks(1), EyeValues.of(place.top()), limit);
        }
        return place.top().isComplete() ? not(limit) : missing();
    }
}
