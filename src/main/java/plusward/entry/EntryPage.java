package plusward.entry;

import java.time.LocalDate;
import java.time.LocalDateTime;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import plusward.child.ChildCard;
import plusward.exam.CycloplegicAgent;
import plusward.exam.Field;
import plusward.exam.FixationPreference;
import plusward.exam.SegmentStyle;
import plusward.readback.FieldRead;
import plusward.readback.ReadBack;
import plusward.rules.Suspicion;
import plusward.visit.RecordedVisit;

/**
 * What the entry page shows, typed or read only.
 *
 * @param visit the visit that is read or corrected; absent for a new one
 * @param last what stood there at earlier visits
 * @param form what stands in the fields
 * @param readBack what is understood of it
 * @param answer what came of saving it
 * @param today the day on which the page is shown
 */
record EntryPage(
        ChildCard child,
        @Nullable RecordedVisit visit,
        LastTime last,
        VisitForm form,
        ReadBack readBack,
        Answer answer,
        LocalDate today) {

    /**
     * What came of saving, or of opening a draft.
     *
     * @param refused what was refused
     * @param doubts what is possible but unlikely, and waits for an answer
     * @param draft what was kept of it before; absent when nothing was
     */
    record Answer(
            List<Refused> refused,
            List<Suspicion> doubts,
            @Nullable Kept draft) {

        static final Answer NONE = new Answer(List.of(), List.of(), null);

        public Answer {
            refused = List.copyOf(refused);
            doubts = List.copyOf(doubts);
        }
    }

    /** A draft that was kept: when by the clinic's clock, and whether it was begun for another day. */
    record Kept(LocalDateTime at, LocalDate begunFor, boolean isOfAnotherDay) {}

    private static final Map<Field, List<String>> CHOICES = Map.of(
            Field.CYCLOPLEGIC_AGENT, words(CycloplegicAgent.values()),
            Field.FIXATION_PREFERENCE, words(FixationPreference.values()),
            Field.SEGMENT_STYLE, words(SegmentStyle.values()));

    /**
     * A part of the page by the name of its messages.
     *
     * @param rows always in sight
     * @param more folded until wanted
     */
    record Part(String key, List<Row> rows, List<Row> more) {

        public boolean isGlasses() {
            return key.equals(EntryPart.GLASSES.key());
        }

        /** True when what is folded must not be overlooked. */
        public boolean isOpen() {
            return more.stream().anyMatch(Row::isUsed);
        }

        private Stream<Entry> entries() {
            return Stream.concat(rows.stream(), more.stream()).flatMap(row -> row.entries().stream());
        }
    }

    /**
     * Fields side by side.
     *
     * @param lastOn the day from which the earlier values are; absent when there are none
     */
    record Row(String key, @Nullable LocalDate lastOn, List<Entry> entries) {

        /** True when something was typed in it or refused, or stood there at an earlier visit. */
        boolean isUsed() {
            return entries.stream()
                    .anyMatch(entry -> !entry.typed().isBlank() || !entry.last().isEmpty() || entry.refused() != null);
        }
    }

    /**
     * A field.
     *
     * @param last what stood there at an earlier visit; empty when nothing did
     * @param refused why its text was refused; absent when it was not
     * @param copy what "as last time" puts there; absent when it leaves the field alone
     * @param read what is understood of it
     */
    record Entry(
            Field field,
            String typed,
            String last,
            @Nullable Refused refused,
            @Nullable String copy,
            FieldRead read) {

        /** The name of the field in addresses, messages and tables. */
        public String name() {
            return field.column();
        }

        public boolean isRequired() {
            return field == Field.VISIT_DATE;
        }

        /** The lines around the field that a screen reader reads with it. */
        public String describedBy() {
            return (last.isEmpty() ? "" : name() + "-last ")
                    + (refused == null ? "" : name() + "-wrong ")
                    + (name() + "-read");
        }

        /** True for a list, which needs the width of several fields. */
        public boolean isWide() {
            return field == Field.DUCTIONS;
        }

        /** The fragment that draws it. */
        public String kind() {
            return field == Field.NOTE ? "note" : CHOICES.containsKey(field) ? "choice" : "line";
        }

        /** The words to choose from; what was typed is always among them. */
        public List<String> choices() {
            List<String> known = CHOICES.getOrDefault(field, List.of());
            return Stream.concat(known.stream(), Stream.of(typed))
                    .filter(word -> !word.isEmpty())
                    .distinct()
                    .toList();
        }
    }

    /** The day of the visit that is read or corrected; today for a new one. */
    public LocalDate date() {
        return visit == null ? today : visit.date();
    }

    /** The day for which the page was opened, by which its draft is found again. */
    public String day() {
        return form.day().isEmpty() ? today.toString() : form.day();
    }

    EntryPage with(Answer other) {
        return new EntryPage(child, visit, last, form, readBack, other, today);
    }

    /** The visit before; absent when there is none. */
    public @Nullable RecordedVisit earlier() {
        return last.visit().orElse(null);
    }

    /** True when an earlier visit has glasses to copy. */
    public boolean hasGlassesToCopy() {
        return last.glasses().isPresent();
    }

    /** True when this text was refused or is in doubt. */
    public boolean isAsking() {
        return !answer.refused().isEmpty() || !answer.doubts().isEmpty();
    }

    /** What was refused of the reason for a correction; absent when nothing was. */
    public @Nullable Refused wrongWhy() {
        return refused(Refused.WHY);
    }

    public List<Part> parts() {
        return Arrays.stream(EntryPart.values())
                .map(part -> new Part(part.key(), rows(part, false), rows(part, true)))
                .toList();
    }

    /** The refused fields in the order of the page. */
    public List<Entry> wrong() {
        return parts().stream()
                .flatMap(Part::entries)
                .filter(entry -> entry.refused() != null)
                .toList();
    }

    private List<Row> rows(EntryPart part, boolean folded) {
        return part.rows().stream()
                .filter(row -> row.folded() == folded)
                .map(this::row)
                .toList();
    }

    private Row row(EntryPart.Row row) {
        Optional<LastTime.Earlier> earlier = last.having(row.fields());
        Map<Field, String> before = earlier.map(LastTime.Earlier::text).orElse(Map.of());
        List<Entry> entries = row.fields().stream()
                .map(field -> entry(field, before.getOrDefault(field, "")))
                .toList();
        return new Row(row.key(), earlier.map(LastTime.Earlier::date).orElse(null), entries);
    }

    private Entry entry(Field field, String before) {
        String copy = last.glasses().map(glasses -> glasses.get(field)).orElse(null);
        return new Entry(field, form.at(field), before, refused(field.column()), copy, readBack.at(field));
    }

    private @Nullable Refused refused(String name) {
        return answer.refused().stream()
                .filter(each -> each.name().equals(name))
                .findFirst()
                .orElse(null);
    }

    private static List<String> words(Object[] values) {
        return Arrays.stream(values).map(Object::toString).toList();
    }
}
