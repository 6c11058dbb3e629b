package plusward.rules;

import java.time.LocalDate;
import java.util.Comparator;
import java.util.List;
import plusward.course.Limits;
import plusward.course.Visit;

/** All rules, in the order in which their findings are shown. */
public final class Rulebook {

    private static final List<Rule> RULES = List.of(new PlusShort());

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
