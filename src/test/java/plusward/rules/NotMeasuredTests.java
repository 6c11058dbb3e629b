package plusward.rules;

import static plusward.rules.FindingAssert.assertThat;
import static plusward.rules.Judged.cell;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class NotMeasuredTests {

    private static final NotMeasured RULE = new NotMeasured();

    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            add  | style    | cycloplegic | distance | near | through add | right (mm) | left (mm) | missing
                 |          | +3.00       | ET 4     | ET 4 |             |            |           |
                 |          | +3.00       |          | ET 4 |             |            |           | distance, with glasses
                 |          | +3.00       | LHT 4    | ET 4 |             |            |           | distance, with glasses
                 |          | +3.00       | ET 4     |      |             |            |           | near, with glasses
                 |          |             | ET 4     | ET 4 |             |            |           | a cycloplegic refraction of the last 24 months
            2.50 | round    | +3.00       | ET 4     | ET 4 | ET 4        | -2         | -2        |
            2.50 | round    | +3.00       | ET 4     | ET 4 |             | -2         | -2        | near, through the add
            2.50 | round    | +3.00       | ET 4     | ET 4 | ET 4        | -2         |           | segment height in both eyes
            2.50 | round    | +3.00       | ET 4     | ET 4 | ET 4        |            | -2        | segment height in both eyes
            2.50 | progressive | +3.00    | ET 4     | ET 4 | ET 4        |            |           |
            2.50 | round    |             |          |      |             |            |           | distance, with glasses; near, with glasses; near, through the add; segment height in both eyes; a cycloplegic refraction of the last 24 months
            """)
    void eachThingMissingIsSaid(
            String add,
            String style,
            String cycloplegic,
            String distance,
            String near,
            String throughAdd,
            String right,
            String left,
            String missing) {
        Finding finding = Judged.by(
                RULE,
                "worn_right=+3.00",
                cell("worn_add", add),
                cell("segment_style", style),
                cell("cycloplegic_right", cycloplegic),
                cell("turn_cc_distance", distance),
                cell("turn_cc_near", near),
                cell("turn_add_near", throughAdd),
                cell("segment_right_mm", right),
                cell("segment_left_mm", left));
        if (missing == null) {
            assertThat(finding).isNotMet().says("Nothing");
        } else {
            assertThat(finding)
                    .isMet(Weight.NOTE)
                    .reads("Missing for a judgement: " + missing + ".")
                    .hasEvidence("missing=" + missing.split(";").length)
                    .hasChecks(0);
        }
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            worn before | ordered before | answer | source
                        |                | no     | a child without glasses
            +3.00       |                | note   | glasses were worn before
                        | +3.00          | note   | glasses were ordered before
            """)
    void glassesOfAnEarlierVisitAreMissed(String worn, String ordered, String answer, String source) {
        assertThat(Judged.latest(RULE, """
                        visit_date | worn_right | ordered_right
                        2024-03-14 | %s         | %s
                        2025-03-14 |            |
                        """.formatted(worn == null ? "" : worn, ordered == null ? "" : ordered)))
                .as(source)
                .answers(answer)
                .says("lasses");
    }

    @Test
    void theFirstVisitWithoutGlassesLacksNothing() {
        assertThat(Judged.by(RULE, "ordered_right=+3.00")).isNotMet().says("No glasses");
    }
}
