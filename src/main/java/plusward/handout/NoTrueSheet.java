package plusward.handout;

import java.util.List;
import plusward.exam.Reason;

/** No sheet can be written that would be true; the reasons say what is missing. */
final class NoTrueSheet extends RuntimeException {

    private static final long serialVersionUID = 1;

    private final transient List<Reason> missing;

    NoTrueSheet(Reason... missing) {
        super("no true sheet can be written");
        this.missing = List.of(missing);
    }

    List<Reason> missing() {
        return missing;
    }
}
