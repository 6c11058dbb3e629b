package plusward.rules;

import static plusward.rules.FindingAssert.assertThat;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import plusward.course.Course;
import plusward.course.CourseText;
import plusward.course.Limits;
import plusward.course.Visit;
import plusward.exam.HoursPerDay;
import plusward.optics.Millimetres;
import plusward.optics.PrismDioptres;

class CycloplegicDueTests {

    private static final CycloplegicDue RULE = new CycloplegicDue();

    /** 12 months, and 3 while the turn is not held: common practice, no source. */
    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            refracted  | near  | answer | source
            2024-03-15 | ET 4  | no     | a day under 12 months
            2024-03-14 | ET 4  | no     | 12 months to the day
            2024-03-13 | ET 4  | look   | a day over 12 months
            2022-01-01 | ET 4  | look   | long ago
            2024-12-15 | ET 12 | no     | not held, a day under 3 months
            2024-12-14 | ET 12 | no     | not held, 3 months to the day
            2024-12-13 | ET 12 | act    | not held, a day over 3 months
            2024-12-13 | E 12  | no     | held
            2024-03-13 |       | look   | not known whether it is held
            """)
    void refractionIsRepeatedInTime(String refracted, String near, String answer, String source) {
        assertThat(judged(refracted, near)).as(source).answers(answer);
    }

    @Test
    void todaysRefractionIsNeverDue() {
        assertThat(Judged.by(RULE, "cycloplegic_left=+3.00", "worn_right=+3.00", "turn_cc_near=ET 30"))
                .isNotMet()
                .says("2025-03-14");
    }

    @Test
    void aChildNeverRefractedIsDueAtOnce() {
        assertThat(Judged.by(RULE))
                .isMet(Weight.LOOK)
                .says("No cycloplegic refraction is on record")
                .hasEvidence("limitMonths=12")
                .hasChecks(1);
        assertThat(Judged.by(RULE, "worn_right=+3.00", "turn_cc_near=ET 30"))
                .isMet(Weight.ACT)
                .hasEvidence("limitMonths=3");
    }

    @Test
    void saysWhenItWasAndHowLongAgo() {
        assertThat(judged("2023-12-01", "ET 4"))
                .says("of 2023-12-01, 15 months before this visit; due after 12 months")
                .hasEvidence("cycloplegicOn=2023-12-01, limitMonths=12")
                .hasChecks(1);
        assertThat(judged("2024-12-01", "ET 4")).says("2024-12-01", "12 months");
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            months | refracted  | near  | answer | source
            6      | 2024-09-14 | ET 4  | no     | the clinic's own 6 months
            6      | 2024-09-13 | ET 4  | look   | a day over them
            2      | 2025-01-13 | ET 12 | act    | shorter than the 3 months of a turn not held
            """)
    void theIntervalIsTheClinicsOwn(int months, String refracted, String near, String answer, String source) {
        Limits limits = new Limits(
                PrismDioptres.of(10), Millimetres.of(1), Millimetres.of(4.5), HoursPerDay.of(8), 8, months, 90);
        Visit visit = course(refracted, near).latest().orElseThrow();
        assertThat(Judged.by(RULE, visit, visit.date(), limits)).as(source).answers(answer);
    }

    private static Finding judged(String refracted, String near) {
        return Judged.latest(RULE, course(refracted, near));
    }

    private static Course course(String refracted, String near) {
        return CourseText.course(Judged.BORN, """
                visit_date | cycloplegic_right | worn_right | turn_cc_distance | turn_cc_near
                %s         | +3.00             |            |                  |
                2025-03-14 |                   | +3.00      | E 4              | %s
                """.formatted(refracted, near == null ? "" : near));
    }
}
