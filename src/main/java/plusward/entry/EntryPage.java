package plusward.entry;

import java.time.LocalDate;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import plusward.child.ChildCard;
import plusward.exam.CycloplegicAgent;
import plusward.exam.Field;
import plusward.exam.FixationPreference;
import plusward.exam.SegmentStyle;
import plusward.visit.RecordedVisit;

/**
 * What the entry page shows, typed or read only.
 *
 * @param visit the visit that is read or corrected; absent for a new one
 * @param last the visit before, greyed beside each field; absent when there is none
 * @param form what stands in the fields
 * @param refused what was refused of it
 * @param today the day on which the page is shown
 */
record EntryPage(
        ChildCard child,
        @Nullable RecordedVisit visit,
        @Nullable RecordedVisit last,
        VisitForm form,
        List<Refused> refused,
        LocalDate today) {

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

    record Row(String key, List<Entry> entries) {

        /** True when something was typed in it or refused, or stood there at the last visit. */
        boolean isUsed() {
            return entries.stream()
                    .anyMatch(entry -> !entry.typed().isBlank() || !entry.last().isEmpty() || entry.refused() != null);
        }
    }

    /**
     * A field.
     *
     * @param last what stood there at the last visit; empty when nothing did
     * @param refused why its text was refused; absent when it was not
     * @param copied true for what "as last time" copies
     */
    record Entry(
            Field field,
            String typed,
            String last,
            @Nullable Refused refused,
            boolean copied) {

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

    EntryPage refusing(List<Refused> why) {
        return new EntryPage(child, visit, last, form, why, today);
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
                .map(row -> new Row(
                        row.key(), row.fields().stream().map(this::entry).toList()))
                .toList();
    }

    private Entry entry(Field field) {
        String before = last == null ? "" : VisitForm.of(last.examination()).at(field);
        Refused why = refused.stream()
                .filter(each -> each.field() == field)
                .findFirst()
                .orElse(null);
        return new Entry(field, form.at(field), before, why, VisitForm.GLASSES.contains(field));
    }

    private static List<String> words(Object[] values) {
        return Arrays.stream(values).map(Object::toString).toList();
    }
}
