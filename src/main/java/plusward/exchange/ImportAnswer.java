package plusward.exchange;

import com.fasterxml.jackson.annotation.JsonProperty;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import plusward.exchange.Outcome.Counts;
import plusward.web.Sentences;

/**
 * The answer of {@code POST /api/import}.
 *
 * @param applied true when the files were stored
 * @param files the counts of rows of each file
 * @param refusedInAll how many cells are refused, of which {@code refused} lists the first 500
 */
record ImportAnswer(
        boolean applied,
        @JsonProperty("new") int added,
        int changed,
        int same,
        Map<String, OfFile> files,
        int refusedInAll,
        List<RefusedCell> refused) {

    record OfFile(@JsonProperty("new") int added, int changed, int same, int refused) {}

    record RefusedCell(String file, int row, String column, String read, String problem, String accepted) {}

    static ImportAnswer of(Plan plan, boolean apply, Sentences sentences) {
        Map<String, OfFile> files = new TreeMap<>();
        Arrays.stream(CsvKind.values()).forEach(kind -> files.put(kind.fileName(), ofFile(plan, kind)));
        Counts all = plan.counts();
        return new ImportAnswer(
                apply && !plan.isRefused(),
                all.added(),
                all.changed(),
                all.same(),
                files,
                plan.refusals().count(),
                plan.refusals().listed().stream()
                        .map(cell -> worded(cell, sentences))
                        .toList());
    }

    private static OfFile ofFile(Plan plan, CsvKind kind) {
        Counts counts = plan.countsOf(kind);
        return new OfFile(
                counts.added(), counts.changed(), counts.same(), plan.refusals().rowsOf(kind));
    }

    private static RefusedCell worded(Refusals.Cell cell, Sentences sentences) {
        return new RefusedCell(
                cell.file().fileName(),
                cell.row(),
                cell.column(),
                cell.read(),
                sentences.of(cell.problem()),
                sentences.of(cell.accepted()));
    }
}
