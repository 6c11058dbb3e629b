package plusward.rules;

import static plusward.rules.FindingAssert.assertThat;
import static plusward.rules.Judged.cell;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class PlusShortTests {

    /** 0.50 D of full plus: common practice, no source. Spherical equivalents, so +4.50 -1.00 x 180 is +4.00. */
    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            worn right        | worn left | cycloplegic right | cycloplegic left  | answer  | source
            +3.00             | +3.00     | +3.49             | +3.49             | no      | 0.49 short
            +3.00             | +3.00     | +3.50             | +3.50             | no      | 0.50 short
            +3.00             | +3.00     | +3.51             | +3.50             | look    | 0.51 short, right
            +3.00             | +3.00     | +3.50             | +3.51             | look    | 0.51 short, left
            +3.00             | +3.00     | +4.00 -1.00 x 180 | +4.00 -1.00 x 180 | no      | minus cylinder: +3.50
            +3.00             | +3.00     | +4.02 -1.00 x 180 | +3.00             | look    | minus cylinder: +3.52
            +3.00             | +3.00     | +3.02 +1.00 x 90  | +3.00             | look    | the same in plus cylinder
            +2.50 +1.00 x 90  | +3.00     | +3.50             | +3.50             | no      | worn in plus cylinder: +3.00
            +3.48 -1.00 x 180 | +3.00     | +3.50             | +3.50             | look    | worn in minus cylinder: +2.98
            +5.00             | +5.00     | +3.00             | +3.00             | no      | over is another finding
            +3.00             | +3.00     | +3.50             |                   | unknown | the left was not refracted
            +3.00             | +3.00     |                   | +3.50             | unknown | the right was not refracted
            +3.00             | +3.00     |                   |                   | unknown | nothing was refracted
            +3.00             | +3.00     | +3.51             |                   | look    | one eye is enough
            +3.00             |           | +3.50             | +9.00             | unknown | no left lens on record
                              |           | +3.50             | +3.50             | no      | no glasses on record
            """)
    void wornPlusIsNoMoreThanHalfADioptreShort(
            String right, String left, String cycloplegicRight, String cycloplegicLeft, String answer, String source) {
        assertThat(judged(right, left, cycloplegicRight, cycloplegicLeft))
                .as(source)
                .answers(answer);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            distance | near  | answer | source
            ET 11    | ET 4  | act    | not held
            ET 4     | ET 11 | act    | not held at near
            ET 4     | ET 4  | look   | held
                     |       | look   | not known
            """)
    void asksForADecisionWhenTheTurnIsNotHeld(String distance, String near, String answer, String source) {
        assertThat(Judged.by(
                        new PlusShort(),
                        "worn_right=+2.00",
                        "cycloplegic_right=+4.00",
                        cell("turn_cc_distance", distance),
                        cell("turn_cc_near", near)))
                .as(source)
                .answers(answer);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            refracted  | answer  | source
            2023-03-14 | look    | 24 calendar months before the visit
            2023-03-13 | unknown | a day older than 24 months
            """)
    void aRefractionServesForTwoYears(String refracted, String answer, String source) {
        assertThat(Judged.latest(new PlusShort(), """
                        visit_date | cycloplegic_right | cycloplegic_left | worn_right | worn_left
                        %s         | +5.00             | +5.00            |            |
                        2025-03-14 |                   |                  | +3.00      | +3.00
                        """.formatted(refracted)))
                .as(source)
                .answers(answer);
    }

    @Test
    void saysByHowMuchAndCarriesBothPowers() {
        assertThat(judged("+2.00", "+3.00", "+3.00", "+3.25"))
                .reads("Worn plus is short by right +1.00 D, left +0.25 D of the cycloplegic refraction of 2025-03-14"
                        + " (allowed ≤ 0.50 D).")
                .hasEvidence("cycloplegicOn=2025-03-14, cycloplegicRight=+3.00, cycloplegicLeft=+3.25,"
                        + " wornRight=+2.00, wornLeft=+3.00, right=+1.00, left=+0.25, limit=+0.50")
                .hasChecks(2);
        assertThat(judged("+3.00", "+3.00", "+3.00", "+3.00")).says("≤ 0.50 D");
        assertThat(judged("+3.00", "+3.00", null, null)).says("a cycloplegic refraction", "missing");
        assertThat(judged(null, null, "+3.00", null)).says("No glasses");
    }

    private static Finding judged(String right, String left, String cycloplegicRight, String cycloplegicLeft) {
        return Judged.by(
                new PlusShort(),
                cell("worn_right", right),
                cell("worn_left", left),
                cell("cycloplegic_right", cycloplegicRight),
                cell("cycloplegic_left", cycloplegicLeft));
    }
}
