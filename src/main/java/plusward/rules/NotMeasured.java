package plusward.rules;

import java.util.ArrayList;
import java.util.List;
import plusward.course.Control;
import plusward.course.CycloplegicInForce;
import plusward.course.Visit;
import plusward.exam.Reason;
import plusward.exam.TurnCondition;

/**
 * What this visit lacks for a judgement, while glasses are worn; or the glasses themselves, when an earlier visit had or ordered
 * some and this one has none on record.
 */
final class NotMeasured implements Rule {

    @Override
    public String code() {
        return "not-measured";
    }

    @Override
    public Source source() {
        return Source.COMMON_PRACTICE;
    }

    @Override
    public List<Weight> weights() {
        return List.of(Weight.NOTE);
    }

    @Override
    public Finding judge(Situation situation) {
        Visit visit = situation.visit();
        if (!visit.glasses().areWorn()) {
            return hadGlasses(visit) ? met(List.of(Reason.of("missing.glasses"))) : notApplicable("no-glasses");
        }
        List<Reason> missing = missing(visit);
        return missing.isEmpty() ? not() : met(missing);
    }

    private static List<Reason> missing(Visit visit) {
        List<Reason> missing = new ArrayList<>();
        turn(visit, TurnCondition.CC_DISTANCE, missing);
        turn(visit, TurnCondition.CC_NEAR, missing);
        if (visit.glasses().haveAdd()) {
            turn(visit, TurnCondition.ADD_NEAR, missing);
            segment(visit, missing);
        }
        if (CycloplegicInForce.at(visit).isEmpty()) {
            missing.add(Reason.of("missing.cycloplegic"));
        }
        return missing;
    }

    private Finding met(List<Reason> missing) {
        return met(Weight.NOTE, Evidence.of("missing", missing.size()), List.of(), Sentences.listed(missing));
    }

    private static boolean hadGlasses(Visit visit) {
        return visit.before()
                .anyMatch(each -> each.glasses().areWorn()
                        || !each.exam().ordered().lenses().isEmpty());
    }

    private static void turn(Visit visit, TurnCondition condition, List<Reason> missing) {
        if (visit.exam().turns().signedAt(condition) == null) {
            missing.add(Reason.of("missing.turn", Reason.of(Control.key(condition))));
        }
    }

    private static void segment(Visit visit, List<Reason> missing) {
        boolean known = visit.exam().segment().top().isComplete();
        if (visit.exam().segment().hasLine() && !known) {
            missing.add(Reason.of("missing.segment"));
        }
    }
}
