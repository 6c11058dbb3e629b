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

class SegmentBelowPupilTests {

    private static final SegmentBelowPupil RULE = new SegmentBelowPupil();

    /** Lower edge = half the pupil under its centre; tolerance 1.0 mm (ANSI Z80.1); default pupil 4.5 mm (from memory). */
    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            add  | style       | pupil (mm) | right (mm) | left (mm) | answer  | source
            2.50 | flat-top 28 | 4          | -3.00      | -3.00     | no      | 1.0 below the edge at -2.0
            2.50 | flat-top 28 | 4          | -3.01      | -3.00     | act     | 1.01 below in the right eye
            2.50 | flat-top 28 | 4          | -3.00      | -3.01     | act     | 1.01 below in the left eye
            2.50 | flat-top 28 | 4          | -3.50      | -3.50     | act     | the worked example: 1.5 below
            2.50 | flat-top 28 | 4          | -2.99      | -2.99     | no      | 0.99 below
            2.50 | flat-top 28 | 4          | +3.00      | +3.00     | no      | above the pupil is another finding
            2.50 | flat-top 28 | 6          | -4.00      | -4.00     | no      | a wider pupil: the edge at -3.0
            2.50 | flat-top 28 |            | -3.25      | -3.25     | no      | the default pupil: the edge at -2.25
            2.50 | flat-top 28 |            | -3.26      | -3.25     | act     | 1.01 below the edge at -2.25
            2.50 | executive   | 4          | -3.50      | -3.50     | act     | any shape with a line
            2.50 |             | 4          | -3.50      | -3.50     | act     | a shape not recorded counts as a line
            2.50 | flat-top 28 | 4          | -3.50      |           | act     | one eye is enough
            2.50 | flat-top 28 | 4          | -3.00      |           | unknown | the left may be too low
            2.50 | flat-top 28 | 4          |            | -3.00     | unknown | the right may be too low
            2.50 | flat-top 28 | 4          |            |           | unknown | nothing was measured
            2.50 | progressive | 4          | -9.00      | -9.00     | no      | a progressive lens has no line
            0.00 | flat-top 28 | 4          | -9.00      | -9.00     | no      | no add
                 | flat-top 28 | 4          | -9.00      | -9.00     | no      | no add
            """)
    void theLineLiesNoMoreThanTheToleranceBelowThePupil(
            String add, String style, String pupil, String right, String left, String answer, String source) {
        assertThat(judged(add, style, pupil, right, left)).as(source).answers(answer);
    }

    @Test
    void saysTheEyesTheNumbersAndThePupil() {
        assertThat(judged("2.50", "round", "4", "-3.50", "-3.00"))
                .reads("The segment top lies below the pupil’s lower edge by right +1.5 mm, left +1.0 mm"
                        + " (pupil 4.0 mm measured; allowed ≤ 1.0 mm).")
                .hasEvidence(
                        "pupil=+4.0, topRight=-3.5, topLeft=-3.0, belowEdgeRight=+1.5, belowEdgeLeft=+1.0, limit=+1.0")
                .hasChecks(3);
        assertThat(judged("2.50", "round", null, "-3.50", null)).says("by right +1.25 mm (pupil 4.5 mm assumed");
    }

    @Test
    void saysWhyItDoesNotApply() {
        assertThat(judged("2.50", "progressive", "4", null, null)).isNotMet().says("no segment line", "fitting cross");
        assertThat(judged(null, null, null, null, null)).isNotMet().says("No add");
        assertThat(judged("2.50", "round", "4", "-3.00", "-3.00")).says("≤ 1.0 mm");
        assertThat(judged("2.50", "round", "4", null, "-3.00")).says("not measured in both eyes");
    }

    @Test
    void theToleranceAndTheDefaultPupilAreTheClinicsOwn() {
        Limits limits =
                new Limits(PrismDioptres.of(10), Millimetres.of(2.0), Millimetres.of(6), HoursPerDay.of(8), 8, 12, 90);
        String[] low = {"worn_right=+3.00", "worn_add=2.50", "segment_right_mm=-5.01", "segment_left_mm=-5"};
        assertThat(Judged.by(RULE, CourseText.visit(low), CourseText.DAY, limits))
                .isMet(Weight.ACT);
        String[] passing = {"worn_right=+3.00", "worn_add=2.50", "segment_right_mm=-5", "segment_left_mm=-5"};
        assertThat(Judged.by(RULE, CourseText.visit(passing), CourseText.DAY, limits))
                .isNotMet();
    }

    private static Finding judged(String add, String style, String pupil, String right, String left) {
        return Judged.by(
                RULE,
                "worn_right=+3.00",
                cell("worn_add", add),
                cell("segment_style", style),
                cell("pupil_mm", pupil),
                cell("segment_right_mm", right),
                cell("segment_left_mm", left));
    }
}
