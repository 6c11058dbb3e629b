package plusward.rules;

import java.time.LocalDate;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import plusward.course.Control;
import plusward.course.Repeatability;
import plusward.course.TurnChange;
import plusward.course.Visit;
import plusward.exam.Eye;
import plusward.exam.PerEye;
import plusward.exam.Reason;
import plusward.exam.TurnCondition;
import plusward.optics.Dioptres;
import plusward.optics.Lens;

/**
 * A reading with glasses rose by a real amount in the same glasses, while the last two cycloplegic refractions, both within 6
 * months of the visit, are the same within 0.50 D in every eye that was refracted twice. Undecided when there are no two.
 */
final class RiseInSameGlasses implements SuddenTurn {

    private static final int RECENT_MONTHS = 6;

    /** Hyperopia is unchanged up to this: 0.50 D (common practice, no source). */
    private static final Limit<Dioptres> UNCHANGED = Limit.atMost(Dioptres.of(0.50));

    @Override
    public Finding judge(Situation situation) {
        Visit visit = situation.visit();
        return rises(visit)
                .findFirst()
                .map(rise -> judge(rise, recentRefractions(visit)))
                .orElseGet(this::not);
    }

    private Finding judge(TurnChange rise, List<Visit> refractions) {
        Reason condition = Reason.of(Control.key(rise.condition()));
        if (refractions.size() < 2) {
            return unknown("rose-unknown", condition, rise.before(), rise.after());
        }
        PerEye<Dioptres> now = equivalents(refractions.get(0));
        PerEye<Dioptres> earlier = equivalents(refractions.get(1));
        PerEye<Dioptres> changes = changes(now, earlier);
        if (changes.isEmpty()) {
            return unknown("rose-unknown", condition, rise.before(), rise.after());
        }
        Evidence evidence = evidence(rise)
                .and("cycloplegicOn", refractions.get(0).date())
                .andEyes("cycloplegic", now)
                .and("earlierOn", refractions.get(1).date())
                .andEyes("earlier", earlier);
        return changes.measured().anyMatch(UNCHANGED::isCrossedBy)
                ? not()
                : raised(evidence, "rose", condition, rise.before(), rise.after(), rise.since());
    }

    private static Evidence evidence(TurnChange rise) {
        return Evidence.of("before", rise.before())
                .and("after", rise.after())
                .and("since", rise.since())
                .and("limit", Repeatability.realFrom(rise.before(), rise.after()));
    }

    private static Stream<TurnChange> rises(Visit visit) {
        return Stream.of(TurnCondition.CC_DISTANCE, TurnCondition.CC_NEAR, TurnCondition.ADD_NEAR)
                .map(condition -> TurnChange.at(visit, condition))
                .flatMap(Optional::stream)
                .filter(change -> !change.glassesChanged())
                .filter(change -> Repeatability.isRealRise(change.before(), change.after()));
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

    private static PerEye<Dioptres> changes(PerEye<Dioptres> now, PerEye<Dioptres> earlier) {
        return new PerEye<>(change(now, earlier, Eye.RIGHT), change(now, earlier, Eye.LEFT));
    }

    private static @Nullable Dioptres change(PerEye<Dioptres> now, PerEye<Dioptres> earlier, Eye eye) {
        Dioptres one = now.of(eye);
        Dioptres other = earlier.of(eye);
        return one == null || other == null ? null : one.minus(other).size();
    }
}
