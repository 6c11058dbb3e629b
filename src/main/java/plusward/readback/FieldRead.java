package plusward.readback;

import java.util.List;
import org.jspecify.annotations.Nullable;
import plusward.exam.Field;
import plusward.exam.Reason;
import plusward.exam.Refusal;
import plusward.rules.Suspicion;

/**
 * One field read back.
 *
 * @param understood what was understood of it, with the change since the last time; empty where nothing was typed
 * @param refused what could not be read; absent when it could
 * @param doubts what is possible but unlikely about it
 */
public record FieldRead(
        Field field, List<Reason> understood, @Nullable Refusal refused, List<Suspicion> doubts) {

    public FieldRead {
        understood = List.copyOf(understood);
        doubts = List.copyOf(doubts);
    }

    public String name() {
        return field.column();
    }

    /** What is wrong, and what would be accepted; empty when it could be read. */
    public List<Reason> problem() {
        return refused == null
                ? List.of()
                : List.of(refused.problem().reason(), refused.problem().accepted());
    }
}
