package plusward.rules;

import java.time.LocalDate;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import plusward.course.Course;
import plusward.course.Demonstration;
import plusward.course.Limits;
import plusward.course.RandomCourses;
import plusward.course.Story;
import plusward.course.Visit;
import plusward.exam.Reason;

/** Everything that the rulebook says of the stories, the demonstration clinic and random courses, also when a visit is overdue. */
final class Told {

    private static final List<Integer> DAYS_LATER = List.of(40, 400);
    private static final List<Finding> FINDINGS = visits().flatMap(Told::judged).toList();

    private Told() {}

    static List<Finding> findings() {
        return FINDINGS;
    }

    static Stream<Finding.Met> met() {
        return met(FINDINGS);
    }

    static Stream<Finding.Met> met(List<Finding> findings) {
        return findings.stream().filter(Finding.Met.class::isInstance).map(Finding.Met.class::cast);
    }

    /** The codes that at least one course leaves undecided. */
    static Set<String> undecidedCodes() {
        return FINDINGS.stream()
                .filter(Finding.Undecided.class::isInstance)
                .map(Finding::code)
                .collect(Collectors.toSet());
    }

    /** All that is judged at a visit: by the whole book on its day, and later by the only rule to which the day matters. */
    static Stream<Finding> judged(Visit visit) {
        return Stream.concat(
                Rulebook.judge(visit, visit.date(), Limits.DEFAULT).stream(),
                DAYS_LATER.stream()
                        .map(days -> Situation.of(visit, visit.date().plusDays(days), Limits.DEFAULT))
                        .map(new VisitOverdue()::judge));
    }

    /** The key of every message that is said: why, what to check first, each line of the ladder, each suspicion. */
    static Set<String> keys() {
        Stream<Reason> because = FINDINGS.stream().map(Finding::because);
        Stream<Reason> checks = met().flatMap(met -> met.checkFirst().stream());
        return Stream.of(because, checks, visits().flatMap(Told::besides))
                .flatMap(reasons -> reasons)
                .flatMap(Told::withNested)
                .map(Reason::key)
                .collect(Collectors.toCollection(TreeSet::new));
    }

    private static Stream<Visit> visits() {
        Stream<Course> told =
                Stream.concat(Story.all().stream().map(Story::course), Demonstration.courses().values().stream());
        return Stream.concat(told, RandomCourses.all().stream()).flatMap(course -> course.visits().stream());
    }

    private static Stream<Reason> besides(Visit visit) {
        LocalDate day = visit.date();
        Stream<Reason> ladder = Ladder.at(visit, day, Limits.DEFAULT).stream()
                .flatMap(step -> Stream.of(step.verdict(), step.because()));
        return Stream.concat(ladder, Suspicion.at(visit).stream().map(Suspicion::because));
    }

    private static Stream<Reason> withNested(Reason reason) {
        Stream<Reason> nested =
                reason.values().stream().filter(Reason.class::isInstance).map(Reason.class::cast);
        return Stream.concat(Stream.of(reason), nested.flatMap(Told::withNested));
    }
}
