package plusward.rules;

import static plusward.rules.FindingAssert.assertThat;
import static plusward.rules.Judged.cell;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class SegmentAbovePupilCentreTests {

    /** Tolerance 1.0 mm (ANSI Z80.1) above the pupil centre. */
    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            add  | style       | right (mm) | left (mm) | answer  | source
            2.50 | flat-top 28 | +0.99      | +0.99     | no      | under the tolerance
            2.50 | flat-top 28 | +1.00      | +1.00     | no      | at the tolerance
            2.50 | flat-top 28 | +1.01      | +1.00     | look    | over it in the right eye
            2.50 | flat-top 28 | +1.00      | +1.01     | look    | over it in the left eye
            2.50 | flat-top 28 | +1.01      |           | look    | one eye is enough
            2.50 | flat-top 28 | +1.00      |           | unknown | the left may be too high
            2.50 | flat-top 28 |            | +1.00     | unknown | the right may be too high
            2.50 | flat-top 28 |            |           | unknown | nothing was measured
            2.50 | flat-top 28 | -5.00      | -5.00     | no      | too low is another finding
            2.50 | progressive | +4.00      | +4.00     | no      | a fitting cross is no line
                 | flat-top 28 | +4.00      | +4.00     | no      | no add
            """)
    void theLineLiesNoMoreThanTheToleranceAboveTheCentre(
            String add, String style, String right, String left, String answer, String source) {
        assertThat(judged(add, style, right, left)).as(source).answers(answer);
    }

    @Test
    void saysTheEyesAndTheNumbers() {
        assertThat(judged("2.50", "round", "+1.50", "+0.50"))
                .says("above the pupil centre: right +1.5 mm, left +0.5 mm (allowed ≤ 1.0 mm)")
                .hasEvidence("pupil=+4.5, topRight=+1.5, topLeft=+0.5, limit=+1.0")
                .hasChecks(1);
        assertThat(judged("2.50", "round", "+1.00", "+0.50")).says("≤ 1.0 mm");
        assertThat(judged("2.50", "progressive", "+1.50", "+0.50")).says("no segment line");
    }

    private static Finding judged(String add, String style, String right, String left) {
        return Judged.by(
                new SegmentAbovePupilCentre(),
                "worn_right=+3.00",
                cell("worn_add", add),
                cell("segment_style", style),
                cell("segment_right_mm", right),
                cell("segment_left_mm", left));
    }
}
