package plusward.exam;

import plusward.optics.Degrees;
import plusward.optics.Millimetres;

/**
 * The five marks of one eye on a photograph: the two ends of the segment's top line, the pupil's top and bottom, and its
 * centre.
 *
 * <p>The true length of the line gives the scale of this eye, k = width / L in mm per pixel, L the marked length. The offset is
 * the distance of the line from the pupil centre, measured square to the line, so that a head or a camera that is rolled changes nothing;
 * + where the line lies above the centre in the picture. The pupil's diameter is the distance from its top to its bottom.
 *
 * <p>Errors are propagated to first order from marks that are each off by the same standard deviation s (pixels) in x and in
 * y, independently. With t the place of the pupil centre along the line (0 at one end, 1 at the other):
 *
 * <pre>
 *   var(offset) = k² s² (1 + (1 − t)² + t²) + offset² · 2 s²/L²
 *   var(pupil)  = k² s² · 2                 + pupil²  · 2 s²/L²
 * </pre>
 *
 * The first term is where the marks are, the second the scale. The definition of distance and the usual propagation of
 * errors; checked against simulated marks in the tests.
 */
record EyeMarks(PicturePoint start, PicturePoint end, Pupil pupil) {

    /** The marked pupil, top and bottom as the picture shows them. */
    record Pupil(PicturePoint top, PicturePoint bottom, PicturePoint centre) {

        double heightInPixels() {
            return top.distanceTo(bottom);
        }

        /** True when the bottom is marked under the top, and the centre within the circle that has both on its rim. */
        boolean isInOrder() {
            return bottom.y() > top.y() && centre.distanceTo(top.middle(bottom)) < heightInPixels() / 2;
        }
    }

    double lineInPixels() {
        return start.distanceTo(end);
    }

    /** The slope of the line in the picture, positive where it goes down to the right. */
    Degrees slope() {
        return start.slopeTo(end);
    }

    /** Millimetres per pixel, for a line of this true length. */
    Millimetres scale(Millimetres width) {
        return width.times(1 / lineInPixels());
    }

    /** The line over the pupil centre. The line from (160, 624) to (440, 624), 28 mm, centre at (300, 600): −2.4 mm. */
    Millimetres offset(Millimetres width) {
        return scale(width).times(aboveCentreInPixels());
    }

    /** The standard deviation of {@link #offset}. */
    Millimetres offsetDeviation(Millimetres width, double markDeviation) {
        double along = alongLine();
        double places = Math.sqrt(1 + square(1 - along) + square(along));
        return deviation(width, markDeviation, places, aboveCentreInPixels());
    }

    /** The pupil from top to bottom. */
    Millimetres pupilDiameter(Millimetres width) {
        return scale(width).times(pupil.heightInPixels());
    }

    /** The standard deviation of {@link #pupilDiameter}. */
    Millimetres pupilDeviation(Millimetres width, double markDeviation) {
        return deviation(width, markDeviation, Math.sqrt(2), pupil.heightInPixels());
    }

    private Millimetres deviation(Millimetres width, double markDeviation, double places, double pixels) {
        double byScale = Math.sqrt(2) * pixels / lineInPixels();
        return scale(width).times(markDeviation * Math.hypot(places, byScale));
    }

    /** How far the line lies above the pupil centre, square to the line; below negative. */
    private double aboveCentreInPixels() {
        double cross = (end.x() - start.x()) * (pupil.centre.y() - start.y())
                - (end.y() - start.y()) * (pupil.centre.x() - start.x());
        return (end.x() >= start.x() ? cross : -cross) / lineInPixels();
    }

    /** Where the foot of the pupil centre is on the line: 0 at the start, 1 at the end. */
    private double alongLine() {
        double dot = (end.x() - start.x()) * (pupil.centre.x() - start.x())
                + (end.y() - start.y()) * (pupil.centre.y() - start.y());
        return dot / square(lineInPixels());
    }

    private static double square(double value) {
        return value * value;
    }
}
