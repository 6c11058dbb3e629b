package plusward.readback;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class FactsTests {

    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            worn right | worn left | found right | found left        | right                  | left                 | source, D
            +3.00      | +3.00     | +4.00       | +2.75             | right short by +1.00 D | left over by +0.25 D | 4.00 - 3.00 and 2.75 - 3.00
            +3.00      | +3.00     | +3.00       | +3.50 -1.00 x 180 | right even             | left even            | 3.00 - 3.00 and 3.50 - 1.00/2 - 3.00
            +3.00      | +3.00     | +2.99       | +3.01             | right over by +0.01 D  | left short by +0.01 D | both sides of even
            +3.00      | ''        | +4.00       | +4.00             | right short by +1.00 D | left not known       | no left lens
            ''         | +3.00     | +4.00       | +4.00             | right not known        | left short by +1.00 D | no right lens
            +3.00      | +3.00     | ''          | +4.00             | right not known        | left short by +1.00 D | the right eye was not refracted
            ''         | +3.00     | +4.00       | ''                | right not known        | left not known       | no eye has both
            """)
    void thePlusIsToldPerEyeAgainstTheCycloplegicRefraction(
            String wornRight,
            String wornLeft,
            String foundRight,
            String foundLeft,
            String right,
            String left,
            String source) {
        ReadBack read = Reread.of(
                "worn_right=" + wornRight,
                "worn_left=" + wornLeft,
                "cycloplegic_right=" + foundRight,
                "cycloplegic_left=" + foundLeft);
        assertThat(Reread.words(read.facts()))
                .as(source)
                .isEqualTo("Worn plus, against cycloplegia of 2025-03-14: %s, %s.".formatted(right, left));
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            refracted on | fact                                                                                             | source
            2023-03-14   | Worn plus, against cycloplegia of 2023-03-14: right short by +1.00 D, left not known.             | 24 months before
            2023-03-13   | Worn plus: no cycloplegic refraction of the last 24 months to compare with.                       | a day longer
            """)
    void anOldRefractionIsNotComparedWith(String on, String fact, String source) {
        ReadBack read = Reread.among("visit_date | cycloplegic_right\n" + on + " | +4.00", "worn_right=+3.00");
        assertThat(Reread.words(read.facts())).as(source).isEqualTo(fact);
    }

    @Test
    void withoutGlassesThereIsNoPlusToTell() {
        assertThat(Reread.of("cycloplegic_right=+4.00").facts()).isEmpty();
    }

    /** An A pattern from 10 Δ, a V pattern from 15 Δ: from memory, as the gaze pattern of the course has it. */
    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, nullValues = "-", textBlock = """
            up     | down    | fact                                                                                      | source, Δ
            ET 20  | ET 10   | Up minus down 10 Δ: more inward looking up, an A pattern (from 10 Δ, from memory).        | 20 - 10, at the limit
            ET 20  | ET 10.1 | Up minus down 9.9 Δ: neither an A nor a V pattern.                                        | just under it
            ET 10  | ET 25   | Up minus down −15 Δ: more inward looking down, a V pattern (from 15 Δ, from memory).      | 10 - 25, at the limit
            ET 10  | ET 24.9 | Up minus down −14.9 Δ: neither an A nor a V pattern.                                      | just under it
            ET 10  | ''      | -                                                                                         | not measured looking down
            RHT 4  | ET 25   | -                                                                                         | no horizontal part looking up
            """)
    void upAndDownAreTakenTogether(String up, String down, String fact, String source) {
        ReadBack read = Reread.of("turn_cc_up=" + up, "turn_cc_down=" + down);
        assertThat(Reread.words(read.facts())).as(source).isEqualTo(fact == null ? "" : fact);
    }

    @Test
    void rightAndLeftGazeAreTakenTogether() {
        ReadBack read = Reread.of("turn_cc_right_gaze=X 4", "turn_cc_left_gaze=ET 10");
        assertThat(Reread.words(read.facts())).isEqualTo("Right minus left gaze −14 Δ.");
    }
}
