package plusward.exchange;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.EnumMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import plusward.exam.NotationException;
import plusward.exam.Reason;

/** Everything that is wrong with a file pair. Keeps the first {@value #LISTED} and counts the others. */
final class Refusals {

    static final int LISTED = 500;
    private static final int SHOWN_OF_A_CELL = 200;

    private final List<Cell> cells = new ArrayList<>();
    private final Map<CsvKind, Set<Integer>> rows = new EnumMap<>(CsvKind.class);
    private int count;

    /**
     * A cell that cannot be taken in.
     *
     * @param row as a spreadsheet counts; the header is row 1
     * @param column its name; the spreadsheet's letter where it has none; empty where it is the file as a whole
     */
    record Cell(CsvKind file, int row, String column, String read, Reason problem, Reason accepted) {

        Cell {
            read = read.length() > SHOWN_OF_A_CELL ? read.substring(0, SHOWN_OF_A_CELL) + "…" : read;
        }

        /** A refusal worded by this package: {@code exchange.problem.<key>} and {@code exchange.accepted.<key>}. */
        static Cell of(Place at, String read, String key, Object... values) {
            return new Cell(
                    at.file(),
                    at.row(),
                    at.column(),
                    read,
                    Reason.of("exchange.problem." + key, values),
                    Reason.of("exchange.accepted." + key, values));
        }
    }

    /** Where a cell stands. */
    record Place(CsvKind file, int row, String column) {}

    /** A refusal worded as on the entry page. */
    static Cell ofNotation(Place at, NotationException problem) {
        return new Cell(at.file(), at.row(), at.column(), problem.read(), problem.reason(), problem.accepted());
    }

    void add(Cell cell) {
        count++;
        rows.computeIfAbsent(cell.file(), file -> new HashSet<>()).add(cell.row());
        if (cells.size() < LISTED) {
            cells.add(cell);
        }
    }

    boolean isEmpty() {
        return count == 0;
    }

    int count() {
        return count;
    }

    /** How many are counted but not listed. */
    int more() {
        return count - cells.size();
    }

    int rowsOf(CsvKind file) {
        return rows.getOrDefault(file, Set.of()).size();
    }

    List<Cell> listed() {
        return cells.stream()
                .sorted(Comparator.comparing(Cell::file).thenComparing(Cell::row))
                .toList();
    }
}
