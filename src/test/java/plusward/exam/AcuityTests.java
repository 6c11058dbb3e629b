package plusward.exam;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import plusward.exam.Acuity.Kind;
import plusward.optics.LogMar;

class AcuityTests {

    @ParameterizedTest
    @CsvSource(useHeadersInDisplayName = true, delimiter = '|', textBlock = """
            typed         | logMAR | source
            20/25         | 0.10   | log10(25/20); Holladay, J Cataract Refract Surg 2004
            6/7.5         | 0.10   | the same in metres
            20/25-2       | 0.14   | 0.097 + 2 × 0.02; Holladay 2004
            20/25 - 2     | 0.14   | spaces
            20/25−2       | 0.14   | the minus sign
            20/40+1       | 0.28   | 0.301 − 0.02
            20/40         | 0.30   | Holladay 2004
            20/63         | 0.50   | Holladay 2004
            20 / 63       | 0.50   | spaces
            0.8           | 0.10   | decimal: log10(1/0.8)
            .8            | 0.10   | decimal
            1             | 0.00   | decimal
            0.10 logMAR   | 0.10   | as it stands
            0.10logmar    | 0.10   | any case, no space
            -0.08 logMAR  | -0.08  | better than 20/20
            −0.08 logMAR  | -0.08  | the minus sign
            0.1           | 1.00   | without the word a number is decimal: 20/200
            -0.5 logMAR   | -0.50  | the best accepted
            2.0 logMAR    | 2.00   | the worst accepted
            """)
    void aChartReadingHasASizeAndStaysAsTyped(String typed, double logMar, String source) {
        Acuity acuity = Acuity.parse(typed);
        assertThat(acuity.logMar())
                .as(source)
                .hasValueSatisfying(size -> assertThat(size.inLogMar()).isEqualTo(logMar, within(0.005)));
        assertThat(acuity).hasToString(typed);
        assertThat(acuity.isBelowTheChart()).isFalse();
    }

    @ParameterizedTest
    @CsvSource(useHeadersInDisplayName = true, delimiter = '|', textBlock = """
            typed             | kind              | written           | below the chart | source
            CF                | CF                | CF                | true            | interchange format
            hm                | HM                | HM                | true            | any case
            LP                | LP                | LP                | true            | interchange format
            NLP               | NLP               | NLP               | true            | interchange format
            fixes and follows | FIXES_AND_FOLLOWS | fixes and follows | false           | says nothing of how small
            Fixes And Follows | FIXES_AND_FOLLOWS | fixes and follows | false           | any case
            """)
    void wordsHaveNoSize(String typed, Kind kind, String written, boolean below, String source) {
        Acuity acuity = Acuity.parse(typed);
        assertThat(acuity).as(source).isEqualTo(new Acuity(kind, written, null));
        assertThat(acuity.logMar()).isEmpty();
        assertThat(acuity.isBelowTheChart()).isEqualTo(below);
    }

    @ParameterizedTest
    @CsvSource(useHeadersInDisplayName = true, delimiter = '|', textBlock = """
            typed          | problem    | source
            -0.51 logMAR   | range      | just better than the best
            2.01 logMAR    | range      | just worse than the worst
            20/6           | range      | −0.523
            20/2001        | range      | 2.0002
            20/2000-1      | range      | 2.02
            20/0           | range      | no letter
            0/20           | range      | no distance
            0              | range      | no decimal acuity
            25             | range      | is it 20/25?
            0,8            | comma      | decimal comma
            20             | range      | half a fraction
            20/            | unreadable | half a fraction
            /25            | unreadable | half a fraction
            20/25-         | unreadable | how many letters?
            20/25-12       | unreadable | more letters than a line has
            20/25 2        | unreadable | more or fewer?
            -0.1           | unreadable | a sign without the word
            logMAR         | unreadable | no number
            FF             | unreadable | not written in full
            twenty/20      | unreadable | words
            20/25/30       | unreadable | two fractions
            """)
    void refuses(String typed, String problem, String source) {
        Refused.assertThat(() -> Acuity.parse(typed)).as(source).saying("acuity", problem, typed);
    }

    @Test
    void refusesNothingAndTooMuch() {
        Refused.assertThat(() -> Acuity.parse(" ")).saying("acuity", "unreadable", " ");
        Refused.assertThat(() -> Acuity.parse("20/" + "9".repeat(58))).saying("acuity", "long");
    }

    @Test
    void aChartHasASizeAndWordsHaveNone() {
        assertThatIllegalArgumentException().isThrownBy(() -> new Acuity(Kind.CHART, "20/20", null));
        assertThatIllegalArgumentException().isThrownBy(() -> new Acuity(Kind.CF, "CF", LogMar.ZERO));
    }
}
