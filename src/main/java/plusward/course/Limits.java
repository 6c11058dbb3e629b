package plusward.course;

import plusward.exam.HoursPerDay;
import plusward.optics.Millimetres;
import plusward.optics.PrismDioptres;

/**
 * The thresholds that belong to the clinic; every other number stands in the code beside its source.
 *
 * <p>Refused with {@link IllegalArgumentException}: a turn, a pupil or an interval of months that is not above 0; any other
 * limit below 0.
 *
 * @param turn largest turn that counts as held: 10 Δ (J AAPOS 2014;18:261); 8 Δ is the other published choice
 * @param segmentTolerance how far the line may miss its place: 1.0 mm, the segment-height tolerance of ANSI Z80.1
 * @param pupil pupil diameter where none was measured: 4.5 mm in room light (from memory)
 * @param wear least hours a day (common practice, no source): 8
 * @param settleWeeks weeks within which a turn settles in new glasses: 8 (a series of 75 children; 81 % within 2 months)
 * @param cycloplegicMonths months after which a cycloplegic refraction is due again: 12 (common practice, no source)
 * @param overdueDays days after which a missed visit needs a decision: 90 (common practice, no source)
 */
public record Limits(
        PrismDioptres turn,
        Millimetres segmentTolerance,
        Millimetres pupil,
        HoursPerDay wear,
        int settleWeeks,
        int cycloplegicMonths,
        int overdueDays) {

    public static final Limits DEFAULT =
            new Limits(PrismDioptres.of(10), Millimetres.of(1.0), Millimetres.of(4.5), HoursPerDay.of(8), 8, 12, 90);

    public Limits {
        if (!turn.isOver(PrismDioptres.ZERO) || !pupil.isOver(Millimetres.ZERO) || cycloplegicMonths < 1) {
            throw new IllegalArgumentException("turn, pupil and cycloplegic months are above 0");
        }
        if (segmentTolerance.isUnder(Millimetres.ZERO) || settleWeeks < 0 || overdueDays < 0) {
            throw new IllegalArgumentException("segment tolerance, weeks to settle and overdue days are not below 0");
        }
    }
}
