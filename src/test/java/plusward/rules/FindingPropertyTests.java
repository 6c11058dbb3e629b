package plusward.rules;

import static org.assertj.core.api.Assertions.assertThat;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.Collections;
import java.util.EnumMap;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Random;
import java.util.TreeMap;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;
import plusward.course.Course;
import plusward.course.Limits;
import plusward.course.RandomCourses;
import plusward.course.Visit;
import plusward.exam.Examination;
import plusward.exam.ExaminationReader;
import plusward.exam.ExaminationWriter;
import plusward.exam.Eye;
import plusward.exam.Field;
import plusward.exam.LensMeasure;
import plusward.exam.Reason;
import plusward.optics.Lens;

/** Over random courses: what must hold of every finding, whatever was typed. */
class FindingPropertyTests {

    private static final List<Course> COURSES = RandomCourses.all();

    /** A met finding without its words. */
    private record Fact(String code, Weight weight, Map<String, Object> evidence) {

        private static Fact of(Finding.Met met) {
            Map<String, Object> evidence = new HashMap<>();
            met.evidence().forEach((name, value) -> evidence.put(name, withoutAxis(value)));
            return new Fact(met.code(), met.weight(), evidence);
        }

        /** Axes are mirrored with the eyes; that they are is held where lenses are tested. */
        private static Object withoutAxis(Object value) {
            return value instanceof String text ? text.replaceFirst(" x \\d+$", "") : value;
        }

        private Fact mirrored() {
            Map<String, Object> other = new HashMap<>();
            evidence.forEach((name, value) -> other.put(mirrored(name), value));
            return new Fact(code, weight, other);
        }

        private static String mirrored(String name) {
            return name.startsWith("right")
                    ? name.replaceFirst("right", "left")
                    : name.startsWith("left")
                            ? name.replaceFirst("left", "right")
                            : name.endsWith("Right")
                                    ? name.replaceFirst("Right$", "Left")
                                    : name.replaceFirst("Left$", "Right");
        }
    }

    @Test
    void aMirroredChildHasTheSameFindingsWithTheEyesExchanged() {
        COURSES.forEach(course -> assertThat(facts(changed(course, Examination::mirrored)))
                .isEqualTo(facts(course).stream()
                        .map(visit -> visit.stream().map(Fact::mirrored).toList())
                        .toList()));
    }

    @Test
    void plusAndMinusCylinderFormsGiveTheSameFindings() {
        COURSES.forEach(course -> assertThat(codes(changed(course, FindingPropertyTests::transposed)))
                .isEqualTo(codes(course)));
    }

    @Test
    void theOrderInWhichVisitsAreBroughtInDoesNotMatter() {
        COURSES.forEach(course -> {
            List<Examination> shuffled = new ArrayList<>(course.examinations());
            Collections.shuffle(shuffled, new Random(shuffled.size()));
            assertThat(facts(new Course(RandomCourses.CHILD, shuffled))).isEqualTo(facts(course));
        });
    }

    /** That the next visit is overdue is the only finding that asks whether a visit is the latest. */
    @Test
    void aVisitIsJudgedAsIfNoLaterOneExisted() {
        COURSES.forEach(course -> {
            List<List<Fact>> whole = facts(course);
            for (int visits = 1; visits <= whole.size(); visits++) {
                Course cut =
                        new Course(RandomCourses.CHILD, course.examinations().subList(0, visits));
                assertThat(facts(cut)).isEqualTo(whole.subList(0, visits));
            }
        });
    }

    @Test
    void aVisitWithoutMeasuresChangesNoFindingOfAnother() {
        COURSES.forEach(course -> {
            Map<LocalDate, List<Fact>> before = byDay(course);
            List<Examination> more = new ArrayList<>(course.examinations());
            course.examinations()
                    .forEach(exam -> more.add(Examination.empty(exam.date().plusDays(1))));
            Map<LocalDate, List<Fact>> after = byDay(new Course(RandomCourses.CHILD, more));
            after.keySet().retainAll(before.keySet());
            assertThat(after).isEqualTo(before);
        });
    }

    @Test
    void everythingThatIsSaidHasItsWords() {
        COURSES.forEach(course -> course.visits().forEach(visit -> {
            for (Finding finding : Rulebook.judge(visit, visit.date().plusDays(100), Limits.DEFAULT)) {
                assertThat(Worded.of(finding.because())).isNotBlank();
                if (finding instanceof Finding.Met met) {
                    assertThat(met.checkFirst().stream().map(Worded::of)).doesNotContain("");
                }
            }
            assertThat(Suspicion.at(visit).stream().map(Suspicion::because).map(Worded::of))
                    .doesNotContain("");
            assertThat(Ladder.at(visit, visit.date(), Limits.DEFAULT).stream()
                            .map(Ladder.Step::because)
                            .map((Reason because) -> Worded.of(because)))
                    .doesNotContain("");
        }));
    }

    private static List<List<Fact>> facts(Course course) {
        return course.visits().stream().map(FindingPropertyTests::facts).toList();
    }

    /** Judged on the day of the visit, when no next visit can be overdue. */
    private static List<Fact> facts(Visit visit) {
        return Rulebook.met(visit, visit.date(), Limits.DEFAULT).stream()
                .map(Fact::of)
                .toList();
    }

    private static List<List<String>> codes(Course course) {
        return facts(course).stream()
                .map(visit ->
                        visit.stream().map(fact -> fact.code() + fact.weight()).toList())
                .toList();
    }

    private static Map<LocalDate, List<Fact>> byDay(Course course) {
        Map<LocalDate, List<Fact>> facts = new TreeMap<>();
        course.visits().forEach(visit -> facts.put(visit.date(), facts(visit)));
        return facts;
    }

    private interface Change {
        Examination of(Examination examination);
    }

    private static Course changed(Course course, Change change) {
        return new Course(
                RandomCourses.CHILD,
                course.examinations().stream().map(change::of).collect(Collectors.toList()));
    }

    /** The same visit with every lens written in the other cylinder form, unless that is too strong to be written. */
    private static Examination transposed(Examination examination) {
        Map<Field, String> text = new EnumMap<>(ExaminationWriter.write(examination));
        for (LensMeasure measure : LensMeasure.values()) {
            for (var eye : Eye.values()) {
                measure.in(examination, eye)
                        .map(Lens::transposed)
                        .ifPresent(lens -> text.put(measure.field(eye), lens.toString()));
            }
        }
        Examination other = ExaminationReader.read(text).examination();
        return other == null ? examination : other;
    }
}
