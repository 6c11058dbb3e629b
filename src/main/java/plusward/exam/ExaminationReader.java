package plusward.exam;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.function.Function;
import org.jspecify.annotations.Nullable;
import plusward.optics.Lens;
import plusward.optics.Millimetres;

/**
 * Turns the text of a visit's fields into an {@link Examination}, or into all that is wrong with it at once.
 *
 * <p>The one place where the names of the fields meet the measures; the entry page, tables of visits and the tests'
 * stories all come through here. Blank text is "not measured".
 */
public final class ExaminationReader {

    /** As typed, by field; a field that is not in it was left empty. */
    private final Map<Field, String> text;

    private final List<Refusal> refusals = new ArrayList<>();

    private ExaminationReader(Map<Field, String> text) {
        this.text = text;
    }

    /**
     * What came of reading.
     *
     * @param examination the examination; absent when anything was refused
     * @param refusals everything that was refused, in the order of the fields
     */
    public record Result(@Nullable Examination examination, List<Refusal> refusals) {

        public Result {
            refusals = List.copyOf(refusals);
        }
    }

    /**
     * Reads all fields. A missing visit date is a refusal, any other missing field was not measured. Never throws for any
     * text, and takes no longer for a hostile one; what is wrong comes in the order of the fields.
     */
    public static Result read(Map<Field, String> text) {
        ExaminationReader reader = new ExaminationReader(text);
        LocalDate date = reader.value(Field.VISIT_DATE, MeasureNotation::requiredDate);
        Examination examination = reader.examination(date == null ? LocalDate.EPOCH : date);
        reader.refusals.sort(Comparator.comparing(Refusal::field));
        return new Result(reader.refusals.isEmpty() ? examination : null, reader.refusals);
    }

    /** Every field is read even when another is refused, so that all refusals come at once. */
    private Examination examination(LocalDate date) {
        return new Examination(
                date,
                value(Field.EXAMINER, MeasureNotation::line),
                glasses(),
                pair(Field.MADE_RIGHT, Field.MADE_LEFT, Field.MADE_ADD),
                acuities(Field.ACUITY_RIGHT, Field.ACUITY_LEFT, Field.ACUITY_BOTH),
                acuities(Field.ACUITY_SC_RIGHT, Field.ACUITY_SC_LEFT, Field.ACUITY_SC_BOTH),
                value(Field.STEREO_ARCSEC, Stereo::parse),
                turns(),
                motility(),
                cycloplegic(),
                lenses(Field.MANIFEST_RIGHT, Field.MANIFEST_LEFT),
                segment(),
                value(Field.PD_MM, MeasureNotation::pupilDistance),
                pair(Field.ORDERED_RIGHT, Field.ORDERED_LEFT, Field.ORDERED_ADD),
                value(Field.NEXT_VISIT_WEEKS, MeasureNotation::weeks),
                value(Field.NOTE, MeasureNotation::note));
    }

    /** The refraction with focusing at rest, and the drops. */
    private Cycloplegic cycloplegic() {
        return new Cycloplegic(
                lenses(Field.CYCLOPLEGIC_RIGHT, Field.CYCLOPLEGIC_LEFT),
                value(Field.CYCLOPLEGIC_AGENT, CycloplegicAgent::parse),
                value(Field.CYCLOPLEGIC_DROPS, MeasureNotation::drops),
                value(Field.CYCLOPLEGIC_MINUTES, MeasureNotation::minutes));
    }

    /** The glasses the child came with. */
    private Glasses glasses() {
        return new Glasses(
                pair(Field.WORN_RIGHT, Field.WORN_LEFT, Field.WORN_ADD),
                value(Field.WORN_SINCE, MeasureNotation::date),
                value(Field.WEAR_HOURS, MeasureNotation::hours));
    }

    /** Where the segment sits. */
    private Segment segment() {
        SegmentStyle style = value(Field.SEGMENT_STYLE, SegmentStyle::parse);
        Millimetres pupil = value(Field.PUPIL_MM, MeasureNotation::pupil);
        PerEye<Millimetres> offset = new PerEye<>(
                value(Field.SEGMENT_RIGHT_MM, MeasureNotation::height),
                value(Field.SEGMENT_LEFT_MM, MeasureNotation::height));
        SegmentHeights heights = new SegmentHeights(
                heights(Field.SEGMENT_HEIGHT_RIGHT_MM, Field.SEGMENT_HEIGHT_LEFT_MM),
                heights(Field.PUPIL_HEIGHT_RIGHT_MM, Field.PUPIL_HEIGHT_LEFT_MM));
        boolean right = agree(Eye.RIGHT, offset, heights);
        boolean left = agree(Eye.LEFT, offset, heights);
        return right && left ? new Segment(style, offset, heights, pupil) : Segment.NONE;
    }

    /** One height over the lowest point of the lens for each eye. */
    private PerEye<Millimetres> heights(Field right, Field left) {
        return new PerEye<>(value(right, MeasureNotation::lensHeight), value(left, MeasureNotation::lensHeight));
    }

    /** True when the offset of this eye and its heights can both be true; otherwise one of them is refused. */
    private boolean agree(Eye eye, PerEye<Millimetres> offset, SegmentHeights heights) {
        Millimetres byHeights = heights.offset().of(eye);
        Problem problem = Segment.problem(offset.of(eye), byHeights);
        if (byHeights == null || problem == null) {
            return true;
        }
        Field field =
                Field.valueOf((problem == Problem.CONFLICT ? "SEGMENT_" : "SEGMENT_HEIGHT_") + eye.name() + "_MM");
        String typed = text.getOrDefault(field, "");
        refusals.add(
                new Refusal(field, Notation.SEGMENT_HEIGHTS.refused(problem, typed.strip(), byHeights.toString())));
        return false;
    }

    /** How the eyes move and which one looks. */
    private Motility motility() {
        Map<Gaze, Turn> gazes = new EnumMap<>(Gaze.class);
        for (Gaze gaze : Gaze.values()) {
            Turn turn = value(fieldOf(gaze), typed -> Turn.parse(typed, Viewing.DISTANCE));
            if (turn != null) {
                gazes.put(gaze, turn);
            }
        }
        return new Motility(
                gazes,
                value(Field.DUCTIONS, Ductions::parse),
                value(Field.FIXATION_PREFERENCE, FixationPreference::parse));
    }

    /** The field in which the turn in a direction of gaze is written. */
    public static Field fieldOf(Gaze gaze) {
        return switch (gaze) {
            case UP -> Field.TURN_CC_UP;
            case DOWN -> Field.TURN_CC_DOWN;
            case RIGHT -> Field.TURN_CC_RIGHT_GAZE;
            case LEFT -> Field.TURN_CC_LEFT_GAZE;
        };
    }

    /** The turns under every condition, each in the notation of its distance. */
    private Turns turns() {
        Map<TurnCondition, Turn> turns = new EnumMap<>(TurnCondition.class);
        for (TurnCondition condition : TurnCondition.values()) {
            Turn turn = value(fieldOf(condition), typed -> Turn.parse(typed, condition.viewing()));
            if (turn != null) {
                turns.put(condition, turn);
            }
        }
        return new Turns(turns, value(Field.TRIAL_PLUS, MeasureNotation::add));
    }

    /** The field in which the turn under a condition is written: TURN_ and the condition's name. */
    public static Field fieldOf(TurnCondition condition) {
        return Field.valueOf("TURN_" + condition.name());
    }

    /** Two lenses and their add. */
    private LensPair pair(Field right, Field left, Field add) {
        return new LensPair(lenses(right, left), value(add, MeasureNotation::add));
    }

    /** One lens for each eye. */
    private PerEye<Lens> lenses(Field right, Field left) {
        return new PerEye<>(value(right, LensNotation::parse), value(left, LensNotation::parse));
    }

    /** The acuity of each eye and of both. */
    private Acuities acuities(Field right, Field left, Field both) {
        return new Acuities(
                new PerEye<>(value(right, Acuity::parse), value(left, Acuity::parse)), value(both, Acuity::parse));
    }

    /** What the notation makes of the field's text; absent when blank, and when refused, which is then noted. */
    private <T> @Nullable T value(Field field, Function<String, @Nullable T> notation) {
        String typed = text.getOrDefault(field, "");
        if (Notation.isEmpty(typed) && field != Field.VISIT_DATE) {
            return null;
        }
        try {
            return notation.apply(typed);
        } catch (NotationException problem) {
            refusals.add(new Refusal(field, problem));
            return null;
        }
    }
}
