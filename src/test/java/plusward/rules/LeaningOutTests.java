package plusward.rules;

import static plusward.rules.FindingAssert.assertThat;
import static plusward.rules.Judged.cell;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class LeaningOutTests {

    /** Up to L = 10 Δ (J AAPOS 2014;18:261); that a smaller one is worth a look is common practice, no source. */
    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            worn  | distance | near    | answer  | source
            +3.00 | ortho    | ortho   | no      | none
            +3.00 | X(T) 0.1 | ortho   | look    | the least that shows
            +3.00 | XT 10    | ortho   | look    | at the limit
            +3.00 | ortho    | X(T) 10 | look    | at near
            +3.00 | XT 10.1  | ortho   | no      | over it: turned out
            +3.00 | XT 10.1  | XT 4    | no      | over it in one: turned out
            +3.00 | X 8      | X 8     | no      | latent
            +3.00 | ET 8     | ET 8    | no      | inward
            +3.00 | X(T) 4   |         | look    | one is enough
            +3.00 | ET 4     |         | unknown | near is missing
            +3.00 |          | ET 4    | unknown | distance is missing
                  | XT 4     | XT 4    | no      | no glasses on record
            """)
    void anOutwardTurnShowsWithinTheLimit(String worn, String distance, String near, String answer, String source) {
        assertThat(judged(worn, distance, near)).as(source).answers(answer);
    }

    @Test
    void saysTheReading() {
        assertThat(judged("+3.00", "X(T) 4", "E 2"))
                .reads("X(T) 4 at distance, with glasses: an outward turn that shows, within the limit (≤ 10 Δ).")
                .hasEvidence("distance=-4, limit=10")
                .hasChecks(2);
        assertThat(judged("+3.00", "XT 12", "E 2")).says("raised as such");
        assertThat(judged("+3.00", "E 2", "E 2")).says("No outward turn shows");
    }

    private static Finding judged(String worn, String distance, String near) {
        return Judged.by(
                new LeaningOut(),
                cell("worn_right", worn),
                cell("turn_cc_distance", distance),
                cell("turn_cc_near", near));
    }
}
