package plusward.rules;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import plusward.exam.LensNotation;
import plusward.optics.Dioptres;

class AnsiZ801Tests {

    /** ANSI Z80.1, summaries of 2010 and 2015. What is off is named; nothing means within tolerance. */
    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            ordered            | made               | off                                      | source
            +5.00              | +5.12              |                                          | ±0.13 to 6.50: the worked example passes
            +5.00              | +5.13              |                                          | at 0.13
            +5.00              | +5.14              | meridian-larger meridian-smaller         | the worked example fails
            +5.00              | +4.87              |                                          | 0.13 less
            +5.00              | +4.86              | meridian-larger meridian-smaller         | 0.14 less
            +6.50              | +6.63              |                                          | at 6.50 still 0.13
            +6.50              | +6.64              | meridian-larger meridian-smaller         | at 6.50 still 0.13
            +10.00             | +10.20             |                                          | beyond, 2 % of 10.00 = 0.20
            +10.00             | +10.21             | meridian-larger meridian-smaller         | beyond, 2 % of 10.00 = 0.20
            -10.00             | -10.20             |                                          | the sign does not matter
            -10.00             | -10.21             | meridian-larger meridian-smaller         | the sign does not matter
            +8.00 -2.00 x 180  | +8.16 -2.13 x 180  |                                          | +8.00: 0.16; +6.00 read +6.03; cylinder 0.13
            +8.00 -2.00 x 180  | +8.17 -2.13 x 180  | meridian-larger                          | +8.00: 2 % = 0.16
            +8.00 -2.00 x 180  | +7.99 -2.12 x 180  |                                          | +6.00 read +5.87: 0.13
            +8.00 -2.00 x 180  | +7.98 -2.12 x 180  | meridian-smaller                         | +6.00 read +5.86: 0.14
            +4.00 -2.00 x 180  | +4.00 -2.13 x 180  |                                          | cylinder to 2.00: 0.13
            +4.10 -2.00 x 180  | +4.16 -2.14 x 180  | cylinder                                 | cylinder to 2.00: 0.13
            +4.00 -3.00 x 180  | +4.07 -3.15 x 180  |                                          | cylinder to 4.50: 0.15, the worked example
            +4.00 -3.00 x 180  | +4.08 -3.16 x 180  | cylinder                                 | cylinder to 4.50: 0.15
            +4.00 -4.50 x 180  | +4.07 -4.65 x 180  |                                          | at 4.50 still 0.15
            +4.00 -4.50 x 180  | +4.08 -4.66 x 180  | cylinder                                 | at 4.50 still 0.15
            +4.00 -5.00 x 180  | +4.10 -5.20 x 180  |                                          | beyond, 4 % of 5.00 = 0.20
            +4.00 -5.00 x 180  | +4.10 -5.21 x 180  | cylinder                                 | beyond, 4 % of 5.00 = 0.20
            +4.00 -1.00 x 180  | +4.00 -0.87 x 180  |                                          | a weaker cylinder, 0.13
            +3.00 -0.25 x 90   | +3.00 -0.25 x 104  |                                          | axis ±14° to 0.25
            +3.00 -0.25 x 90   | +3.00 -0.25 x 105  | axis                                     | axis ±14° to 0.25
            +3.00 -0.26 x 90   | +3.00 -0.26 x 97   |                                          | ±7° to 0.50
            +3.00 -0.26 x 90   | +3.00 -0.26 x 98   | axis                                     | ±7° to 0.50
            +3.00 -0.50 x 90   | +3.00 -0.50 x 97   |                                          | ±7° to 0.50
            +3.00 -0.50 x 90   | +3.00 -0.50 x 98   | axis                                     | ±7° to 0.50
            +3.00 -0.75 x 90   | +3.00 -0.75 x 85   |                                          | ±5° to 0.75
            +3.00 -0.75 x 90   | +3.00 -0.75 x 84   | axis                                     | ±5° to 0.75
            +3.00 -1.00 x 90   | +3.00 -1.00 x 93   |                                          | ±3° to 1.50: the worked example passes
            +3.00 -1.00 x 90   | +3.00 -1.00 x 94   | axis                                     | the worked example fails
            +3.00 -1.50 x 90   | +3.00 -1.50 x 93   |                                          | ±3° to 1.50
            +3.00 -1.51 x 90   | +3.00 -1.51 x 93   | axis                                     | ±2° above
            +3.00 -1.51 x 90   | +3.00 -1.51 x 92   |                                          | ±2° above
            +3.00 -1.00 x 178  | +3.00 -1.00 x 1    |                                          | 3° apart over 180
            +3.00 -1.00 x 178  | +3.00 -1.00 x 2    | axis                                     | 4° apart over 180
            +3.00 -1.00 x 2    | +3.00 -1.00 x 178  | axis                                     | 4° apart over 180
            +4.50 -1.00 x 180  | +3.50 +1.00 x 90   |                                          | read in the other cylinder form
            +3.50 +1.00 x 90   | +4.50 -1.00 x 180  |                                          | ordered in the other cylinder form
            +3.50 +1.00 x 90   | +4.50 -1.00 x 4    | axis                                     | 4° in either form
            +3.00              | +3.00 -0.13 x 40   |                                          | a sphere has no axis; cylinder 0.13
            +3.00              | +3.06 -0.14 x 40   | cylinder                                 | a sphere has no axis; cylinder 0.14
            +3.00 -1.00 x 180  | +3.00 -1.00 x 90   | axis                                     | turned by a quarter
            """)
    void eachPartHasItsTolerance(String ordered, String made, String off, String source) {
        assertThat(faults(ordered, made)).as(source).isEqualTo(off == null ? "" : off);
    }

    /** ±0.12 D to 4.00, ±0.18 D above: ANSI Z80.1, summaries. */
    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            ordered (D) | made (D) | off   | source
            2.50        | 2.62     | false | 0.12 more
            2.50        | 2.63     | true  | 0.13 more
            2.50        | 2.38     | false | 0.12 less
            2.50        | 2.37     | true  | 0.13 less
            4.00        | 4.13     | true  | at 4.00 still 0.12
            4.01        | 4.19     | false | above, 0.18
            4.01        | 4.20     | true  | above, 0.19
            """)
    void theAddHasItsTolerance(double ordered, double made, boolean off, String source) {
        assertThat(AnsiZ801.isAddOff(Dioptres.of(ordered), Dioptres.of(made)))
                .as(source)
                .isEqualTo(off);
    }

    @Test
    void aFaultSaysWhatWasOrderedReadAndAllowed() {
        assertThat(
                        AnsiZ801.faults(LensNotation.parse("+5.00 -1.00 x 90"), LensNotation.parse("+5.20 -1.00 x 94"))
                                .stream()
                                .map(Worded::of))
                .containsExactly(
                        "the meridian with more plus reads +5.20 D, ordered +5.00 D: off by 0.20 D (allowed ≤ 0.13 D)",
                        "the meridian with less plus reads +4.20 D, ordered +4.00 D: off by 0.20 D (allowed ≤ 0.13 D)",
                        "the axis reads 94, ordered 90: off by 4.0° (allowed ≤ 3.0°)");
    }

    private static String faults(String ordered, String made) {
        return AnsiZ801.faults(LensNotation.parse(ordered), LensNotation.parse(made)).stream()
                .map(fault -> fault.key().replace("lens-fault.", ""))
                .collect(Collectors.joining(" "));
    }
}
