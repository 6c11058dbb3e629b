package plusward.handout;

import java.util.Comparator;
import java.util.Locale;
import java.util.Optional;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import plusward.course.SegmentPlace;
import plusward.exam.Eye;
import plusward.exam.PerEye;
import plusward.optics.Millimetres;

/**
 * The spectacle lens before the eye, to scale, with the line where it should sit; and where it sits now, if that is too low.
 *
 * @param pupilMeasured false when the clinic's usual pupil stands in for this child's
 * @param pupil radius of the pupil
 * @param line height of the line on the page, at the pupil's lower edge
 * @param now height of the lower line on the page; absent when no line is too low or nothing was measured
 * @param nowEye the eye of that line, as the message {@code handout.draw.line.now-…} names it
 */
record LensDrawing(
        boolean pupilMeasured,
        String pupil,
        String line,
        @Nullable String now,
        @Nullable String nowEye) {

    private static final double UNITS_A_MILLIMETRE = 7;
    private static final double CENTRE = 92;
    /** Nothing is drawn below the rim of the lens. */
    private static final double RIM = 196;

    /** Absent when the glasses to wear have no add, or a lens without a line. */
    static @Nullable LensDrawing of(SheetFacts facts) {
        if (!facts.lenses().haveAdd() || !facts.visit().exam().segment().hasLine()) {
            return null;
        }
        Millimetres measured = facts.visit().exam().segment().pupil();
        Millimetres pupil = measured == null ? facts.limits().pupil() : measured;
        double radius = pupil.times(0.5).inMillimetres() * UNITS_A_MILLIMETRE;
        Optional<Eye> low = facts.line().flatMap(place -> lowest(facts, place));
        return new LensDrawing(
                measured != null,
                written(radius),
                written(CENTRE + radius),
                low.map(eye -> written(heightOf(facts.line().orElseThrow().top(), eye)))
                        .orElse(null),
                low.map(eye -> eye.name().toLowerCase(Locale.ROOT)).orElse(null));
    }

    /** The height of the writing beside the line where it should sit. */
    public String lineLabel() {
        return written(Double.parseDouble(line) + (now == null ? 5 : -3));
    }

    /** The height of the writing beside the lower line, clear of that beside the upper one. */
    public String nowLabel() {
        double lower = now == null ? 0 : Double.parseDouble(now);
        return written(Math.max(lower, Double.parseDouble(line) + 16) + 5);
    }

    private static Optional<Eye> lowest(SheetFacts facts, SegmentPlace place) {
        return Stream.of(Eye.values())
                .filter(eye -> LineNow.isTooLow(facts, place.belowEdge().of(eye)))
                .max(Comparator.comparing(
                        eye -> place.belowEdge().of(eye), Comparator.nullsFirst(Comparator.naturalOrder())));
    }

    private static double heightOf(PerEye<Millimetres> top, Eye eye) {
        Millimetres height = top.of(eye);
        return height == null ? RIM : Math.min(RIM, CENTRE - height.inMillimetres() * UNITS_A_MILLIMETRE);
    }

    private static String written(double length) {
        return String.format(Locale.ROOT, "%.1f", length);
    }
}
