package plusward.entry;

import static plusward.exam.Field.*;

import java.util.List;
import java.util.Locale;
import plusward.exam.Field;

/** The parts of the entry page, in the order in which a visit goes, each with its rows of fields. */
enum EntryPart {
    VISIT(row("visit", VISIT_DATE, EXAMINER)),
    GLASSES(
            row("wear", WEAR_HOURS, WORN_SINCE),
            row("worn", WORN_RIGHT, WORN_LEFT, WORN_ADD),
            row("made", MADE_RIGHT, MADE_LEFT, MADE_ADD)),
    ACUITY(
            row("acuity", ACUITY_RIGHT, ACUITY_LEFT, ACUITY_BOTH),
            row("acuity-sc", ACUITY_SC_RIGHT, ACUITY_SC_LEFT, ACUITY_SC_BOTH),
            row("stereo", STEREO_ARCSEC)),
    TURN(
            row("turn-sc", TURN_SC_DISTANCE, TURN_SC_NEAR),
            row("turn-cc", TURN_CC_DISTANCE, TURN_CC_NEAR, TURN_ADD_NEAR),
            row("trial", TRIAL_PLUS, TURN_TRIAL_NEAR),
            folded("gaze-vertical", TURN_CC_UP, TURN_CC_DOWN),
            folded("gaze-side", TURN_CC_RIGHT_GAZE, TURN_CC_LEFT_GAZE),
            folded("ductions", DUCTIONS),
            folded("fixation", FIXATION_PREFERENCE)),
    REFRACTION(
            row("cycloplegic", CYCLOPLEGIC_RIGHT, CYCLOPLEGIC_LEFT, CYCLOPLEGIC_AGENT),
            row("manifest", MANIFEST_RIGHT, MANIFEST_LEFT),
            folded("drops", CYCLOPLEGIC_DROPS, CYCLOPLEGIC_MINUTES)),
    SEGMENT(
            row("segment", SEGMENT_RIGHT_MM, SEGMENT_LEFT_MM, SEGMENT_STYLE),
            row("pupil", PUPIL_MM, PD_MM),
            folded("segment-height", SEGMENT_HEIGHT_RIGHT_MM, SEGMENT_HEIGHT_LEFT_MM),
            folded("pupil-height", PUPIL_HEIGHT_RIGHT_MM, PUPIL_HEIGHT_LEFT_MM)),
    ORDERS(
            row("ordered", ORDERED_RIGHT, ORDERED_LEFT, ORDERED_ADD),
            row("next", NEXT_VISIT_WEEKS),
            row("note", Field.NOTE));

    /**
     * Fields that stand side by side, right before left.
     *
     * @param folded true for what few visits need: out of sight until wanted, behind the other rows of its part
     */
    record Row(String key, boolean folded, List<Field> fields) {}

    @SuppressWarnings("ImmutableEnumChecker") // never changes: List.of
    private final List<Row> rows;

    EntryPart(Row... rows) {
        this.rows = List.of(rows);
    }

    private static Row row(String key, Field... fields) {
        return new Row(key, false, List.of(fields));
    }

    private static Row folded(String key, Field... fields) {
        return new Row(key, true, List.of(fields));
    }

    String key() {
        return name().toLowerCase(Locale.ROOT);
    }

    List<Row> rows() {
        return rows;
    }
}
