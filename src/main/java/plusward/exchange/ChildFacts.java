package plusward.exchange;

import java.time.LocalDate;
import java.util.HashMap;
import java.util.Map;
import java.util.Objects;
import org.jspecify.annotations.Nullable;
import plusward.child.ChildDetails;

/** A child as a row of {@code children.csv} writes it: the text of each column that is not empty. */
record ChildFacts(Map<String, String> cells) {

    private static final String LANGUAGE = "handout_language";

    /** A child without a language of its own gets the handout in English. */
    ChildFacts {
        Map<String, String> complete = new HashMap<>(cells);
        complete.putIfAbsent(LANGUAGE, "en");
        cells = Map.copyOf(complete);
    }

    static ChildFacts of(ChildDetails details) {
        Map<String, String> cells = new HashMap<>();
        put(cells, CsvKind.CLINIC_NUMBER, details.clinicNumber());
        put(cells, "given_name", details.givenName());
        put(cells, "family_name", details.familyName());
        put(cells, "birth_date", details.bornOn());
        put(cells, "turn_first_seen_months", details.turnFirstSeenMonths());
        put(cells, LANGUAGE, details.handoutLanguage());
        put(cells, "note", details.note());
        return new ChildFacts(cells);
    }

    private static void put(Map<String, String> cells, String column, @Nullable Object value) {
        if (value != null) {
            cells.put(column, value.toString());
        }
    }

    String clinicNumber() {
        return Objects.requireNonNull(cells.get(CsvKind.CLINIC_NUMBER));
    }

    LocalDate bornOn() {
        return LocalDate.parse(Objects.requireNonNull(cells.get("birth_date")));
    }

    ChildDetails details() {
        String months = cells.get("turn_first_seen_months");
        return new ChildDetails(
                clinicNumber(),
                cells.get("given_name"),
                cells.get("family_name"),
                bornOn(),
                months == null ? null : Integer.valueOf(months),
                Objects.requireNonNull(cells.get(LANGUAGE)),
                cells.get("note"));
    }
}
