package plusward.rules;

import java.time.LocalDate;
import java.util.Comparator;
import java.util.List;
import plusward.course.Limits;
import plusward.course.Visit;
import plusward.exam.TurnCondition;

/** All rules, in the order in which their findings are shown. */
public final class Rulebook {

    private static final List<Rule> RULES = List.of(
            new TurnNotHeld(),
            new ControlLost(),
            new SuddenLargerTurn(),
            new SegmentBelowPupil(),
            new SegmentAbovePupilCentre(),
            new SegmentUneven(),
            new PlusShort(),
            new PlusOver(),
            new LensesOffOrder(),
            new CycloplegicDue(),
            new CycloplegiaDoubtful(),
            new NearGap(),
            new TurnedOut(),
            new LeaningOut(),
            new LargeLatentTurn(),
            new WearShort(),
            new AcuityGap(),
            new AcuityLow(),
            new UnequalHyperopia(),
            new ChangeRule(TurnCondition.CC_DISTANCE, true),
            new ChangeRule(TurnCondition.CC_NEAR, true),
            new ChangeRule(TurnCondition.ADD_NEAR, true),
            new ChangeRule(TurnCondition.CC_DISTANCE, false),
            new ChangeRule(TurnCondition.CC_NEAR, false),
            new ChangeRule(TurnCondition.ADD_NEAR, false),
            new HyperopiaFalling(),
            new NotMeasured(),
            new VisitOverdue());

    private Rulebook() {}

    /** The answer of every rule at a visit, in the order of the rulebook: met, not met and undecided alike. */
    public static List<Finding> judge(Visit visit, LocalDate on, Limits limits) {
        Situation situation = Situation.of(visit, on, limits);
        return RULES.stream().map(rule -> rule.judge(situation)).toList();
    }

    /** What is met at a visit, heaviest first and otherwise in the order of the rulebook. */
    public static List<Finding.Met> met(Visit visit, LocalDate on, Limits limits) {
        return judge(visit, on, limits).stream()
                .filter(Finding.Met.class::isInstance)
                .map(Finding.Met.class::cast)
                .sorted(Comparator.comparing(Finding.Met::weight))
                .toList();
    }

    /** The rules, for documents and tests. */
    static List<Rule> rules() {
        return RULES;
    }
}
