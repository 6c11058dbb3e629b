package plusward.entry;

import java.time.Instant;
import java.time.LocalDateTime;
import java.time.ZoneId;
import org.jspecify.annotations.Nullable;
import plusward.visit.RecordedVisit;

/** Who entered a visit and who changed it last, by the clinic's clock. */
record History(Entry entered, Entry changed) {

    /** An account and a time; no account for what the application stored by itself. */
    record Entry(LocalDateTime at, @Nullable String by) {

        private static Entry of(Instant at, ZoneId zone, @Nullable String by) {
            return new Entry(LocalDateTime.ofInstant(at, zone), by);
        }
    }

    static History of(RecordedVisit visit, ZoneId zone) {
        return new History(
                Entry.of(visit.enteredAt(), zone, visit.enteredBy()),
                Entry.of(visit.changedAt(), zone, visit.changedBy()));
    }
}
