package plusward.photo;

import java.util.List;
import java.util.stream.Stream;
import plusward.exam.Eye;
import plusward.exam.Field;
import plusward.exam.MarkedLength;
import plusward.exam.SegmentMarks;
import plusward.optics.Degrees;

/**
 * What the marks measure, in tenths of a millimetre.
 *
 * @param eyes right, then left
 * @param pupil the mean of both pupils
 * @param coarse true when the marks are too coarse to judge a segment by
 */
record Measured(List<OfEye> eyes, MarkedLength pupil, Degrees roll, boolean coarse) {

    /**
     * One eye.
     *
     * @param field the field of the visit that the offset may fill
     * @param scale millimetres a pixel
     * @param tilt of the line against the eyes
     */
    record OfEye(Eye eye, Field field, MarkedLength offset, MarkedLength pupil, String scale, Degrees tilt) {

        /** {@code above}, {@code below} or {@code level}: where the line lies against the pupil centre. */
        public String side() {
            double top = offset.value().amount();
            return top > 0 ? "above" : top < 0 ? "below" : "level";
        }
    }

    static Measured of(SegmentMarks marks) {
        return new Measured(
                Stream.of(Eye.values()).map(eye -> of(marks, eye)).toList(),
                marks.pupil().inTenths(),
                marks.roll(),
                marks.isCoarse());
    }

    private static OfEye of(SegmentMarks marks, Eye eye) {
        return new OfEye(
                eye,
                eye == Eye.RIGHT ? Field.SEGMENT_RIGHT_MM : Field.SEGMENT_LEFT_MM,
                marks.offset(eye).inTenths(),
                marks.pupil(eye).inTenths(),
                marks.scale(eye),
                marks.tilt(eye));
    }
}
