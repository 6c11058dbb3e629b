package plusward.rules;

import static plusward.rules.FindingAssert.assertThat;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import plusward.course.Course;
import plusward.course.CourseText;

class LateOnsetTests {

    private static final LateOnset RULE = new LateOnset();

    /** From 6 years, under +1.50 D: common practice, no source, for both numbers. */
    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            onset (months) | hyperopia | near  | answer  | source
            71             | +1.49     | ET 12 | no      | began before 6 years
            72             | +1.49     | ET 12 | act     | at 6 years, under +1.50
            90             | -2.00     | ET 12 | act     | short-sighted is under +1.50 too
            72             | +1.50     | ET 12 | no      | enough hyperopia to explain it
            72             | +1.49     | ET 10 | no      | held
            72             | +1.49     |       | no      | not known not to be held
                           | +1.49     | ET 12 | unknown | onset is missing
                           | +1.50     | ET 12 | no      | hyperopia explains it, whenever it began
            72             |           | ET 12 | unknown | hyperopia is missing
            71             |           | ET 12 | no      | began early, whatever the hyperopia
                           |           | ET 12 | unknown | both are missing
            """)
    void beganLateWithLittleHyperopia(Integer onset, String hyperopia, String near, String answer, String source) {
        assertThat(judged(onset, hyperopia, near)).as(source).answers(answer);
    }

    @Test
    void saysTheNumbers() {
        assertThat(judged(80, "+1.00", "ET 12"))
                .says("80 months", "hyperopia is +1.00 D (< 1.50 D is little)")
                .hasEvidence("turnFirstSeenMonths=80, hyperopia=+1.00, limit=+1.50")
                .hasChecks(3);
        assertThat(judged(null, "+1.00", "ET 12")).says("the age at which it was first seen");
        assertThat(judged(80, null, "ET 12")).says("no cycloplegic refraction of the last 24 months");
    }

    private static Finding judged(Integer onset, String hyperopia, String near) {
        Course course = CourseText.course(CourseText.patient("2012-01-01", onset), """
                visit_date | worn_right | cycloplegic_right | turn_cc_distance | turn_cc_near
                2025-03-14 | plano      | %s                | E 4              | %s
                """.formatted(
                        hyperopia == null ? "" : hyperopia, near == null ? "" : near));
        return Judged.latest(RULE, course);
    }
}
