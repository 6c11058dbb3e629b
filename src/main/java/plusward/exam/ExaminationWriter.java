package plusward.exam;

import java.util.EnumMap;
import java.util.Map;
import org.jspecify.annotations.Nullable;
import plusward.optics.Lens;
import plusward.optics.Millimetres;

/**
 * Writes an {@link Examination} as the text of its fields: the inverse of {@link ExaminationReader}.
 *
 * <p>What was not measured has no entry. Reading the result gives an equal examination, as long as its lenses hold whole
 * hundredths of a dioptre and its lengths whole hundredths of a millimetre, as every examination that was read does.
 */
public final class ExaminationWriter {

    private final Map<Field, String> text = new EnumMap<>(Field.class);

    private ExaminationWriter() {}

    /** The text of every field that has one; lenses to 0.01 D, lengths to 0.01 mm. */
    public static Map<Field, String> write(Examination examination) {
        ExaminationWriter writer = new ExaminationWriter();
        writer.visit(examination);
        writer.glasses(examination);
        writer.measures(examination);
        writer.motility(examination.motility());
        writer.segment(examination.segment());
        writer.pair(examination.ordered(), Field.ORDERED_RIGHT, Field.ORDERED_LEFT, Field.ORDERED_ADD);
        return writer.text;
    }

    /** When, by whom, and when again. */
    private void visit(Examination examination) {
        put(Field.VISIT_DATE, examination.date());
        put(Field.EXAMINER, examination.examiner());
        put(Field.NEXT_VISIT_WEEKS, examination.nextVisitWeeks());
        put(Field.NOTE, examination.note());
    }

    /** The glasses worn, as ordered and as measured. */
    private void glasses(Examination examination) {
        Glasses glasses = examination.glasses();
        put(Field.WEAR_HOURS, glasses.wear());
        put(Field.WORN_SINCE, glasses.since());
        pair(glasses.asOrdered(), Field.WORN_RIGHT, Field.WORN_LEFT, Field.WORN_ADD);
        pair(examination.made(), Field.MADE_RIGHT, Field.MADE_LEFT, Field.MADE_ADD);
    }

    /** Refractions, turns, acuities and what else was measured of the eyes. */
    private void measures(Examination examination) {
        Cycloplegic cycloplegic = examination.cycloplegic();
        lenses(cycloplegic.refraction(), Field.CYCLOPLEGIC_RIGHT, Field.CYCLOPLEGIC_LEFT);
        put(Field.CYCLOPLEGIC_AGENT, cycloplegic.agent());
        put(Field.CYCLOPLEGIC_DROPS, cycloplegic.drops());
        put(Field.CYCLOPLEGIC_MINUTES, cycloplegic.minutes());
        lenses(examination.manifest(), Field.MANIFEST_RIGHT, Field.MANIFEST_LEFT);
        examination.turns().byCondition().forEach((at, turn) -> put(ExaminationReader.fieldOf(at), turn));
        put(Field.TRIAL_PLUS, examination.turns().trialPlus());
        acuities(examination.acuities(), Field.ACUITY_RIGHT, Field.ACUITY_LEFT, Field.ACUITY_BOTH);
        acuities(examination.acuitiesUncorrected(), Field.ACUITY_SC_RIGHT, Field.ACUITY_SC_LEFT, Field.ACUITY_SC_BOTH);
        put(Field.STEREO_ARCSEC, examination.stereo());
        unsigned(Field.PD_MM, examination.pupilDistance());
    }

    /** How the eyes move and which one looks. */
    private void motility(Motility motility) {
        motility.gazes().forEach((gaze, turn) -> put(ExaminationReader.fieldOf(gaze), turn));
        put(Field.DUCTIONS, motility.ductions());
        put(Field.FIXATION_PREFERENCE, motility.fixation());
    }

    /** Where the segment sits, as it was measured: what follows from the heights is not written. */
    private void segment(Segment segment) {
        put(Field.SEGMENT_STYLE, segment.style());
        height(Field.SEGMENT_RIGHT_MM, segment.offset().right());
        height(Field.SEGMENT_LEFT_MM, segment.offset().left());
        unsigned(Field.SEGMENT_HEIGHT_RIGHT_MM, segment.heights().line().right());
        unsigned(Field.SEGMENT_HEIGHT_LEFT_MM, segment.heights().line().left());
        unsigned(Field.PUPIL_HEIGHT_RIGHT_MM, segment.heights().pupil().right());
        unsigned(Field.PUPIL_HEIGHT_LEFT_MM, segment.heights().pupil().left());
        unsigned(Field.PUPIL_MM, segment.pupil());
    }

    /** Two lenses and their add. */
    private void pair(LensPair pair, Field right, Field left, Field add) {
        lenses(pair.lenses(), right, left);
        put(add, pair.add());
    }

    /** One lens for each eye. */
    private void lenses(PerEye<Lens> lenses, Field right, Field left) {
        put(right, lenses.right());
        put(left, lenses.left());
    }

    /** The acuity of each eye and of both. */
    private void acuities(Acuities acuities, Field right, Field left, Field both) {
        put(right, acuities.each().right());
        put(left, acuities.each().left());
        put(both, acuities.both());
    }

    /** A height keeps its sign, which says on which side of the pupil centre it lies. */
    private void height(Field field, @Nullable Millimetres height) {
        put(field, height == null ? null : height.toString());
    }

    /** A diameter or a distance is written without the plus. */
    private void unsigned(Field field, @Nullable Millimetres length) {
        put(field, length == null ? null : length.toString().replace("+", ""));
    }

    /** What was not measured has no entry. */
    private void put(Field field, @Nullable Object value) {
        if (value != null) {
            text.put(field, value.toString());
        }
    }
}
