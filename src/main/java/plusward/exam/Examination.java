package plusward.exam;

import java.time.LocalDate;
import org.jspecify.annotations.Nullable;
import plusward.optics.Lens;
import plusward.optics.Millimetres;

/**
 * Everything that was seen and measured at one visit.
 *
 * <p>Everything but the date may be missing; what is missing was not measured, and says nothing. Lenses in dioptres, turns in
 * prism dioptres with eso positive, lengths in millimetres; which condition each holds under stands with each part.
 *
 * @param date the day of the visit
 * @param examiner who measured, free text
 * @param glasses the glasses worn when the child came
 * @param made the lensmeter reading of those glasses
 * @param acuities distance acuity with correction
 * @param acuitiesUncorrected distance acuity without correction
 * @param stereo stereoacuity at near
 * @param turns the turns, by condition
 * @param motility the turn in directions of gaze, ductions and fixation preference
 * @param cycloplegic refraction with focusing at rest
 * @param manifest refraction without drops
 * @param segment where the segment sits
 * @param pupilDistance interpupillary distance, in millimetres
 * @param ordered the lenses ordered at this visit
 * @param nextVisitWeeks weeks until the child should come again
 * @param note free text
 */
public record Examination(
        LocalDate date,
        @Nullable String examiner,
        Glasses glasses,
        LensPair made,
        Acuities acuities,
        Acuities acuitiesUncorrected,
        @Nullable Stereo stereo,
        Turns turns,
        Motility motility,
        Cycloplegic cycloplegic,
        PerEye<Lens> manifest,
        Segment segment,
        @Nullable Millimetres pupilDistance,
        LensPair ordered,
        @Nullable Integer nextVisitWeeks,
        @Nullable String note) {

    /** A visit at which nothing was measured. */
    public static Examination empty(LocalDate date) {
        return new Examination(
                date,
                null,
                Glasses.NONE,
                LensPair.NONE,
                Acuities.NONE,
                Acuities.NONE,
                null,
                Turns.NONE,
                Motility.NONE,
                Cycloplegic.NONE,
                PerEye.none(),
                Segment.NONE,
                null,
                LensPair.NONE,
                null,
                null);
    }

    /** The day on which the child should come again; absent when no visit was set. */
    public @Nullable LocalDate nextVisit() {
        return nextVisitWeeks == null ? null : date.plusWeeks(nextVisitWeeks);
    }

    /**
     * The same visit in a mirror: right and left change places everywhere, axes are mirrored, the higher eye is the other
     * one; inward stays inward. Every judgement about the child must come out the same, eyes exchanged.
     */
    public Examination mirrored() {
        return new Examination(
                date,
                examiner,
                glasses.swapped(),
                made.swapped(),
                acuities.swapped(),
                acuitiesUncorrected.swapped(),
                stereo,
                turns.mirrored(),
                motility.mirrored(),
                cycloplegic.swapped(),
                manifest.map(Lens::mirrored).swapped(),
                segment.swapped(),
                pupilDistance,
                ordered.swapped(),
                nextVisitWeeks,
                note);
    }
}
