package plusward.course;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.time.LocalDate;
import java.util.List;
import org.junit.jupiter.api.Test;
import plusward.exam.Examination;

class CourseTests {

    private static final Patient CHILD = CourseText.patient("2019-05-02", 30);
    private static final LocalDate FIRST = LocalDate.parse("2023-03-14");
    private static final LocalDate SECOND = LocalDate.parse("2024-03-14");
    private static final LocalDate THIRD = LocalDate.parse("2025-03-14");

    @Test
    void visits_come_in_order_of_date_whatever_the_order_given() {
        assertThat(course(THIRD, FIRST, SECOND)).isEqualTo(course(FIRST, SECOND, THIRD));
        assertThat(days(course(THIRD, FIRST, SECOND).visits())).containsExactly(FIRST, SECOND, THIRD);
    }

    @Test
    void two_examinations_on_one_day_are_refused() {
        assertThatThrownBy(() -> course(FIRST, SECOND, FIRST)).isInstanceOf(IllegalArgumentException.class);
    }

    @Test
    void the_latest_visit_is_the_one_that_none_follows() {
        Course course = course(FIRST, SECOND);
        assertThat(course.latest().orElseThrow().date()).isEqualTo(SECOND);
        assertThat(course.visits().stream().map(Visit::isLatest)).containsExactly(false, true);
        assertThat(course().latest()).isEmpty();
    }

    @Test
    void a_visit_is_found_by_its_day() {
        assertThat(course(FIRST, SECOND).on(FIRST).orElseThrow().date()).isEqualTo(FIRST);
        assertThat(course(FIRST, SECOND).on(THIRD)).isEmpty();
    }

    @Test
    void a_visit_looks_back_and_never_forward() {
        Visit second = course(FIRST, SECOND, THIRD).visits().get(1);
        assertThat(days(second.before().toList())).containsExactly(FIRST);
        assertThat(days(second.upToHere().toList())).containsExactly(SECOND, FIRST);
        assertThat(days(second.fromFirst())).containsExactly(FIRST, SECOND);
    }

    @Test
    void the_last_earlier_visit_of_a_kind_is_the_nearest() {
        Visit third = course(FIRST, SECOND, THIRD).visits().get(2);
        assertThat(third.lastBefore(visit -> true).orElseThrow().date()).isEqualTo(SECOND);
        assertThat(third.lastBefore(visit -> visit.date().equals(FIRST))
                        .orElseThrow()
                        .date())
                .isEqualTo(FIRST);
        assertThat(third.lastBefore(visit -> visit.date().equals(THIRD))).isEmpty();
    }

    /** 2019-05-02 to 2025-03-14 is 2143 days, 2143/365.2425 years. */
    @Test
    void a_visit_knows_the_child_and_its_age() {
        Visit visit = course(THIRD).visits().get(0);
        assertThat(visit.patient()).isEqualTo(CHILD);
        assertThat(visit.age().inYears()).isEqualTo(Math.rint(2143 / 365.2425 * 1e9) / 1e9);
        assertThat(visit.exam()).isEqualTo(Examination.empty(THIRD));
        assertThat(visit.glasses().areWorn()).isFalse();
        assertThat(visit).hasToString("T-1 on 2025-03-14");
    }

    @Test
    void an_examination_takes_its_place_among_the_others() {
        Visit second = course(THIRD, FIRST).with(Examination.empty(SECOND));
        assertThat(second.date()).isEqualTo(SECOND);
        assertThat(days(second.before().toList())).containsExactly(FIRST);
        assertThat(second.isLatest()).isFalse();
        assertThat(second.patient()).isEqualTo(CHILD);
        assertThat(course().with(Examination.empty(FIRST)).isLatest()).isTrue();
    }

    @Test
    void an_examination_takes_the_place_of_the_one_of_its_day() {
        Course before = course(FIRST, SECOND, THIRD);
        Examination richer = CourseText.exam("visit_date=" + SECOND, "turn_cc_near=ET 12");
        Visit second = before.with(richer);
        assertThat(second.exam()).isEqualTo(richer);
        assertThat(days(second.fromFirst())).containsExactly(FIRST, SECOND);
        assertThat(second.isLatest()).isFalse();
        assertThat(before.on(SECOND).orElseThrow().exam()).isEqualTo(Examination.empty(SECOND));
    }

    private static List<LocalDate> days(List<Visit> visits) {
        return visits.stream().map(Visit::date).toList();
    }

    private static Course course(LocalDate... days) {
        return new Course(CHILD, List.of(days).stream().map(Examination::empty).toList());
    }
}
