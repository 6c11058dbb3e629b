package plusward.course;

import java.util.Optional;
import plusward.exam.PerEye;
import plusward.exam.Segment;
import plusward.optics.Millimetres;

/**
 * The segment line against the pupil.
 *
 * <p>The pupil's lower edge lies half its diameter below its centre. Below the edge: the edge's height minus the top's, in
 * mm; positive when the line lies below the edge, negative when above. Worked example: pupil 4 mm, top −3.5 mm: the edge is
 * at −2.0, the line 1.5 mm below it.
 *
 * @param pupil the diameter used
 * @param assumed true when it is the clinic's default and was not measured
 * @param top the line relative to the pupil centre, + above
 * @param belowEdge the line relative to the lower edge, + below
 */
public record SegmentPlace(Millimetres pupil, boolean assumed, PerEye<Millimetres> top, PerEye<Millimetres> belowEdge) {

    /** Empty when no add is worn, no height was measured, or the lens has no line. */
    public static Optional<SegmentPlace> at(Visit visit, Limits limits) {
        Segment segment = visit.exam().segment();
        if (!visit.glasses().haveAdd() || segment.top().isEmpty() || !segment.hasLine()) {
            return Optional.empty();
        }
        Millimetres measured = segment.pupil();
        Millimetres pupil = measured == null ? limits.pupil() : measured;
        Millimetres edge = pupil.times(-0.5);
        return Optional.of(new SegmentPlace(
                pupil, measured == null, segment.top(), segment.top().map(edge::minus)));
    }
}
