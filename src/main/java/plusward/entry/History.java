package plusward.entry;

import java.time.Instant;
import java.time.LocalDateTime;
import java.time.ZoneId;
import java.util.List;
import org.jspecify.annotations.Nullable;
import plusward.visit.RecordedVisit;
import plusward.visit.VisitChange;

/**
 * Who entered a visit and who changed it, by the clinic's clock.
 *
 * @param changes each field that was changed or confirmed, the latest first
 */
record History(Entry entered, Entry changed, List<Change> changes) {

    /** An account and a time; no account for what the application stored by itself. */
    record Entry(LocalDateTime at, @Nullable String by) {

        private static Entry of(Instant at, ZoneId zone, @Nullable String by) {
            return new Entry(LocalDateTime.ofInstant(at, zone), by);
        }
    }

    record Change(Entry made, VisitChange of) {

        public boolean isConfirmation() {
            return of.kind() == VisitChange.Kind.CONFIRMED;
        }

        public boolean isImport() {
            return of.kind() == VisitChange.Kind.IMPORTED;
        }
    }

    static History of(RecordedVisit visit, List<VisitChange> changes, ZoneId zone) {
        return new History(
                Entry.of(visit.enteredAt(), zone, visit.enteredBy()),
                Entry.of(visit.changedAt(), zone, visit.changedBy()),
                changes.stream()
                        .map(each -> new Change(Entry.of(each.at(), zone, each.by()), each))
                        .toList());
    }
}
