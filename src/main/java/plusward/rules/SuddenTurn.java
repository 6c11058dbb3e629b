package plusward.rules;

import java.util.List;
import plusward.exam.Reason;

/** One of the ways in which a turn asks for an early examination; they share a name, a weight and what to check first. */
interface SuddenTurn extends Rule {

    @Override
    default String code() {
        return "sudden-larger-turn";
    }

    @Override
    default Source source() {
        return Source.HOYT_GOOD_1995;
    }

    @Override
    default List<Weight> weights() {
        return List.of(Weight.ACT);
    }

    default Finding raised(Evidence evidence, String which, Object... values) {
        return met(Weight.ACT, evidence, checks(3), Reason.of("finding.sudden-larger-turn." + which, values));
    }

    default Finding unknown(String which, Object... values) {
        return missing(Reason.of("finding.sudden-larger-turn." + which, values));
    }
}
