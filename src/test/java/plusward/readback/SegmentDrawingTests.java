package plusward.readback;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.tuple;

import java.util.Objects;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class SegmentDrawingTests {

    private static SegmentDrawing drawing(String... entries) {
        return Objects.requireNonNull(Reread.of(entries).segment());
    }

    @Test
    void thePupilIsDrawnAsMeasuredWithItsLowerEdge() {
        SegmentDrawing drawing = drawing("worn_add=2.50", "pupil_mm=4", "segment_right_mm=-3.5");
        assertThat(drawing.assumed()).isFalse();
        assertThat(drawing.radius()).isEqualTo("2.00");
        assertThat(drawing.edge()).isEqualTo("9.00");
    }

    @Test
    void theUsualPupilIsDrawnAndSaidToBeAssumed() {
        SegmentDrawing drawing = drawing("worn_add=2.50", "segment_right_mm=-3.5");
        assertThat(drawing.assumed()).isTrue();
        assertThat(drawing.radius()).isEqualTo("2.25");
        assertThat(drawing.edge()).isEqualTo("9.25");
    }

    /** The pupil centre is at 7, down is positive; a line further off than 6.5 mm is drawn at the rim. */
    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            top, mm | drawn at | source
            0       | 7.00     | at the centre
            -3.5    | 10.50    | 7 + 3.5
            +2      | 5.00     | 7 - 2
            -6.5    | 13.50    | the lower rim
            -20     | 13.50    | beyond it
            +20     | 0.50     | beyond the upper rim
            """)
    void theLineIsDrawnToScale(String top, String drawnAt, String source) {
        SegmentDrawing drawing = drawing("worn_add=2.50", "segment_right_mm=" + top, "segment_left_mm=" + top);
        assertThat(drawing.eyes())
                .as(source)
                .extracting(SegmentDrawing.Line::right, SegmentDrawing.Line::x, SegmentDrawing.Line::top)
                .containsExactly(tuple(true, "10.00", drawnAt), tuple(false, "30.00", drawnAt));
    }

    @Test
    void anEyeThatWasNotMeasuredIsNotDrawn() {
        assertThat(drawing("worn_add=2.50", "segment_left_mm=-2").eyes())
                .singleElement()
                .satisfies(line -> assertThat(line.right()).isFalse());
    }

    @Test
    void withoutAnAddNothingIsDrawn() {
        assertThat(Reread.of("segment_left_mm=-2").segment()).isNull();
    }
}
