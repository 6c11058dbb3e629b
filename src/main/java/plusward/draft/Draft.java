package plusward.draft;

import java.time.Instant;
import java.time.LocalDate;
import java.util.Map;
import plusward.exam.Field;

/**
 * A visit as far as it is typed. It is text, not measurements: no finding, chart or count ever sees it.
 *
 * @param place whose visit it is
 * @param version the version of the stored visit that is corrected; of no meaning for a new one
 * @param why the reason for a correction, as far as it is typed
 * @param typed the text of the fields in which there is some
 * @param keptAt when it was last kept
 */
public record Draft(Place place, int version, String why, Map<Field, String> typed, Instant keptAt) {

    /** A new visit. */
    public static final long NEW = 0;

    public Draft {
        typed = Map.copyOf(typed);
    }

    /**
     * Which visit is typed; an account has at most one draft of each.
     *
     * @param visitId the stored visit that is corrected; {@link #NEW} for a new one
     * @param begunFor the day for which it was begun: today's for a new visit, the visit's own for a correction
     */
    public record Place(long childId, long visitId, LocalDate begunFor) {

        public boolean isNew() {
            return visitId == NEW;
        }
    }
}
