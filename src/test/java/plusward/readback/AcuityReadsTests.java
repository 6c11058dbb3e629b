package plusward.readback;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.jspecify.annotations.Nullable;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import plusward.exam.Field;

class AcuityReadsTests {

    private static final List<Field> FIELDS = List.of(
            Field.ACUITY_RIGHT,
            Field.ACUITY_LEFT,
            Field.ACUITY_BOTH,
            Field.ACUITY_SC_RIGHT,
            Field.ACUITY_SC_LEFT,
            Field.ACUITY_SC_BOTH);

    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, nullValues = "-", textBlock = """
            before            | now         | read back                                             | source
            -                 | 20/40       | 0.30 logMAR                                           | log10(40/20) = 0.301
            -                 | 20/25-2     | 0.14 logMAR                                           | log10(25/20) + 2 x 0.02
            -                 | 0.10 logMAR | 0.10 logMAR                                           | as written
            -                 | 0.5         | 0.30 logMAR                                           | -log10(0.5)
            -                 | 20/16       | −0.10 logMAR                                          | log10(16/20) = -0.097
            20/25             | 20/20       | 0.00 logMAR, better by 0.10 logMAR since 2024-03-14   | 0 - 0.097
            20/25             | 20/25-2     | 0.14 logMAR, worse by 0.04 logMAR since 2024-03-14    | 2 x 0.02
            20/20             | 20/200      | 1.00 logMAR, worse by 1.00 logMAR since 2024-03-14    | log10(10)
            20/40             | 6/12        | 0.30 logMAR, as on 2024-03-14                         | the same line in metres
            20/25             | 0.10 logMAR | 0.10 logMAR, as on 2024-03-14                         | 0.097, which prints alike
            0.10 logMAR       | 0.11 logMAR | 0.11 logMAR, worse by 0.01 logMAR since 2024-03-14    | the smallest that is shown
            CF                | 20/200      | 1.00 logMAR                                           | counting fingers is not compared
            20/200            | CF          | ''                                                    | it has no number
            -                 | hm          | ''                                                    | only the case differs
            fixes and follows | 20/40       | 0.30 logMAR                                           | not compared
            """)
    void anAcuityIsReadBackInLogMar(@Nullable String before, String now, String readBack, String source) {
        assertThat(FIELDS)
                .allSatisfy(field ->
                        assertThat(Reread.field(field, before, now)).as(source).isEqualTo(readBack));
    }

    @Test
    void theLastChartThatWasReadIsComparedWith() {
        ReadBack read = Reread.among("""
                visit_date | acuity_left
                2023-03-14 | 20/40
                2024-03-14 | CF
                """, "acuity_left=20/20");
        assertThat(Reread.words(read.at(Field.ACUITY_LEFT).understood()))
                .isEqualTo("0.00 logMAR, better by 0.30 logMAR since 2023-03-14");
    }
}
