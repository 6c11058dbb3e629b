package plusward.rules;

import static plusward.rules.FindingAssert.assertThat;
import static plusward.rules.Judged.cell;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import plusward.course.CourseText;
import plusward.course.Limits;
import plusward.exam.HoursPerDay;
import plusward.optics.Millimetres;
import plusward.optics.PrismDioptres;

class SegmentUnevenTests {

    /** 1.0 mm between the eyes: ANSI Z80.1. */
    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            add  | style       | right (mm) | left (mm) | answer  | source
            2.50 | flat-top 28 | -2.00      | -2.99     | no      | 0.99 apart
            2.50 | flat-top 28 | -2.00      | -3.00     | no      | 1.00 apart
            2.50 | flat-top 28 | -2.00      | -3.01     | look    | 1.01 apart, the right higher
            2.50 | flat-top 28 | -3.01      | -2.00     | look    | 1.01 apart, the left higher
            2.50 | flat-top 28 | +0.60      | -0.50     | look    | 1.10 apart, either side of the centre
            2.50 | flat-top 28 | -2.00      |           | unknown | the left is missing
            2.50 | flat-top 28 |            | -2.00     | unknown | the right is missing
            2.50 | flat-top 28 |            |           | unknown | both are missing
            2.50 | progressive | -2.00      | -9.00     | no      | no line
                 | flat-top 28 | -2.00      | -9.00     | no      | no add
            """)
    void theLinesDifferByNoMoreThanTheStandardAllows(
            String add, String style, String right, String left, String answer, String source) {
        assertThat(judged(add, style, right, left)).as(source).answers(answer);
    }

    @Test
    void saysBothHeightsAndTheDifference() {
        assertThat(judged("2.50", "round", "-2.00", "-3.50"))
                .says("right -2.0 mm, left -3.5 mm", "by 1.5 mm (allowed ≤ 1.0 mm)")
                .hasEvidence("pupil=+4.5, topRight=-2.0, topLeft=-3.5, difference=+1.5, limit=+1.0")
                .hasChecks(1);
        assertThat(judged("2.50", "round", "-2.00", "-2.00")).says("≤ 1.0 mm");
    }

    @Test
    void aWiderToleranceOfPlaceDoesNotLoosenIt() {
        Limits limits =
                new Limits(PrismDioptres.of(10), Millimetres.of(3), Millimetres.of(4.5), HoursPerDay.of(8), 8, 12, 90);
        String[] uneven = {"worn_right=+3.00", "worn_add=2.50", "segment_right_mm=-2", "segment_left_mm=-3.5"};
        assertThat(Judged.by(new SegmentUneven(), CourseText.visit(uneven), CourseText.DAY, limits))
                .isMet(Weight.LOOK);
    }

    private static Finding judged(String add, String style, String right, String left) {
        return Judged.by(
                new SegmentUneven(),
                "worn_right=+3.00",
                cell("worn_add", add),
                cell("segment_style", style),
                cell("segment_right_mm", right),
                cell("segment_left_mm", left));
    }
}
