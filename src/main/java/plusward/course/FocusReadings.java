package plusward.course;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import plusward.exam.Reason;
import plusward.exam.TurnCondition;
import plusward.exam.Turns;
import plusward.optics.Accommodation;
import plusward.optics.Amplitude;
import plusward.optics.Dioptres;
import plusward.optics.PrismDioptres;

/**
 * The turns of a visit that may enter its model, and what was left out and why.
 *
 * <p>Hyperopia is that of the cycloplegic refraction in force; the plus worn is the mean of the lenses. A reading without
 * glasses is left out when it needs more than three quarters of Hofstetter's least amplitude for the age, or when the
 * hyperopia is over +6.00 D: such a child may stop focusing (common practice, no source).
 */
record FocusReadings(List<FocusReading> readings, List<Reason> leftOut) {

    private static final double SUSTAINED = 0.75;
    private static final Dioptres HIGH_HYPEROPIA = Dioptres.of(6);

    static FocusReadings at(Visit visit) {
        Optional<CycloplegicInForce> cycloplegic = CycloplegicInForce.at(visit);
        if (cycloplegic.isEmpty()) {
            return new FocusReadings(List.of(), List.of(Reason.of("model.no-cycloplegic")));
        }
        return new Collector(visit, cycloplegic.get().hyperopia()).collect();
    }

    /** The focusing that a child of this age keeps up: three quarters of Hofstetter's least amplitude, D. */
    static Dioptres sustainable(Visit visit) {
        return Amplitude.least(visit.age()).times(SUSTAINED);
    }

    private static final class Collector {

        private final Visit visit;
        private final Dioptres hyperopia;
        private final Optional<Dioptres> worn;
        private final List<FocusReading> readings = new ArrayList<>();
        private final List<Reason> leftOut = new ArrayList<>();

        Collector(Visit visit, Dioptres hyperopia) {
            this.visit = visit;
            this.hyperopia = hyperopia;
            this.worn = Worn.meanEquivalent(visit.glasses());
        }

        FocusReadings collect() {
            Turns turns = visit.exam().turns();
            for (TurnCondition condition : TurnCondition.values()) {
                PrismDioptres turn = turns.signedAt(condition);
                if (turn != null) {
                    add(condition, turn);
                }
            }
            return new FocusReadings(readings, leftOut);
        }

        private void add(TurnCondition condition, PrismDioptres turn) {
            Dioptres need = need(condition);
            if (need == null) {
                leftOut.add(Reason.of("model.left-out.unknown-need", named(condition)));
            } else if (!condition.isCorrected() && hyperopia.isOver(HIGH_HYPEROPIA)) {
                leftOut.add(Reason.of("model.left-out.high-hyperopia", named(condition), hyperopia, HIGH_HYPEROPIA));
            } else if (!condition.isCorrected() && need.isOver(sustainable(visit))) {
                leftOut.add(Reason.of("model.left-out.beyond-amplitude", named(condition), need, sustainable(visit)));
            } else {
                readings.add(new FocusReading(condition, need, turn));
            }
        }

        private static Reason named(TurnCondition condition) {
            return Reason.of(Control.key(condition));
        }

        /** The focusing a condition needs; absent when the lens or the extra plus it was measured through is unknown. */
        private @Nullable Dioptres need(TurnCondition condition) {
            return switch (condition) {
                case SC_DISTANCE -> Accommodation.neededForDistance(hyperopia, Dioptres.ZERO);
                case SC_NEAR -> Accommodation.neededForNear(hyperopia, Dioptres.ZERO, Dioptres.ZERO);
                case CC_DISTANCE ->
                    worn.map(w -> Accommodation.neededForDistance(hyperopia, w)).orElse(null);
                case CC_NEAR -> near(Dioptres.ZERO);
                case ADD_NEAR ->
                    near(visit.glasses().haveAdd() ? visit.glasses().asOrdered().add() : null);
                case TRIAL_NEAR -> near(visit.exam().turns().trialPlus());
            };
        }

        private @Nullable Dioptres near(@Nullable Dioptres extra) {
            return extra == null
                    ? null
                    : worn.map(w -> Accommodation.neededForNear(hyperopia, w, extra))
                            .orElse(null);
        }
    }
}
