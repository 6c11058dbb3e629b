package plusward.rules;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import plusward.exam.HoursPerDay;
import plusward.optics.Degrees;
import plusward.optics.Dioptres;
import plusward.optics.LogMar;
import plusward.optics.Millimetres;
import plusward.optics.PrismDioptres;

class LimitTests {

    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            value (Δ) | at most 10 | under 10 | at least 10 | source
            9.99      | false      | false    | true        | just below
            10        | false      | true     | false       | at the bound
            10.01     | true       | true     | false       | just above
            """)
    void aLimitDecides(double value, boolean atMost, boolean under, boolean atLeast, String source) {
        PrismDioptres bound = PrismDioptres.of(10);
        PrismDioptres turn = PrismDioptres.of(value);
        assertThat(Limit.atMost(bound).isCrossedBy(turn)).as(source).isEqualTo(atMost);
        assertThat(Limit.under(bound).isCrossedBy(turn)).as(source).isEqualTo(under);
        assertThat(Limit.atLeast(bound).isCrossedBy(turn)).as(source).isEqualTo(atLeast);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            written       | kind  | source
            ≤ 10 Δ        | prism | a turn
            ≤ 0.50 D      | lens  | without the sign of a lens
            ≤ 1.0 mm      | mm    | without the sign of a height
            ≥ 8 h/day      | hours | a least
            < 0.20 logMAR | acuity | a bound that is not allowed itself
            ≤ 3.0°        | axis  | an angle has no gap
            """)
    void aLimitPrintsAsItDecides(String written, String kind, String source) {
        Limit<?> limit = switch (kind) {
            case "prism" -> Limit.atMost(PrismDioptres.of(10));
            case "lens" -> Limit.atMost(Dioptres.of(0.50));
            case "mm" -> Limit.atMost(Millimetres.of(1));
            case "hours" -> Limit.atLeast(HoursPerDay.of(8));
            case "acuity" -> Limit.under(LogMar.of(0.20));
            default -> Limit.atMost(Degrees.of(3));
        };
        assertThat(limit).as(source).hasToString(written);
    }
}
