package plusward.exchange;

import java.time.LocalDate;
import java.util.HashMap;
import java.util.Map;
import java.util.TreeMap;
import org.jspecify.annotations.Nullable;
import plusward.exchange.Refusals.Cell;
import plusward.exchange.Refusals.Place;
import plusward.exchange.Sheet.Row;

/** Judges the rows of {@code children.csv} against the children that the clinic has. */
final class ChildRows {

    private final Sheet sheet;
    private final Map<String, ChildFacts> stored;
    private final LocalDate today;
    private final Refusals refusals;
    private final ChildNotation notation;
    private final Outcome<ChildFacts> outcome = new Outcome<>(CsvKind.CHILDREN);
    private final Map<String, Integer> firstRows = new HashMap<>();

    private final Map<String, LocalDate> bornOn = new HashMap<>();

    ChildRows(Sheet sheet, Map<String, ChildFacts> stored, LocalDate today, Refusals refusals) {
        this.sheet = sheet;
        this.stored = stored;
        this.today = today;
        this.refusals = refusals;
        this.notation = new ChildNotation(refusals);
    }

    Outcome<ChildFacts> judge() {
        sheet.rows().forEach(this::judge);
        return outcome;
    }

    /** The days of birth that the file gives, by clinic number. */
    Map<String, LocalDate> bornOn() {
        return bornOn;
    }

    /** The row of the child's day of birth. */
    int rowOf(String clinicNumber) {
        return firstRows.getOrDefault(clinicNumber, 1);
    }

    private void judge(Row row) {
        int before = refusals.count();
        Map<String, String> cells = read(row);
        String number = cells.get(CsvKind.CLINIC_NUMBER);
        if (number != null) {
            judgeKey(row, number);
            judgeBirth(row, number, cells.get("birth_date"));
        }
        if (number != null && refusals.count() == before) {
            compare(row, number, cells);
        }
    }

    private Map<String, String> read(Row row) {
        Map<String, String> cells = new HashMap<>();
        for (String column : sheet.columns()) {
            String cell = row.cell(column);
            Place at = at(row, column);
            String read = cell.isEmpty() ? null : notation.read(at, cell);
            if (read != null) {
                cells.put(column, read);
            } else if (cell.isEmpty() && sheet.kind().required().contains(column)) {
                refusals.add(Cell.of(at, "", "missing-cell", column));
            }
        }
        return cells;
    }

    private void judgeKey(Row row, String number) {
        Integer first = firstRows.putIfAbsent(number, row.number());
        if (first != null) {
            refusals.add(Cell.of(at(row, CsvKind.CLINIC_NUMBER), number, "child-twice", first, row.number()));
        }
    }

    private void judgeBirth(Row row, String number, @Nullable String birthDate) {
        if (birthDate == null) {
            return;
        }
        LocalDate born = LocalDate.parse(birthDate);
        if (born.isAfter(today)) {
            refusals.add(Cell.of(at(row, "birth_date"), birthDate, "future", today));
        } else {
            bornOn.putIfAbsent(number, born);
        }
    }

    /** Columns that the file does not have keep what is stored. */
    private void compare(Row row, String number, Map<String, String> cells) {
        ChildFacts known = stored.get(number);
        if (known == null) {
            outcome.isNew(new ChildFacts(cells));
            return;
        }
        Map<String, String> merged = new TreeMap<>(known.cells());
        merged.keySet().removeAll(sheet.columns());
        merged.putAll(cells);
        ChildFacts facts = new ChildFacts(merged);
        if (facts.equals(known)) {
            outcome.isSame();
        } else {
            outcome.isChanged(facts, row.number(), number, known.cells(), facts.cells());
        }
    }

    private static Place at(Row row, String column) {
        return new Place(CsvKind.CHILDREN, row.number(), column);
    }
}
