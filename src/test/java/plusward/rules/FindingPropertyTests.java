package plusward.rules;

import static org.assertj.core.api.Assertions.assertThat;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.Collections;
import java.util.EnumMap;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Random;
import java.util.TreeMap;
import java.util.function.UnaryOperator;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
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
import plusward.exam.LensNotation;
import plusward.optics.Lens;

/** Over random courses: what must hold of every finding, whatever was typed. */
class FindingPropertyTests {

    private static final List<Course> COURSES = RandomCourses.all();
    private static final Pattern WITH_CYLINDER = Pattern.compile(".* x \\d+");
    private static final double STRONGEST_SPHERE = 30;

    /** A finding without its words; lenses in minus-cylinder form, since either form is the same lens. */
    private record Fact(
            String code,
            Class<? extends Finding> answer,
            @Nullable Weight weight,
            Map<String, Object> evidence) {

        private static Fact of(Finding finding) {
            if (!(finding instanceof Finding.Met met)) {
                return new Fact(finding.code(), finding.getClass(), null, Map.of());
            }
            Map<String, Object> evidence = new HashMap<>();
            met.evidence().forEach((name, value) -> evidence.put(name, inMinusCylinder(value)));
            return new Fact(met.code(), met.getClass(), met.weight(), evidence);
        }

        private static Object inMinusCylinder(Object value) {
            return value instanceof String text && WITH_CYLINDER.matcher(text).matches()
                    ? LensNotation.parse(text).inMinusCylinder()
                    : value;
        }

        private Fact mirrored() {
            Map<String, Object> other = new HashMap<>();
            evidence.forEach(
                    (name, value) -> other.put(mirrored(name), value instanceof Lens lens ? lens.mirrored() : value));
            return new Fact(code, answer, weight, other);
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
    void noRuleThrowsAndEveryRuleAnswers() {
        COURSES.forEach(course -> course.visits()
                .forEach(visit -> assertThat(Told.judged(visit))
                        .extracting(Finding::code)
                        .startsWith(Rulebook.rules().stream().map(Rule::code).toArray(String[]::new))));
    }

    @Test
    void theDayOfTheJudgementMattersOnlyToAnOverdueVisit() {
        COURSES.forEach(course -> course.visits()
                .forEach(visit -> assertThat(
                                factsExceptOverdue(visit, visit.date().plusDays(400)))
                        .isEqualTo(factsExceptOverdue(visit, visit.date()))));
    }

    @Test
    void theRandomCoursesMeetEveryCodeOfTheBook() {
        Stream<Finding> judged =
                COURSES.stream().flatMap(course -> course.visits().stream()).flatMap(Told::judged);
        assertThat(Told.met(judged.toList()).map(Finding.Met::code)).containsAll(RulebookTests.codes());
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
        COURSES.forEach(course -> assertThat(facts(changed(course, FindingPropertyTests::transposed)))
                .isEqualTo(facts(course)));
    }

    @Test
    void mostRandomCoursesHoldALensThatIsWrittenInEitherForm() {
        assertThat(COURSES.stream()
                        .filter(course -> !changed(course, FindingPropertyTests::transposed)
                                .examinations()
                                .equals(course.examinations())))
                .hasSizeGreaterThan(COURSES.size() / 2);
    }

    @Test
    void theOrderInWhichVisitsAreBroughtInDoesNotMatter() {
        COURSES.forEach(course -> {
            List<Examination> shuffled = new ArrayList<>(course.examinations());
            Collections.shuffle(shuffled, new Random(shuffled.size()));
            assertThat(facts(new Course(course.patient(), shuffled))).isEqualTo(facts(course));
        });
    }

    @Test
    void aVisitIsJudgedAsIfNoLaterOneExisted() {
        COURSES.forEach(course -> {
            List<List<Fact>> whole = factsOfTheDay(course);
            for (int visits = 1; visits <= whole.size(); visits++) {
                Course cut = new Course(course.patient(), course.examinations().subList(0, visits));
                assertThat(factsOfTheDay(cut)).isEqualTo(whole.subList(0, visits));
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
            Map<LocalDate, List<Fact>> after = byDay(new Course(course.patient(), more));
            assertThat(after).hasSizeGreaterThan(before.size()).containsAllEntriesOf(before);
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
                            .map(Worded::of))
                    .doesNotContain("");
        }));
    }

    private static List<List<Fact>> facts(Course course) {
        return course.visits().stream()
                .map(visit -> Told.judged(visit).map(Fact::of).toList())
                .toList();
    }

    private static List<List<Fact>> factsOfTheDay(Course course) {
        return course.visits().stream().map(FindingPropertyTests::factsOfTheDay).toList();
    }

    private static List<Fact> factsOfTheDay(Visit visit) {
        return factsExceptOverdue(visit, visit.date());
    }

    /** Without the only rule that asks what day it is, and whether a visit is the latest. */
    private static List<Fact> factsExceptOverdue(Visit visit, LocalDate on) {
        return Rulebook.judge(visit, on, Limits.DEFAULT).stream()
                .filter(finding -> !finding.code().equals("visit-overdue"))
                .map(Fact::of)
                .toList();
    }

    private static Map<LocalDate, List<Fact>> byDay(Course course) {
        Map<LocalDate, List<Fact>> facts = new TreeMap<>();
        course.visits().forEach(visit -> facts.put(visit.date(), factsOfTheDay(visit)));
        return facts;
    }

    private static Course changed(Course course, UnaryOperator<Examination> change) {
        return new Course(
                course.patient(), course.examinations().stream().map(change).toList());
    }

    /** The same visit with every lens written in the other cylinder form, unless that is too strong to be written. */
    private static Examination transposed(Examination examination) {
        Map<Field, String> text = new EnumMap<>(ExaminationWriter.write(examination));
        for (LensMeasure measure : LensMeasure.values()) {
            for (Eye eye : Eye.values()) {
                measure.in(examination, eye)
                        .map(Lens::transposed)
                        .filter(lens -> Math.abs(lens.sphere().amount()) <= STRONGEST_SPHERE)
                        .ifPresent(lens -> text.put(measure.field(eye), lens.toString()));
            }
        }
        return Objects.requireNonNull(ExaminationReader.read(text).examination());
    }
}
