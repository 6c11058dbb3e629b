package plusward.course;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import plusward.exam.Eye;
import plusward.exam.PerEye;
import plusward.exam.TurnCondition;

/** All that the course says of one visit under the default limits. */
record Judgement(
        Control control,
        Pattern pattern,
        ControlHistory history,
        VisitModel model,
        List<Optional<AcaEstimate>> ratios,
        List<Optional<TurnChange>> changes,
        Worn.Fullness fullness,
        Settling settling,
        Optional<SegmentPlace> segment,
        Derived derived,
        PerEye<Trend> trends) {

    static Judgement of(Visit visit) {
        return new Judgement(
                Control.at(visit, Limits.DEFAULT),
                Pattern.at(visit, Limits.DEFAULT),
                ControlHistory.at(visit, Limits.DEFAULT),
                VisitModel.at(visit),
                List.of(GradientAca.overAdd(visit), GradientAca.overTrial(visit), HeterophoriaAca.at(visit)),
                Arrays.stream(TurnCondition.values())
                        .map(condition -> TurnChange.at(visit, condition))
                        .toList(),
                Worn.fullness(visit),
                Settling.at(visit, Limits.DEFAULT),
                SegmentPlace.at(visit, Limits.DEFAULT),
                Derived.at(visit),
                new PerEye<>(
                        Trend.at(visit, Eye.RIGHT).orElse(null),
                        Trend.at(visit, Eye.LEFT).orElse(null)));
    }

    static List<Judgement> of(Course course) {
        return course.visits().stream().map(Judgement::of).toList();
    }

    /** What must be said of the mirrored child: the same, with right and left exchanged where an eye is named. */
    Judgement mirrored() {
        return new Judgement(
                control,
                pattern,
                history,
                model,
                ratios,
                changes,
                fullness,
                settling,
                segment.map(place -> new SegmentPlace(
                        place.pupil(),
                        place.assumed(),
                        place.top().swapped(),
                        place.belowEdge().swapped())),
                mirrored(derived),
                trends.swapped());
    }

    private static Derived mirrored(Derived derived) {
        CycloplegicInForce inForce = derived.inForce();
        return new Derived(
                derived.cycloplegic().swapped(),
                inForce == null
                        ? null
                        : new CycloplegicInForce(
                                inForce.takenOn(), inForce.equivalent().swapped()),
                derived.manifest().swapped(),
                derived.worn().swapped(),
                derived.latent().swapped(),
                derived.shortBy().swapped(),
                derived.turns(),
                derived.turnsTrue());
    }
}
