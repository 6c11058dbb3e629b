package plusward.exchange;

import java.time.LocalDate;
import java.util.EnumMap;
import java.util.HashSet;
import java.util.Map;
import java.util.Set;
import org.jspecify.annotations.Nullable;
import plusward.exchange.Refusals.Cell;
import plusward.exchange.Refusals.Place;

/** Reads a file pair and judges it against what the clinic has, naming everything that is wrong at once. */
final class Judge {

    private final Map<CsvKind, Sheet> sheets = new EnumMap<>(CsvKind.class);
    private final Refusals refusals = new Refusals();
    private final boolean childrenUnread;

    Judge(CsvPair files) {
        for (CsvKind kind : CsvKind.values()) {
            byte[] bytes = files.bytesOf(kind);
            Sheet sheet = bytes == null ? null : SheetReader.read(kind, bytes, refusals);
            if (sheet != null) {
                sheets.put(kind, sheet);
            }
        }
        childrenUnread = files.bytesOf(CsvKind.CHILDREN) != null && !sheets.containsKey(CsvKind.CHILDREN);
    }

    /** The clinic numbers for which {@link #judge} must know what the clinic has. */
    Set<String> mentioned() {
        Set<String> numbers = new HashSet<>();
        sheets.values().forEach(sheet -> numbers.addAll(sheet.mentioned()));
        return numbers;
    }

    Plan judge(StoredClinic clinic, LocalDate today) {
        Sheet children = sheets.getOrDefault(CsvKind.CHILDREN, Sheet.none(CsvKind.CHILDREN));
        ChildRows childRows = new ChildRows(children, clinic.children(), today, refusals);
        Outcome<ChildFacts> ofChildren = childRows.judge();
        judgeBirths(childRows, clinic);
        @Nullable Set<String> beside = childrenUnread ? null : children.mentioned();
        KnownChildren known = new KnownChildren(clinic.children(), beside, childRows.bornOn(), today);
        Sheet visits = sheets.getOrDefault(CsvKind.VISITS, Sheet.none(CsvKind.VISITS));
        return new Plan(ofChildren, new VisitRows(visits, known, clinic, refusals).judge(), refusals);
    }

    /** A corrected day of birth must not come after a visit that the clinic has. */
    private void judgeBirths(ChildRows childRows, StoredClinic clinic) {
        childRows
                .bornOn()
                .forEach((number, born) -> clinic.visitsOf(number).keySet().stream()
                        .min(LocalDate::compareTo)
                        .filter(first -> first.isBefore(born))
                        .ifPresent(first -> {
                            Place at = new Place(CsvKind.CHILDREN, childRows.rowOf(number), "birth_date");
                            refusals.add(Cell.of(at, born.toString(), "born-after-visit", first));
                        }));
    }
}
