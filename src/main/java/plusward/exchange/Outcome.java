package plusward.exchange;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import org.jspecify.annotations.Nullable;

/**
 * What bringing in one file would do: rows new, changed and the same.
 *
 * @param <T> what a row holds
 */
final class Outcome<T> {

    private final CsvKind file;
    private final List<T> added = new ArrayList<>();
    private final List<T> changed = new ArrayList<>();
    private final List<Change> changes = new ArrayList<>();
    private int same;

    Outcome(CsvKind file) {
        this.file = file;
    }

    /** One cell that would change; absent before or after is "not measured". */
    record Change(
            CsvKind file,
            int row,
            String key,
            String column,
            @Nullable String before,
            @Nullable String after) {}

    /** The counts of one file, or of both. */
    record Counts(int added, int changed, int same) {

        Counts plus(Counts other) {
            return new Counts(added + other.added, changed + other.changed, same + other.same);
        }

        int rows() {
            return added + changed + same;
        }
    }

    void isNew(T facts) {
        added.add(facts);
    }

    void isSame() {
        same++;
    }

    /** Keeps what differs between two rows, column by column. */
    void isChanged(T facts, int row, String key, Map<String, String> before, Map<String, String> after) {
        changed.add(facts);
        for (String column : file.columns()) {
            String was = before.get(column);
            String willBe = after.get(column);
            if (!Objects.equals(was, willBe)) {
                changes.add(new Change(file, row, key, column, was, willBe));
            }
        }
    }

    List<T> added() {
        return added;
    }

    List<T> changed() {
        return changed;
    }

    List<Change> changes() {
        return changes;
    }

    Counts counts() {
        return new Counts(added.size(), changed.size(), same);
    }
}
