package plusward.rules;

import static plusward.rules.FindingAssert.assertThat;
import static plusward.rules.Judged.cell;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class UnequalHyperopiaTests {

    /** 1.00 D: common practice, no source. */
    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            right             | left             | answer  | source
            +3.00             | +3.99            | no      | 0.99
            +3.00             | +4.00            | note    | 1.00, left more
            +4.00             | +3.00            | note    | 1.00, right more
            +4.50 -1.00 x 180 | +3.00            | note    | minus cylinder: +4.00
            +3.50 +1.00 x 90  | +3.00            | note    | the same in plus cylinder
            +4.50 -1.02 x 180 | +3.00            | no      | minus cylinder: +3.99
            +3.00             |                  | unknown | the left was not refracted
                              | +3.00            | unknown | the right was not refracted
                              |                  | no      | no cycloplegic refraction today
            """)
    void theEyesDifferByADioptre(String right, String left, String answer, String source) {
        assertThat(judged(right, left)).as(source).answers(answer);
    }

    @Test
    void saysBothEyes() {
        assertThat(judged("+3.00", "+4.50"))
                .says("right +3.00 D, left +4.50 D: they differ by 1.50 D")
                .hasEvidence("right=+3.00, left=+4.50, difference=+1.50, limit=+1.00")
                .hasChecks(1);
        assertThat(judged("+3.00", "+3.25")).says("differ by 0.25 D", "from 1.00 D");
    }

    @Test
    void anEarlierRefractionIsNotThisVisits() {
        assertThat(Judged.latest(new UnequalHyperopia(), """
                        visit_date | cycloplegic_right | cycloplegic_left
                        2024-03-14 | +3.00             | +5.00
                        2025-03-14 |                   |
                        """))
                .isNotMet()
                .says("No cycloplegic refraction at this visit");
    }

    private static Finding judged(String right, String left) {
        return Judged.by(new UnequalHyperopia(), cell("cycloplegic_right", right), cell("cycloplegic_left", left));
    }
}
