package plusward.exam;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import plusward.optics.Lens;

class LensNotationTests {

    @ParameterizedTest
    @CsvSource(useHeadersInDisplayName = true, delimiter = '|', textBlock = """
            typed                      | S D   | C D   | A ° | source
            +3.50                      | 3.50  | 0     | 180 | interchange format
            +3.50 DS                   | 3.50  | 0     | 180 | interchange format
            +3.50 -0.75 x 180          | 3.50  | -0.75 | 180 | interchange format
            +4.00 -0.50 x 090          | 4.00  | -0.50 | 90  | interchange format
            plano                      | 0     | 0     | 180 | interchange format
            pl -0.50 x 90              | 0     | -0.50 | 90  | interchange format
            +3.00 +1.00 x 90           | 3.00  | 1.00  | 90  | interchange format: plus-cylinder, kept as typed
            +3.50-0.75x180             | 3.50  | -0.75 | 180 | without spaces
            +3.5/-1 x90                | 3.5   | -1    | 90  | with a slash between
            +3.50 DS -0.75 DC X 180°   | 3.50  | -0.75 | 180 | with units
            −2.25 −0.75 × 5            | -2.25 | -0.75 | 5   | minus sign and multiplication sign
            +3.50 -0.75 axis 10        | 3.50  | -0.75 | 10  | the word for x
            +.50                       | 0.50  | 0     | 180 | no zero before the point
            PLANO                      | 0     | 0     | 180 | any case
            0                          | 0     | 0     | 180 | 0 needs no sign
            0.00 -1.00 x 0             | 0     | -1.00 | 180 | axis 0 is read as 180
            +1.00 -1.00 x 1            | 1.00  | -1.00 | 1   | lowest axis
            +3.50 -0.00 x 90           | 3.50  | 0     | 180 | a cylinder of 0 is none
            +30.00 -15.00 x 180        | 30    | -15   | 180 | strongest
            -30.00 +15.00 x 180        | -30   | 15    | 180 | strongest the other way
            """)
    void reads(String typed, double sphere, double cylinder, int axis, String source) {
        assertThat(LensNotation.parse(typed)).as(source).isEqualTo(Lens.of(sphere, cylinder, axis));
    }

    @ParameterizedTest
    @CsvSource(useHeadersInDisplayName = true, delimiter = '|', textBlock = """
            typed               | problem    | source
            3.50                | sign       | an unsigned sphere other than 0 is refused
            .50                 | sign       | also without a zero before the point
            3                   | sign       | also a whole number
            +3.50 0.75 x 180    | sign       | the cylinder too
            +3.505              | fine       | finer than 0.01 D
            +3.50 -0.755 x 180  | fine       | the cylinder too
            +30.01              | range      | just above 30
            -30.01              | range      | just below −30
            +350-075x180        | range      | hundredths without a point
            +3.50 -15.01 x 180  | range      | just below −15
            +3.50 +15.01 x 180  | range      | just above 15
            +3.50 -0.75 x 181   | axis       | just above 180
            +3.50 -0.75 x 1800  | axis       | four digits
            +3.50 -0.75 x 45.5  | axis       | not whole
            +3.50 -0.75 x -5    | axis       | negative
            +3.50 -0.75 x       | axis       | missing
            +3.50 -0.75         | axis       | missing with its x
            +3.50 -0.75 180     | axis       | x missing
            +3,50               | comma      | decimal comma
            +3.50 x 90          | unreadable | an axis without a cylinder
            +10 x 90            | unreadable | not +1 with the cylinder 0
            +3.50 -0.75 @ 180   | unreadable | @ names the meridian with the power
            +3.5.5              | unreadable | two points
            3.50+               | unreadable | sign behind
            +-3.50              | unreadable | two signs
            + 3.50              | unreadable | sign apart
            +3.50 D D           | unreadable | unit twice
            plain               | unreadable | not a word of the trade
            +3.50 -0.75 x 180 ! | unreadable | something behind
            +3.50.              | unreadable | point behind
            +٣                  | unreadable | digits of another script
            """)
    void refuses(String typed, String problem, String source) {
        Refused.assertThat(() -> LensNotation.parse(typed)).as(source).saying("lens", problem, typed);
    }

    @Test
    void refusesWhatIsTooLongToBeALens() {
        Refused.assertThat(() -> LensNotation.parse("+" + "0".repeat(59) + "1")).saying("lens", "long");
        Refused.assertThat(() -> LensNotation.parse("+" + "1".repeat(59))).saying("lens", "range");
    }

    @Test
    void whiteSpaceAroundAndNoBreakSpacesDoNotMatter() {
        assertThat(LensNotation.parse("  +3.50\u00a0-0.75\u202fx\u00a0180\t"))
                .isEqualTo(LensNotation.parse("+3.50 -0.75 x 180"));
    }

    @Test
    void nothingIsNotALens() {
        Refused.assertThat(() -> LensNotation.parse("")).saying("lens", "unreadable", "");
    }
}
