package plusward.exam;

import java.util.stream.Stream;
import plusward.optics.Degrees;
import plusward.optics.Millimetres;
import plusward.optics.Quantity;

/**
 * Where the segment line sits on the child's face, measured on a photograph of the child wearing the glasses.
 *
 * <p>A person marks ten places (see {@link SegmentMark}); this is arithmetic on the places, and no picture comes here. Each
 * eye is measured by the scale of its own segment line, whose true length is known, so that an eye farther from the camera is not taken for
 * smaller. The offset is the line over the pupil centre square to the line, as in {@link Segment}: + above, − below.
 *
 * <p>The picture is seen as one faces the child: the child's right eye is on the picture's left. A mirrored picture exchanges
 * the eyes without changing a number, so marks of a right eye that lies right of the left one are refused.
 *
 * <p>Millimetres and pixels of the picture. The line 5 to 80 mm; 28 and 35 are usual.
 *
 * <p>Errors are 95 % (1.96 standard deviations), of two parts added as squares. Marks: each is off by 1.5 pixels in either
 * direction, as a standard deviation, of the picture or of the screen it was marked on, whichever is coarser. Tilt: a length l may really be
 * l / cos τ, τ the largest tilt seen, since it stays open whether the line or the eyes are level and a turned head shortens what it shows.
 *
 * <p>Refused with {@link RefusedMarks}: eyes exchanged; a pupil whose bottom is over its top or whose centre is not in it; a
 * line under 40 pixels; a head rolled by more than 10° (the line through both pupil centres against the picture's
 * horizontal); a segment line more than 10° from the line through both pupil centres, as from a bent frame or a turned head; scales of the
 * two eyes that differ by more than 15 %; an offset over 20 mm or a pupil outside 1 to 10 mm.
 *
 * <p>Assumes that line and pupil are equally far from the camera. A camera above or below the child's eyes shifts the line
 * against the pupil, which no mark can show: by 12 mm × tan 5° = 1.0 mm for 5° and a lens 12 mm before the eye. Source: definition of
 * distance and angle; 1.5 pixels, 40 pixels, 15 % and the 10° are our own choice, no source.
 *
 * <p>Worked example: both lines 280 pixels for 28 mm, so 0.1 mm a pixel. The right line at y 624, its pupil centre at y 600:
 * −2.4 mm. Pupil from y 577 to 623: 4.6 mm.
 *
 * @param right the marks of the child's right eye, on the picture's left
 * @param left the marks of the child's left eye
 * @param width the true length of the segment's top line
 * @param pixelsPerStep how many pixels of the picture one pixel of the screen covered when the coarsest mark was set
 */
public record SegmentMarks(EyeMarks right, EyeMarks left, Millimetres width, double pixelsPerStep) {

    /** How well a place can be marked, as a standard deviation in pixels: own choice, no source. */
    static final double MARK_DEVIATION = 1.5;

    /** The largest tilt of the head, or of a line against the eyes, that is measured: own choice, no source. */
    static final Degrees STEEPEST = Degrees.of(10);

    /** The shortest line that gives a scale, in pixels; below it the scale alone is off by over 10 %: own choice, no source. */
    static final int SHORTEST = 40;

    /** How much the scales of both eyes may differ, as a factor: own choice, no source. */
    private static final double UNEVEN = 1.15;

    /** From a standard deviation to a 95 % interval of a normal distribution. */
    private static final double NORMAL_95 = 1.96;

    /** More pixels of a picture under one of the screen than any zoom makes. */
    private static final int COARSEST = 200;

    public SegmentMarks {
        if (!(pixelsPerStep > 0 && pixelsPerStep <= COARSEST)) {
            throw new RefusedMarks(Reason.of("marks.place"));
        }
        if (right.pupil().centre().x() >= left.pupil().centre().x()) {
            throw new RefusedMarks(Reason.of("marks.exchanged"));
        }
        Degrees roll = roll(right, left);
        if (roll.size().isOver(STEEPEST)) {
            throw new RefusedMarks(Reason.of("marks.rolled", roll.size(), STEEPEST));
        }
        check(Eye.RIGHT, right, width, roll);
        check(Eye.LEFT, left, width, roll);
        double uneven = right.lineInPixels() / left.lineInPixels();
        if (Math.max(uneven, 1 / uneven) > UNEVEN) {
            throw new RefusedMarks(
                    Reason.of("marks.uneven", thousandths(right.scale(width)), thousandths(left.scale(width))));
        }
    }

    private static String thousandths(Millimetres scale) {
        return Quantity.fixed(scale.amount(), 3);
    }

    private static void check(Eye eye, EyeMarks marks, Millimetres width, Degrees roll) {
        if (!marks.pupil().isInOrder()) {
            throw new RefusedMarks(Reason.of("marks.pupil", eye));
        }
        if (marks.lineInPixels() < SHORTEST) {
            throw new RefusedMarks(Reason.of("marks.short", eye, SHORTEST));
        }
        Degrees tilt = tilt(marks, roll).size();
        if (tilt.isOver(STEEPEST)) {
            throw new RefusedMarks(Reason.of("marks.tilted", eye, tilt, STEEPEST));
        }
        if (marks.offset(width).size().isOver(Millimetres.of(Segment.FARTHEST))) {
            throw new RefusedMarks(
                    Reason.of("marks.far", eye, marks.offset(width).unsigned()));
        }
        if (isNoPupil(marks.pupilDiameter(width))) {
            throw new RefusedMarks(
                    Reason.of("marks.size", eye, marks.pupilDiameter(width).unsigned()));
        }
    }

    private static boolean isNoPupil(Millimetres diameter) {
        return diameter.isUnder(Millimetres.of(Segment.SMALLEST_PUPIL))
                || diameter.isOver(Millimetres.of(Segment.LARGEST_PUPIL));
    }

    /** The line through both pupil centres against the picture's horizontal; positive where the child's left eye is lower. */
    public Degrees roll() {
        return roll(right, left);
    }

    private static Degrees roll(EyeMarks right, EyeMarks left) {
        return right.pupil().centre().slopeTo(left.pupil().centre());
    }

    /** The segment line of an eye against the line through both pupil centres, either way, without a sign. */
    public Degrees tilt(Eye eye) {
        return tilt(marks(eye), roll()).size();
    }

    /** Two lines are at most 90° apart. */
    private static Degrees tilt(EyeMarks marks, Degrees roll) {
        return Degrees.of(Math.IEEEremainder(marks.slope().minus(roll).inDegrees(), 180));
    }

    /** How many millimetres of this eye's lens one pixel of the picture covers, to a thousandth: {@code 0.100}. */
    public String scale(Eye eye) {
        return thousandths(marks(eye).scale(width));
    }

    /** The top of the segment over the pupil centre, below negative. */
    public MarkedLength offset(Eye eye) {
        return within(marks(eye).offset(width), marks(eye).offsetDeviation(width, markDeviation()));
    }

    /** The diameter of this eye's pupil, as seen through the lens. */
    public MarkedLength pupil(Eye eye) {
        return within(marks(eye).pupilDiameter(width), marks(eye).pupilDeviation(width, markDeviation()));
    }

    /** The mean of both pupils, which a visit keeps as one number. 4.4 and 4.8 mm give 4.6 mm. */
    public MarkedLength pupil() {
        MarkedLength one = pupil(Eye.RIGHT);
        MarkedLength other = pupil(Eye.LEFT);
        return new MarkedLength(
                one.value().plus(other.value()).times(0.5),
                Millimetres.of(Math.hypot(one.error().amount(), other.error().amount()) / 2));
    }

    /** True when an offset may be off by more than 1.0 mm, the tolerance by which a segment's height is judged (ANSI Z80.1). */
    public boolean isCoarse() {
        return Stream.of(Eye.values()).anyMatch(eye -> offset(eye).error().isOver(Millimetres.of(1)));
    }

    private MarkedLength within(Millimetres length, Millimetres deviation) {
        double byTilt = length.amount() * (1 / Math.cos(Math.toRadians(largestTilt())) - 1);
        return new MarkedLength(length, Millimetres.of(Math.hypot(NORMAL_95 * deviation.amount(), byTilt)));
    }

    private double largestTilt() {
        return Stream.of(roll().size(), tilt(Eye.RIGHT), tilt(Eye.LEFT))
                .mapToDouble(Degrees::inDegrees)
                .max()
                .orElseThrow();
    }

    private double markDeviation() {
        return MARK_DEVIATION * Math.max(1, pixelsPerStep);
    }

    private EyeMarks marks(Eye eye) {
        return eye == Eye.RIGHT ? right : left;
    }
}
