package plusward.exchange;

import java.util.Arrays;
import java.util.List;
import java.util.stream.Stream;
import plusward.exam.Field;

/** The two files, with the columns that each may have, in the order in which they are written. */
enum CsvKind {
    CHILDREN(
            "children.csv",
            "birth_date",
            List.of(
                    "clinic_number",
                    "given_name",
                    "family_name",
                    "birth_date",
                    "turn_first_seen_months",
                    "handout_language",
                    "note")),
    VISITS(
            "visits.csv",
            "visit_date",
            Stream.concat(
                            Stream.of("clinic_number"),
                            Arrays.stream(Field.values()).map(Field::column))
                    .toList());

    static final String CLINIC_NUMBER = "clinic_number";

    private final String fileName;
    private final String ownColumn;

    @SuppressWarnings("ImmutableEnumChecker") // every list above is unmodifiable
    private final List<String> columns;

    CsvKind(String fileName, String ownColumn, List<String> columns) {
        this.fileName = fileName;
        this.ownColumn = ownColumn;
        this.columns = columns;
    }

    public String fileName() {
        return fileName;
    }

    List<String> columns() {
        return columns;
    }

    public List<String> required() {
        return List.of(CLINIC_NUMBER, ownColumn);
    }

    /** True when these columns are those of the other file: chosen in the wrong place. */
    boolean isTheOther(List<String> header) {
        CsvKind other = this == CHILDREN ? VISITS : CHILDREN;
        return header.contains(other.ownColumn) && !header.contains(ownColumn);
    }
}
