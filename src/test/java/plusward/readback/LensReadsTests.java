package plusward.readback;

import static org.assertj.core.api.Assertions.assertThat;

import org.jspecify.annotations.Nullable;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import plusward.exam.Eye;
import plusward.exam.Field;
import plusward.exam.LensMeasure;

class LensReadsTests {

    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, nullValues = "-", textBlock = """
            before, D          | now, D            | read back                                                           | source
            -                  | +3.50             | SE +3.50 D                                                          | a sphere
            -                  | +4.50 -1.00 x 180 | SE +4.00 D                                                          | 4.50 - 1.00/2
            -                  | +3.50 +1.00 x 90  | SE +4.00 D                                                          | 3.50 + 1.00/2, kept in plus cylinder
            -                  | -0.25 -0.75 x 10  | SE −0.63 D                                                          | -0.25 - 0.75/2 = -0.625
            -                  | plano             | SE 0.00 D                                                           | 0
            -                  | PL                | read as plano · SE 0.00 D                                           | written otherwise
            -                  | PLANO             | SE 0.00 D                                                           | only the case differs
            -                  | +3.5              | SE +3.50 D                                                          | only a zero differs
            -                  | +3.50 DS          | read as +3.50 · SE +3.50 D                                          | written otherwise
            -                  | +4.50-1.00x0      | read as +4.50 -1.00 x 180 · SE +4.00 D                              | 0 is 180
            +3.50              | +4.25             | SE +4.25 D · SE +0.75 D since 2024-03-14                            | 4.25 - 3.50
            +4.25              | +3.50             | SE +3.50 D · SE −0.75 D since 2024-03-14                            | 3.50 - 4.25
            +4.00              | +4.50 -0.50 x 90  | SE +4.25 D · SE +0.25 D since 2024-03-14                            | 4.50 - 0.50/2 - 4.00
            +4.00              | +4.50 -1.00 x 180 | SE +4.00 D · same SE as on 2024-03-14, the cylinder differs         | 4.50 - 1.00/2 - 4.00 = 0
            +4.50 -1.00 x 90   | +4.50 -1.00 x 180 | SE +4.00 D · same SE as on 2024-03-14, the cylinder differs         | the axis differs
            +4.50 -1.00 x 180  | +4.50 -1.00 x 180 | SE +4.00 D · as on 2024-03-14                                       | the same
            +3.50 +1.00 x 90   | +4.50 -1.00 x 180 | SE +4.00 D · as on 2024-03-14                                       | the same in the other cylinder form
            """)
    void aLensIsReadBackInEveryMeasureAndEye(@Nullable String before, String now, String readBack, String source) {
        for (LensMeasure measure : LensMeasure.values()) {
            for (Eye eye : Eye.values()) {
                Field field = measure.field(eye);
                assertThat(Reread.field(field, before, now))
                        .as("%s, %s", source, field)
                        .isEqualTo(readBack);
            }
        }
    }

    @Test
    void theLastVisitThatHasTheLensIsComparedWith() {
        ReadBack read = Reread.among("""
                visit_date | worn_right | worn_left
                2023-03-14 | +2.00      | +9.00
                2024-03-14 | +3.00      | +9.00
                2024-09-14 |            | +4.00
                """, "worn_right=+3.50");
        assertThat(Reread.words(read.at(Field.WORN_RIGHT).understood()))
                .isEqualTo("SE +3.50 D · SE +0.50 D since 2024-03-14");
    }

    @Test
    void aLaterVisitIsNeverUsed() {
        ReadBack read = Reread.among("""
                visit_date | worn_right | turn_cc_near | acuity_right
                2025-03-15 | +2.00      | ET 40        | 20/20
                """, "worn_right=+3.50", "turn_cc_near=ET 10", "acuity_right=20/40");
        assertThat(Reread.words(read.at(Field.WORN_RIGHT).understood())).isEqualTo("SE +3.50 D");
        assertThat(Reread.words(read.at(Field.TURN_CC_NEAR).understood()))
                .isEqualTo("inward, shows all the time, 10 Δ");
        assertThat(Reread.words(read.at(Field.ACUITY_RIGHT).understood())).isEqualTo("0.30 logMAR");
    }
}
