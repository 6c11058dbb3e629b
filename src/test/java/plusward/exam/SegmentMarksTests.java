package plusward.exam;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Random;
import java.util.function.Function;
import java.util.stream.Stream;
import org.assertj.core.data.Offset;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import plusward.optics.Millimetres;

class SegmentMarksTests {

    private static final Offset<Double> EXACT = within(1e-6);

    @ParameterizedTest
    @CsvSource(useHeadersInDisplayName = true, delimiter = '|', textBlock = """
            start    | end      | top     | bottom  | centre  | width mm | scale | offset | pupil | arithmetic
            160 624  | 440 624  | 300 577 | 300 623 | 300 600 | 28       | 0.100 | -2.4   | 4.6   | 28/280; 0.1 × (600 − 624); 0.1 × (623 − 577)
            160 590  | 440 590  | 300 577 | 300 623 | 300 600 | 28       | 0.100 | 1.0    | 4.6   | the line over the centre: 0.1 × (600 − 590)
            160 600  | 440 600  | 300 577 | 300 623 | 300 600 | 28       | 0.100 | 0      | 4.6   | through the centre
            160 624  | 440 624  | 300 577 | 300 623 | 300 600 | 35       | 0.125 | -3.0   | 5.75  | 35/280 = 0.125; 0.125 × −24; 0.125 × 46
            440 624  | 160 624  | 300 577 | 300 623 | 300 600 | 28       | 0.100 | -2.4   | 4.6   | ends exchanged, nothing changes
            165.6 603.2 | 434.4 644.8 | 300 577 | 300 623 | 300 600 | 27.2 | 0.100 | -2.3717647 | 4.6 | a slope of 13 : 84 : 85, L = √(268.8² + 41.6²) = 272; square to it 24 × 84/85 = 23.717647 px
            """)
    void eachEyeIsMeasuredByItsOwnLine(
            String start,
            String end,
            String top,
            String bottom,
            String centre,
            String width,
            String scale,
            double offset,
            double pupil,
            String arithmetic) {
        SegmentMarks marks = MarkedFace.level()
                .with("right-line-start", start)
                .with("right-line-end", end)
                .with("right-pupil-top", top)
                .with("right-pupil-bottom", bottom)
                .with("right-pupil-centre", centre)
                .with("width", width)
                .read();
        assertThat(marks.scale(Eye.RIGHT)).as(arithmetic).isEqualTo(scale);
        assertThat(marks.offset(Eye.RIGHT).value().amount()).as(arithmetic).isEqualTo(offset, EXACT);
        assertThat(marks.pupil(Eye.RIGHT).value().amount()).as(arithmetic).isEqualTo(pupil, EXACT);
    }

    @Test
    void theErrorIsThatOfTheMarksAndOfTheScale() {
        SegmentMarks marks = MarkedFace.level().read();
        // half way along the line: 1.96 × 0.1 mm × 1.5 px × √(1 + ¼ + ¼ + 2 × 24²/280²)
        assertThat(marks.offset(Eye.RIGHT).error().amount())
                .isEqualTo(1.96 * 0.1 * 1.5 * Math.sqrt(1.5 + 2 * 576 / 78400.0), EXACT);
        // 1.96 × 0.1 mm × 1.5 px × √(2 + 2 × 46²/280²)
        double pupil = 1.96 * 0.1 * 1.5 * Math.sqrt(2 + 2 * 2116 / 78400.0);
        assertThat(marks.pupil(Eye.LEFT).error().amount()).isEqualTo(pupil, EXACT);
        // the mean of two: both errors as squares, halved
        assertThat(marks.pupil().error().amount()).isEqualTo(pupil / Math.sqrt(2), EXACT);
        assertThat(marks.pupil().value()).isEqualTo(Millimetres.of(4.6));
    }

    @Test
    void theErrorAgreesWithTenThousandSimulatedMarkings() {
        MarkedFace face = MarkedFace.level().rolled(3);
        Random random = new Random(20261201);
        double[][] found = Stream.generate(() ->
                        face.displaced(at -> at + 1.5 * random.nextGaussian()).read())
                .limit(10_000)
                .map(marks -> new double[] {
                    marks.offset(Eye.RIGHT).value().amount(),
                    marks.offset(Eye.LEFT).value().amount(),
                    marks.pupil(Eye.RIGHT).value().amount(),
                    marks.pupil().value().amount()
                })
                .toArray(double[][]::new);
        SegmentMarks told = face.read();
        // 10 000 give a standard deviation to 1/√20 000 = 0.7 %; four times that
        assertThat(1.96 * deviation(found, 0)).isCloseTo(error(told.offset(Eye.RIGHT)), within(0.006));
        assertThat(1.96 * deviation(found, 1)).isCloseTo(error(told.offset(Eye.LEFT)), within(0.006));
        assertThat(1.96 * deviation(found, 2)).isCloseTo(error(told.pupil(Eye.RIGHT)), within(0.012));
        assertThat(1.96 * deviation(found, 3)).isCloseTo(error(told.pupil()), within(0.009));
    }

    private static double error(MarkedLength length) {
        return length.error().amount();
    }

    private static double deviation(double[][] found, int column) {
        double mean = Stream.of(found).mapToDouble(row -> row[column]).average().orElseThrow();
        return Math.sqrt(Stream.of(found)
                .mapToDouble(row -> (row[column] - mean) * (row[column] - mean))
                .average()
                .orElseThrow());
    }

    @Test
    void marksSetOnACoarseScreenAreOffByScreenPixels() {
        double fine =
                error(MarkedFace.level().with("pixels-per-step", "0.25").read().offset(Eye.RIGHT));
        double coarse =
                error(MarkedFace.level().with("pixels-per-step", "3").read().offset(Eye.RIGHT));
        assertThat(fine).isEqualTo(error(MarkedFace.level().read().offset(Eye.RIGHT)));
        assertThat(coarse).isEqualTo(3 * fine, EXACT);
    }

    @ParameterizedTest
    @CsvSource(useHeadersInDisplayName = true, delimiter = '|', textBlock = """
            pixels per step | coarse | arithmetic
            2.7             | false  | 2.7 × 0.3618 mm = 0.977 mm
            2.8             | true   | 2.8 × 0.3618 mm = 1.013 mm, over 1.0 mm
            """)
    void anErrorOverTheToleranceOfASegmentIsCoarse(String step, boolean coarse, String arithmetic) {
        assertThat(MarkedFace.level().with("pixels-per-step", step).read().isCoarse())
                .as(arithmetic)
                .isEqualTo(coarse);
    }

    @ParameterizedTest
    @ValueSource(doubles = {-9.9, -4, 0.5, 9.9})
    void aRolledHeadChangesNoLength(double degrees) {
        SegmentMarks rolled = MarkedFace.level().rolled(degrees).read();
        assertThat(rolled.roll().inDegrees()).isCloseTo(degrees, EXACT);
        assertThat(rolled.tilt(Eye.LEFT).inDegrees()).isCloseTo(0, EXACT);
        assertThat(rolled.offset(Eye.RIGHT).value().amount()).isCloseTo(-2.4, EXACT);
        assertThat(rolled.pupil(Eye.LEFT).value().amount()).isCloseTo(4.6, EXACT);
        assertThat(error(rolled.offset(Eye.RIGHT)))
                .isGreaterThan(error(MarkedFace.level().read().offset(Eye.RIGHT)));
    }

    @Test
    void theTiltAddsWhatATurnedHeadWouldShorten() {
        SegmentMarks level = MarkedFace.level().read();
        SegmentMarks rolled = MarkedFace.level().rolled(9).read();
        // l × (1/cos 9° − 1) beside the error of the marks
        double byTilt = 4.6 * (1 / Math.cos(Math.toRadians(9)) - 1);
        assertThat(error(rolled.pupil(Eye.RIGHT))).isEqualTo(Math.hypot(error(level.pupil(Eye.RIGHT)), byTilt), EXACT);
    }

    @ParameterizedTest
    @CsvSource(useHeadersInDisplayName = true, delimiter = '|', textBlock = """
            roll ° | refused | source
            9.9    |         | 10° is our own choice
            10.0   |         | the limit itself is allowed; 1e-7 under it for the rounding of pixels
            10.1   | rolled  |
            -10.1  | rolled  | to the other side
            """)
    void aHeadIsMeasuredUpToTenDegreesOfRoll(double degrees, String refused, String source) {
        assertReads(MarkedFace.level().rolled(degrees - Math.signum(degrees) * 1e-7), refused);
    }

    @ParameterizedTest
    @CsvSource(useHeadersInDisplayName = true, delimiter = '|', textBlock = """
            eye   | line ° | roll ° | refused | source
            right | 9.9    | 0      |         | 10° is our own choice
            right | 10.1   | 0      | tilted  |
            left  | -9.9   | 0      |         |
            left  | -10.1  | 0      | tilted  |
            left  | 9.9    | 9.9    |         | 19.8° in the picture, 9.9° against the eyes
            right | 10.1   | -9.9   | tilted  | level in the picture, not against the eyes
            right | 90     | 0      | tilted  | upright
            """)
    void aLineIsMeasuredUpToTenDegreesAgainstTheEyes(
            String eye, double line, double roll, String refused, String source) {
        assertReads(MarkedFace.level().withLineTurned(eye, line).rolled(roll), refused);
    }

    @Test
    void aMirrorExchangesTheEyesAndNothingElse() {
        MarkedFace face = MarkedFace.level()
                .with("right-line-start", "160 610")
                .with("right-line-end", "440 620")
                .rolled(4);
        SegmentMarks seen = face.read();
        SegmentMarks mirrored = face.mirrored().read();
        assertThat(mirrored.roll()).isEqualTo(seen.roll().times(-1));
        for (Eye eye : Eye.values()) {
            same(eye, marks -> marks.offset(eye), marks -> marks.offset(eye.other()), seen, mirrored);
            same(eye, marks -> marks.pupil(eye), marks -> marks.pupil(eye.other()), seen, mirrored);
        }
    }

    private static void same(
            Eye eye,
            Function<SegmentMarks, MarkedLength> here,
            Function<SegmentMarks, MarkedLength> there,
            SegmentMarks seen,
            SegmentMarks mirrored) {
        assertThat(there.apply(mirrored).value().amount())
                .as("%s", eye)
                .isEqualTo(here.apply(seen).value().amount(), EXACT);
        assertThat(error(there.apply(mirrored))).as("%s", eye).isEqualTo(error(here.apply(seen)), EXACT);
    }

    @Test
    void tenthsRoundTheErrorUp() {
        MarkedLength tenths = new MarkedLength(Millimetres.of(-2.44), Millimetres.of(0.31)).inTenths();
        assertThat(tenths).isEqualTo(new MarkedLength(Millimetres.of(-2.4), Millimetres.of(0.4)));
    }

    private static void assertReads(MarkedFace face, String refused) {
        if (refused == null) {
            assertThat(face.read()).isNotNull();
        } else {
            MarksReaderTests.assertRefused(face, refused);
        }
    }
}
