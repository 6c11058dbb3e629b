package plusward.exam;

import java.util.Arrays;
import java.util.Locale;
import java.util.Optional;

/**
 * One measure of a visit by the name it has everywhere: in tables of visits, on the entry page, in messages and documents.
 *
 * <p>{@link #column()} is that name; the order is the order of the columns in a table of visits.
 */
public enum Field {
    VISIT_DATE,
    EXAMINER,
    WEAR_HOURS,
    WORN_RIGHT,
    WORN_LEFT,
    WORN_ADD,
    WORN_SINCE,
    MADE_RIGHT,
    MADE_LEFT,
    MADE_ADD,
    CYCLOPLEGIC_RIGHT,
    CYCLOPLEGIC_LEFT,
    CYCLOPLEGIC_AGENT,
    MANIFEST_RIGHT,
    MANIFEST_LEFT,
    TURN_SC_DISTANCE,
    TURN_SC_NEAR,
    TURN_CC_DISTANCE,
    TURN_CC_NEAR,
    TURN_ADD_NEAR,
    TRIAL_PLUS,
    TURN_TRIAL_NEAR,
    SEGMENT_STYLE,
    SEGMENT_RIGHT_MM,
    SEGMENT_LEFT_MM,
    PUPIL_MM,
    PD_MM,
    ACUITY_RIGHT,
    ACUITY_LEFT,
    ACUITY_BOTH,
    ACUITY_SC_RIGHT,
    ACUITY_SC_LEFT,
    ACUITY_SC_BOTH,
    STEREO_ARCSEC,
    ORDERED_RIGHT,
    ORDERED_LEFT,
    ORDERED_ADD,
    NEXT_VISIT_WEEKS,
    NOTE;

    private final String column = name().toLowerCase(Locale.ROOT);

    /** The name of the column and of the form field, for example {@code turn_cc_near}. */
    public String column() {
        return column;
    }

    /** The field of that name; empty when there is none. */
    public static Optional<Field> named(String column) {
        return Arrays.stream(values())
                .filter(field -> field.column.equals(column))
                .findFirst();
    }
}
