package plusward.course;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.EnumMap;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.stream.IntStream;
import org.jspecify.annotations.Nullable;
import plusward.exam.Examination;
import plusward.exam.ExaminationReader;
import plusward.exam.Field;

/**
 * Writes a child's course as text: the columns are those of a table of visits, the cells its notation.
 *
 * <pre>{@code
 * Visit visit = CourseText.visit("worn_right=+3.00", "worn_left=+3.00", "turn_cc_near=ET 12");
 *
 * Course course = CourseText.course("2019-05-02", """
 *         visit_date | worn_right | worn_left | turn_cc_distance | turn_cc_near
 *         2024-03-14 | +3.00      | +3.00     | E 4              | E 6
 *         2025-03-14 | "          | "         | ET 14            | ET 16
 *         """);
 * }</pre>
 *
 * <p>Cells stand between bars. An empty cell is not measured; {@code "} is the same as in the line above. Blank lines and
 * lines that begin with # are passed over. Whatever cannot be read fails the test with its column and the text.
 */
public final class CourseText {

    /** The day of birth of {@link #visit}'s child. */
    public static final LocalDate BORN = LocalDate.parse("2019-05-02");

    /** The day of {@link #visit}, unless it names another: the child is 5.87 years old. */
    public static final LocalDate DAY = LocalDate.parse("2025-03-14");

    private static final String DITTO = "\"";

    private CourseText() {}

    /** The only visit of a child, on {@link #DAY}; each entry is {@code column=text}. */
    public static Visit visit(String... entries) {
        return new Course(patient(BORN.toString()), List.of(exam(entries)))
                .latest()
                .orElseThrow();
    }

    /** The examination of one visit, on {@link #DAY}; each entry is {@code column=text}. */
    public static Examination exam(String... entries) {
        Map<String, String> row = new HashMap<>(Map.of(Field.VISIT_DATE.column(), DAY.toString()));
        for (String entry : entries) {
            int sign = entry.indexOf('=');
            row.put(entry.substring(0, sign), entry.substring(sign + 1));
        }
        return exam(row);
    }

    /** The examination that one line of a table of visits describes; every column must be one of the format. */
    public static Examination exam(Map<String, String> row) {
        Map<Field, String> text = new EnumMap<>(Field.class);
        row.forEach((column, cell) ->
                text.put(Field.named(column).orElseThrow(() -> new AssertionError("no such column: " + column)), cell));
        ExaminationReader.Result read = ExaminationReader.read(text);
        read.refusals().forEach(refusal -> {
            throw new AssertionError(refusal.field().column() + " cannot read: "
                    + refusal.problem().read());
        });
        return Objects.requireNonNull(read.examination());
    }

    /** The course of a child born on that day; the table's first line names the columns. */
    public static Course course(String bornOn, String table) {
        return course(patient(bornOn), table);
    }

    /** The course of this child; the table's first line names the columns. */
    public static Course course(Patient patient, String table) {
        return new Course(patient, rows(table).stream().map(row -> exam(row)).toList());
    }

    /** A child born on that day; when the turn was first seen is not known. */
    public static Patient patient(String bornOn) {
        return patient(bornOn, null);
    }

    /** A child born on that day, whose turn was first seen at that age in months. */
    public static Patient patient(String bornOn, @Nullable Integer turnFirstSeenMonths) {
        return new Patient("T-1", LocalDate.parse(bornOn), turnFirstSeenMonths);
    }

    /** The lines of a table below its header, each as text by column, empty cells included. */
    public static List<Map<String, String>> rows(String table) {
        List<List<String>> lines = table.lines()
                .filter(line -> !line.isBlank() && !line.strip().startsWith("#"))
                .map(CourseText::cells)
                .toList();
        List<Map<String, String>> rows = new ArrayList<>();
        for (List<String> line : lines.subList(1, lines.size())) {
            Map<String, String> above = rows.isEmpty() ? Map.of() : rows.get(rows.size() - 1);
            rows.add(row(lines.get(0), line, above));
        }
        return rows;
    }

    private static Map<String, String> row(List<String> columns, List<String> cells, Map<String, String> above) {
        if (cells.size() != columns.size()) {
            throw new AssertionError("expected " + columns.size() + " cells: " + cells);
        }
        Map<String, String> row = new HashMap<>();
        IntStream.range(0, cells.size()).forEach(i -> {
            String column = columns.get(i);
            row.put(column, cells.get(i).equals(DITTO) ? above.getOrDefault(column, "") : cells.get(i));
        });
        return row;
    }

    private static List<String> cells(String line) {
        return Arrays.stream(line.split("\\|", -1)).map(String::strip).toList();
    }
}
