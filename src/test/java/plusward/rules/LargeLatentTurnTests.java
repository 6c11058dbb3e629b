package plusward.rules;

import static plusward.rules.FindingAssert.assertThat;
import static plusward.rules.Judged.cell;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class LargeLatentTurnTests {

    /** L = 10 Δ: J AAPOS 2014;18:261. */
    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            worn  | add  | distance | near   | through add | answer  | source
            +3.00 |      | E 9.9    | E 9.9  |             | no      | under the limit
            +3.00 |      | E 10     | E 10   |             | no      | at the limit
            +3.00 |      | E 10.1   | E 4    |             | look    | over it at distance
            +3.00 |      | E 4      | E 10.1 |             | look    | over it at near
            +3.00 | 2.50 | E 4      | E 4    | E 10.1      | look    | over it through the add
            +3.00 |      | ET 40    | E(T) 40 |            | no      | it shows
            +3.00 |      | X 40     | X 40   |             | no      | outward
            +3.00 |      | E 11     |        |             | look    | one is enough
            +3.00 |      | E 10     |        |             | unknown | near is missing
            +3.00 |      |          | E 10   |             | unknown | distance is missing
                  |      | E 40     | E 40   |             | no      | no glasses on record
            """)
    void aLatentInwardTurnIsOverTheLimit(
            String worn, String add, String distance, String near, String throughAdd, String answer, String source) {
        assertThat(judged(worn, add, distance, near, throughAdd)).as(source).answers(answer);
    }

    @Test
    void saysTheReading() {
        assertThat(judged("+3.00", null, "E 4", "E 16", null))
                .reads("E 16 at near, with glasses: latent, so it counts as held, and over the limit (≤ 10 Δ).")
                .hasEvidence("near=16, limit=10")
                .hasChecks(1);
        assertThat(judged("+3.00", null, "E 4", "E 4", null)).says("≤ 10 Δ");
    }

    private static Finding judged(String worn, String add, String distance, String near, String throughAdd) {
        return Judged.by(
                new LargeLatentTurn(),
                cell("worn_right", worn),
                cell("worn_add", add),
                cell("turn_cc_distance", distance),
                cell("turn_cc_near", near),
                cell("turn_add_near", throughAdd));
    }
}
