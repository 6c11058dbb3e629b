package plusward.rules;

import static plusward.rules.FindingAssert.assertThat;
import static plusward.rules.Judged.cell;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class DistanceExcessTests {

    private static final DistanceExcess RULE = new DistanceExcess();

    /** 10 Δ more at distance than at near: common practice, no source, for the number. */
    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            worn  | distance | near  | answer  | source
            +3.00 | ET 19.9  | ET 10 | no      | 9.9 more
            +3.00 | ET 20    | ET 10 | act     | 10.0 more
            +3.00 | E 20     | E 10  | act     | latent too
            +3.00 | ET 8     | X 2   | act     | outward at near
            +3.00 | ortho    | XT 10 | no      | no inward turn at distance
            +3.00 | XT 2     | XT 20 | no      | outward at distance
            +3.00 | ET 10    | ET 20 | no      | near is larger
            +3.00 | ET 20    |       | unknown | near is missing
            +3.00 |          | ET 20 | unknown | distance is missing
            +3.00 | ortho    |       | no      | without an inward turn at distance near does not matter
                  | ET 20    | ET 10 | no      | no glasses on record
            """)
    void distanceExceedsNear(String worn, String distance, String near, String answer, String source) {
        assertThat(judged(worn, distance, near)).as(source).answers(answer);
    }

    @Test
    void saysTheNumbers() {
        assertThat(judged("+3.00", "ET 20", "ET 8"))
                .says("20 Δ at distance and 8 Δ at near: distance exceeds near by 12 Δ")
                .hasEvidence("distance=20, near=8, limit=10")
                .hasChecks(3);
        assertThat(judged("+3.00", "ET 20", null)).says("through the distance part, is missing");
    }

    private static Finding judged(String worn, String distance, String near) {
        return Judged.by(
                RULE, cell("worn_right", worn), cell("turn_cc_distance", distance), cell("turn_cc_near", near));
    }
}
