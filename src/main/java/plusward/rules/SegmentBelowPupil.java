package plusward.rules;

import java.util.List;
import plusward.course.SegmentPlace;
import plusward.exam.Reason;
import plusward.optics.Millimetres;

/**
 * The segment line lies too far below the pupil's lower edge, in either eye. For a child the line bisects the pupil or lies at, or
 * just under, its lower edge (common practice; manuals disagree); the tolerance is that of ANSI Z80.1.
 */
final class SegmentBelowPupil implements SegmentRule {

    @Override
    public String code() {
        return "segment-below-pupil";
    }

    @Override
    public Source source() {
        return Source.ANSI_Z80_1;
    }

    @Override
    public List<Weight> weights() {
        return List.of(Weight.ACT);
    }

    @Override
    public Finding judge(Situation situation, SegmentPlace place) {
        Limit<Millimetres> limit = Limit.atMost(situation.limits().segmentTolerance());
        if (place.belowEdge().measured().anyMatch(limit::isCrossedBy)) {
            Evidence evidence = SegmentRule.evidence(place)
                    .and("belowEdgeRight", place.belowEdge().right())
                    .and("belowEdgeLeft", place.belowEdge().left())
                    .limit(limit);
            Reason pupil = Reason.of(
                    place.assumed() ? "segment.pupil-assumed" : "segment.pupil-measured", new Size(place.pupil()));
            return met(Weight.ACT, evidence, checks(3), EyeValues.of(place.belowEdge()), pupil, limit);
        }
        return place.belowEdge().isComplete() ? not(limit) : missing();
    }
}
