package plusward.optics;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class PrenticeTests {

    @ParameterizedTest
    @CsvSource(useHeadersInDisplayName = true, delimiter = '|', textBlock = """
            power D | off centre mm | prism Δ | source
            5.00    | 4             | 2.0     | definition cm × D: 0.4 × 5
            -5.00   | 4             | -2.0    | sign of the product
            5.00    | -4            | -2.0    | sign of the product
            5.00    | 0             | 0       | through the optical centre
            """)
    void prismAwayFromTheCentre(double power, double off, double prism, String source) {
        assertThat(Prentice.prism(Dioptres.of(power), Millimetres.of(off)))
                .as(source)
                .isEqualTo(PrismDioptres.of(prism));
    }
}
