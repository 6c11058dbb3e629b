package plusward.rules;

import static plusward.rules.FindingAssert.assertThat;
import static plusward.rules.Judged.cell;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class CycloplegiaDoubtfulTests {

    private static final CycloplegiaDoubtful RULE = new CycloplegiaDoubtful();

    /** 0.25 D under the manifest one: common practice, no source. */
    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            cycloplegic right | left  | manifest right    | left  | answer  | source
            +3.00             | +3.00 | +3.24             | +3.24 | no      | 0.24 less
            +3.00             | +3.00 | +3.25             | +3.25 | no      | 0.25 less
            +3.00             | +3.00 | +3.26             | +3.00 | look    | 0.26 less, right
            +3.00             | +3.00 | +3.00             | +3.26 | look    | 0.26 less, left
            +3.00             | +3.00 | +1.00             | +1.00 | no      | more plus, as it should be
            +3.50 -1.00 x 180 | +3.00 | +3.26             | +3.00 | look    | minus cylinder: +3.00
            +2.50 +1.00 x 90  | +3.00 | +3.26             | +3.00 | look    | the same in plus cylinder
            +3.00             | +3.00 | +3.50 -0.50 x 10  | +3.00 | no      | manifest +3.25
            +3.00             | +3.00 | +3.00             |       | unknown | the left has nothing beside it
            +3.00             |       | +3.00             |       | no      | the eye refracted has
            +3.00             | +3.00 | +3.26             |       | look    | one eye is enough
            +3.00             | +3.00 |                   |       | unknown | nothing to compare with
                              |       | +3.00             | +3.00 | no      | no cycloplegic refraction today
            """)
    void showsNoLessPlusThanWithoutDrops(
            String right, String left, String manifestRight, String manifestLeft, String answer, String source) {
        assertThat(Judged.by(
                        RULE,
                        cell("cycloplegic_right", right),
                        cell("cycloplegic_left", left),
                        cell("manifest_right", manifestRight),
                        cell("manifest_left", manifestLeft)))
                .as(source)
                .answers(answer);
    }

    /** 1.00 D within 6 months: common practice, no source. */
    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            earlier    | right | left  | right now | left now | answer  | source
            2024-12-14 | +3.00 | +3.00 | +3.99     | +2.01    | no      | 0.99 apart
            2024-12-14 | +3.00 | +3.00 | +4.00     | +2.00    | no      | 1.00 apart
            2024-12-14 | +3.00 | +3.00 | +4.01     | +3.00    | look    | 1.01 more, right
            2024-12-14 | +3.00 | +3.00 | +3.00     | +1.99    | look    | 1.01 less, left
            2024-09-14 | +3.00 | +3.00 | +5.00     | +5.00    | look    | 6 months to the day
            2024-09-13 | +3.00 | +3.00 | +5.00     | +5.00    | unknown | a day over 6 months
            2024-12-14 | +3.00 |       |           | +5.00    | unknown | the other eye
            2024-12-14 | +3.00 |       | +3.00     | +5.00    | unknown | the left has nothing beside it
            2024-12-14 | +3.00 | +3.00 | +3.00     |          | no      | the eye refracted has
            """)
    void isNearThoseOfTheLastHalfYear(
            String earlier, String r1, String l1, String r2, String l2, String answer, String source) {
        assertThat(Judged.latest(RULE, """
                        visit_date | cycloplegic_right | cycloplegic_left
                        %s         | %s                | %s
                        2025-03-14 | %s                | %s
                        """.formatted(earlier, text(r1), text(l1), text(r2), text(l2))))
                .as(source)
                .answers(answer);
    }

    @Test
    void anyOfTheLastHalfYearCounts() {
        assertThat(Judged.latest(RULE, """
                        visit_date | cycloplegic_right
                        2024-11-14 | +3.00
                        2025-01-14 | +4.00
                        2025-03-14 | +4.50
                        """))
                .isMet(Weight.LOOK)
                .says("from that of 2024-11-14 by right 1.50 D (allowed ≤ 1.00 D)");
    }

    @Test
    void saysTheNumbersAndCarriesBothRefractions() {
        assertThat(Judged.by(RULE, "cycloplegic_right=+3.00", "manifest_right=+4.00"))
                .says("of 2025-03-14 shows less plus", "by right +1.00 D (allowed ≤ 0.25 D)")
                .hasEvidence("cycloplegicRight=+3.00, manifestRight=+4.00, underManifestRight=+1.00, limit=+0.25")
                .hasChecks(1);
        assertThat(Judged.latest(RULE, """
                        visit_date | cycloplegic_left
                        2025-01-14 | +3.00
                        2025-03-14 | +1.00
                        """))
                .hasEvidence("earlierOn=2025-01-14, cycloplegicLeft=+1.00, earlierLeft=+3.00, left=+2.00, limit=+1.00");
        assertThat(Judged.by(RULE, "cycloplegic_right=+3.00")).says("2025-03-14", "nothing to be compared with");
        assertThat(Judged.by(RULE, "manifest_right=+3.00")).says("No cycloplegic refraction at this visit");
    }

    private static String text(String cell) {
        return cell == null ? "" : cell;
    }
}
