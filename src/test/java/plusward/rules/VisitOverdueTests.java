package plusward.rules;

import static plusward.rules.FindingAssert.assertThat;
import static plusward.rules.Judged.cell;

import java.time.LocalDate;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import plusward.course.Course;
import plusward.course.CourseText;
import plusward.course.Limits;
import plusward.exam.HoursPerDay;
import plusward.optics.Millimetres;
import plusward.optics.PrismDioptres;

class VisitOverdueTests {

    private static final VisitOverdue RULE = new VisitOverdue();

    /** Seen on 2025-03-14, due 4 weeks later, on 2025-04-11. 90 days: common practice, no source. */
    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            weeks | on         | answer  | source
            4     | 2025-04-10 | no      | the day before
            4     | 2025-04-11 | no      | the day itself
            4     | 2025-04-12 | look    | a day after
            4     | 2025-07-10 | look    | 90 days after
            4     | 2025-07-11 | act     | 91 days after
            0     | 2025-03-14 | no      | due the same day
                  | 2030-01-01 | unknown | no visit was set
            """)
    void theNextVisitHasTakenPlaceInTime(String weeks, String on, String answer, String source) {
        assertThat(judged(weeks, on)).as(source).answers(answer);
    }

    @Test
    void saysTheDayAndTheDays() {
        assertThat(judged("4", "2025-04-12"))
                .says("due on 2025-04-11, 1 day ago")
                .hasEvidence("due=2025-04-11, days=1, limitDays=90")
                .hasChecks(1);
        assertThat(judged("4", "2025-04-21")).says("10 days ago");
        assertThat(judged("4", "2025-04-11")).says("2025-04-11");
        assertThat(judged(null, "2025-04-11")).says("No next visit was set");
    }

    @Test
    void onlyTheLatestVisitIsAsked() {
        Course course = CourseText.course(Judged.BORN, """
                visit_date | next_visit_weeks
                2024-03-14 | 4
                2025-03-14 | 4
                """);
        LocalDate on = LocalDate.parse("2026-01-01");
        assertThat(Judged.by(RULE, course.visits().get(0), on, Limits.DEFAULT))
                .isNotMet()
                .says("A later visit");
        assertThat(Judged.by(RULE, course.visits().get(1), on, Limits.DEFAULT)).isMet(Weight.ACT);
    }

    @Test
    void theDaysAreTheClinicsOwn() {
        Limits limits =
                new Limits(PrismDioptres.of(10), Millimetres.of(1), Millimetres.of(4.5), HoursPerDay.of(8), 8, 12, 30);
        LocalDate day31 = LocalDate.parse("2025-05-12");
        assertThat(Judged.by(RULE, CourseText.visit("next_visit_weeks=4"), day31, limits))
                .isMet(Weight.ACT);
        assertThat(Judged.by(RULE, CourseText.visit("next_visit_weeks=4"), day31.minusDays(1), limits))
                .isMet(Weight.LOOK);
    }

    private static Finding judged(String weeks, String on) {
        return Judged.by(RULE, CourseText.visit(cell("next_visit_weeks", weeks)), LocalDate.parse(on), Limits.DEFAULT);
    }
}
