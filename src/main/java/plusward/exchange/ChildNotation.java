package plusward.exchange;

import java.time.LocalDate;
import java.util.Locale;
import java.util.Map;
import java.util.Set;
import org.jspecify.annotations.Nullable;
import plusward.child.ChildDetails;
import plusward.exam.Examination;
import plusward.exam.ExaminationReader;
import plusward.exam.Field;
import plusward.exchange.Refusals.Cell;
import plusward.exchange.Refusals.Place;

/** Reads the cells of {@code children.csv} into the one way in which each is kept. */
final class ChildNotation {

    private static final int LONGEST_LINE = 80;
    private static final int LONGEST_NOTE = 4000;
    private static final int MOST_MONTHS = 216;
    private static final Set<String> LANGUAGES = Set.of("en", "es");

    private final Refusals refusals;

    ChildNotation(Refusals refusals) {
        this.refusals = refusals;
    }

    /** The cell as it is kept; absent when it is refused. */
    @Nullable
    String read(Place at, String cell) {
        return switch (at.column()) {
            case "birth_date" -> date(at, cell);
            case "turn_first_seen_months" -> months(at, cell);
            case "handout_language" -> language(at, cell);
            case "note" -> text(at, cell.replace("\r\n", "\n"), LONGEST_NOTE);
            case CsvKind.CLINIC_NUMBER -> clinicNumber(at, cell);
            default -> text(at, cell, LONGEST_LINE);
        };
    }

    private @Nullable String clinicNumber(Place at, String cell) {
        String typed = cell.strip();
        if (!ChildDetails.isClinicNumber(typed)) {
            refusals.add(Cell.of(at, cell, "clinic-number"));
            return null;
        }
        return typed;
    }

    /** The same reader as for the date of a visit. */
    private @Nullable String date(Place at, String cell) {
        ExaminationReader.Result result = ExaminationReader.read(Map.of(Field.VISIT_DATE, cell));
        Examination read = result.examination();
        if (read != null) {
            LocalDate date = read.date();
            return date.toString();
        }
        result.refusals().forEach(refusal -> refusals.add(Refusals.ofNotation(at, refusal.problem())));
        return null;
    }

    private @Nullable String months(Place at, String cell) {
        String typed = cell.strip();
        if (!typed.matches("\\d{1,3}") || Integer.parseInt(typed) > MOST_MONTHS) {
            refusals.add(Cell.of(at, cell, "months", MOST_MONTHS));
            return null;
        }
        return Integer.valueOf(typed).toString();
    }

    private @Nullable String language(Place at, String cell) {
        String typed = cell.strip().toLowerCase(Locale.ROOT);
        if (!LANGUAGES.contains(typed)) {
            refusals.add(Cell.of(at, cell, "language"));
            return null;
        }
        return typed;
    }

    private @Nullable String text(Place at, String cell, int longest) {
        String typed = cell.strip();
        String allowed = longest == LONGEST_NOTE ? "\n\t" : "";
        boolean control = typed.chars().anyMatch(c -> Character.isISOControl(c) && allowed.indexOf(c) < 0);
        if (control || typed.length() > longest) {
            refusals.add(Cell.of(at, cell, control ? "control" : "long", longest));
            return null;
        }
        return typed;
    }
}
