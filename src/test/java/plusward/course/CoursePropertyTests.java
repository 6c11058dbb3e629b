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
import org.junit.jupiter.api.Test;
import plusward.exam.Examination;

/** Over random courses: some of anything that can be typed, some of what a clinic sees. */
class CoursePropertyTests {

    private static final List<Course> COURSES = RandomCourses.all();

    @Test
    void every_course_is_judged_without_a_fault() {
        assertThatCode(() -> COURSES.forEach(Judgement::of)).doesNotThrowAnyException();
    }

    @Test
    void a_mirrored_child_is_judged_alike_with_the_eyes_exchanged() {
        COURSES.forEach(course -> {
            Course mirrored = new Course(
                    course.patient(),
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
            assertThat(Judgement.of(new Course(course.patient(), shuffled))).isEqualTo(Judgement.of(course));
        });
    }

    @Test
    void a_visit_is_judged_as_if_no_later_one_existed() {
        COURSES.forEach(course -> {
            List<Judgement> whole = Judgement.of(course);
            for (int visits = 1; visits <= whole.size(); visits++) {
                Course cut = new Course(course.patient(), course.examinations().subList(0, visits));
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
            Map<LocalDate, Judgement> after = byDay(new Course(course.patient(), more));
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

    private static Map<LocalDate, Judgement> byDay(Course course) {
        Map<LocalDate, Judgement> judgements = new TreeMap<>();
        course.visits().forEach(visit -> judgements.put(visit.date(), Judgement.of(visit)));
        return judgements;
    }
}
