package plusward.rules;

import static plusward.rules.FindingAssert.assertThat;
import static plusward.rules.Judged.cell;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class AcuityGapTests {

    /** Two lines, 0.20 logMAR: common practice, no source. 20/20 is 0.00, 20/32 is 0.204; a letter is 0.02 (Holladay 2004). */
    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            worn  | right             | left              | answer  | source
            +3.00 | 0.10 logMAR       | 0.29 logMAR       | no      | 0.19
            +3.00 | 0.10 logMAR       | 0.30 logMAR       | look    | 0.20, left worse
            +3.00 | 0.30 logMAR       | 0.10 logMAR       | look    | 0.20, right worse
            +3.00 | -0.10 logMAR      | 0.10 logMAR       | look    | 0.20, either side of 0
            +3.00 | 20/20             | 20/32             | look    | log10(32/20) = 0.204
            +3.00 | 20/20             | 20/32+1           | no      | a letter better: 0.184
            +3.00 | 20/20             |                   | unknown | the left is missing
            +3.00 |                   | 20/20             | unknown | the right is missing
            +3.00 | 20/20             | fixes and follows | unknown | it says nothing of how small
            +3.00 | 20/40             | CF                | look    | worse than any line
            +3.00 | HM                | 20/40             | look    | worse than any line
            +3.00 | CF                | NLP               | unknown | two words cannot be subtracted
            +3.00 | CF                |                   | unknown | nothing to compare with
            +3.00 | CF                | fixes and follows | unknown | nothing to compare with
                  | 20/20             | 20/200            | no      | no glasses on record
            """)
    void theEyesSeeAlikeWithGlasses(String worn, String right, String left, String answer, String source) {
        assertThat(judged(worn, right, left)).as(source).answers(answer);
    }

    @Test
    void saysBothAcuities() {
        assertThat(judged("+3.00", "20/20", "20/40"))
                .says("right 20/20, left 20/40: they differ by 0.30 logMAR")
                .hasEvidence("right=0.00, left=0.30, gap=0.30, limit=0.20")
                .hasChecks(2);
        assertThat(judged("+3.00", "20/20", "LP"))
                .says("right 20/20, left LP", "worse than any line")
                .hasEvidence("right=20/20, left=LP, limit=0.20")
                .hasChecks(2);
        assertThat(judged("+3.00", "20/20", "20/20")).says("0.00 logMAR", "from 0.20 logMAR");
        assertThat(judged("+3.00", "20/20", null)).says("cannot be excluded");
    }

    private static Finding judged(String worn, String right, String left) {
        return Judged.by(
                new AcuityGap(), cell("worn_right", worn), cell("acuity_right", right), cell("acuity_left", left));
    }
}
