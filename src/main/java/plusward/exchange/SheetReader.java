package plusward.exchange;

import java.io.IOException;
import java.io.StringReader;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.Iterator;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVParser;
import org.apache.commons.csv.CSVRecord;
import org.jspecify.annotations.Nullable;
import plusward.exchange.Refusals.Cell;
import plusward.exchange.Refusals.Place;
import plusward.exchange.Sheet.Row;

/**
 * Reads a CSV file: separator found from the header, quoting as in RFC 4180, rows counted as a spreadsheet counts them.
 *
 * <p>Every cell is data; one that starts with {@code =} or {@code +} is not a formula. Never throws for any bytes.
 */
final class SheetReader {

    static final int MOST_ROWS = 50_000;

    private final CsvKind kind;
    private final Refusals refusals;
    private final List<Row> rows = new ArrayList<>();
    private final Set<String> mentioned = new HashSet<>();
    private @Nullable SheetHeader header;

    private SheetReader(CsvKind kind, Refusals refusals) {
        this.kind = kind;
        this.refusals = refusals;
    }

    /** The rows that could be read; absent when the file or its header does not let any row be judged. */
    static @Nullable Sheet read(CsvKind kind, byte[] bytes, Refusals refusals) {
        String text = SheetText.read(kind, bytes, refusals);
        return text == null ? null : new SheetReader(kind, refusals).sheet(text);
    }

    private @Nullable Sheet sheet(String text) {
        if (text.isBlank()) {
            refuse(1, "", "", "empty");
            return null;
        }
        CSVFormat format = CSVFormat.RFC4180
                .builder()
                .setDelimiter(separatorOf(text))
                .setIgnoreEmptyLines(false)
                .get();
        try (CSVParser parser = CSVParser.parse(new StringReader(text), format)) {
            readAll(parser);
        } catch (IOException unreadable) {
            throw new UncheckedIOException(unreadable);
        }
        return header == null ? null : new Sheet(kind, header.columns(), rows, mentioned);
    }

    private void readAll(CSVParser parser) {
        Iterator<CSVRecord> records = parser.iterator();
        boolean goOn = true;
        while (goOn) {
            try {
                goOn = records.hasNext() && read(records.next());
            } catch (UncheckedIOException brokenQuotes) {
                refuse((int) parser.getRecordNumber() + 1, "", "", "quotes");
                goOn = false;
            }
        }
    }

    /** False when nothing more of the file can be judged. */
    private boolean read(CSVRecord cells) {
        int number = (int) cells.getRecordNumber();
        if (number == 1) {
            SheetHeader first = new SheetHeader(kind, cells.toList(), refusals);
            boolean judgeable = first.judge();
            header = judgeable ? first : null;
            return judgeable;
        }
        if (number > MOST_ROWS + 1) {
            refuse(number, "", "", "rows", MOST_ROWS);
            return false;
        }
        if (header != null && cells.stream().anyMatch(cell -> !cell.isBlank())) {
            header.find(CsvKind.CLINIC_NUMBER, cells.toList()).ifPresent(mentioned::add);
            row(header, number, cells);
        }
        return true;
    }

    private void row(SheetHeader header, int number, CSVRecord cells) {
        int size = header.size();
        if (cells.size() != size) {
            String key = cells.size() < size ? "few-cells" : "many-cells";
            String column = header.nameAt(Math.min(cells.size(), size));
            String read = cells.size() > size ? cells.get(size) : "";
            refuse(number, column, read, key, cells.size(), size);
            return;
        }
        Map<String, String> byColumn = new HashMap<>();
        for (int i = 0; i < size; i++) {
            String cell = cells.get(i);
            if (!cell.isBlank()) {
                place(header, number, i, cell, byColumn);
            }
        }
        rows.add(new Row(number, byColumn));
    }

    private void place(SheetHeader header, int number, int index, String cell, Map<String, String> byColumn) {
        if (header.isKnown(index)) {
            byColumn.put(header.nameAt(index), cell);
        } else if (header.isLeftOver(index)) {
            refuse(number, header.nameAt(index), cell, "unnamed-column");
        }
    }

    private void refuse(int row, String column, String read, String key, Object... values) {
        refusals.add(Cell.of(new Place(kind, row, column), read, key, values));
    }

    /** The one of comma, semicolon and tab that the header has most of; quoted names do not count. */
    static char separatorOf(String text) {
        String header = text.lines().findFirst().orElse("").replaceAll("\"[^\"]*\"", "");
        char separator = ',';
        for (char candidate : new char[] {';', '\t'}) {
            if (count(header, candidate) > count(header, separator)) {
                separator = candidate;
            }
        }
        return separator;
    }

    private static long count(String text, char wanted) {
        return text.chars().filter(c -> c == wanted).count();
    }
}
