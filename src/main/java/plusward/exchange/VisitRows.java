package plusward.exchange;

import java.time.LocalDate;
import java.util.EnumMap;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import plusward.exam.Examination;
import plusward.exam.ExaminationReader;
import plusward.exam.ExaminationWriter;
import plusward.exam.Field;
import plusward.exchange.Refusals.Cell;
import plusward.exchange.Refusals.Place;
import plusward.exchange.Sheet.Row;

/** Judges the rows of {@code visits.csv} against the visits that the clinic has. */
final class VisitRows {

    private final Sheet sheet;
    private final List<Field> fields;
    private final KnownChildren children;
    private final StoredClinic clinic;
    private final LocalDate today;
    private final Refusals refusals;
    private final Outcome<VisitFacts> outcome = new Outcome<>(CsvKind.VISITS);
    private final Map<String, Integer> firstRows = new HashMap<>();

    VisitRows(Sheet sheet, KnownChildren children, StoredClinic clinic, Refusals refusals) {
        this.sheet = sheet;
        this.fields = sheet.columns().stream()
                .flatMap(column -> Field.named(column).stream())
                .toList();
        this.children = children;
        this.clinic = clinic;
        this.today = children.today();
        this.refusals = refusals;
    }

    Outcome<VisitFacts> judge() {
        sheet.rows().forEach(this::judge);
        return outcome;
    }

    private void judge(Row row) {
        int before = refusals.count();
        String number = row.cell(CsvKind.CLINIC_NUMBER).strip();
        judgeChild(row, number);
        ExaminationReader.Result result = ExaminationReader.read(cells(row));
        refuse(row, result);
        Examination read = result.examination();
        if (read != null) {
            judgeDate(row, number, read.date());
            if (refusals.count() == before) {
                compare(row, number, read);
            }
        }
    }

    private void refuse(Row row, ExaminationReader.Result result) {
        result.refusals()
                .forEach(refusal ->
                        refusals.add(Refusals.ofNotation(at(row, refusal.field().column()), refusal.problem())));
    }

    private Map<Field, String> cells(Row row) {
        Map<Field, String> cells = new EnumMap<>(Field.class);
        fields.forEach(field -> cells.put(field, row.cell(field.column())));
        return cells;
    }

    private void judgeChild(Row row, String number) {
        Place at = at(row, CsvKind.CLINIC_NUMBER);
        if (number.isEmpty()) {
            refusals.add(Cell.of(at, "", "missing-cell", CsvKind.CLINIC_NUMBER));
        } else if (!children.has(number)) {
            refusals.add(Cell.of(at, number, "unknown-child"));
        }
    }

    private void judgeDate(Row row, String number, LocalDate date) {
        Place at = at(row, Field.VISIT_DATE.column());
        LocalDate born = children.bornOn(number);
        if (date.isAfter(today)) {
            refusals.add(Cell.of(at, date.toString(), "future", today));
        } else if (born != null && date.isBefore(born)) {
            refusals.add(Cell.of(at, date.toString(), "before-birth", born));
        }
        Integer first = number.isEmpty() ? null : firstRows.putIfAbsent(key(number, date), row.number());
        if (first != null) {
            refusals.add(Cell.of(at, date.toString(), "visit-twice", first, row.number()));
        }
    }

    private void compare(Row row, String number, Examination read) {
        Examination known = clinic.visitsOf(number).get(read.date());
        if (known == null) {
            outcome.isNew(new VisitFacts(number, read));
            return;
        }
        ExaminationReader.Result result = merged(known, row);
        Examination merged = result.examination();
        if (merged == null) {
            refuse(row, result);
        } else if (merged.equals(known)) {
            outcome.isSame();
        } else {
            outcome.isChanged(
                    new VisitFacts(number, merged), row.number(), key(number, read.date()), text(known), text(merged));
        }
    }

    /** Columns that the file does not have keep what is stored; a cell may then be at odds with what is stored. */
    private ExaminationReader.Result merged(Examination known, Row row) {
        Map<Field, String> cells = new EnumMap<>(Field.class);
        cells.putAll(ExaminationWriter.write(known));
        cells.putAll(cells(row));
        return ExaminationReader.read(cells);
    }

    private static Map<String, String> text(Examination examination) {
        Map<String, String> text = new HashMap<>();
        ExaminationWriter.write(examination).forEach((field, value) -> text.put(field.column(), value));
        return text;
    }

    private static String key(String number, LocalDate date) {
        return number + ", " + date;
    }

    private static Place at(Row row, String column) {
        return new Place(CsvKind.VISITS, row.number(), column);
    }
}
