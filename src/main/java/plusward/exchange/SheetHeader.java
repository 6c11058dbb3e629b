package plusward.exchange;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import plusward.exchange.Refusals.Cell;
import plusward.exchange.Refusals.Place;

/** The first row: which column stands where. */
final class SheetHeader {

    private final CsvKind kind;
    private final List<String> names;
    private final Refusals refusals;
    private final Map<Integer, String> known = new LinkedHashMap<>();
    private final int width;

    SheetHeader(CsvKind kind, List<String> cells, Refusals refusals) {
        this.kind = kind;
        this.names = cells.stream()
                .map(cell -> cell.strip().toLowerCase(Locale.ROOT))
                .toList();
        this.refusals = refusals;
        this.width = widthOf(names);
    }

    /** Names what is wrong with the header; true when the rows below it can be judged all the same. */
    boolean judge() {
        if (kind.isTheOther(names)) {
            refuse("", "", "other-file");
            return false;
        }
        for (int i = 0; i < width; i++) {
            place(i);
        }
        List<String> missing = new ArrayList<>(kind.required());
        missing.removeAll(known.values());
        missing.forEach(column -> refuse(column, "", "missing-column", column));
        return missing.isEmpty();
    }

    /** How many cells every row must have. */
    int size() {
        return names.size();
    }

    List<String> columns() {
        return List.copyOf(known.values());
    }

    /** The name of a column, by its place; its letter when it has no name of ours. */
    String nameAt(int index) {
        String name = known.get(index);
        return name == null ? letters(index) : name;
    }

    /** The cell of a row in a column of ours, even where the row has too many or too few cells. */
    Optional<String> find(String column, List<String> cells) {
        return known.entrySet().stream()
                .filter(each -> each.getValue().equals(column) && each.getKey() < cells.size())
                .map(each -> cells.get(each.getKey()).strip())
                .findFirst();
    }

    boolean isKnown(int index) {
        return known.containsKey(index);
    }

    /** True for a column without a name at the right end, which must stay empty. */
    boolean isLeftOver(int index) {
        return index >= width;
    }

    /** Columns without a name at the right end are what a spreadsheet leaves behind: allowed while they are empty. */
    private static int widthOf(List<String> names) {
        int width = names.size();
        while (width > 0 && names.get(width - 1).isEmpty()) {
            width--;
        }
        return width;
    }

    private void place(int index) {
        String name = names.get(index);
        if (!kind.columns().contains(name)) {
            refuse(name.isEmpty() ? letters(index) : name, name, "unknown-column");
        } else if (known.containsValue(name)) {
            refuse(name, name, "duplicate-column", letters(names.indexOf(name)), letters(index));
        } else {
            known.put(index, name);
        }
    }

    private void refuse(String column, String read, String key, Object... values) {
        refusals.add(Cell.of(new Place(kind, 1, column), read, key, values));
    }

    /** As a spreadsheet letters its columns: A to Z, AA, AB … */
    static String letters(int index) {
        String last = String.valueOf((char) ('A' + index % 26));
        return index < 26 ? last : letters(index / 26 - 1) + last;
    }
}
