package plusward.rules;

import static plusward.rules.FindingAssert.assertThat;
import static plusward.rules.Judged.cell;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class PlusOverTests {

    /** 0.50 D: common practice, no source. */
    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            worn right        | worn left | cycloplegic right | cycloplegic left | answer  | source
            +3.49             | +3.00     | +3.00             | +3.00            | no      | 0.49 over
            +3.50             | +3.50     | +3.00             | +3.00            | no      | 0.50 over
            +3.51             | +3.00     | +3.00             | +3.00            | look    | 0.51 over, right
            +3.00             | +3.51     | +3.00             | +3.00            | look    | 0.51 over, left
            +4.02 -1.00 x 180 | +3.00     | +3.00             | +3.00            | look    | minus cylinder: +3.52
            +3.02 +1.00 x 90  | +3.00     | +3.00             | +3.00            | look    | the same in plus cylinder
            +1.00             | +1.00     | +3.00             | +3.00            | no      | short is another finding
            +3.51             | +3.00     | +3.00             |                  | look    | one eye is enough
            +3.50             | +9.00     | +3.00             |                  | unknown | the left was not refracted
                              | +3.50     | +3.00             | +3.00            | unknown | no right lens on record
            +3.00             | +3.00     |                   |                  | unknown | nothing was refracted
                              |           | +3.00             | +3.00            | no      | no glasses on record
            """)
    void wornPlusIsNoMoreThanHalfADioptreOver(
            String right, String left, String cycloplegicRight, String cycloplegicLeft, String answer, String source) {
        assertThat(judged(right, left, cycloplegicRight, cycloplegicLeft))
                .as(source)
                .answers(answer);
    }

    @Test
    void saysByHowMuchAndCarriesBothPowers() {
        assertThat(judged("+4.00", "+3.00", "+3.00", "+3.25"))
                .says("over by right +1.00 D, left -0.25 D", "2025-03-14", "≤ 0.50 D")
                .hasEvidence("cycloplegicOn=2025-03-14, cycloplegicRight=+3.00, cycloplegicLeft=+3.25,"
                        + " wornRight=+4.00, wornLeft=+3.00, right=+1.00, left=-0.25, limit=+0.50")
                .hasChecks(2);
        assertThat(judged("+3.00", "+3.00", "+3.00", "+3.00")).says("≤ 0.50 D");
        assertThat(judged(null, null, "+3.00", null)).says("No glasses");
    }

    private static Finding judged(String right, String left, String cycloplegicRight, String cycloplegicLeft) {
        return Judged.by(
                new PlusOver(),
                cell("worn_right", right),
                cell("worn_left", left),
                cell("cycloplegic_right", cycloplegicRight),
                cell("cycloplegic_left", cycloplegicLeft));
    }
}
