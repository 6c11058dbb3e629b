package plusward.web;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.time.LocalDate;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import plusward.exam.CycloplegicAgent;
import plusward.exam.Eye;
import plusward.exam.HoursPerDay;
import plusward.exam.TurnCondition;
import plusward.optics.Age;
import plusward.optics.Degrees;
import plusward.optics.Dioptres;
import plusward.optics.Lens;
import plusward.optics.LogMar;
import plusward.optics.Millimetres;
import plusward.optics.PrismDioptres;

class ShownTests {

    private final Shown shown = new Shown(new WebConfiguration().messageSource());

    ShownTests() throws IOException {}

    @Test
    void givesAQuantityItsUnitAndARealMinus() {
        assertThat(shown.of(Dioptres.of(3.5))).isEqualTo("+3.50 D");
        assertThat(shown.of(Dioptres.of(-0.75))).isEqualTo("−0.75 D");
        assertThat(shown.of(Dioptres.ZERO)).isEqualTo("0.00 D");
        assertThat(shown.of(PrismDioptres.of(-4))).isEqualTo("−4 Δ");
        assertThat(shown.of(Millimetres.of(-1.5))).isEqualTo("−1.5 mm");
        assertThat(shown.of(LogMar.of(-0.1))).isEqualTo("−0.10 logMAR");
        assertThat(shown.of(HoursPerDay.of(7.5))).isEqualTo("7.5 h/day");
        assertThat(shown.of(Age.of(5.87))).isEqualTo("5.9 y");
    }

    @Test
    void writesAnAngleWithoutASpace() {
        assertThat(shown.of(Degrees.of(-5))).startsWith("−5").endsWith("°").doesNotContain(" ");
    }

    @Test
    void leavesTheUnitToTheColumnWhenAskedForTheNumber() {
        assertThat(shown.number(Dioptres.of(-0.75))).isEqualTo("−0.75");
        assertThat(shown.number(null)).isEmpty();
    }

    @Test
    void saysThatNothingWasMeasuredInsteadOfZero() {
        assertThat(shown.of(null)).isEqualTo("not measured");
        assertThat(shown.lens(null)).isEqualTo("not measured");
    }

    @Test
    void writesALensWithTypographicSigns() {
        assertThat(shown.lens(Lens.of(4, -0.5, 180))).isEqualTo("+4.00 −0.50 × 180");
    }

    @Test
    void wordsTheTermsOfTheCoreAndKeepsTheirNotationWhereNoMessageRenamesThem() {
        assertThat(shown.of(Eye.RIGHT)).isEqualTo("right");
        assertThat(shown.of(TurnCondition.CC_NEAR)).isEqualTo("with glasses, near");
        assertThat(shown.of(CycloplegicAgent.ATROPINE)).isEqualTo("atropine");
    }

    @Test
    void joinsSeveralAndWritesDatesAndCountsPlainly() {
        assertThat(shown.of(List.of(Eye.RIGHT, Eye.LEFT))).isEqualTo("right, left");
        assertThat(shown.of(LocalDate.of(2026, 3, 14))).isEqualTo("2026-03-14");
        assertThat(shown.of(1234)).isEqualTo("1234");
        assertThat(shown.of("E(T) 14")).isEqualTo("E(T) 14");
    }

    @ParameterizedTest
    @CsvSource(useHeadersInDisplayName = true, textBlock = """
            born,       on,         age
            2019-05-02, 2019-05-02, 0 months
            2019-05-02, 2019-06-02, 1 month
            2019-05-02, 2020-05-01, 11 months
            2019-05-02, 2020-05-02, 1 year 0 months
            2019-05-02, 2025-03-14, 5 years 10 months
            """)
    void countsAnAgeInYearsAndMonths(LocalDate born, LocalDate on, String age) {
        assertThat(shown.age(born, on)).isEqualTo(age);
    }
}
