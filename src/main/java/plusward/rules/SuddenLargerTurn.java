package plusward.rules;

import java.time.LocalDate;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import plusward.course.Control;
import plusward.course.CycloplegicInForce;
import plusward.course.Repeatability;
import plusward.course.TurnChange;
import plusward.course.Visit;
import plusward.exam.Eye;
import plusward.exam.PerEye;
import plusward.exam.Reason;
import plusward.exam.TurnCondition;
import plusward.exam.Turns;
import plusward.optics.Dioptres;
import plusward.optics.Lens;
import plusward.optics.PrismDioptres;

/** A turn that grew for no reason that glasses explain, began late with little hyperopia, or is larger at distance than near. */
final class SuddenLargerTurn implements Rule {

    private static final int RECENT_MONTHS = 6;
    private static final Limit<Dioptres> UNCHANGED = Limit.atMost(Dioptres.of(0.50));
    private static final int LATE_ONSET_MONTHS = 72;
    private static final Limit<Dioptres> LITTLE_HYPEROPIA = Limit.under(Dioptres.of(1.50));
    private static final Limit<PrismDioptres> DISTANCE_EXCESS = Limit.under(PrismDioptres.of(10));

    @Override
    public String code() {
        return "sudden-larger-turn";
    }

    @Override
    public Source source() {
        return Source.HOYT_GOOD_1995;
    }

    @Override
    public Finding judge(Situation situation) {
        return rose(situation)
                .or(() -> lateOnset(situation))
                .or(() -> distanceExcess(situation))
                .orElseGet(() -> unexplained(situation) ? missing() : not());
    }

    /** A real rise in the same glasses while the hyperopia is known to be the same. */
    private Optional<Finding> rose(Situation situation) {
        return rises(situation.visit())
                .findFirst()
                .filter(rise -> hyperopiaUnchanged(situation.visit()))
                .map(rise -> met(
                        Weight.ACT,
                        Evidence.of("before", rise.before())
                                .and("after", rise.after())
                                .and("since", rise.since())
                                .and("limit", Repeatability.realFrom(rise.before(), rise.after())),
                        checks(3),
                        Reason.of(
                                "finding.sudden-larger-turn.rose",
                                Reason.of(Control.key(rise.condition())),
                                rise.before(),
                                rise.after(),
                                rise.since())));
    }

    /** A rise whose cause cannot be told, since the hyperopia was not refracted twice of late. */
    private static boolean unexplained(Situation situation) {
        return rises(situation.visit()).findAny().isPresent()
                && recentRefractions(situation.visit()).size() < 2;
    }

    private static Stream<TurnChange> rises(Visit visit) {
        return Stream.of(TurnCondition.CC_DISTANCE, TurnCondition.CC_NEAR, TurnCondition.ADD_NEAR)
                .map(condition -> TurnChange.at(visit, condition))
                .flatMap(Optional::stream)
                .filter(change -> !change.glassesChanged())
                .filter(change -> Repeatability.isRealRise(change.before(), change.after()));
    }

    private static boolean hyperopiaUnchanged(Visit visit) {
        List<Visit> recent = recentRefractions(visit);
        return recent.size() >= 2 && isSame(equivalents(recent.get(0)), equivalents(recent.get(1)));
    }

    private static boolean isSame(PerEye<Dioptres> one, PerEye<Dioptres> other) {
        List<Dioptres> changes = Stream.of(Eye.values())
                .flatMap(eye -> change(one.of(eye), other.of(eye)).stream())
                .toList();
        return !changes.isEmpty() && changes.stream().noneMatch(UNCHANGED::isCrossedBy);
    }

    private static Optional<Dioptres> change(@Nullable Dioptres one, @Nullable Dioptres other) {
        return one == null || other == null
                ? Optional.empty()
                : Optional.of(one.minus(other).size());
    }

    private static List<Visit> recentRefractions(Visit visit) {
        LocalDate earliest = visit.date().minusMonths(RECENT_MONTHS);
        return visit.upToHere()
                .filter(each ->
                        !each.exam().cycloplegic().isEmpty() && !each.date().isBefore(earliest))
                .toList();
    }

    private static PerEye<Dioptres> equivalents(Visit visit) {
        return visit.exam().cycloplegic().refraction().map(Lens::sphericalEquivalent);
    }

    private Optional<Finding> lateOnset(Situation situation) {
        Integer onset = situation.visit().patient().turnFirstSeenMonths();
        if (!situation.state().isNotHeld() || onset == null || onset < LATE_ONSET_MONTHS) {
            return Optional.empty();
        }
        return CycloplegicInForce.at(situation.visit())
                .map(CycloplegicInForce::hyperopia)
                .filter(hyperopia -> !LITTLE_HYPEROPIA.isCrossedBy(hyperopia))
                .map(hyperopia -> met(
                        Weight.ACT,
                        Evidence.of("turnFirstSeenMonths", onset)
                                .and("hyperopia", hyperopia)
                                .limit(LITTLE_HYPEROPIA),
                        checks(3),
                        Reason.of("finding.sudden-larger-turn.late", onset / 12, hyperopia, LITTLE_HYPEROPIA)));
    }

    private Optional<Finding> distanceExcess(Situation situation) {
        Turns turns = situation.visit().exam().turns();
        PrismDioptres distance = turns.signedAt(TurnCondition.CC_DISTANCE);
        PrismDioptres near = turns.signedAt(TurnCondition.CC_NEAR);
        if (distance == null || near == null || !distance.isOver(PrismDioptres.ZERO)) {
            return Optional.empty();
        }
        PrismDioptres excess = distance.minus(near);
        return DISTANCE_EXCESS.isCrossedBy(excess)
                ? Optional.of(met(
                        Weight.ACT,
                        Evidence.of("distance", distance).and("near", near).limit(DISTANCE_EXCESS),
                        checks(3),
                        Reason.of("finding.sudden-larger-turn.distance", distance, near, excess)))
                : Optional.empty();
    }
}
