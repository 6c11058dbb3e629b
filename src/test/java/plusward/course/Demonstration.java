package plusward.course;

import java.io.IOException;
import java.io.Reader;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVRecord;

/** The demonstration clinic's children, read from its tables, with what each visit is expected to show. */
public final class Demonstration {

    /** The day on which the expectations hold. */
    public static final LocalDate JUDGED_ON = LocalDate.parse("2026-12-01");

    private static final CSVFormat WITH_HEADER =
            CSVFormat.DEFAULT.builder().setHeader().setSkipHeaderRecord(true).get();

    private Demonstration() {}

    /** What one visit is expected to show; findings as codes, with ! after those of the weight act. */
    public record ExpectedVisit(LocalDate date, String state, List<String> findings) {}

    /** What one child is expected to show: the pattern at the last visit, and every visit. */
    public record ExpectedChild(String clinicNumber, String pattern, List<ExpectedVisit> visits) {

        @Override
        public String toString() {
            return clinicNumber;
        }
    }

    /** Every child's course by clinic number. */
    public static Map<String, Course> courses() {
        List<CSVRecord> visits = records("seed-data/visits.csv");
        Map<String, Course> courses = new HashMap<>();
        for (CSVRecord child : records("seed-data/children.csv")) {
            String number = child.get("clinic_number");
            courses.put(
                    number,
                    new Course(
                            patient(child),
                            visits.stream()
                                    .filter(visit -> visit.get("clinic_number").equals(number))
                                    .map(Demonstration::row)
                                    .map(row -> CourseText.exam(row))
                                    .toList()));
        }
        return courses;
    }

    /** The expectations, in the order of their file. */
    public static List<ExpectedChild> expected() {
        List<ExpectedChild> children = new ArrayList<>();
        for (String line : lines("src/test/resources/stories/demonstration.txt")) {
            String[] cells = line.split("\\s*\\|\\s*", -1);
            if (cells.length == 2) {
                children.add(new ExpectedChild(cells[0], cells[1], new ArrayList<>()));
            } else {
                children.get(children.size() - 1)
                        .visits()
                        .add(new ExpectedVisit(LocalDate.parse(cells[0]), cells[1], codes(cells[2])));
            }
        }
        return children;
    }

    private static List<String> codes(String cell) {
        return Arrays.stream(cell.split(",\\s*"))
                .map(String::strip)
                .filter(code -> !code.isEmpty())
                .sorted()
                .toList();
    }

    private static Patient patient(CSVRecord child) {
        String months = child.get("turn_first_seen_months");
        return new Patient(
                child.get("clinic_number"),
                LocalDate.parse(child.get("birth_date")),
                months.isEmpty() ? null : Integer.valueOf(months));
    }

    private static Map<String, String> row(CSVRecord visit) {
        Map<String, String> row = new HashMap<>(visit.toMap());
        row.remove("clinic_number");
        return row;
    }

    private static List<CSVRecord> records(String file) {
        try (Reader reader = Files.newBufferedReader(Path.of(file))) {
            return WITH_HEADER.parse(reader).getRecords();
        } catch (IOException unreadable) {
            throw new UncheckedIOException(unreadable);
        }
    }

    private static List<String> lines(String file) {
        try (Stream<String> lines = Files.lines(Path.of(file))) {
            return lines.filter(line -> !line.isBlank() && !line.startsWith("#"))
                    .toList();
        } catch (IOException unreadable) {
            throw new UncheckedIOException(unreadable);
        }
    }
}
