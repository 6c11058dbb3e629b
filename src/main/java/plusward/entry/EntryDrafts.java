package plusward.entry;

import java.time.Clock;
import java.time.LocalDate;
import java.time.format.DateTimeParseException;
import java.util.Comparator;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import org.springframework.stereotype.Component;
import plusward.child.ChildCard;
import plusward.draft.Draft;
import plusward.draft.Drafts;
import plusward.visit.RecordedVisit;

/** Keeps what is typed on the entry page until it is saved. */
@Component
class EntryDrafts {

    /** Longer, as with a year of nine digits, is a date to Java, but to no database. */
    private static final int LENGTH_OF_A_DAY = "2026-01-05".length();

    private final Drafts drafts;
    private final Clock clock;

    EntryDrafts(Drafts drafts, Clock clock) {
        this.drafts = drafts;
        this.clock = clock;
    }

    /** The account's draft for a visit: of a new one the latest kept. */
    Optional<Draft> of(ChildCard child, @Nullable RecordedVisit visit) {
        return visit == null
                ? drafts.mine().stream()
                        .filter(each -> each.place().isNew() && each.place().childId() == child.id())
                        .max(Comparator.comparing(Draft::keptAt))
                : drafts.find(place(child, visit, VisitForm.of(visit)));
    }

    /** The account's draft of a new visit that was begun for that day. */
    Optional<Draft> begunFor(ChildCard child, String day) {
        return drafts.find(new Draft.Place(child.id(), Draft.NEW, day(day)));
    }

    /** Keeps what is typed; a page that is empty again is forgotten. False when it is too long to keep. */
    boolean keep(ChildCard child, @Nullable RecordedVisit visit, VisitForm form) {
        if (form.isBlank()) {
            forget(child, visit, form);
            return true;
        }
        return drafts.keep(place(child, visit, form), form.version(), form.why(), form.text());
    }

    void forget(ChildCard child, @Nullable RecordedVisit visit, VisitForm form) {
        drafts.forget(place(child, visit, form));
    }

    private Draft.Place place(ChildCard child, @Nullable RecordedVisit visit, VisitForm form) {
        return visit == null
                ? new Draft.Place(child.id(), Draft.NEW, day(form.day()))
                : new Draft.Place(child.id(), visit.id(), visit.date());
    }

    /** The day that the page was opened for; today when it does not say. */
    private LocalDate day(String sent) {
        if (sent.length() != LENGTH_OF_A_DAY) {
            return LocalDate.now(clock);
        }
        try {
            return LocalDate.parse(sent);
        } catch (DateTimeParseException unreadable) {
            return LocalDate.now(clock);
        }
    }
}
