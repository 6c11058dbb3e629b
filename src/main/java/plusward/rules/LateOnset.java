package plusward.rules;

import org.jspecify.annotations.Nullable;
import plusward.course.CycloplegicInForce;
import plusward.optics.Dioptres;

/**
 * Not held in a child first seen turning at 6 years or older, with hyperopia under +1.50 D (common practice, no source, for both
 * numbers). Undecided when what is missing, onset or refraction, could make it so.
 */
final class LateOnset implements SuddenTurn {

    private static final int LATE_MONTHS = 72;
    private static final Limit<Dioptres> LITTLE = Limit.under(Dioptres.of(1.50));

    @Override
    public Finding judge(Situation situation) {
        Integer onset = situation.visit().patient().turnFirstSeenMonths();
        Dioptres hyperopia = CycloplegicInForce.at(situation.visit())
                .map(CycloplegicInForce::hyperopia)
                .orElse(null);
        boolean early = onset != null && onset < LATE_MONTHS;
        boolean hyperopic = hyperopia != null && LITTLE.isCrossedBy(hyperopia);
        return !situation.state().isNotHeld() || early || hyperopic ? not() : late(onset, hyperopia);
    }

    private Finding late(@Nullable Integer onset, @Nullable Dioptres hyperopia) {
        if (onset == null || hyperopia == null) {
            return unknown(onset == null ? "onset-unknown" : "hyperopia-unknown");
        }
        Evidence evidence = Evidence.of("turnFirstSeenMonths", onset)
                .and("hyperopia", hyperopia)
                .limit(LITTLE);
        return raised(evidence, "late", onset, hyperopia, LITTLE);
    }
}
