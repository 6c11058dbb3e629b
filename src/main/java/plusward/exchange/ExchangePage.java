package plusward.exchange;

import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import org.jspecify.annotations.Nullable;
import plusward.exchange.Outcome.Change;
import plusward.exchange.Outcome.Counts;

/**
 * What the page shows.
 *
 * @param preview of the files that this account has chosen; absent when there are none
 * @param trouble the start of the keys of a title and a text; absent when all went well
 * @param noFile true when the preview was asked for without a file
 */
record ExchangePage(@Nullable Preview preview, @Nullable String trouble, boolean noFile) {

    private static final int LISTED = 500;

    public boolean isWrong() {
        return noFile || trouble != null || (preview != null && preview.isRefused());
    }

    public List<CsvKind> kinds() {
        return List.of(CsvKind.values());
    }

    /** The names under which the form sends the files. */
    public List<String> files() {
        return Arrays.stream(CsvKind.values())
                .map(kind -> kind.name().toLowerCase(Locale.ROOT))
                .toList();
    }

    /** One file of the preview; {@code refused} counts rows. */
    record FileRows(String name, Counts counts, int refused) {

        public int rows() {
            return counts.rows() + refused;
        }
    }

    /** What bringing in the chosen files would do. */
    record Preview(List<FileRows> files, Plan plan) {

        static Preview of(Plan plan, CsvPair pair) {
            List<FileRows> files = Arrays.stream(CsvKind.values())
                    .filter(kind -> pair.bytesOf(kind) != null)
                    .map(kind -> new FileRows(
                            kind.fileName(),
                            plan.countsOf(kind),
                            plan.refusals().rowsOf(kind)))
                    .toList();
            return new Preview(files, plan);
        }

        public Counts all() {
            return plan.counts();
        }

        public int refusedRows() {
            return files.stream().mapToInt(FileRows::refused).sum();
        }

        public int refusedCells() {
            return plan.refusals().count();
        }

        public boolean isRefused() {
            return plan.isRefused();
        }

        public List<Refusals.Cell> refused() {
            return plan.refusals().listed();
        }

        public int moreRefused() {
            return plan.refusals().more();
        }

        public List<Change> changes() {
            return plan.changes().stream().limit(LISTED).toList();
        }

        public int moreChanges() {
            return Math.max(0, plan.changes().size() - LISTED);
        }

        public boolean isDoneAlready() {
            return !isRefused() && all().added() + all().changed() == 0;
        }

        public boolean canApply() {
            return !isRefused() && !isDoneAlready();
        }

        public String fingerprint() {
            return plan.fingerprint();
        }
    }
}
