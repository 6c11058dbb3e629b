package plusward.course;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import plusward.optics.PrismDioptres;

class EstimateTests {

    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            value | sd  | low         | high        | source
            10    | 0.5 | 9.02        | 10.98       | 10 ∓ 1.96 · 0.5, the normal distribution
            -1    | 1   | -2.96       | 0.96        | -1 ∓ 1.96
            4     | 0   | 4           | 4           | nothing uncertain
            """)
    void the_interval_is_1_96_standard_deviations_either_way(
            double value, double sd, double low, double high, String source) {
        assertThat(Estimate.around(value, sd, PrismDioptres::of))
                .as(source)
                .isEqualTo(new Estimate<>(PrismDioptres.of(value), PrismDioptres.of(low), PrismDioptres.of(high)));
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            high (Δ) | below 0 | source
            -0.01    | true    | the whole interval lies below
            0        | false   | its end touches
            0.01     | false   | its end lies above
            """)
    void it_is_wholly_below_only_when_its_high_end_is(double high, boolean below, String source) {
        var estimate = new Estimate<>(PrismDioptres.of(-5), PrismDioptres.of(-9), PrismDioptres.of(high));
        assertThat(estimate.isWhollyBelow(PrismDioptres.ZERO)).as(source).isEqualTo(below);
    }
}
