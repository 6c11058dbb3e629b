package plusward.course;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.LocalDate;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import plusward.optics.PrismDioptres;

/**
 * One child's course as a text table with what each visit is expected to show beside it.
 *
 * <p>The file begins with lines of a word and its value: {@code born 2019-05-02}, {@code first-seen 30} (months),
 * {@code turn-limit 8} (Δ), {@code judged-on 2026-12-01}; the last three may be missing. Then follows a table of visits as
 * {@link CourseText} reads it, with the columns {@code state}, {@code pattern} and {@code findings} beside.
 *
 * @param name the file's name
 * @param limits the clinic's limits in this story
 * @param judgedOn the day of the judgement, which matters only to an overdue visit; the last visit's day unless stated
 * @param states expected control at each visit, oldest first
 * @param patterns expected pattern at each visit
 * @param findings expected findings at each visit as codes, with ! after those of the weight act
 */
public record Story(
        String name,
        Course course,
        Limits limits,
        LocalDate judgedOn,
        List<String> states,
        List<String> patterns,
        List<List<String>> findings) {

    private static final Path FOLDER = Path.of("src/test/resources/stories");
    private static final List<String> EXPECTATIONS = List.of("state", "pattern", "findings");

    /** Every story of the folder, by name. */
    public static List<Story> all() {
        try (Stream<Path> files = Files.list(FOLDER)) {
            return files.filter(file -> !file.endsWith("demonstration.txt"))
                    .sorted()
                    .map(Story::read)
                    .toList();
        } catch (IOException unreadable) {
            throw new UncheckedIOException(unreadable);
        }
    }

    @Override
    public String toString() {
        return name;
    }

    private static Story read(Path file) {
        List<String> lines = lines(file);
        Map<String, String> words = lines.stream()
                .filter(line -> !line.contains("|"))
                .map(line -> line.split(" "))
                .collect(Collectors.toMap(word -> word[0], word -> word[1]));
        List<Map<String, String>> rows = CourseText.rows(
                lines.stream().filter(line -> line.contains("|")).collect(Collectors.joining("\n")));
        Course course = new Course(
                patient(words),
                rows.stream()
                        .map(Story::measures)
                        .map(row -> CourseText.exam(row))
                        .toList());
        String judgedOn =
                words.getOrDefault("judged-on", rows.get(rows.size() - 1).get("visit_date"));
        return new Story(
                file.getFileName().toString(),
                course,
                limits(words.get("turn-limit")),
                LocalDate.parse(judgedOn),
                column(rows, "state"),
                column(rows, "pattern"),
                column(rows, "findings").stream().map(Story::codes).toList());
    }

    private static List<String> lines(Path file) {
        try {
            return Files.readAllLines(file).stream()
                    .filter(line -> !line.isBlank() && !line.startsWith("#"))
                    .toList();
        } catch (IOException unreadable) {
            throw new UncheckedIOException(unreadable);
        }
    }

    private static Patient patient(Map<String, String> words) {
        String months = words.get("first-seen");
        return CourseText.patient(words.get("born"), months == null ? null : Integer.valueOf(months));
    }

    private static Limits limits(@Nullable String turn) {
        Limits usual = Limits.DEFAULT;
        return turn == null
                ? usual
                : new Limits(
                        PrismDioptres.of(Double.parseDouble(turn)),
                        usual.segmentTolerance(),
                        usual.pupil(),
                        usual.wear(),
                        usual.settleWeeks(),
                        usual.cycloplegicMonths(),
                        usual.overdueDays());
    }

    private static Map<String, String> measures(Map<String, String> row) {
        Map<String, String> measures = new HashMap<>(row);
        EXPECTATIONS.forEach(measures::remove);
        return measures;
    }

    private static List<String> column(List<Map<String, String>> rows, String column) {
        return rows.stream().map(row -> row.get(column)).toList();
    }

    private static List<String> codes(String cell) {
        return Arrays.stream(cell.split(" "))
                .filter(code -> !code.isEmpty())
                .sorted()
                .toList();
    }
}
