package plusward.rules;

import java.util.List;
import plusward.course.Control;
import plusward.course.Repeatability;
import plusward.course.TurnChange;
import plusward.exam.Reason;
import plusward.exam.TurnCondition;
import plusward.optics.PrismDioptres;

/**
 * A reading with glasses against the last comparable one: a likely real change, or within measurement noise (Pediatric Eye Disease
 * Investigator Group, Arch Ophthalmol 2009;127:59). One for each condition and answer; a change of glasses in between and a
 * comparison under 10 Δ, where nothing was published, are said.
 */
record ChangeRule(TurnCondition condition, boolean real) implements Rule {

    @Override
    public String code() {
        return real ? "real-change" : "within-noise";
    }

    @Override
    public Source source() {
        return Source.PEDIG_2009;
    }

    @Override
    public List<Weight> weights() {
        return List.of(Weight.NOTE);
    }

    @Override
    public Finding judge(Situation situation) {
        return TurnChange.at(situation.visit(), condition)
                .map(this::judge)
                .orElseGet(() -> nothingToCompare(situation));
    }

    private Finding nothingToCompare(Situation situation) {
        boolean addIsWorn = situation.visit().glasses().haveAdd();
        return condition == TurnCondition.ADD_NEAR && !addIsWorn
                ? notApplicable("no-add")
                : missing(Reason.of(Control.key(condition)));
    }

    private Finding judge(TurnChange change) {
        if (change.isReal() != real) {
            return not(Reason.of(Control.key(condition)));
        }
        PrismDioptres from = Repeatability.realFrom(change.before(), change.after());
        return met(
                Weight.NOTE,
                Evidence.of("condition", code(condition))
                        .and("since", change.since())
                        .and("before", change.before())
                        .and("after", change.after())
                        .and("limit", from),
                List.of(),
                Reason.of(Control.key(condition)),
                change.before(),
                change.after(),
                change.since(),
                from,
                Reason.of(change.glassesChanged() ? "change.glasses-changed" : "change.same-glasses"),
                Reason.of(change.isExtrapolated() ? "change.extrapolated" : "change.published"));
    }

    private static String code(TurnCondition condition) {
        return Control.key(condition).replace("condition.", "");
    }
}
