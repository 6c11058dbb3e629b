package plusward.exchange;

import java.util.List;
import java.util.Map;
import java.util.Set;

/**
 * A file that could be read.
 *
 * @param columns the columns that it has, of those it may have
 * @param rows the rows that have as many cells as the header
 * @param mentioned the clinic numbers of all its rows, also of those left out
 */
record Sheet(CsvKind kind, List<String> columns, List<Row> rows, Set<String> mentioned) {

    Sheet {
        columns = List.copyOf(columns);
        rows = List.copyOf(rows);
        mentioned = Set.copyOf(mentioned);
    }

    /** A file that was not given. */
    static Sheet none(CsvKind kind) {
        return new Sheet(kind, List.of(), List.of(), Set.of());
    }

    /**
     * One row.
     *
     * @param number as a spreadsheet counts, the header being row 1
     * @param cells what is not empty, by column
     */
    record Row(int number, Map<String, String> cells) {

        String cell(String column) {
            return cells.getOrDefault(column, "");
        }
    }
}
