package plusward.rules;

import java.util.Optional;
import plusward.course.SegmentPlace;
import plusward.course.Visit;
import plusward.exam.Segment;

/** What the rules about the segment line share: when they apply, and when they cannot tell. */
interface SegmentRule extends Rule {

    Finding judge(Situation situation, SegmentPlace place);

    @Override
    default Finding judge(Situation situation) {
        Visit visit = situation.visit();
        Segment segment = visit.exam().segment();
        if (!visit.glasses().haveAdd()) {
            return notApplicable("no-add");
        }
        if (!segment.hasLine()) {
            return notApplicable("progressive");
        }
        Optional<SegmentPlace> place = SegmentPlace.at(visit, situation.limits());
        return place.map(found -> judge(situation, found)).orElseGet(this::missing);
    }

    /** The pupil used, and where it came from. */
    static Evidence evidence(SegmentPlace place) {
        return Evidence.of("pupil", place.pupil())
                .and("topRight", place.top().right())
                .and("topLeft", place.top().left());
    }
}
