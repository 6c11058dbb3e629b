package plusward.exam;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.catchThrowableOfType;

import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class MarksReaderTests {

    @Test
    void noMarksAtAllAreTenMissingOnes() {
        Reason reason = refusal(Map.of("width", "28"));
        assertThat(reason).isEqualTo(Reason.of("marks.missing", 10, List.of(SegmentMark.values())));
    }

    @Test
    void aMissingMarkIsNamed() {
        Reason reason =
                refusal(MarkedFace.level().with("left-pupil-centre", " ").typed());
        assertThat(reason).isEqualTo(Reason.of("marks.missing", 1, List.of(SegmentMark.LEFT_PUPIL_CENTRE)));
    }

    @ParameterizedTest
    @CsvSource(useHeadersInDisplayName = true, delimiter = '|', textBlock = """
            key                 | text            | refused | why
            right-pupil-centre  | NaN 600         | place   | not a number
            right-pupil-centre  | Infinity 600    | place   | not finite
            right-pupil-centre  | 1e3 600         | place   | not written so
            right-pupil-centre  | 300             | place   | one number
            right-pupil-centre  | 300 600 1       | place   | three numbers
            right-pupil-centre  | 300,600         | place   | a comma
            right-pupil-centre  | -1 600          | place   | outside the picture
            left-line-end       | 20001 624       | place   | over 20 000, own choice
            left-line-end       | 1040 -0.5       | place   | over the upper edge
            pixels-per-step     | 0               | place   | no screen
            pixels-per-step     | 201             | place   | over 200, own choice
            pixels-per-step     | NaN             | place   | not a number
            right-pupil-bottom  | 300 577         | pupil   | at the top
            right-pupil-bottom  | 300 560         | pupil   | over the top
            left-pupil-centre   | 900 577         | pupil   | on the rim: 23 px from the middle, half of 46
            left-pupil-centre   | 924 600         | pupil   | 24 px beside the middle
            right-line-end      | 199.5 624       | short   | 39.5 px from 160, under 40
            right-line-end      | 438 624         |         | 278 px
            right-line-end      | 403 624         | uneven  | 243 px: 280/243 = 1.152, over 1.15
            right-line-end      | 404 624         |         | 244 px: 280/244 = 1.148
            right-pupil-centre  | 900 600         | exchanged | on one spot
            """)
    void whatCannotBeMeasuredIsRefused(String key, String text, String refused, String why) {
        MarkedFace face = MarkedFace.level().with(key, text);
        if (refused == null) {
            assertThat(face.read()).as(why).isNotNull();
        } else {
            assertRefused(face, refused);
        }
    }

    @Test
    void aRightEyeOnThePicturesRightIsRefusedAsMirrored() {
        MarkedFace face = MarkedFace.level();
        assertRefused(
                face.with("right-pupil-centre", face.typed().get("left-pupil-centre"))
                        .with("left-pupil-centre", face.typed().get("right-pupil-centre")),
                "exchanged");
    }

    @Test
    void fortyPixelsAreTheShortestLine() {
        assertThat(shortLines("40").read()).isNotNull();
        assertRefused(shortLines("39.9"), "short");
    }

    /** Both lines so many pixels for 5 mm, the pupils 46 × 5/40 = 5.75 mm. */
    private static MarkedFace shortLines(String pixels) {
        double length = Double.parseDouble(pixels);
        return MarkedFace.level()
                .with("width", "5")
                .with("right-line-end", (160 + length) + " 624")
                .with("left-line-end", (760 + length) + " 624");
    }

    @ParameterizedTest
    @CsvSource(useHeadersInDisplayName = true, delimiter = '|', textBlock = """
            y of the line | refused | arithmetic
            800           |         | 0.1 × (600 − 800) = −20 mm, the farthest
            801           | far     | −20.1 mm
            400           |         | +20 mm
            399           | far     | +20.1 mm
            """)
    void aLineFartherThanAnySegmentIsRefused(int y, String refused, String arithmetic) {
        MarkedFace face =
                MarkedFace.level().with("right-line-start", "160 " + y).with("right-line-end", "440 " + y);
        if (refused == null) {
            assertThat(face.read()).as(arithmetic).isNotNull();
        } else {
            assertRefused(face, refused);
        }
    }

    @ParameterizedTest
    @CsvSource(useHeadersInDisplayName = true, delimiter = '|', textBlock = """
            pupil px | refused | arithmetic
            10       |         | 1.0 mm, the smallest
            9.8      | size    | 0.98 mm
            100      |         | 10.0 mm, the largest
            100.2    | size    | 10.02 mm
            """)
    void aPupilOfNoPossibleSizeIsRefused(double pixels, String refused, String arithmetic) {
        MarkedFace face = MarkedFace.level()
                .with("right-pupil-top", "300 " + (600 - pixels / 2))
                .with("right-pupil-bottom", "300 " + (600 + pixels / 2));
        if (refused == null) {
            assertThat(face.read()).as(arithmetic).isNotNull();
        } else {
            assertRefused(face, refused);
        }
    }

    @ParameterizedTest
    @CsvSource(useHeadersInDisplayName = true, delimiter = '|', textBlock = """
            width  | refused
            ''     | missing
            abc    | unreadable
            28,5   | comma
            4.99   | range
            80.01  | range
            28.001 | fine
            """)
    void aLineNeedsAKnownLength(String width, String refused) {
        Reason reason = refusal(MarkedFace.level().with("width", width).typed());
        assertThat(reason.key()).isEqualTo("notation.line-width." + refused);
    }

    @ParameterizedTest
    @CsvSource(useHeadersInDisplayName = true, delimiter = '|', textBlock = """
            width | pupil px | scale | arithmetic
            5     | 60       | 0.018 | 5/280 mm a pixel, a pupil of 1.07 mm
            28    | 46       | 0.100 | 28/280
            35    | 46       | 0.125 | 35/280
            80    | 30       | 0.286 | 80/280, a pupil of 8.6 mm
            """)
    void anyKnownLengthOfALineGivesTheScale(String width, double pupil, String scale, String arithmetic) {
        MarkedFace face = MarkedFace.level()
                .with("width", width)
                .with("right-pupil-top", "300 " + (600 - pupil / 2))
                .with("right-pupil-bottom", "300 " + (600 + pupil / 2))
                .with("left-pupil-top", "900 " + (600 - pupil / 2))
                .with("left-pupil-bottom", "900 " + (600 + pupil / 2));
        assertThat(face.read().scale(Eye.LEFT)).as(arithmetic).isEqualTo(scale);
    }

    static void assertRefused(MarkedFace face, String problem) {
        assertThat(refusal(face.typed()).key()).isEqualTo("marks." + problem);
    }

    private static Reason refusal(Map<String, String> typed) {
        RefusedMarks refused = catchThrowableOfType(RefusedMarks.class, () -> MarksReader.read(typed));
        assertThat(refused).as("%s", typed).isNotNull();
        return refused.reason();
    }
}
