package plusward.exam;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.function.Function;
import org.jspecify.annotations.Nullable;
import plusward.optics.Lens;

/**
 * Turns the text of a visit's fields into an {@link Examination}, or into all that is wrong with it at once.
 *
 * <p>The one place where the names of the fields meet the measures; the entry page, tables of visits and the tests'
 * stories all come through here. Blank text is "not measured".
 */
public final class ExaminationReader {

    private final Map<Field, String> text;
    private final List<Refusal> refusals = new ArrayList<>();

    private ExaminationReader(Map<Field, String> text) {
        this.text = text;
    }

    /** What came of reading: the examination, absent when anything was refused, and every refusal. */
    public record Result(@Nullable Examination examination, List<Refusal> refusals) {

        public Result {
            refusals = List.copyOf(refusals);
        }
    }

    /** Reads all fields; a missing visit date is a refusal. Never throws for any text. */
    public static Result read(Map<Field, String> text) {
        ExaminationReader reader = new ExaminationReader(text);
        Examination examination = reader.examination();
        return new Result(reader.refusals.isEmpty() ? examination : null, reader.refusals);
    }

    private @Nullable Examination examination() {
        var date = value(Field.VISIT_DATE, MeasureNotation::requiredDate);
        Glasses glasses = glasses();
        LensPair made = pair(Field.MADE_RIGHT, Field.MADE_LEFT, Field.MADE_ADD);
        Acuities corrected = acuities(Field.ACUITY_RIGHT, Field.ACUITY_LEFT, Field.ACUITY_BOTH);
        Acuities uncorrected = acuities(Field.ACUITY_SC_RIGHT, Field.ACUITY_SC_LEFT, Field.ACUITY_SC_BOTH);
        Stereo stereo = value(Field.STEREO_ARCSEC, Stereo::parse);
        Turns turns = turns();
        Cycloplegic cycloplegic = new Cycloplegic(
                lenses(Field.CYCLOPLEGIC_RIGHT, Field.CYCLOPLEGIC_LEFT),
                value(Field.CYCLOPLEGIC_AGENT, CycloplegicAgent::parse));
        PerEye<Lens> manifest = lenses(Field.MANIFEST_RIGHT, Field.MANIFEST_LEFT);
        Segment segment = segment();
        var pupilDistance = value(Field.PD_MM, MeasureNotation::pupilDistance);
        LensPair ordered = pair(Field.ORDERED_RIGHT, Field.ORDERED_LEFT, Field.ORDERED_ADD);
        Integer weeks = value(Field.NEXT_VISIT_WEEKS, MeasureNotation::weeks);
        String examiner = value(Field.EXAMINER, MeasureNotation::line);
        String note = value(Field.NOTE, MeasureNotation::note);
        return date == null
                ? null
                : new Examination(
                        date,
                        examiner,
                        glasses,
                        made,
                        corrected,
                        uncorrected,
                        stereo,
                        turns,
                        cycloplegic,
                        manifest,
                        segment,
                        pupilDistance,
                        ordered,
                        weeks,
                        note);
    }

    private Glasses glasses() {
        return new Glasses(
                pair(Field.WORN_RIGHT, Field.WORN_LEFT, Field.WORN_ADD),
                value(Field.WORN_SINCE, MeasureNotation::date),
                value(Field.WEAR_HOURS, MeasureNotation::hours));
    }

    private Segment segment() {
        return new Segment(
                value(Field.SEGMENT_STYLE, SegmentStyle::parse),
                new PerEye<>(
                        value(Field.SEGMENT_RIGHT_MM, MeasureNotation::height),
                        value(Field.SEGMENT_LEFT_MM, MeasureNotation::height)),
                value(Field.PUPIL_MM, MeasureNotation::pupil));
    }

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
    static Field fieldOf(TurnCondition condition) {
        return Field.valueOf("TURN_" + condition.name());
    }

    private LensPair pair(Field right, Field left, Field add) {
        return new LensPair(lenses(right, left), value(add, MeasureNotation::add));
    }

    private PerEye<Lens> lenses(Field right, Field left) {
        return new PerEye<>(value(right, LensNotation::parse), value(left, LensNotation::parse));
    }

    private Acuities acuities(Field right, Field left, Field both) {
        return new Acuities(
                new PerEye<>(value(right, Acuity::parse), value(left, Acuity::parse)), value(both, Acuity::parse));
    }

    private <T> @Nullable T value(Field field, Function<String, @Nullable T> notation) {
        String typed = text.getOrDefault(field, "");
        if (typed.isBlank() && field != Field.VISIT_DATE) {
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
