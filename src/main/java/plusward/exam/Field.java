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
    /** The day of the visit; the only field that must be there. */
    VISIT_DATE,
    /** Who measured; free text of one line. */
    EXAMINER,
    /** Hours on an ordinary day for which the glasses are worn, 0 to 24. */
    WEAR_HOURS,
    /** The right lens worn when the child came, as ordered. */
    WORN_RIGHT,
    /** The left lens worn when the child came, as ordered. */
    WORN_LEFT,
    /** The near add of both lenses worn, 0 to 4 D; empty: no segment. */
    WORN_ADD,
    /** The day on which these glasses were first worn. */
    WORN_SINCE,
    /** The lensmeter reading of the right lens worn. */
    MADE_RIGHT,
    /** The lensmeter reading of the left lens worn. */
    MADE_LEFT,
    /** The lensmeter reading of the add, 0 to 4 D. */
    MADE_ADD,
    /** The refraction of the right eye with focusing at rest. */
    CYCLOPLEGIC_RIGHT,
    /** The refraction of the left eye with focusing at rest. */
    CYCLOPLEGIC_LEFT,
    /** The drops that put focusing to rest. */
    CYCLOPLEGIC_AGENT,
    /** The refraction of the right eye without drops. */
    MANIFEST_RIGHT,
    /** The refraction of the left eye without drops. */
    MANIFEST_LEFT,
    /** The turn without correction, at distance. */
    TURN_SC_DISTANCE,
    /** The turn without correction, at near. */
    TURN_SC_NEAR,
    /** The turn with the glasses, at distance. */
    TURN_CC_DISTANCE,
    /** The turn with the glasses, at near, through the distance part. */
    TURN_CC_NEAR,
    /** The turn with the glasses, at near, through the segment. */
    TURN_ADD_NEAR,
    /** Extra plus held over the glasses for the trial reading, 0 to 4 D. */
    TRIAL_PLUS,
    /** The turn with the glasses and the trial plus, at near. */
    TURN_TRIAL_NEAR,
    /** The shape of the segment. */
    SEGMENT_STYLE,
    /** The top of the right segment over the pupil centre, as worn: mm, + above, − below. */
    SEGMENT_RIGHT_MM,
    /** The top of the left segment over the pupil centre, as worn: mm, + above, − below. */
    SEGMENT_LEFT_MM,
    /** The pupil's diameter in the room in which the segment was judged, 1 to 10 mm; empty: the clinic's default. */
    PUPIL_MM,
    /** The interpupillary distance, 30 to 80 mm. */
    PD_MM,
    /** Distance acuity of the right eye, with correction when glasses are worn. */
    ACUITY_RIGHT,
    /** Distance acuity of the left eye, with correction when glasses are worn. */
    ACUITY_LEFT,
    /** Distance acuity with both eyes open, with correction when glasses are worn. */
    ACUITY_BOTH,
    /** Distance acuity of the right eye without correction. */
    ACUITY_SC_RIGHT,
    /** Distance acuity of the left eye without correction. */
    ACUITY_SC_LEFT,
    /** Distance acuity with both eyes open, without correction. */
    ACUITY_SC_BOTH,
    /** Stereoacuity at near, seconds of arc; {@code nil}: none. */
    STEREO_ARCSEC,
    /** The right lens ordered at this visit. */
    ORDERED_RIGHT,
    /** The left lens ordered at this visit. */
    ORDERED_LEFT,
    /** The near add ordered at this visit, 0 to 4 D. */
    ORDERED_ADD,
    /** Weeks until the child should come again, 0 to 260. */
    NEXT_VISIT_WEEKS,
    /** The turn with the glasses, at distance, looking up. */
    TURN_CC_UP,
    /** The turn with the glasses, at distance, looking down. */
    TURN_CC_DOWN,
    /** The turn with the glasses, at distance, looking to the child's right. */
    TURN_CC_RIGHT_GAZE,
    /** The turn with the glasses, at distance, looking to the child's left. */
    TURN_CC_LEFT_GAZE,
    /** The movements of each eye by itself: {@code normal}, or what is limited. */
    DUCTIONS,
    /** With which eye the child looks. */
    FIXATION_PREFERENCE,
    /** How many drops were given in each eye for cycloplegia, 1 to 10. */
    CYCLOPLEGIC_DROPS,
    /** Minutes from the first drop to the refraction, 1 to 1440. */
    CYCLOPLEGIC_MINUTES,
    /** The top of the right segment over the lowest point of that lens, 0 to 60 mm. */
    SEGMENT_HEIGHT_RIGHT_MM,
    /** The top of the left segment over the lowest point of that lens, 0 to 60 mm. */
    SEGMENT_HEIGHT_LEFT_MM,
    /** The right pupil centre over the lowest point of that lens, 0 to 60 mm. */
    PUPIL_HEIGHT_RIGHT_MM,
    /** The left pupil centre over the lowest point of that lens, 0 to 60 mm. */
    PUPIL_HEIGHT_LEFT_MM,
    /** Free text of several lines. */
    NOTE;

    /** Lower case with underscores, as the tables have it. */
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
