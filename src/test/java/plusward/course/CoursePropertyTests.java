package plusward.course;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatCode;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Map;
import java.util.Random;
import java.util.TreeMap;
import java.util.stream.IntStream;
import java.util.stream.LongStream;
import org.junit.jupiter.api.Test;
import plusward.exam.Examination;
import plusward.exam.Generator;

/** Over random courses: some of anything that can be typed, some of what a clinic sees. */
class CoursePropertyTests {

    private static final int NUMBER = 80;
    private static final LocalDate FIRST = LocalDate.parse("2020-01-15");
    private static final Patient CHILD = CourseText.patient("2017-03-03", 30);
    private static final List<Course> COURSES = courses();

    @Test
    void every_course_is_judged_without_a_fault() {
        assertThatCode(() -> COURSES.forEach(Judgement::of)).doesNotThrowAnyException();
    }

    @Test
    void a_mirrored_child_is_judged_alike_with_the_eyes_exchanged() {
        COURSES.forEach(course -> {
            Course mirrored = new Course(
                    CHILD,
                    course.examinations().stream().map(Examination::mirrored).toList());
            assertThat(Judgement.of(mirrored))
                    .isEqualTo(Judgement.of(course).stream()
                            .map(Judgement::mirrored)
                            .toList());
        });
    }

    @Test
    void the_order_in_which_visits_are_brought_in_does_not_matter() {
        COURSES.forEach(course -> {
            List<Examination> shuffled = new ArrayList<>(course.examinations());
            Collections.shuffle(shuffled, new Random(shuffled.size()));
            assertThat(Judgement.of(new Course(CHILD, shuffled))).isEqualTo(Judgement.of(course));
        });
    }

    @Test
    void a_visit_is_judged_as_if_no_later_one_existed() {
        COURSES.forEach(course -> {
            List<Judgement> whole = Judgement.of(course);
            for (int visits = 1; visits <= whole.size(); visits++) {
                Course cut = new Course(CHILD, course.examinations().subList(0, visits));
                assertThat(Judgement.of(cut)).isEqualTo(whole.subList(0, visits));
            }
        });
    }

    @Test
    void a_visit_without_measures_changes_what_is_said_of_no_other() {
        COURSES.forEach(course -> {
            Map<LocalDate, Judgement> before = byDay(course);
            List<Examination> more = new ArrayList<>(course.examinations());
            course.examinations()
                    .forEach(exam -> more.add(Examination.empty(exam.date().plusDays(1))));
            Map<LocalDate, Judgement> after = byDay(new Course(CHILD, more));
            after.keySet().retainAll(before.keySet());
            assertThat(after).isEqualTo(before);
        });
    }

    @Test
    void the_random_courses_reach_every_state_and_pattern() {
        List<Judgement> all = COURSES.stream()
                .flatMap(course -> Judgement.of(course).stream())
                .toList();
        assertThat(all.stream().map(judgement -> judgement.control().state())).contains(ControlState.values());
        assertThat(all.stream().map(judgement -> judgement.pattern().kind())).contains(PatternKind.values());
        assertThat(all.stream().filter(judgement -> judgement.model().base() != null))
                .isNotEmpty();
        assertThat(all.stream().filter(judgement -> judgement.trends().isComplete()))
                .isNotEmpty();
    }

    private static List<Course> courses() {
        return LongStream.range(0, NUMBER)
                .mapToObj(seed -> course(seed, seed % 2 == 0 ? anything(seed) : clinic(seed)))
                .toList();
    }

    private static Course course(long seed, Visits visits) {
        int number = 1 + new Random(seed).nextInt(6);
        return new Course(
                CHILD,
                IntStream.range(0, number)
                        .mapToObj(i -> visits.on(FIRST.plusDays(120L * i + seed % 60)))
                        .toList());
    }

    private interface Visits {
        Examination on(LocalDate day);
    }

    private static Visits anything(long seed) {
        return new Generator(seed)::examination;
    }

    /** Turns around the limits, plus around full, dates around eight weeks; a quarter of each missing. */
    private static Visits clinic(long seed) {
        Random random = new Random(seed);
        String[] plus = {"+3.00", "+3.50", "+3.75 -0.50 x 90", "+4.00"};
        String[] turns = {"ET 30", "ET 22", "E(T) 15", "ET 10", "E 9", "E 4", "ortho", "X 4", "X(T) 12"};
        return day -> CourseText.exam(
                "visit_date=" + day,
                "worn_right=" + pick(random, plus),
                "worn_left=" + pick(random, plus),
                "worn_add=" + pick(random, "", "2.50"),
                "worn_since="
                        + pick(
                                random,
                                day.minusWeeks(8).toString(),
                                day.minusDays(55).toString()),
                "cycloplegic_right=" + pick(random, plus),
                "cycloplegic_left=" + pick(random, plus),
                "turn_sc_distance=" + pick(random, "ET 40", "ET 32", "ET 22"),
                "turn_sc_near=" + pick(random, "ET 40", "ET 32", "ET 22"),
                "turn_cc_distance=" + pick(random, turns),
                "turn_cc_near=" + pick(random, turns),
                "turn_add_near=" + pick(random, turns),
                "segment_right_mm=" + pick(random, "-2.0", "-4.0"),
                "segment_left_mm=" + pick(random, "-2.0", "-4.0"));
    }

    private static String pick(Random random, String... choices) {
        return random.nextInt(4) == 0 ? "" : choices[random.nextInt(choices.length)];
    }

    private static Map<LocalDate, Judgement> byDay(Course course) {
        Map<LocalDate, Judgement> judgements = new TreeMap<>();
        course.visits().forEach(visit -> judgements.put(visit.date(), Judgement.of(visit)));
        return judgements;
    }
}
